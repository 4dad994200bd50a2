/** The outline of a project's page while it is fetched. */
export default function Loading() {
  return (
    <main aria-busy="true" className="mx-auto grid max-w-7xl grid-cols-1 gap-8 px-4 py-6">
      <p role="status" className="text-ink-soft">Fetching the project</p>
      <div className="h-9 w-72 max-w-full bg-rule" />
      <div className="grid gap-4 lg:grid-cols-2">
        <div className="h-48 border border-rule bg-sheet" />
        <div className="h-48 border border-rule bg-sheet" />
      </div>
      <div className="h-32 border border-rule bg-sheet" />
    </main>
  )
}

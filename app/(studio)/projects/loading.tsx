/** The outline of the cards while the projects are fetched. */
export default function Loading() {
  return (
    <main aria-busy="true" className="mx-auto grid max-w-7xl grid-cols-1 gap-5 px-4 py-6">
      <p role="status" className="text-ink-soft">Fetching the projects</p>
      <div className="h-9 w-48 max-w-full bg-rule" />
      <div className="grid gap-4 md:grid-cols-2 xl:grid-cols-3">
        <div className="h-44 border border-rule bg-sheet" />
        <div className="h-44 border border-rule bg-sheet" />
        <div className="h-44 border border-rule bg-sheet" />
      </div>
    </main>
  )
}

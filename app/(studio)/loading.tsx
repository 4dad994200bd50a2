/** The outline of a page while it is fetched. */
export default function Loading() {
  return (
    <main aria-busy="true" className="mx-auto max-w-6xl px-4 py-6">
      <p role="status" className="text-ink-soft">Fetching the page</p>
      <div className="mt-3 h-9 w-64 max-w-full bg-rule" />
      <div className="mt-6 grid gap-3">
        <div className="h-16 border border-rule bg-sheet" />
        <div className="h-16 border border-rule bg-sheet" />
        <div className="h-16 border border-rule bg-sheet" />
      </div>
    </main>
  )
}

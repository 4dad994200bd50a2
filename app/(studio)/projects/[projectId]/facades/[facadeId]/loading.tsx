/** The table's outline while the sheet is fetched. */
export default function Loading() {
  return (
    <main aria-busy="true" className="flex h-[calc(100dvh-var(--studio-header,4rem))] min-h-[36rem] flex-col">
      <p className="flex h-15 items-center border-b border-rule px-4 text-ink-soft" role="status">Fetching the sheet</p>
      <div className="flex min-h-0 flex-1">
        <div className="w-18 border-r border-rule" />
        <div className="flex-1 bg-sheet" />
        <div className="w-80 border-l border-rule xl:w-96" />
      </div>
      <div className="h-16 border-t border-rule" />
    </main>
  )
}

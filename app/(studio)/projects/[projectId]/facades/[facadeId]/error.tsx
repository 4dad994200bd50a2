'use client'

/** A fault of ours: what it means for the work, and what to do. */
export default function DrawingTableError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <main className="mx-auto max-w-xl p-8">
      <h1 className="font-heading text-2xl">The drawing could not be laid out</h1>
      <p className="mt-2">Something went wrong on our side. Edits that were not sent yet wait on this device and go on when the page opens again.</p>
      {error.digest ? <p className="mt-1 text-ink-soft">If it stays so, name this number: <span className="font-mono">{error.digest}</span></p> : null}
      <button type="button" onClick={reset} className="mt-4 inline-flex min-h-11 items-center rounded-sm bg-leaf px-4 font-bold text-sheet focus-visible:outline-2 focus-visible:outline-offset-2 focus-visible:outline-leaf">Try again</button>
    </main>
  )
}

import { Button } from '@/components/ui'

interface FaultProps {
  digest: string | undefined
  onRetry: () => void
}

/** A fault of ours, said plainly, with the number the log knows it by. */
export function Fault({ digest, onRetry }: FaultProps) {
  return (
    <main className="mx-auto max-w-xl px-5 py-10">
      <h1 className="font-heading text-3xl leading-tight">This page could not be made</h1>
      <p className="mt-3">Something went wrong on our side. What was saved before is safe.</p>
      {digest && <p className="mt-2 text-ink-soft">If it stays so, name this number: <span className="font-mono">{digest}</span></p>}
      <Button variant="primary" onClick={onRetry} className="mt-5">Try again</Button>
    </main>
  )
}

'use client'
import { Fault } from '@/components/shell/fault'

/** A page of the studio that throws: the header stays, so that one can go elsewhere. */
export default function StudioError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return <Fault digest={error.digest} onRetry={reset} />
}

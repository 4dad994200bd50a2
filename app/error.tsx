'use client'
import { Fault } from '@/components/shell/fault'

/** Any page that throws. */
export default function PageError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return <Fault digest={error.digest} onRetry={reset} />
}

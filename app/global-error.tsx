'use client'
import { Fault } from '@/components/shell/fault'
import { fontVariables } from './fonts'
import './globals.css'

/** The layout itself threw: this page brings its own. */
export default function GlobalError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <html lang="en" className={fontVariables}>
      <body>
        <title>Tenth Summer</title>
        <Fault digest={error.digest} onRetry={reset} />
      </body>
    </html>
  )
}

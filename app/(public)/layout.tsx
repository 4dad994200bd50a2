import type { ReactNode } from 'react'

/** Pages for someone not signed in: the bare sheet. Each page brings its own main. */
export default function PublicLayout({ children }: { children: ReactNode }) {
  return <div className="min-h-dvh bg-paper text-ink">{children}</div>
}

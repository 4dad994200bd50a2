import type { ReactNode } from 'react'

interface EmptyStateProps {
  title: string
  /** What belongs here. */
  children?: ReactNode
  /** The one button that starts it. */
  action?: ReactNode
}

/** What stands where a list has nothing yet. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <section className="rounded-sm border border-dashed border-ink-soft bg-sheet px-6 py-10 text-center">
      <h2 className="font-heading text-2xl">{title}</h2>
      {children && <div className="mx-auto mt-2 max-w-prose text-ink-soft">{children}</div>}
      {action && <div className="mt-5 flex justify-center">{action}</div>}
    </section>
  )
}

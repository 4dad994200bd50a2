import type { ReactNode } from 'react'

interface Props {
  /** What the table is called to those who do not see it. */
  label: string
  className?: string
  children: ReactNode
}

/** A table that may be wider than its place: it scrolls sideways by itself, by finger and by keyboard. */
export function WideTable({ label, className = '', children }: Props) {
  return <div className={`overflow-x-auto ${className}`} role="region" aria-label={label} tabIndex={0}>{children}</div>
}

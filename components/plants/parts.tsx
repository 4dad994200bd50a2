/** Classes and small pieces the plant pages share. */
import type { ReactNode } from 'react'

export const CONTROL = 'min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-3 text-ink aria-invalid:border-conflict'
const BUTTON = 'inline-flex min-h-11 items-center justify-center gap-2 rounded-sm px-4 aria-disabled:opacity-60 disabled:opacity-60'
export const STRONG = `${BUTTON} bg-leaf font-bold text-sheet`
export const PLAIN = `${BUTTON} border border-ink-soft bg-sheet text-ink hover:bg-paper`
export const CARD = 'rounded-sm border border-rule bg-sheet p-4'
export const HEADING = 'font-heading text-2xl'

interface FieldProps {
  id: string
  label: string
  hint?: string
  error?: string | undefined
  children: ReactNode
}

/** Ids of what describes a control, for aria-describedby. */
export const describedBy = ({ id, hint, error }: Pick<FieldProps, 'id' | 'hint' | 'error'>): string | undefined =>
  [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ') || undefined

/** A control with its label above and its hint or fault below. */
export function Labelled({ id, label, hint, error, children }: FieldProps) {
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block font-bold">{label}</label>
      {children}
      {hint && <p id={`${id}-hint`} className="mt-1 text-sm text-ink-soft">{hint}</p>}
      {error && <p id={`${id}-error`} className="mt-1 text-conflict">{error}</p>}
    </div>
  )
}

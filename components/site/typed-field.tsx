'use client'
/** A text field that means a value: echoes what was understood, keeps what was typed when it means nothing. */
import { useId, useState, type InputHTMLAttributes, type KeyboardEvent } from 'react'

export type Read<T> = { ok: true; value: T } | { ok: false; message: string }

export interface TypedFieldProps<T> {
  label: string
  /** Read aloud and found by tests where the visible label is short: "Kitchen, sill". */
  longLabel?: string
  value: T
  read: (text: string) => Read<T>
  write: (value: T) => string
  /** Said under the field: what was understood. */
  echo?: (value: T) => string
  hint?: string
  /** What is wrong with the value beside others, if anything. */
  problem?: string | null
  readOnly?: boolean
  inputMode?: InputHTMLAttributes<HTMLInputElement>['inputMode']
  /** A readable value was typed; the value that stood before when what is typed means nothing. */
  onValue: (value: T) => void
  /** The field is left and holds a readable value. */
  onLeave?: () => void
}

const INPUT = 'min-h-11 w-full rounded-sm border bg-sheet px-2.5 font-mono text-ink tabular-nums read-only:bg-paper focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf'

/** What is said under the field, for its screen reader as for the eye. */
function Said({ id, message, echo, hint }: { id: string; message: string | null; echo: string | null; hint?: string | undefined }) {
  return (
    <p id={id} aria-live="polite" className={`mt-0.5 text-[13px] leading-tight ${message ? 'text-conflict' : 'text-ink-soft'}`}>
      {message ?? [echo, hint].filter(Boolean).join(' · ')}
    </p>
  )
}

/** See `TypedFieldProps`. Escape brings back the value that is kept. */
export function TypedField<T>(props: TypedFieldProps<T>) {
  const { label, longLabel, value, read, write, echo, hint, problem = null, readOnly, inputMode, onValue, onLeave } = props
  const id = useId()
  const [typed, setTyped] = useState<string | null>(null)
  const [hasFocus, setHasFocus] = useState(false)
  // What stood here when the typing began: text that means nothing brings it back.
  const [start, setStart] = useState(value)
  const typedRead = typed === null ? null : read(typed)
  const message = typedRead?.ok === false ? typedRead.message : problem
  const isTypedShown = typed !== null && (hasFocus || message !== null)
  const known = typedRead?.ok ? typedRead.value : value

  const change = (text: string) => {
    setTyped(text)
    const next = read(text)
    onValue(next.ok ? next.value : start)
  }
  const leave = () => {
    setHasFocus(false)
    if (typedRead?.ok === false) return
    if (message === null) setTyped(null)
    onLeave?.()
  }
  const key = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter' && typedRead?.ok !== false) onLeave?.()
    if (event.key !== 'Escape' || typed === null) return
    event.preventDefault()
    setTyped(null)
    onValue(start)
  }

  return (
    <div className="min-w-0">
      <label htmlFor={id} className="block text-sm text-ink-soft">
        {longLabel ? <span className="sr-only">{longLabel}</span> : null}
        <span aria-hidden={longLabel ? true : undefined}>{label}</span>
      </label>
      <input
        id={id}
        className={`${INPUT} ${message ? 'border-2 border-conflict' : 'border-ink-soft'}`}
        type="text"
        autoComplete="off"
        spellCheck={false}
        inputMode={inputMode}
        readOnly={readOnly}
        aria-invalid={message ? true : undefined}
        aria-describedby={`${id}-said`}
        data-typing={typed === null ? undefined : true}
        value={isTypedShown ? typed : write(value)}
        onChange={(event) => change(event.target.value)}
        onFocus={() => {
          setHasFocus(true)
          setStart(value)
          if (!isTypedShown) setTyped(null)
        }}
        onBlur={leave}
        onKeyDown={key}
      />
      <Said id={`${id}-said`} message={message} echo={echo?.(known) ?? null} hint={hint} />
    </div>
  )
}

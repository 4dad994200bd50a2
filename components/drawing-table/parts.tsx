'use client'
/** Small parts of the drawing table: buttons of commands, one-of-a-few choices, lengths in a table. */
import { useId, useState } from 'react'
import { formatLength, parseLength } from '@/lib/measure'
import { commandNamed } from './editor'
import { useDesk, useEditorState } from './desk-context'

const FOCUS = 'focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf'
export const BUTTON = `inline-flex min-h-11 min-w-11 items-center justify-center gap-2 rounded-sm px-3 ${FOCUS}`
export const PLAIN = `${BUTTON} border border-ink-soft bg-sheet text-ink hover:bg-paper aria-disabled:border-rule aria-disabled:text-ink-soft`
export const STRONG = `${BUTTON} bg-leaf font-bold text-sheet`
export const QUIET = `${BUTTON} text-ink underline decoration-rule underline-offset-4 hover:decoration-ink`

/** A button of a command; greyed, not gone, while it cannot run. */
export function CommandButton({ id, label, className = PLAIN, children }: { id: string; label?: string; className?: string; children: React.ReactNode }) {
  const desk = useDesk()
  useEditorState()
  const command = commandNamed(id)
  const canRun = command.when(desk)
  return (
    <button
      type="button"
      aria-label={label ?? command.label}
      title={`${command.label} (${command.keyText})`}
      aria-disabled={!canRun}
      className={className}
      onClick={() => {
        if (canRun) command.run(desk)
      }}
    >
      {children}
    </button>
  )
}

interface SegmentsProps<T extends string> {
  label: string
  value: T
  choices: readonly (readonly [T, string])[]
  onChoice: (value: T) => void
}

/** One of a few, all in sight. */
export function Segments<T extends string>({ label, value, choices, onChoice }: SegmentsProps<T>) {
  const name = useId()
  return (
    <fieldset className="flex">
      <legend className="sr-only">{label}</legend>
      {choices.map(([choice, word]) => (
        <label
          key={choice}
          className="-ml-px flex min-h-11 cursor-pointer items-center border border-ink-soft bg-sheet px-3 first-of-type:rounded-l-sm last-of-type:rounded-r-sm has-checked:bg-ink has-checked:text-sheet has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-leaf"
        >
          <input type="radio" name={name} value={choice} checked={choice === value} onChange={() => onChoice(choice)} className="sr-only" />
          {word}
        </label>
      ))}
    </fieldset>
  )
}

interface LengthCellProps {
  /** Full name: "Inkberry A, distance from the wall". */
  label: string
  /** Inches. */
  value: number
  readOnly: boolean
  /** Takes a readable length; answers what is wrong with it. */
  onCommit: (inches: number) => string | null
  className?: string
}

/** A length in a table. Kept on Enter and on leaving; Escape brings back what stands. */
export function LengthCell({ label, value, readOnly, onCommit, className = 'w-24' }: LengthCellProps) {
  const id = useId()
  const [typed, setTyped] = useState<string | null>(null)
  const [message, setMessage] = useState<string | null>(null)
  const reset = () => {
    setTyped(null)
    setMessage(null)
  }
  const commit = () => {
    if (typed === null) return
    const read = parseLength(typed)
    if (!read.ok) return setMessage(read.message)
    const problem = Math.abs(read.inches - value) < 1e-9 ? null : onCommit(read.inches)
    if (problem) setMessage(problem)
    else reset()
  }
  return (
    <span className="block">
      <input
        type="text"
        aria-label={label}
        aria-invalid={message ? true : undefined}
        aria-describedby={message ? id : undefined}
        autoComplete="off"
        spellCheck={false}
        readOnly={readOnly}
        value={typed ?? formatLength(value)}
        onChange={(event) => {
          setTyped(event.target.value)
          setMessage(null)
        }}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === 'Enter') commit()
          if (event.key === 'Escape') reset()
        }}
        className={`${className} min-h-11 rounded-sm border bg-sheet px-2 font-mono text-[15px] tabular-nums read-only:border-transparent read-only:bg-transparent ${message ? 'border-2 border-conflict' : 'border-rule'} ${FOCUS}`}
      />
      {message ? <span id={id} role="alert" className="block max-w-56 text-[13px] leading-tight text-conflict">{message}</span> : null}
    </span>
  )
}

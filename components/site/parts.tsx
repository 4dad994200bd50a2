'use client'
/** The furniture of the measure form: sections, rows of fields, and the smaller choices. */
import { useId, useRef, type ReactNode } from 'react'
import { TypedField } from './typed-field'

/** A part of the form with its heading; `id` is its address in the page. */
export function Section({ id, title, lead, children }: { id: string; title: string; lead: string; children: ReactNode }) {
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="scroll-mt-28 rounded-sm border border-rule bg-sheet p-4">
      <h2 id={`${id}-title`} tabIndex={-1} className="font-heading text-2xl outline-none">{title}</h2>
      <p className="mb-3 max-w-prose text-ink-soft">{lead}</p>
      {children}
    </section>
  )
}

const COLUMNS = { 2: 'sm:grid-cols-2', 3: 'grid-cols-2 sm:grid-cols-3', 4: 'grid-cols-2 sm:grid-cols-4' } as const

export function FieldGrid({ columns = 3, children }: { columns?: keyof typeof COLUMNS; children: ReactNode }) {
  return <div className={`mt-2 grid items-start gap-x-3 gap-y-2 ${COLUMNS[columns]}`}>{children}</div>
}

/** A short table of fields, one row for each point or stretch. */
export function RowTable({ label, headings, children }: { label: string; headings: readonly string[]; children: ReactNode }) {
  return (
    <table aria-label={label} className="my-2 w-full border-collapse text-left [&_td]:pr-3 [&_td]:pb-2 [&_td]:align-top">
      <thead>
        <tr>
          {headings.map((heading, i) => (
            <th key={i} scope="col" className="pr-3 text-sm font-normal text-ink-soft">
              {heading || <span className="sr-only">Deeds</span>}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>{children}</tbody>
    </table>
  )
}

interface RowProps {
  title: string
  readOnly: boolean
  onCopy: () => void
  onRemove: () => void
  children: ReactNode
}

/** One thing of a list: its fields, and copying and removing it. */
export function Row({ title, readOnly, onCopy, onRemove, children }: RowProps) {
  const id = useId()
  const row = useRef<HTMLDivElement>(null)
  const remove = () => {
    // The button goes with its row: the focus moves to the heading of the part.
    row.current?.closest('section')?.querySelector('h2')?.focus()
    onRemove()
  }
  return (
    <div ref={row} role="group" aria-labelledby={id} className="border-t border-rule pt-2">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h3 id={id} className="font-heading text-lg">{title}</h3>
        {readOnly ? null : (
          <span className="flex gap-1">
            <ActionButton kind="quiet" label={`Copy ${title}`} onPress={onCopy}>Copy</ActionButton>
            <ActionButton kind="quiet" label={`Remove ${title}`} onPress={remove}>Remove</ActionButton>
          </span>
        )}
      </div>
      {children}
    </div>
  )
}

const BUTTONS = {
  quiet: 'text-ink underline decoration-rule underline-offset-4 hover:decoration-ink',
  plain: 'border border-ink-soft bg-sheet text-ink hover:bg-paper',
  strong: 'bg-leaf text-sheet',
} as const

interface ActionProps {
  kind: keyof typeof BUTTONS
  /** Full name where the visible word is short. */
  label?: string
  isDisabled?: boolean
  /** Takes the focus when it appears: for questions that stop the work. */
  takesFocus?: boolean
  onPress: () => void
  children: ReactNode
}

export function ActionButton({ kind, label, isDisabled, takesFocus, onPress, children }: ActionProps) {
  return (
    <button
      type="button"
      autoFocus={takesFocus}
      aria-label={label}
      // Not `disabled`: the focus stays where it is when the last step is taken back.
      aria-disabled={isDisabled}
      onClick={isDisabled ? undefined : onPress}
      className={`min-h-11 min-w-11 rounded-sm px-3 whitespace-nowrap focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf aria-disabled:border-rule aria-disabled:text-ink-soft ${BUTTONS[kind]}`}
    >
      {children}
    </button>
  )
}

interface ChoiceProps<T extends string> {
  label: string
  longLabel?: string
  value: T
  choices: readonly T[]
  words: Record<T, string>
  onChoice: (value: T) => void
}

/** One of a list, as a drop-down. */
export function ChoiceField<T extends string>({ label, longLabel, value, choices, words, readOnly, onChoice }: ChoiceProps<T> & { readOnly: boolean }) {
  const id = useId()
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="block text-sm text-ink-soft">
        {longLabel ? <span className="sr-only">{longLabel}</span> : null}
        <span aria-hidden={longLabel ? true : undefined}>{label}</span>
      </label>
      <select
        id={id}
        value={value}
        disabled={readOnly}
        onChange={(event) => {
          const next = choices.find((choice) => choice === event.target.value)
          if (next) onChoice(next)
        }}
        className="min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-2 text-ink focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf disabled:bg-paper disabled:opacity-100"
      >
        {choices.map((choice) => (
          <option key={choice} value={choice}>{words[choice]}</option>
        ))}
      </select>
    </div>
  )
}

/** One of two or three, all of them in sight. */
export function Choice<T extends string>({ label, value, choices, words, onChoice }: ChoiceProps<T>) {
  const name = useId()
  return (
    <fieldset className="flex flex-wrap items-center gap-x-4">
      <legend className="float-left mr-3 py-2.5 text-sm text-ink-soft">{label}</legend>
      {choices.map((choice) => (
        <label key={choice} className="flex min-h-11 items-center gap-2">
          <input type="radio" name={name} value={choice} checked={choice === value} onChange={() => onChoice(choice)} className="size-5 accent-leaf" />
          {words[choice]}
        </label>
      ))}
    </fieldset>
  )
}

interface NameProps {
  longLabel: string
  value: string
  problem: string | null
  readOnly: boolean
  onValue: (name: string) => void
  onLeave: () => void
}

export function NameField(props: NameProps) {
  return <TypedField<string> {...props} label="Name" read={(text) => ({ ok: true, value: text })} write={(name) => name} />
}

interface WaitingProps {
  /** What keeping the change would break in other parts of the sheet. */
  messages: readonly string[]
  /** Brings back what is kept; null when nothing waits. */
  onPutBack: (() => void) | null
  /** What is wrong with the thing as a whole. */
  children?: string | null
}

/** Says that a thing as typed is not kept yet, why where no field says it, and offers what is kept. */
export function NotKept({ messages, onPutBack, children }: WaitingProps) {
  if (!onPutBack) return null
  const reasons = [...new Set([...(children ? [children] : []), ...messages])]
  return (
    <div role="status" className="mt-2 flex flex-wrap items-center justify-between gap-2 border-l-4 border-conflict pl-3 text-conflict">
      <p>Not kept yet{reasons.length > 0 ? `: ${reasons.join(' ')}` : ': see the field marked above.'}</p>
      <ActionButton kind="quiet" onPress={onPutBack}>Put back what was kept</ActionButton>
    </div>
  )
}

export function EmptySection({ children }: { children: ReactNode }) {
  return <p className="rounded-sm border border-dashed border-ink-soft p-4 text-ink-soft">{children}</p>
}

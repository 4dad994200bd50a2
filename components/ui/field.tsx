import { useId, type ComponentProps, type ReactNode } from 'react'

const CONTROL =
  'min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-3 py-2 text-ink focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf aria-invalid:border-2 aria-invalid:border-conflict disabled:bg-paper disabled:text-ink-soft'

interface Words {
  label: ReactNode
  hint?: ReactNode
  /** What is wrong with what was typed, as a sentence. */
  error?: string | null | undefined
}

interface Wiring {
  id: string
  'aria-describedby': string | undefined
  'aria-invalid': true | undefined
}

function wire(id: string, { hint, error }: Words): Wiring {
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ')
  return { id, 'aria-describedby': described || undefined, 'aria-invalid': error ? true : undefined }
}

function Below({ id, hint, error }: { id: string } & Omit<Words, 'label'>) {
  return (
    <>
      {hint && <p id={`${id}-hint`} className="mt-1 text-sm text-ink-soft">{hint}</p>}
      {error && <p id={`${id}-error`} className="mt-1 text-conflict">{error}</p>}
    </>
  )
}

interface FieldProps extends Words {
  id: string
  className?: string
  /** Draws the control; spread what it is given onto it. */
  children: (wiring: Wiring) => ReactNode
}

/** A label above any control, with its hint and its fault below, tied together for screen readers. */
export function Field({ id, label, hint, error, className = '', children }: FieldProps) {
  return (
    <div className={`min-w-0 ${className}`}>
      <label htmlFor={id} className="mb-1 block font-bold">{label}</label>
      {children(wire(id, { label, hint, error }))}
      <Below id={id} hint={hint} error={error} />
    </div>
  )
}

type TextFieldProps = Words & ComponentProps<'input'>

/** One line of text. Anything an input takes may be passed; `className` goes to the whole field. */
export function TextField({ label, hint, error, className, id, ...rest }: TextFieldProps) {
  const made = useId()
  return (
    <Field id={id ?? made} label={label} hint={hint} error={error} className={className}>
      {(wiring) => <input type="text" {...rest} {...wiring} className={CONTROL} />}
    </Field>
  )
}

type TextAreaFieldProps = Words & ComponentProps<'textarea'>

/** Several lines of text. */
export function TextAreaField({ label, hint, error, className, id, rows = 4, ...rest }: TextAreaFieldProps) {
  const made = useId()
  return (
    <Field id={id ?? made} label={label} hint={hint} error={error} className={className}>
      {(wiring) => <textarea rows={rows} {...rest} {...wiring} className={CONTROL} />}
    </Field>
  )
}

interface SelectFieldProps extends Words, Omit<ComponentProps<'select'>, 'children'> {
  options: readonly { value: string; label: string }[]
}

/** One of a list. */
export function SelectField({ label, hint, error, className, id, options, ...rest }: SelectFieldProps) {
  const made = useId()
  return (
    <Field id={id ?? made} label={label} hint={hint} error={error} className={className}>
      {(wiring) => (
        <select {...rest} {...wiring} className={CONTROL}>
          {options.map(({ value, label: word }) => <option key={value} value={value}>{word}</option>)}
        </select>
      )}
    </Field>
  )
}

type CheckboxFieldProps = Words & Omit<ComponentProps<'input'>, 'type'>

/** Yes or no. The whole line can be tapped. */
export function CheckboxField({ label, hint, error, className = '', id, ...rest }: CheckboxFieldProps) {
  const made = useId()
  const own = id ?? made
  return (
    <div className={`min-w-0 ${className}`}>
      <label htmlFor={own} className="flex min-h-11 items-center gap-3">
        <input {...rest} type="checkbox" {...wire(own, { label, hint, error })} className="size-5 shrink-0 accent-leaf focus-visible:outline-2 focus-visible:outline-offset-2 focus-visible:outline-leaf" />
        <span>{label}</span>
      </label>
      <Below id={own} hint={hint} error={error} />
    </div>
  )
}

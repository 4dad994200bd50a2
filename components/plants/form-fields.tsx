'use client'
/** Controls of the plant form, tied to their field by name. */
import { useId } from 'react'
import { useFormContext, type FieldPath } from 'react-hook-form'
import { monthName, wordOf, type PlantFormValues } from '@/lib/plants'
import { CONTROL, describedBy, Labelled } from './parts'

type Name = FieldPath<PlantFormValues>

/** What is wrong with a field now. */
export function useProblem(name: Name): string | undefined {
  const { getFieldState, formState } = useFormContext<PlantFormValues>()
  return getFieldState(name, formState).error?.message
}

interface TextProps {
  name: Name
  label: string
  hint?: string
  mono?: boolean
}

export function FormText({ name, label, hint, mono = false }: TextProps) {
  const { register } = useFormContext<PlantFormValues>()
  const error = useProblem(name)
  const id = useId()
  return (
    <Labelled id={id} label={label} {...(hint && { hint })} error={error}>
      <input
        {...register(name)} id={id} type="text" autoComplete="off" className={mono ? `${CONTROL} font-mono` : CONTROL}
        aria-invalid={error ? true : undefined} aria-describedby={describedBy({ id, ...(hint && { hint }), error })}
      />
    </Labelled>
  )
}

interface SelectProps {
  name: Name
  label: string
  values: readonly string[]
  words?: Readonly<Record<string, string>>
}

export function FormSelect({ name, label, values, words = {} }: SelectProps) {
  const { register } = useFormContext<PlantFormValues>()
  const error = useProblem(name)
  const id = useId()
  return (
    <Labelled id={id} label={label} error={error}>
      <select {...register(name)} id={id} className={CONTROL} aria-invalid={error ? true : undefined} aria-describedby={describedBy({ id, error })}>
        {values.map((value) => <option key={value} value={value}>{words[value] ?? wordOf(value)}</option>)}
      </select>
    </Labelled>
  )
}

const BOX = 'flex min-h-11 items-center gap-2 rounded-sm border border-rule px-3 has-checked:border-leaf has-checked:bg-paper'

interface ChoicesProps {
  name: Name
  legend: string
  values: readonly string[]
  word?: (value: string) => string
}

/** Any of several, all in sight. */
export function FormChoices({ name, legend, values, word = wordOf }: ChoicesProps) {
  const { register } = useFormContext<PlantFormValues>()
  const error = useProblem(name)
  const id = useId()
  return (
    <fieldset aria-describedby={describedBy({ id, error })}>
      <legend className="mb-1 font-bold">{legend}</legend>
      <div className="flex flex-wrap gap-2">
        {values.map((value) => (
          <label key={value} className={BOX}>
            <input {...register(name)} type="checkbox" value={value} className="size-5 accent-leaf" />
            {word(value)}
          </label>
        ))}
      </div>
      {error && <p id={`${id}-error`} className="mt-1 text-conflict">{error}</p>}
    </fieldset>
  )
}

const MONTHS = Array.from({ length: 12 }, (_, i) => String(i + 1))

export function FormMonths({ name, legend }: { name: 'bloomMonths' | 'fruitMonths'; legend: string }) {
  return <FormChoices name={name} legend={legend} values={MONTHS} word={(month) => monthName(Number(month))} />
}

export function FormYesNo({ name, label }: { name: 'thorns' | 'invasive'; label: string }) {
  const { register } = useFormContext<PlantFormValues>()
  return (
    <label className={`${BOX} w-fit`}>
      <input {...register(name)} type="checkbox" className="size-5 accent-leaf" />
      {label}
    </label>
  )
}

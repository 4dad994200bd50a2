'use client'
/** Controls of the plant form, tied to their field by name. */
import { useId } from 'react'
import { useFormContext, type FieldPath } from 'react-hook-form'
import { SelectField, TextField } from '@/components/ui'
import { monthName, wordOf, type PlantFormValues } from '@/lib/plants'

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
}

export function FormText({ name, label, hint }: TextProps) {
  const { register } = useFormContext<PlantFormValues>()
  const error = useProblem(name)
  return <TextField {...register(name)} label={label} hint={hint} error={error} autoComplete="off" />
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
  const options = values.map((value) => ({ value, label: words[value] ?? wordOf(value) }))
  return <SelectField {...register(name)} label={label} error={error} options={options} />
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
    <fieldset aria-describedby={error ? `${id}-error` : undefined}>
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

'use client'
/** A project's facts: a new project, or one to be changed. */
import { zodResolver } from '@hookform/resolvers/zod'
import { startTransition, useActionState, useEffect, useState, type ReactNode } from 'react'
import { useForm, type FieldPath, type SubmitErrorHandler, type UseFormReturn } from 'react-hook-form'
import { Button, CheckboxField, Notice, SelectField, TextAreaField, TextField } from '@/components/ui'
import { WATERS } from '@/lib/plants'
import {
  AIM_WORDS, DEER_PRESSURE_WORDS, EMPTY_PROJECT, MOISTURE_WORDS, projectFormSchema, projectFormValuesOf, WALNUT_WORDS, ZONES,
  type ProjectFormValues, type ProjectInput,
} from '@/lib/project'
import { AIMS, DEER_PRESSURES, WALNUTS } from '@/lib/spacing'

interface ProjectState {
  isSaved: boolean
  error: string | null
  fields: Record<string, string>
  typed: Record<string, string | string[]> | null
}

interface Props {
  /** The project as it stands; absent for a new one. */
  project?: ProjectInput
  /** The version the form was opened with; absent for a new one. */
  version?: number
  action: (before: ProjectState, form: FormData) => Promise<ProjectState>
  /** What the button says. */
  submit: string
}

const optionsOf = <T extends string>(values: readonly T[], words: Record<T, string>) => values.map((value) => ({ value, label: words[value] }))
const ZONE_OPTIONS = [{ value: '', label: 'Choose' }, ...ZONES.map((zone) => ({ value: zone, label: zone }))]

/** The browser asks before a page with unsaved entries is closed. */
function useUnloadQuestion(isDirty: boolean) {
  useEffect(() => {
    if (!isDirty) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [isDirty])
}

function Part({ title, lead, children }: { title: string; lead?: string; children: ReactNode }) {
  return (
    <fieldset className="grid min-w-0 grid-cols-1 gap-4 border border-rule bg-sheet p-5 sm:grid-cols-2">
      <legend className="float-left w-full font-heading text-2xl leading-tight sm:col-span-2">{title}{lead && <span className="mt-1 block font-text text-base text-ink-soft">{lead}</span>}</legend>
      {children}
    </fieldset>
  )
}

interface PartProps {
  form: UseFormReturn<ProjectFormValues, unknown, ProjectInput>
  /** What the server said of fields, by name. */
  said: Record<string, string>
}

const fieldOf = ({ form: { register, formState }, said }: PartProps) => (name: FieldPath<ProjectFormValues>) =>
  ({ ...register(name), error: (formState.errors as Record<string, { message?: string } | undefined>)[name]?.message ?? said[name] })

function Whose(parts: PartProps) {
  const field = fieldOf(parts)
  return (
    <Part title="The commission">
      <TextField {...field('name')} label="Name" hint="How the studio speaks of it, such as Alder House." autoComplete="off" maxLength={80} className="sm:col-span-2" />
      <TextField {...field('address')} label="Address" autoComplete="off" maxLength={200} />
      <TextField {...field('clientName')} label="Client" autoComplete="off" maxLength={80} />
    </Part>
  )
}

function SiteFacts(parts: PartProps) {
  const { form } = parts
  const field = fieldOf(parts)
  return (
    <Part title="The site" lead="Light and facing belong to each facade and are given where it is measured.">
      <SelectField {...field('zone')} label="Hardiness zone" options={ZONE_OPTIONS} />
      <SelectField {...field('moisture')} label="Soil moisture" options={optionsOf(WATERS, MOISTURE_WORDS)} />
      <SelectField {...field('deer')} label="Deer" options={optionsOf(DEER_PRESSURES, DEER_PRESSURE_WORDS)} />
      <SelectField {...field('walnut')} label="Black walnut" options={optionsOf(WALNUTS, WALNUT_WORDS)} />
      <TextField {...field('latitude')} label="Latitude" hint="Degrees, such as 41.52. May stay empty." inputMode="text" autoComplete="off" />
      <TextField {...field('longitude')} label="Longitude" hint="Degrees, west with a minus, such as -72.8." inputMode="text" autoComplete="off" />
      <CheckboxField {...form.register('fireZone')} label="In a wildfire zone" hint="Local law decides what may be planted near the wall." className="sm:col-span-2" />
    </Part>
  )
}

function Brief(parts: PartProps) {
  const { form } = parts
  const field = fieldOf(parts)
  return (
    <Part title="The brief">
      <fieldset className="sm:col-span-2">
        <legend className="mb-1 font-bold">What the client wants it to do</legend>
        <div className="flex flex-wrap gap-2">
          {AIMS.map((aim) => (
            <label key={aim} className="flex min-h-11 items-center gap-2 rounded-sm border border-rule px-3 has-checked:border-leaf has-checked:bg-paper">
              <input {...form.register('brief')} type="checkbox" value={aim} className="size-5 accent-leaf" />
              {AIM_WORDS[aim]}
            </label>
          ))}
        </div>
      </fieldset>
      <TextAreaField {...field('notes')} label="Notes" hint="For the studio only; the client never sees them." maxLength={5000} className="sm:col-span-2" />
    </Part>
  )
}

/** The judged input as the action reads it. */
function formDataOf({ brief = [], fireZone, latitude, longitude, ...texts }: ProjectInput, version: number | undefined): FormData {
  const data = new FormData()
  for (const [name, value] of Object.entries({ ...texts, latitude: latitude ?? '', longitude: longitude ?? '' })) data.set(name, String(value))
  for (const aim of brief) data.append('brief', aim)
  if (fireZone) data.set('fireZone', 'on')
  if (version !== undefined) data.set('version', String(version))
  return data
}

const UNTRIED: ProjectState = { isSaved: false, error: null, fields: {}, typed: null }

/** See `Props`. What does not fit is said at its field; what was typed stays. */
export function ProjectForm({ project, version, action, submit }: Props) {
  const [state, send, isPending] = useActionState(action, UNTRIED)
  const [refusal, setRefusal] = useState<string | null>(null)
  const form = useForm<ProjectFormValues, unknown, ProjectInput>({
    resolver: zodResolver(projectFormSchema),
    defaultValues: project ? projectFormValuesOf(project) : EMPTY_PROJECT,
    mode: 'onTouched',
  })
  useUnloadQuestion(form.formState.isDirty && !state.isSaved)
  const onValid = (input: ProjectInput) => {
    if (isPending) return
    setRefusal(null)
    startTransition(() => send(formDataOf(input, version)))
  }
  const onInvalid: SubmitErrorHandler<ProjectFormValues> = (errors) => {
    const count = Object.keys(errors).length
    setRefusal(`${count === 1 ? 'One field does' : `${count} fields do`} not fit yet. Nothing was saved.`)
  }
  const message = refusal ?? state.error
  const parts = { form, said: state.fields }
  return (
    <form noValidate onSubmit={form.handleSubmit(onValid, onInvalid)} className="grid grid-cols-1 gap-5">
      <Whose {...parts} />
      <SiteFacts {...parts} />
      <Brief {...parts} />
      {message && <Notice tone="error">{message}</Notice>}
      <Button type="submit" variant="primary" aria-disabled={isPending} className="justify-self-start">{isPending ? 'Saving' : submit}</Button>
    </form>
  )
}

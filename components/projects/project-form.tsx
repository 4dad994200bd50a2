'use client'
import { useActionState, useState, type ReactNode } from 'react'
import { Button, CheckboxField, Notice, SelectField, TextAreaField, TextField } from '@/components/ui'
import type { ProjectInput } from '@/lib/project'
import { AIMS } from '@/lib/spacing'
import { AIM_WORDS, DEER, MOISTURE, WALNUT } from './words'

/** What the form shows after an attempt. What was typed is given back, so that nothing is lost. `version`: to be sent next. */
export interface ProjectFormState {
  isSaved: boolean
  error: string | null
  fields: Record<string, string>
  typed: Record<string, string | string[]> | null
  version?: number
}

interface Props {
  action: (before: ProjectFormState, form: FormData) => Promise<ProjectFormState>
  project?: ProjectInput
  version?: number
  submit: string
}

const UNTRIED: ProjectFormState = { isSaved: false, error: null, fields: {}, typed: null }
const EMPTY = { name: '', address: '', clientName: '', zone: '', moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false, brief: [], notes: '' }

function Group({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className="grid gap-4 sm:grid-cols-2">
      <legend className="mb-2 font-heading text-xl">{title}</legend>
      {children}
    </fieldset>
  )
}

/** A project's form: who and where, the facts of its site, what is wished for, and words for the studio alone. */
export function ProjectForm({ action, project, version, submit }: Props) {
  // The version the form was opened with stays its own: a later one would let it overwrite what its writer never saw.
  const [opened] = useState(version)
  const [state, send, isPending] = useActionState(action, UNTRIED)
  const start = { ...EMPTY, ...project }
  const { typed, fields, version: held = opened } = state
  const text = (name: string) => String(typed?.[name] ?? (start as Record<string, unknown>)[name] ?? '')
  const line = (name: string) => ({ name, defaultValue: text(name), error: fields[name] })
  const brief: readonly string[] = typed ? [typed.brief ?? []].flat() : (start.brief ?? [])
  const isFire = typed ? typed.fireZone === 'on' : start.fireZone
  return (
    // The key starts the fields anew with what was typed: React clears a form after its action.
    <form key={JSON.stringify(typed)} action={send} className="grid max-w-3xl gap-8">
      {held !== undefined && <input key={held} type="hidden" name="version" defaultValue={held} />}
      {state.error && <Notice tone="error">{state.error}</Notice>}
      {state.isSaved && <Notice tone="good">Saved. Every facade was checked again.</Notice>}
      <Group title="The commission">
        <TextField label="Project" required maxLength={80} {...line('name')} />
        <TextField label="Client" maxLength={80} {...line('clientName')} />
        <TextField label="Address" maxLength={200} className="sm:col-span-2" {...line('address')} />
      </Group>
      <Group title="The site">
        <TextField label="Hardiness zone" hint="1a to 13b, such as 6b" required maxLength={3} {...line('zone')} />
        <SelectField label="Soil moisture" options={MOISTURE} {...line('moisture')} />
        <SelectField label="Deer" options={DEER} {...line('deer')} />
        <SelectField label="Black walnut" options={WALNUT} {...line('walnut')} />
        <TextField label="Latitude" hint="Degrees, north is positive; may stay empty" inputMode="decimal" {...line('latitude')} />
        <TextField label="Longitude" hint="Degrees, west is negative; may stay empty" inputMode="decimal" {...line('longitude')} />
        <CheckboxField label="In a wildfire zone" hint="Local law decides." name="fireZone" defaultChecked={isFire} className="sm:col-span-2" />
      </Group>
      <Group title="What is wished for">
        {AIMS.map((aim) => <CheckboxField key={aim} label={AIM_WORDS[aim]} name="brief" value={aim} defaultChecked={brief.includes(aim)} />)}
      </Group>
      <TextAreaField label="Notes" hint="For the studio alone; the client never sees them." maxLength={5000} {...line('notes')} />
      <Button type="submit" variant="primary" disabled={isPending} className="justify-self-start">{isPending ? 'Saving' : submit}</Button>
    </form>
  )
}

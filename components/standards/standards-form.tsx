'use client'
/** The studio's standards: every rule with its question, its numbers beside their defaults, its sources. */
import { useActionState, useState } from 'react'
import { Button, Notice, SelectField, TextField } from '@/components/ui'
import { STANDARDS, type Known, type RuleMeta, type Setting, type Source } from '@/lib/spacing'
import { settingText } from '@/lib/standards'

export interface StandardsState {
  error: string | null
  /** Facades checked anew after saving; null before. */
  checked: number | null
  fields: Record<string, string>
  typed: Record<string, string>
}

type Values = Readonly<Record<string, number | string>>

interface Props {
  values: Values
  canEdit: boolean
  action: (before: StandardsState, form: FormData) => Promise<StandardsState>
}

const UNTRIED: StandardsState = { error: null, checked: null, fields: {}, typed: {} }

const KNOWN_WORDS: Record<Known, string> = { read: 'read', practice: 'common practice', memory: 'from memory' }
const KIND_OPTIONS = [{ value: 'off', label: 'Off' }, { value: 'note', label: 'Note' }, { value: 'risk', label: 'Risk' }]
const KIND_WORDS = { conflict: 'conflict', risk: 'risk', note: 'note' } as const

function SourceLine({ source }: { source: Source }) {
  const { publisher, title, address, known } = source
  return (
    <li className="break-words">
      {publisher}: {address ? <a href={address} className="underline decoration-rule underline-offset-4 hover:decoration-ink" rel="noreferrer" target="_blank">{title}</a> : title}. <span className="text-ink-soft">{KNOWN_WORDS[known]}</span>
    </li>
  )
}

function SettingField({ setting, values, state, canEdit }: { setting: Setting; values: Values; state: StandardsState; canEdit: boolean }) {
  const { name, label } = setting
  const now = settingText(setting, (values[name] as number | undefined) ?? setting.default)
  return (
    <TextField
      name={name} label={label} defaultValue={state.typed[name] ?? now} readOnly={!canEdit} autoComplete="off" error={state.fields[name]}
      hint={`By default ${settingText(setting, setting.default)}; from ${settingText(setting, setting.min)} to ${settingText(setting, setting.max)}`}
    />
  )
}

function Rule({ meta, values, state, canEdit }: { meta: RuleMeta; values: Values; state: StandardsState; canEdit: boolean }) {
  const { id, title, question, settings, fixedKind, sources, notes } = meta
  const kind = `${id}.kind`
  return (
    <section aria-labelledby={`rule-${id}`} className="grid gap-4 border border-rule bg-sheet p-4 lg:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
      <div className="min-w-0">
        <h2 id={`rule-${id}`} className="font-heading text-xl">{title}</h2>
        <p>{question}</p>
        <ul className="mt-3 grid gap-1 text-sm">{sources.map((source) => <SourceLine key={source.title} source={source} />)}</ul>
        {notes && <p className="mt-2 text-sm text-ink-soft">{notes}</p>}
      </div>
      <div className="grid min-w-0 content-start gap-4 sm:grid-cols-2">
        {settings.map((setting) => <SettingField key={setting.name} setting={setting} values={values} state={state} canEdit={canEdit} />)}
        {fixedKind && (
          <SelectField
            name={kind} label="Said as" defaultValue={state.typed[kind] ?? String(values[kind] ?? '')} disabled={!canEdit} error={state.fields[kind]}
            options={[{ value: '', label: `As the rule has it: ${KIND_WORDS[fixedKind]} at most` }, ...KIND_OPTIONS]}
          />
        )}
        {settings.length === 0 && !fixedKind && <p className="text-ink-soft">Nothing to set: the figures are those of the source.</p>}
      </div>
    </section>
  )
}

function Search({ text, onText }: { text: string; onText: (text: string) => void }) {
  return <TextField type="search" label="Find a rule" placeholder="sill, walk, deer" autoComplete="off" value={text} onChange={(event) => onText(event.target.value)} className="max-w-md" />
}

const holds = ({ title, question, settings }: RuleMeta, text: string) => [title, question, ...settings.map(({ label }) => label)].join(' ').toLocaleLowerCase('en-US').includes(text)

function Outcome({ state }: { state: StandardsState }) {
  if (state.error) return <Notice tone="error">{state.error}</Notice>
  if (state.checked === null) return null
  return <Notice tone="good" title="The standards are saved">{state.checked === 1 ? 'The one facade of the studio was checked anew.' : `All ${state.checked} facades of the studio were checked anew.`}</Notice>
}

export function StandardsForm({ values, canEdit, action }: Props) {
  const [state, submit, isPending] = useActionState(action, UNTRIED)
  const [text, setText] = useState('')
  const wanted = text.trim().toLocaleLowerCase('en-US')
  const shown = new Set(STANDARDS.filter((meta) => holds(meta, wanted)).map(({ id }) => id))
  return (
    // Saved or refused, the fields start anew with what stands or what was typed.
    <form key={JSON.stringify([state.typed, values])} action={submit} className="grid gap-4">
      <Search text={text} onText={setText} />
      <div role="status">{shown.size === 0 ? 'No rule speaks of that. Try fewer letters.' : <Outcome state={state} />}</div>
      {/* Rules that are not looked for stay in the form, so that nothing they hold is lost. */}
      {STANDARDS.map((meta) => <div key={meta.id} hidden={!shown.has(meta.id)}><Rule meta={meta} values={values} state={state} canEdit={canEdit} /></div>)}
      {canEdit && (
        <div className="sticky bottom-0 flex flex-wrap items-center gap-4 border-t border-rule bg-paper py-3">
          <Button type="submit" variant="primary" disabled={isPending}>{isPending ? 'Checking every facade' : 'Save and check every facade'}</Button>
          <p className="text-ink-soft">An empty field goes back to its default.</p>
        </div>
      )}
    </form>
  )
}

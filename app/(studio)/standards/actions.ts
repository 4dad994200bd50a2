'use server'
import { revalidatePath } from 'next/cache'
import type { StandardsState } from '@/components/standards/standards-form'
import { STANDARDS } from '@/lib/spacing'
import { readSetting } from '@/lib/standards'
import { runAction } from '@/lib/server/http/run-action'
import { requireContext } from '@/lib/server/people/require-context'
import { saveStandards } from '@/lib/server/standards/save-standards'

const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

interface Typed {
  values: Record<string, number | string>
  fields: Record<string, string>
  typed: Record<string, string>
}

/** What was typed, setting by setting; what is as the rule has it is left out. */
function readForm(form: FormData): Typed {
  const read: Typed = { values: {}, fields: {}, typed: {} }
  for (const { id, settings, fixedKind } of STANDARDS) {
    for (const setting of settings) {
      const text = (read.typed[setting.name] = textOf(form, setting.name))
      const found = readSetting(setting, text)
      if (!found.ok) read.fields[setting.name] = found.message
      else if (found.value !== setting.default) read.values[setting.name] = found.value
    }
    const name = `${id}.kind`
    const kind = fixedKind ? (read.typed[name] = textOf(form, name)) : ''
    if (kind !== '') read.values[name] = kind
  }
  return read
}

/** The fields at fault by rule and label: the form is long, and they may stand far from its top. */
function faultsText(fields: Record<string, string>): string {
  const named = STANDARDS.flatMap(({ title, settings }) => settings.flatMap(({ name, label }) => (fields[name] ? [`${title}, ${label.toLowerCase()}: ${fields[name]}`] : [])))
  return named.join(' ')
}

/** Saves the studio's standards over those the page was opened with. */
export async function saveStandardsAction(opened: Record<string, number | string>, _before: StandardsState, form: FormData): Promise<StandardsState> {
  const context = await requireContext('member')
  const { values, fields, typed } = readForm(form)
  if (Object.keys(fields).length > 0) return { error: `${faultsText(fields)} Nothing was changed.`, checked: null, fields, typed }
  const answer = await runAction('save standards', () => saveStandards(context, { values, opened }))
  if (!answer.ok) {
    const named = Object.fromEntries((answer.error.problems ?? []).map(({ path, message }) => [String(path[0]), message]))
    return { error: answer.error.message, checked: null, fields: named, typed }
  }
  revalidatePath('/standards')
  return { error: null, checked: answer.value.checked, fields: {}, typed: {} }
}

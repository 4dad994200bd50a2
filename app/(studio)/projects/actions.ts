'use server'
import type { Route } from 'next'
import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import type { ErrorBody } from '@/lib/errors'
import { parseLength } from '@/lib/measure'
import { createClientLink } from '@/lib/server/clients/create-client-link'
import { revokeClientLink } from '@/lib/server/clients/revoke-client-link'
import { createFacade } from '@/lib/server/facades/create-facade'
import { removeFacade } from '@/lib/server/facades/remove-facade'
import { renameFacade } from '@/lib/server/facades/rename-facade'
import { runAction } from '@/lib/server/http/run-action'
import { requireContext } from '@/lib/server/people/require-context'
import { createProject } from '@/lib/server/projects/create-project'
import { saveProject } from '@/lib/server/projects/save-project'

/** What the project form shows after an attempt. */
interface ProjectState {
  isSaved: boolean
  error: string | null
  fields: Record<string, string>
  typed: Record<string, string | string[]> | null
}

/** What a small form shows after an attempt. */
interface SmallState {
  error: string | null
  /** What the attempt made, where it is to be shown. */
  made: string | null
}

const DONE: SmallState = { error: null, made: null }
const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

/** All that was typed, by field; Next's own fields left out, fields nobody asked for kept: the schema refuses them. */
function typedIn(form: FormData): Record<string, string | string[]> {
  const names = [...new Set(form.keys())].filter((name) => !name.startsWith('$ACTION') && name !== 'version')
  return Object.fromEntries(names.map((name) => [name, name === 'brief' ? form.getAll(name).map(String) : textOf(form, name)]))
}

function inputOf({ latitude = '', longitude = '', fireZone, brief = [], ...rest }: Record<string, string | string[]>) {
  const degrees = (name: string, text: string | string[]) => (String(text).trim() === '' ? {} : { [name]: Number(text) })
  return { ...rest, brief, fireZone: fireZone === 'on', ...degrees('latitude', latitude), ...degrees('longitude', longitude) }
}

function refused({ message, problems = [] }: ErrorBody['error'], typed: ProjectState['typed']): ProjectState {
  const fields = Object.fromEntries(problems.map((problem) => [String(problem.path[0]), problem.message]))
  return { isSaved: false, error: message, fields, typed }
}

/** Makes a project and goes to it. */
export async function createProjectAction(_before: ProjectState, form: FormData): Promise<ProjectState> {
  const context = await requireContext('member')
  const typed = typedIn(form)
  const answer = await runAction('create project', () => createProject(context, { input: inputOf(typed) }))
  if (!answer.ok) return refused(answer.error, typed)
  redirect(`/projects/${answer.value.id}` as Route)
}

/** Saves the form of a project. */
export async function saveProjectAction(projectId: string, _before: ProjectState, form: FormData): Promise<ProjectState> {
  const context = await requireContext('member')
  const typed = typedIn(form)
  // An absent version is no version: it must not pass for the first one.
  const version = Number(textOf(form, 'version') || NaN)
  const answer = await runAction('save project', () => saveProject(context, { projectId, input: inputOf(typed), version }))
  if (!answer.ok) return refused(answer.error, typed)
  revalidatePath(`/projects/${projectId}`)
  return { isSaved: true, error: null, fields: {}, typed: null }
}

async function small(projectId: string, name: string, work: () => string | void): Promise<SmallState> {
  const answer = await runAction(name, work)
  if (!answer.ok) return { error: answer.error.problems?.[0]?.message ?? answer.error.message, made: null }
  revalidatePath(`/projects/${projectId}`)
  return { error: null, made: answer.value ?? null }
}

/** Adds a facade: its name, and the width of its wall in any way a length is written. */
export async function addFacadeAction(projectId: string, _before: SmallState, form: FormData): Promise<SmallState> {
  const context = await requireContext('member')
  const width = parseLength(textOf(form, 'width'), 'ft')
  if (!width.ok) return { ...DONE, error: `Width: ${width.message}` }
  const facade = { projectId, name: textOf(form, 'name'), width: width.inches }
  return small(projectId, 'add facade', () => void createFacade(context, facade))
}

export async function renameFacadeAction(projectId: string, facadeId: string, _before: SmallState, form: FormData): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, 'rename facade', () => void renameFacade(context, { facadeId, name: textOf(form, 'name') }))
}

export async function removeFacadeAction(projectId: string, facadeId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, 'remove facade', () => void removeFacade(context, { facadeId }))
}

/** Makes a client link; its path is told this once. */
export async function createClientLinkAction(projectId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, 'client link', () => createClientLink(context, { projectId }).path)
}

export async function revokeClientLinkAction(projectId: string, linkId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, 'revoke client link', () => revokeClientLink(context, { linkId }))
}

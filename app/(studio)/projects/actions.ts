'use server'
import { randomUUID } from 'node:crypto'
import type { Route } from 'next'
import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import type { ProjectFormState } from '@/components/projects/project-form'
import type { SmallState } from '@/components/projects/small-action'
import type { ErrorBody } from '@/lib/errors'
import { createClientLink } from '@/lib/server/clients/create-client-link'
import { revokeClientLink } from '@/lib/server/clients/revoke-client-link'
import { createFacade } from '@/lib/server/facades/create-facade'
import { removeFacade } from '@/lib/server/facades/remove-facade'
import { renameFacade } from '@/lib/server/facades/rename-facade'
import { parseInput } from '@/lib/server/http/parse'
import { runAction } from '@/lib/server/http/run-action'
import { requireContext } from '@/lib/server/people/require-context'
import { createProject } from '@/lib/server/projects/create-project'
import { saveProject } from '@/lib/server/projects/save-project'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { newFacadeSchema, projectInput, projectTyped, renameSchema, typedIn, type Typed } from './read-forms'

const byField = (problems: ErrorBody['error']['problems'] = []) => Object.fromEntries(problems.map(({ path, message }) => [String(path[0]), message]))

const refused = ({ message, problems }: ErrorBody['error'], typed: Typed): ProjectFormState => ({ isSaved: false, error: message, fields: byField(problems), typed })

/** Makes a project and goes to it. */
export async function createProjectAction(_before: ProjectFormState, form: FormData): Promise<ProjectFormState> {
  const context = await requireContext('member')
  const typed = projectTyped(form)
  const answer = await runAction('create project', () => createProject(context, { input: projectInput(typed) }))
  if (!answer.ok) return refused(answer.error, typed)
  redirect(`/projects/${answer.value.id}` as Route)
}

/** Saves the form of a project over the version it was opened with, or last saved as. */
export async function saveProjectAction(projectId: string, _before: ProjectFormState, form: FormData): Promise<ProjectFormState> {
  const context = await requireContext('member')
  const { version: opened, ...typed } = projectTyped(form)
  // An absent version is no version: it must not pass for the first one.
  const version = Number(opened || NaN)
  const answer = await runAction('save project', () => saveProject(context, { projectId, input: projectInput(typed), version }))
  if (!answer.ok) return { ...refused(answer.error, typed), ...(Number.isFinite(version) && { version }) }
  revalidatePath(`/projects/${projectId}`)
  return { isSaved: true, error: null, fields: {}, typed, version: answer.value.version }
}

interface Work {
  name: string
  form?: FormData
  /** The fields the form has: problems of these are shown beside them, others above. */
  fields?: readonly string[]
  work: (typed: Record<string, string>) => Pick<SmallState, 'id'> & { made?: string } | void
}

/** Runs the work of a small form; a refused one gets back what was typed. */
async function small(projectId: string, { name, form, fields = [], work }: Work): Promise<SmallState> {
  const typed = form ? typedIn(form) : {}
  const answer = await runAction(name, () => work(typed))
  if (answer.ok) {
    revalidatePath(`/projects/${projectId}`)
    return { error: null, made: null, ...answer.value }
  }
  const { message, problems = [] } = answer.error
  const isAllBeside = problems.length > 0 && problems.every(({ path }) => fields.includes(String(path[0])))
  return { error: isAllBeside ? null : message, made: null, fields: byField(problems), typed }
}

/** Adds a facade: its name, the width of its wall and the height of its gutter in any way a length is written. */
export async function addFacadeAction(projectId: string, _before: SmallState, form: FormData): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, { name: 'add facade', form, fields: ['name', 'width', 'gutter'], work: (typed) => {
    const { name, width, gutter } = parseInput(newFacadeSchema, typed)
    const { id: facadeId } = createFacade(context, { projectId, name, width })
    const { sheet, seq } = getSheet(context, { facadeId })
    saveEdits(context, { facadeId, base: seq, editor: 'project-page', edits: [{ id: randomUUID(), op: 'put', kind: 'facade', value: { ...sheet.facade, gutter } }] })
  } })
}

/** Gives a facade another name. */
export async function renameFacadeAction(projectId: string, facadeId: string, _before: SmallState, form: FormData): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, { name: 'rename facade', form, fields: ['name'], work: (typed) => renameFacade(context, { facadeId, ...parseInput(renameSchema, typed) }) })
}

/** Removes a facade with everything on it. */
export async function removeFacadeAction(projectId: string, facadeId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, { name: 'remove facade', work: () => void removeFacade(context, { facadeId }) })
}

/** Makes a client link; its path is told this once. */
export async function createClientLinkAction(projectId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, { name: 'client link', work: () => {
    const { id, path } = createClientLink(context, { projectId })
    return { id, made: path }
  } })
}

/** Makes a client link useless at once. */
export async function revokeClientLinkAction(projectId: string, linkId: string): Promise<SmallState> {
  const context = await requireContext('member')
  return small(projectId, { name: 'revoke client link', work: () => revokeClientLink(context, { linkId }) })
}

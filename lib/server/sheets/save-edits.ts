/** The one way a sheet is changed. Everything happens in one synchronous transaction, or nothing does. */
import { and, eq, gt, inArray, ne } from 'drizzle-orm'
import { transact } from '@/db/open'
import { edits as editLog, facades, projects } from '@/db/schema'
import { AppError, type FieldProblem } from '@/lib/errors'
import {
  applyEdits, editSchema, findProblems, listOf, LISTED_KINDS, MAX_PLACEMENTS, MAX_THINGS, targetOf,
  type Edit, type EditKind,
} from '@/lib/sheet'
import { check, type Report, type Sheet } from '@/lib/spacing'
import { z } from '@/lib/zod'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { invalid } from '../http/parse'
import { findFacade, type FoundFacade } from './find-facade'
import { readSheet } from './read-sheet'
import { sheetPlants } from './sheet-plants'
import { storeFindings } from './store-findings'
import { writeThings } from './write-things'

export const MAX_EDITS = 500

/** A batch as it comes over the wire. `base` is the seq the edits were made on, `editor` the open drawing table. */
export const batchSchema = z.strictObject({
  base: z.number({ error: 'base is a whole number.' }).int({ error: 'base is a whole number.' }).min(0, { error: 'base is 0 or more.' }),
  editor: z.string({ error: 'editor is text.' }).min(1, { error: 'Name the editor.' }).max(64, { error: 'An editor has at most 64 characters.' }),
  edits: z
    .array(editSchema, { error: 'edits is a list.' })
    .min(1, { error: 'There are no edits here.' })
    .max(MAX_EDITS, { error: `At most ${MAX_EDITS} edits at once.` }),
})

export type Batch = z.infer<typeof batchSchema>

/** A thing that two editors changed apart: as it stands now (null: removed), and as this batch would have it. */
export interface Clash {
  kind: EditKind
  target: string
  theirs: unknown
  yours: unknown
}

/** Edits not saved yet, each id once: a batch sent again after a lost answer changes nothing twice. */
function unsaved({ db }: Context, facadeId: string, edits: readonly Edit[]): Edit[] {
  const ids = edits.map(({ id }) => id)
  const rows = db.select({ id: editLog.id }).from(editLog).where(and(eq(editLog.facadeId, facadeId), inArray(editLog.id, ids))).all()
  const known = new Set(rows.map(({ id }) => id))
  return edits.filter(({ id }) => !known.has(id) && known.add(id))
}

function valueIn(sheet: Sheet, kind: EditKind, target: string): unknown {
  if (kind === 'facade') return sheet.facade
  if (kind === 'aspect') return { light: sheet.site.light, ...(sheet.site.facing !== undefined && { facing: sheet.site.facing }) }
  return listOf(sheet, kind).find(({ id }) => id === target) ?? null
}

function findClashes({ db }: Context, sheet: Sheet, facadeId: string, { base, editor, edits }: Batch): Clash[] {
  const since = and(eq(editLog.facadeId, facadeId), gt(editLog.seq, base), ne(editLog.editor, editor))
  const touched = db.select({ kind: editLog.kind, target: editLog.target }).from(editLog).where(since).all()
  const others = new Set(touched.map(({ kind, target }) => `${kind} ${target}`))
  const clashes = new Map<string, Clash>()
  for (const edit of edits) {
    const { kind, target } = targetOf(edit)
    const name = `${kind} ${target}`
    if (others.has(name)) clashes.set(name, { kind, target, theirs: valueIn(sheet, kind, target), yours: edit.op === 'put' ? edit.value : null })
  }
  return [...clashes.values()]
}

/** The sheet with the plants its placements now name; a plant the studio cannot see is named by the edit that has it. */
function withPlants({ db, actor }: Context, sheet: Sheet, edits: readonly Edit[]): Sheet {
  const plants = sheetPlants(db, actor.studioId, sheet.placements.map(({ plant }) => plant))
  const known = new Set(plants.map(({ id }) => id))
  const problems = edits.flatMap((edit, i): FieldProblem[] =>
    edit.op === 'put' && edit.kind === 'placement' && !known.has(edit.value.plant) && sheet.placements.some(({ id, plant }) => id === edit.value.id && plant === edit.value.plant)
      ? [{ path: ['edits', i, 'value', 'plant'], message: 'This plant is not in the library.' }]
      : [],
  )
  if (problems.length > 0) throw invalid(problems)
  return { ...sheet, plants }
}

function sizeProblems(sheet: Sheet): FieldProblem[] {
  return LISTED_KINDS.flatMap((kind): FieldProblem[] => {
    const most = kind === 'placement' ? MAX_PLACEMENTS : MAX_THINGS
    return listOf(sheet, kind).length > most ? [{ path: [kind], message: `A sheet holds at most ${most} of these.` }] : []
  })
}

function writeLog({ db, actor, now }: Context, facade: FoundFacade['facade'], editor: string, edits: readonly Edit[]) {
  for (const edit of edits) {
    const { kind, target } = targetOf(edit)
    const body = edit.op === 'put' ? { op: edit.op, value: edit.value } : { op: edit.op }
    db.insert(editLog)
      .values({ id: edit.id, facadeId: facade.id, studioId: facade.studioId, personId: actor.personId, editor, seq: facade.seq + 1, kind, target, body, at: now })
      .run()
  }
}

function save(context: Context, found: FoundFacade, batch: Batch): { seq: number; report: Report } {
  const { db, now } = context
  const { facade, project } = found
  if (batch.base > facade.seq) throw invalid([{ path: ['base'], message: 'This drawing is ahead of what is saved. Load it again.' }])
  const before = readSheet(db, found)
  const edits = unsaved(context, facade.id, batch.edits)
  if (edits.length === 0) return { seq: facade.seq, report: check(before) }
  const conflicts = findClashes(context, before, facade.id, { ...batch, edits })
  if (conflicts.length > 0) throw new AppError('conflict', undefined, { detail: { conflicts, seq: facade.seq } })
  const sheet = withPlants(context, applyEdits(before, edits), batch.edits)
  const problems = [...sizeProblems(sheet), ...findProblems(sheet)]
  if (problems.length > 0) throw invalid(problems)
  const where = { db, facadeId: facade.id, studioId: facade.studioId }
  writeThings(where, sheet, edits)
  writeLog(context, facade, batch.editor, edits)
  const report = check(sheet)
  storeFindings({ ...where, standards: sheet.standards ?? {} }, report)
  const seq = facade.seq + 1
  db.update(facades).set({ seq, updatedAt: now }).where(eq(facades.id, facade.id)).run()
  db.update(projects).set({ updatedAt: now }).where(eq(projects.id, project.id)).run()
  return { seq, report }
}

/**
 * Saves a batch of edits and answers the new seq and the report on the sheet as it then stands. Edits already
 * saved are skipped by id. Throws AppError('conflict') with `{ conflicts, seq }` when another editor touched the
 * same things since `base`; AppError('invalid') when the sheet would not be sound; AppError('not-found'). Whatever
 * is thrown, nothing was written.
 */
export function saveEdits(context: Context, { facadeId, ...batch }: Batch & { facadeId: string }): { seq: number; report: Report } {
  authorize(context, 'sheet:edit')
  return transact(context.db, () => save(context, findFacade(context, facadeId), batch))
}

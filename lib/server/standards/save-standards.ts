import { eq } from 'drizzle-orm'
import { transact, type Db } from '@/db/open'
import { facades, projects, standards } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { standardProblem, standardsSchema } from '@/lib/sheet'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { invalid, parseInput } from '../http/parse'
import { recheck } from '../sheets/freshen-findings'
import { standardsOf } from '../sheets/read-sheet'

type Values = Record<string, number | string>

interface Asked {
  /** All that is to be set, by name; what is not named goes back to the rule's own. */
  values: unknown
  /** What was set when the page was opened: somebody else's change in between is not lost. */
  opened: unknown
}

const sorted = (values: Values) => JSON.stringify(Object.entries(values).sort(([a], [b]) => (a < b ? -1 : 1)))

function readValues(input: unknown): Values {
  const values = parseInput(standardsSchema, input)
  const problems = Object.entries(values).flatMap(([name, value]) => {
    const message = standardProblem(name, value)
    return message ? [{ path: [name], message }] : []
  })
  if (problems.length > 0) throw invalid(problems)
  return values
}

function write(db: Db, studioId: string, values: Values, now: number): void {
  db.delete(standards).where(eq(standards.studioId, studioId)).run()
  for (const [name, value] of Object.entries(values)) {
    const set = typeof value === 'number' ? { number: value, kind: null } : { number: null, kind: value }
    db.insert(standards).values({ studioId, name, ...set, updatedAt: now }).run()
  }
}

/**
 * Sets a studio's standards and checks every facade of it anew, all or nothing. Answers how many facades were checked.
 * Throws AppError('invalid') naming each bad entry, AppError('conflict') where others changed them meanwhile.
 */
export function saveStandards(context: Context, { values: input, opened }: Asked): { checked: number } {
  authorize(context, 'standards:edit')
  const { db, actor, now } = context
  const values = readValues(input)
  const before = parseInput(standardsSchema, opened)
  return transact(db, () => {
    if (sorted(standardsOf(db, actor.studioId)) !== sorted(before)) throw new AppError('conflict', 'Someone else changed the standards meanwhile. Load the page again; nothing was changed.')
    write(db, actor.studioId, values, now)
    const all = db.select({ facade: facades, project: projects }).from(facades).innerJoin(projects, eq(projects.id, facades.projectId)).where(eq(facades.studioId, actor.studioId)).all()
    for (const found of all) recheck(db, found)
    return { checked: all.length }
  })
}

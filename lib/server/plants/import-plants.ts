import { transact } from '@/db/open'
import { plants } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { CsvProblem } from '@/lib/plants/csv'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { newId } from '../new-id'
import { factsOf } from './library-rows'
import { readImport, type ReadImport } from './read-import'
import { writeSources } from './write-sources'

export const IMPORT_MODES = ['good-rows', 'all-or-none'] as const
export type ImportMode = (typeof IMPORT_MODES)[number]

export interface Imported {
  added: number
  /** Lines left out, with what is wrong with each. */
  problems: CsvProblem[]
}

/** Why nothing of a file is taken; null when something is. */
function refusalOf({ isReadable, problems }: ReadImport, mode: ImportMode): string | null {
  const first = problems[0]
  if (!first) return null
  if (!isReadable) return `Nothing was brought in. Line ${first.line}${first.column && `, ${first.column}`}: ${first.message}`
  const lines = new Set(problems.map(({ line }) => line)).size
  return mode === 'all-or-none' ? `Nothing was brought in: ${lines} ${lines === 1 ? 'line has' : 'lines have'} problems.` : null
}

/**
 * Brings plants into the studio's own, in one transaction. `good-rows` keeps the sound lines and answers the others;
 * `all-or-none` takes everything or nothing. Throws AppError('invalid') with each problem at [line, column] when
 * nothing is taken because of them.
 */
export function importPlants(context: Context, { text, mode }: { text: string; mode: ImportMode }): Imported {
  authorize(context, 'plant:edit')
  const { db, actor, now } = context
  return transact(db, () => {
    const file = readImport(context, text)
    const refusal = refusalOf(file, mode)
    if (refusal) {
      throw new AppError('invalid', refusal, { problems: file.problems.map(({ line, column, message }) => ({ path: [line, column], message })) })
    }
    for (const { plant } of file.rows) {
      const id = newId()
      db.insert(plants).values({ ...factsOf(plant), id, studioId: actor.studioId, createdAt: now }).run()
      writeSources(db, id, plant)
    }
    return { added: file.rows.length, problems: file.problems }
  })
}

import { isNull } from 'drizzle-orm'
import { plants } from '@/db/schema'
import { nameKey } from '@/lib/plants'
import { parsePlantCsv, type PlantCsv } from '@/lib/plants/csv'
import type { Context } from '../context'
import { studioNames, TAKEN } from './studio-names'

export interface ReadImport extends PlantCsv {
  /** What is worth knowing of a good line, and breaks nothing. */
  notes: { line: number; message: string }[]
}

/** A file of plants, judged also against the plants the studio has. */
export function readImport({ db, actor }: Context, text: string): ReadImport {
  const file = parsePlantCsv(text)
  const own = studioNames(db, actor.studioId)
  const isTaken = (botanical: string) => own.has(nameKey(botanical))
  const taken = file.rows.filter(({ plant }) => isTaken(plant.botanical)).map(({ line }) => ({ line, column: 'botanical', message: TAKEN }))
  const rows = file.rows.filter(({ plant }) => !isTaken(plant.botanical))
  const shared = new Set(db.select({ botanical: plants.botanical }).from(plants).where(isNull(plants.studioId)).all().map(({ botanical }) => nameKey(botanical)))
  const notes = rows
    .filter(({ plant }) => shared.has(nameKey(plant.botanical)))
    .map(({ line }) => ({ line, message: 'The shared library has this plant too. Yours will stand beside it with your figures.' }))
  const problems = [...file.problems, ...taken].sort((a, b) => a.line - b.line)
  return { ...file, rows, problems, notes }
}

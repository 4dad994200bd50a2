/** Brings the shared library in: the plants of plants.csv with their sources. */
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { eq, getTableColumns, sql } from 'drizzle-orm'
import { v5 } from 'uuid'
import { transact, type Db } from '@/db/open'
import { plants, plantSources } from '@/db/schema'
import { nameKey, plantSourcesOf } from '@/lib/plants'
import { parsePlantCsv, type CsvRow } from '@/lib/plants/csv'

/** Namespace of the shared library's ids; a number of our own, never to be changed. */
const LIBRARY = '6f0c1d52-8a53-4b0e-9d57-3d0f6c2a7e41'
const FILE = fileURLToPath(new URL('./plants.csv', import.meta.url))

/** Id of a shared plant: the same for the same botanical name, always and everywhere. */
export const libraryPlantId = (botanical: string): string => v5(nameKey(botanical), LIBRARY)

/** Every column of a plant but its id and the day it came, taken from the row that was to be inserted. */
function newFacts() {
  const facts = Object.entries(getTableColumns(plants)).filter(([key]) => !['id', 'studioId', 'createdAt'].includes(key))
  return Object.fromEntries(facts.map(([key, column]) => [key, sql.raw(`excluded."${column.name}"`)]))
}

function putPlant(db: Db, { plant }: CsvRow, now: number) {
  const { sources, memoryFacts, ...facts } = plant
  const id = libraryPlantId(plant.botanical)
  db.insert(plants).values({ ...facts, id, studioId: null, createdAt: now }).onConflictDoUpdate({ target: plants.id, set: newFacts() }).run()
  db.delete(plantSources).where(eq(plantSources.plantId, id)).run()
  const rows = plantSourcesOf({ sources, memoryFacts }).map((source, position) => ({ ...source, id: v5(`${id} ${position}`, LIBRARY), plantId: id, position }))
  db.insert(plantSources).values(rows).run()
}

/**
 * Puts the shared library into a database, all in one transaction; run again it brings the same plants up to date
 * and adds none twice. Plants that left the file stay, since drawings may hold them. Answers how many plants the
 * file holds. Throws with the line and column when the file has a fault.
 */
export function loadPlants(db: Db, { now, file = FILE }: { now: number; file?: string }): number {
  const { rows, problems } = parsePlantCsv(readFileSync(file, 'utf8'))
  const [first] = problems
  if (first) throw new Error(`${file}, line ${first.line}, ${first.column}: ${first.message}`)
  transact(db, () => {
    for (const row of rows) putPlant(db, row, now)
  })
  return rows.length
}

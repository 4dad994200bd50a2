/** Rows of the library as the plants people read. */
import { and, asc, eq, inArray, isNull, or } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { plants, plantSources } from '@/db/schema'
import type { LibraryPlant, PlantInput, PlantSource } from '@/lib/plants'

/** Shared plants and the studio's own: all that a studio may see. */
export const isVisibleTo = (studioId: string) => or(isNull(plants.studioId), eq(plants.studioId, studioId))

type PlantRow = typeof plants.$inferSelect

function sourcesByPlant(db: Db, ids: string[]): Map<string, PlantSource[]> {
  const found = new Map<string, PlantSource[]>(ids.map((id) => [id, []]))
  const rows = db.select().from(plantSources).where(inArray(plantSources.plantId, ids)).orderBy(asc(plantSources.position)).all()
  for (const { plantId, title, url, evidence, facts } of rows) found.get(plantId)?.push({ title, url, evidence, facts })
  return found
}

/** Rows with their sources, in the order given. */
export function withSources(db: Db, rows: PlantRow[]): LibraryPlant[] {
  if (rows.length === 0) return []
  const sources = sourcesByPlant(db, rows.map(({ id }) => id))
  return rows.map(({ createdAt: _createdAt, ...facts }) => ({ ...facts, sources: sources.get(facts.id) ?? [] }))
}

/** Where a plant is, if the studio may see it. */
export const isPlantVisible = (plantId: string, studioId: string) => and(eq(plants.id, plantId), isVisibleTo(studioId))

/** What stands in the row of a plant as entered: everything but its sources. */
export function factsOf({ sources: _sources, memoryFacts: _memoryFacts, ...facts }: PlantInput) {
  return facts
}

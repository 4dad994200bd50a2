import { eq } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { plantSources } from '@/db/schema'
import { plantSourcesOf, type PlantInput } from '@/lib/plants'
import { newId } from '../new-id'

/** Keeps the sources of a plant in place of the ones before. Part of the caller's transaction. */
export function writeSources(db: Db, plantId: string, entered: Pick<PlantInput, 'sources' | 'memoryFacts'>): void {
  db.delete(plantSources).where(eq(plantSources.plantId, plantId)).run()
  const rows = plantSourcesOf(entered).map((source, position) => ({ ...source, id: newId(), plantId, position }))
  if (rows.length > 0) db.insert(plantSources).values(rows).run()
}

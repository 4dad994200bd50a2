import { eq } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { facades, placements, projects } from '@/db/schema'

/** Facades on which a plant stands, with the number of its placements on each. */
export function placesOfPlant(db: Db, plantId: string) {
  const rows = db
    .select({ facade: facades, project: projects })
    .from(placements)
    .innerJoin(facades, eq(facades.id, placements.facadeId))
    .innerJoin(projects, eq(projects.id, facades.projectId))
    .where(eq(placements.plantId, plantId))
    .all()
  const places = new Map<string, { facade: typeof facades.$inferSelect; project: typeof projects.$inferSelect; count: number }>()
  for (const row of rows) {
    const known = places.get(row.facade.id)
    if (known) known.count += 1
    else places.set(row.facade.id, { ...row, count: 1 })
  }
  return [...places.values()]
}

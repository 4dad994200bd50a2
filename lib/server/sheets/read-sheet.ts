/** Rows into a sheet. Nothing here asks who may see it: operations do, before. */
import { asc, eq } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { beds, facades, fixtures, openings, placements, projects, standards, walks } from '@/db/schema'
import type { Facade, Fixture, Opening, Placement, Sheet, Site } from '@/lib/spacing'
import type { FoundFacade } from './find-facade'
import { sheetPlants } from './sheet-plants'

type ProjectRow = typeof projects.$inferSelect
type FacadeRow = typeof facades.$inferSelect

/** The object without its null fields: what is absent from a row is absent from the sheet. */
function present<T extends object>(fields: T): { [K in keyof T]?: Exclude<T[K], null> } {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== null)) as { [K in keyof T]?: Exclude<T[K], null> }
}

function siteOf(project: ProjectRow, { light, facing }: FacadeRow): Site {
  const { zone, moisture, deer, walnut, fireZone, brief, latitude, longitude } = project
  return { zone, light, moisture, deer, walnut, fireZone, brief, ...present({ facing, latitude, longitude }) }
}

function facadeOf({ wall, grade, fall, gutter, overhang, siding, exposed, mulch }: FacadeRow): Facade {
  return { wall, grade, fall, gutter, overhang, siding, exposed, mulch }
}

const openingOf = ({ id, kind, name, x, width, sill, head }: typeof openings.$inferSelect): Opening => ({ id, kind, name, x, width, sill, head })

function fixtureOf({ id, kind, x, y, width, depth, z, height, outlet }: typeof fixtures.$inferSelect): Fixture {
  return { id, kind: kind as Fixture['kind'], x, y, width, depth, z, height, ...present({ outlet }) }
}

const outlineOf = ({ id, name, outline }: typeof beds.$inferSelect | typeof walks.$inferSelect) => ({ id, name, outline })

function placementOf(row: typeof placements.$inferSelect): Placement {
  const kept = present({ height: row.keptHeight, spread: row.keptSpread })
  const { id, plantId: plant, x, y, drift, clearStem } = row
  const role = row.role as Placement['role'] | null
  const status = row.status as Placement['status'] | null
  return {
    id, plant, x, y,
    planted: { height: row.plantedHeight, spread: row.plantedSpread },
    ...present({ role, drift, clearStem, status }),
    ...(Object.keys(kept).length > 0 && { kept }),
  }
}

/** What a studio has set otherwise than the rules do, by name. */
export function standardsOf(db: Db, studioId: string): Record<string, number | string> {
  const rows = db.select().from(standards).where(eq(standards.studioId, studioId)).orderBy(asc(standards.name)).all()
  return Object.fromEntries(rows.map(({ name, number, kind }) => [name, number ?? kind ?? '']))
}

/** The sheet of a facade as it stands now, with the site of its project, its studio's standards and the plants used. */
export function readSheet(db: Db, { facade, project }: FoundFacade): Sheet {
  const listed = <T extends typeof openings | typeof fixtures | typeof walks | typeof beds | typeof placements>(table: T) =>
    db.select().from(table).where(eq(table.facadeId, facade.id)).orderBy(asc(table.position)).all() as T['$inferSelect'][]
  const placed = listed(placements).map(placementOf)
  const own = standardsOf(db, facade.studioId)
  return {
    version: 1,
    units: 'in',
    site: siteOf(project, facade),
    facade: facadeOf(facade),
    openings: listed(openings).map(openingOf),
    fixtures: listed(fixtures).map(fixtureOf),
    walks: listed(walks).map(outlineOf),
    beds: listed(beds).map(outlineOf),
    plants: sheetPlants(db, facade.studioId, placed.map(({ plant }) => plant)),
    placements: placed,
    ...(Object.keys(own).length > 0 && { standards: own }),
  }
}

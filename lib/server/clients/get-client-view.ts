import { asc, eq } from 'drizzle-orm'
import { snapshot } from '@/db/open'
import { facades, studios } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { Placement, Sheet } from '@/lib/spacing'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findProject } from '../projects/find-project'
import { readSheet } from '../sheets/read-sheet'

/** A sheet as a client may have it. Findings, standards, brief and where the house stands are the studio's own. */
type ClientSheet = Omit<Sheet, 'standards'>

export interface ClientView {
  studio: { name: string }
  project: { name: string }
  facades: { id: string; name: string; sheet: ClientSheet }[]
}

/** Drift names are the designer's working words: the client's drawing needs only which plants stand together. */
function withoutWords(placements: readonly Placement[]): Placement[] {
  const names = new Map<string, string>()
  return placements.map((placement) => {
    if (placement.drift === undefined) return placement
    const name = names.get(placement.drift) ?? `drift-${names.size + 1}`
    names.set(placement.drift, name)
    return { ...placement, drift: name }
  })
}

function forClient({ version, units, site, facade, openings, fixtures, walks, beds, plants, placements }: Sheet): ClientSheet {
  const { zone, light, facing, moisture, deer, walnut, fireZone } = site
  return {
    version, units, facade, openings, fixtures, walks, beds, plants,
    site: { zone, light, moisture, deer, walnut, fireZone, ...(facing !== undefined && { facing }) },
    placements: withoutWords(placements),
  }
}

/**
 * What a client sees: the house fronts of their one project as last saved, nothing internal. Standards are left out,
 * so sizes are drawn as the rules have them by default.
 */
export function getClientView(context: Context, _: Record<string, never> = {}): ClientView {
  authorize(context, 'client-view:read')
  const { db, actor } = context
  if (actor.kind !== 'client') throw new AppError('forbidden')
  return snapshot(db, () => {
    const project = findProject(context, actor.projectId)
    const studio = db.select({ name: studios.name }).from(studios).where(eq(studios.id, actor.studioId)).get()
    const fronts = db.select().from(facades).where(eq(facades.projectId, project.id)).orderBy(asc(facades.createdAt), asc(facades.id)).all()
    return {
      studio: { name: studio?.name ?? '' },
      project: { name: project.name },
      facades: fronts.map((facade) => ({ id: facade.id, name: facade.name, sheet: forClient(readSheet(db, { facade, project })) })),
    }
  })
}

import { count, eq } from 'drizzle-orm'
import { facades, placements } from '@/db/schema'
import type { ProjectInput, Stage } from '@/lib/project'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { countFindings, noCounts, type Counts } from '../reviews/count-findings'
import { freshenFindings } from '../sheets/freshen-findings'
import { findProject } from './find-project'

export interface ProjectPage {
  id: string
  stage: Stage
  /** What the form holds, as `saveProject` takes it back. */
  input: ProjectInput
  /** To be sent back with the form. */
  version: number
  updatedAt: number
  facades: { id: string; name: string; counts: Counts; placements: number; updatedAt: number }[]
}

/** One project with its facades. Throws AppError('not-found'). */
export function getProject(context: Context, { projectId }: { projectId: string }): ProjectPage {
  authorize(context, 'project:read')
  const { db, actor } = context
  const { id, stage, version, updatedAt, latitude, longitude, ...row } = findProject(context, projectId)
  freshenFindings(db, actor.studioId)
  const counts = countFindings(db, actor.studioId)
  const fronts = db
    .select({ id: facades.id, name: facades.name, placements: count(placements.id), updatedAt: facades.updatedAt })
    .from(facades)
    .leftJoin(placements, eq(placements.facadeId, facades.id))
    .where(eq(facades.projectId, projectId))
    .groupBy(facades.id)
    .orderBy(facades.createdAt, facades.id)
    .all()
  const { name, address, clientName, zone, moisture, deer, walnut, fireZone, brief, notes } = row
  const input: ProjectInput = {
    name, address, clientName, zone, moisture, deer, walnut, fireZone, brief, notes,
    ...(latitude !== null && { latitude }),
    ...(longitude !== null && { longitude }),
  }
  return { id, stage, input, version, updatedAt, facades: fronts.map((front) => ({ ...front, counts: counts.get(front.id) ?? noCounts() })) }
}

import { count, desc, eq } from 'drizzle-orm'
import { facades, placements, projects } from '@/db/schema'
import type { Stage } from '@/lib/project'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { countFindings, noCounts, sumCounts, type Counts } from '../reviews/count-findings'
import { freshenFindings } from '../sheets/freshen-findings'

export interface ProjectSummary {
  id: string
  name: string
  address: string
  clientName: string
  stage: Stage
  zone: string
  facades: { id: string; name: string; counts: Counts }[]
  /** Over all facades. */
  counts: Counts
  placements: number
  /** Last change of the form or of any of its drawings, ms UTC. */
  updatedAt: number
}

/** The studio's projects with their facades and how many findings of each kind they have; the latest change first. */
export function listProjects(context: Context): ProjectSummary[] {
  authorize(context, 'project:list')
  const { db, actor } = context
  freshenFindings(db, actor.studioId)
  const counts = countFindings(db, actor.studioId)
  const fronts = db
    .select({ id: facades.id, name: facades.name, projectId: facades.projectId, placements: count(placements.id) })
    .from(facades)
    .leftJoin(placements, eq(placements.facadeId, facades.id))
    .where(eq(facades.studioId, actor.studioId))
    .groupBy(facades.id)
    .orderBy(facades.createdAt)
    .all()
  const rows = db.select().from(projects).where(eq(projects.studioId, actor.studioId)).orderBy(desc(projects.updatedAt), projects.id).all()
  return rows.map(({ id, name, address, clientName, stage, zone, updatedAt }) => {
    const own = fronts.filter(({ projectId }) => projectId === id).map((front) => ({ ...front, counts: counts.get(front.id) ?? noCounts() }))
    const planted = own.reduce((sum, front) => sum + front.placements, 0)
    return { id, name, address, clientName, stage, zone, facades: own, counts: sumCounts(own.map((front) => front.counts)), placements: planted, updatedAt }
  })
}

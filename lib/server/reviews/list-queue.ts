import { count, eq, sql } from 'drizzle-orm'
import { edits, facades, people, placements, projects } from '@/db/schema'
import type { Stage } from '@/lib/project'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { freshenFindings } from '../sheets/freshen-findings'
import { countFindings, noCounts, type Counts } from './count-findings'

export interface QueueItem {
  facadeId: string
  facadeName: string
  projectId: string
  projectName: string
  stage: Stage
  counts: Counts
  placements: number
  /** Last saved edit, ms UTC. */
  updatedAt: number
  /** Who made it; null when nothing was drawn yet. */
  updatedBy: string | null
}

const byUrgency = (a: QueueItem, b: QueueItem) =>
  b.counts.conflict - a.counts.conflict || b.counts.risk - a.counts.risk || b.updatedAt - a.updatedAt || (a.facadeId < b.facadeId ? -1 : 1)

/** Every facade of the studio, those with most conflicts first, then most risks, then the latest change. */
export function listQueue(context: Context): QueueItem[] {
  authorize(context, 'review:queue')
  const { db, actor } = context
  freshenFindings(db, actor.studioId)
  const counts = countFindings(db, actor.studioId)
  const rows = db
    .select({
      facadeId: facades.id, facadeName: facades.name, projectId: projects.id, projectName: projects.name, stage: projects.stage,
      placements: count(placements.id), updatedAt: facades.updatedAt,
      updatedBy: sql<string | null>`(select ${people.name} from ${edits} join ${people} on ${people.id} = ${edits.personId} where ${edits.facadeId} = ${facades.id} order by ${edits.seq} desc limit 1)`,
    })
    .from(facades)
    .innerJoin(projects, eq(projects.id, facades.projectId))
    .leftJoin(placements, eq(placements.facadeId, facades.id))
    .where(eq(facades.studioId, actor.studioId))
    .groupBy(facades.id)
    .all()
  return rows.map((row) => ({ ...row, counts: counts.get(row.facadeId) ?? noCounts() })).sort(byUrgency)
}

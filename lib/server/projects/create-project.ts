import { transact } from '@/db/open'
import { projects } from '@/db/schema'
import { projectInputSchema } from '@/lib/project'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { newId } from '../new-id'

/** Makes a project of the actor's studio, in draft, without facades. `input` is judged here. Throws AppError('invalid'). */
export function createProject(context: Context, { input }: { input: unknown }): { id: string } {
  authorize(context, 'project:create')
  const { db, actor, now } = context
  const { latitude = null, longitude = null, ...fields } = parseInput(projectInputSchema, input)
  const id = newId()
  transact(db, () => {
    db.insert(projects).values({ ...fields, id, studioId: actor.studioId, latitude, longitude, createdAt: now, updatedAt: now }).run()
    recordActivity(context, 'project:create', { projectId: id })
  })
  return { id }
}

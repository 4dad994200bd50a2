import { eq } from 'drizzle-orm'
import { transact } from '@/db/open'
import { facades, projects } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { projectInputSchema } from '@/lib/project'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { recheck } from '../sheets/freshen-findings'
import { findProject } from './find-project'

interface Args {
  projectId: string
  /** The whole form, judged here. */
  input: unknown
  /** The version the form was opened with. */
  version: number
}

/**
 * Saves a project's form and checks its facades again, for zone and site decide findings. Throws AppError('invalid'),
 * AppError('not-found'), and AppError('conflict') when someone saved the form since it was opened.
 */
export function saveProject(context: Context, { projectId, input, version }: Args): { version: number } {
  authorize(context, 'project:edit')
  const { db, now } = context
  const { latitude = null, longitude = null, ...fields } = parseInput(projectInputSchema, input)
  return transact(db, () => {
    const before = findProject(context, projectId)
    if (before.version !== version) throw new AppError('conflict', 'Someone else saved this project meanwhile. Load the page again to see it; nothing was changed.')
    const change = { ...fields, latitude, longitude, version: version + 1, updatedAt: now }
    const project = db.update(projects).set(change).where(eq(projects.id, projectId)).returning().get()
    for (const facade of db.select().from(facades).where(eq(facades.projectId, projectId)).all()) recheck(db, { facade, project })
    recordActivity(context, 'project:save', { projectId })
    return { version: project.version }
  })
}

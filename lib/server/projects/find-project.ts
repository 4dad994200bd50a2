import { and, eq } from 'drizzle-orm'
import { projects } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { Context } from '../context'

/** A project of the actor's studio; AppError('not-found') when it is absent or another studio's. */
export function findProject({ db, actor }: Context, projectId: string): typeof projects.$inferSelect {
  const found = db.select().from(projects).where(and(eq(projects.id, projectId), eq(projects.studioId, actor.studioId))).get()
  if (!found) throw new AppError('not-found')
  return found
}

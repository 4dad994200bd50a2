import { and, eq } from 'drizzle-orm'
import { facades, projects } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { Context } from '../context'

/** A facade of the actor's studio with its project; AppError('not-found') when it is absent or another studio's. */
export function findFacade({ db, actor }: Context, facadeId: string) {
  const found = db
    .select({ facade: facades, project: projects })
    .from(facades)
    .innerJoin(projects, eq(projects.id, facades.projectId))
    .where(and(eq(facades.id, facadeId), eq(facades.studioId, actor.studioId)))
    .get()
  if (!found) throw new AppError('not-found')
  return found
}

export type FoundFacade = ReturnType<typeof findFacade>

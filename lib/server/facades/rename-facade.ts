import { eq } from 'drizzle-orm'
import { transact } from '@/db/open'
import { facades } from '@/db/schema'
import { facadeNameSchema } from '@/lib/project'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { findFacade } from '../sheets/find-facade'

/** Gives a facade another name. Throws AppError('invalid' | 'not-found'). */
export function renameFacade(context: Context, { facadeId, name: typed }: { facadeId: string; name: unknown }): void {
  authorize(context, 'project:edit')
  const { db, now } = context
  const name = parseInput(facadeNameSchema, typed)
  transact(db, () => {
    const { facade } = findFacade(context, facadeId)
    db.update(facades).set({ name, updatedAt: now }).where(eq(facades.id, facade.id)).run()
    recordActivity(context, 'facade:rename', { projectId: facade.projectId, detail: `${facade.name} -> ${name}` })
  })
}

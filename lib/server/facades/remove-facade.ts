import { eq } from 'drizzle-orm'
import { transact } from '@/db/open'
import { facades } from '@/db/schema'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findFacade } from '../sheets/find-facade'

/** Removes a facade with everything drawn on it. Throws AppError('not-found'). */
export function removeFacade(context: Context, { facadeId }: { facadeId: string }): { projectId: string } {
  authorize(context, 'project:edit')
  const { db } = context
  return transact(db, () => {
    const { facade } = findFacade(context, facadeId)
    db.delete(facades).where(eq(facades.id, facade.id)).run()
    recordActivity(context, 'facade:remove', { projectId: facade.projectId, detail: facade.name })
    return { projectId: facade.projectId }
  })
}

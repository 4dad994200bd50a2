import { and, eq, isNull } from 'drizzle-orm'
import { transact } from '@/db/open'
import { clients, sessions, signInLinks } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'

/**
 * Makes a client link useless and ends the client's sessions; another link of theirs lets them in again.
 * Throws AppError('not-found') when it is absent, another studio's or revoked already.
 */
export function revokeClientLink(context: Context, { linkId }: { linkId: string }): void {
  authorize(context, 'client-link:create')
  const { db, actor, now } = context
  transact(db, () => {
    const isOurs = and(eq(signInLinks.id, linkId), eq(signInLinks.studioId, actor.studioId), isNull(signInLinks.revokedAt))
    const link = db.update(signInLinks).set({ revokedAt: now }).where(isOurs).returning().get()
    if (!link) throw new AppError('not-found')
    const client = db.select({ personId: clients.personId }).from(clients).where(eq(clients.id, link.clientId)).get()
    if (client) db.delete(sessions).where(eq(sessions.userId, client.personId)).run()
    recordActivity(context, 'client-link:revoke', { projectId: link.projectId })
  })
}

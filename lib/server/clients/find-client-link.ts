import { and, eq, gt, isNull } from 'drizzle-orm'
import { clients, projects, signInLinks, studios } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { Anonymous } from '../context'
import { hashSecret } from '../people/hashed-sessions'

/**
 * What a link's secret opens: for the page behind the link and for the exchange. Uses nothing up.
 * Throws AppError('not-found') when it is unknown, expired or revoked: one answer for all three.
 */
export function findClientLink({ db, now }: Anonymous, { token }: { token: string }) {
  const found = db
    .select({
      personId: clients.personId, studioId: signInLinks.studioId, projectId: signInLinks.projectId,
      studioName: studios.name, projectName: projects.name,
    })
    .from(signInLinks)
    .innerJoin(clients, eq(clients.id, signInLinks.clientId))
    .innerJoin(projects, eq(projects.id, signInLinks.projectId))
    .innerJoin(studios, eq(studios.id, signInLinks.studioId))
    .where(and(eq(signInLinks.tokenHash, hashSecret(token)), isNull(signInLinks.revokedAt), gt(signInLinks.expiresAt, now)))
    .get()
  if (!found) throw new AppError('not-found', 'This link is no longer good. Ask your designer for a new one.')
  return found
}

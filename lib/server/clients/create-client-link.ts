import { randomBytes } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { transact } from '@/db/open'
import { clients, people, signInLinks } from '@/db/schema'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { newId } from '../new-id'
import { hashSecret } from '../people/hashed-sessions'
import { findProject } from '../projects/find-project'

const DAY_MS = 24 * 60 * 60 * 1000
/** Long enough for a proposal to be talked over at leisure. */
export const LINK_DAYS = 60

interface ClientLink {
  id: string
  /** Path of the link, to stand behind the address of the site. Told once: only a hash of its secret is kept. */
  path: `/c/${string}`
  /** Access ends then, for sessions begun by the link too; ms UTC. */
  expiresAt: number
}

/** The project's one client, made when the first link is. */
function clientOf({ db, actor, now }: Context, project: { id: string; clientName: string }): string {
  const known = db.select({ id: clients.id }).from(clients).where(eq(clients.projectId, project.id)).get()
  if (known) return known.id
  const personId = newId()
  const id = newId()
  db.insert(people).values({ id: personId, name: project.clientName || 'Client', createdAt: now }).run()
  db.insert(clients).values({ id, studioId: actor.studioId, projectId: project.id, personId, createdAt: now }).run()
  return id
}

/**
 * Makes a link that signs the client in to this one project. It can be used again, on another phone or after the
 * cookies are gone, until it expires or is revoked. Throws AppError('not-found').
 */
export function createClientLink(context: Context, { projectId }: { projectId: string }): ClientLink {
  authorize(context, 'client-link:create')
  const { db, actor, now } = context
  const token = randomBytes(32).toString('base64url')
  const id = newId()
  const expiresAt = now + LINK_DAYS * DAY_MS
  transact(db, () => {
    const clientId = clientOf(context, findProject(context, projectId))
    const row = { id, tokenHash: hashSecret(token), studioId: actor.studioId, projectId, clientId, expiresAt, createdBy: actor.personId, createdAt: now }
    db.insert(signInLinks).values(row).run()
    recordActivity(context, 'client-link:create', { projectId })
  })
  return { id, path: `/c/${token}`, expiresAt }
}

import { and, eq, gt, isNull } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { clients, members, people, signInLinks } from '@/db/schema'
import type { Actor } from '../context'

interface Whom {
  personId: string
  studioId: string
  /** Set for a client's session. */
  projectId: string | null
  now: number
}

function findMember(db: Db, { personId, studioId }: Whom): Actor | null {
  const row = db
    .select({ name: people.name, email: people.email, role: members.role })
    .from(members)
    .innerJoin(people, eq(people.id, members.personId))
    .where(and(eq(members.personId, personId), eq(members.studioId, studioId)))
    .get()
  return row ? { kind: 'member', personId, studioId, role: row.role, name: row.name, email: row.email ?? '' } : null
}

function findClient(db: Db, { personId, studioId, now }: Whom, projectId: string): Actor | null {
  const row = db
    .select({ name: people.name })
    .from(clients)
    .innerJoin(people, eq(people.id, clients.personId))
    .innerJoin(signInLinks, and(eq(signInLinks.clientId, clients.id), isNull(signInLinks.revokedAt), gt(signInLinks.expiresAt, now)))
    .where(and(eq(clients.personId, personId), eq(clients.studioId, studioId), eq(clients.projectId, projectId)))
    .get()
  return row ? { kind: 'client', personId, studioId, projectId, role: 'client', name: row.name } : null
}

/**
 * The person of a session as they stand now; null when their membership was taken away, or, for a client, when
 * no link of theirs stands any more: access ends with the last link that expires or is revoked.
 */
export function findActor(db: Db, whom: Whom): Actor | null {
  return whom.projectId === null ? findMember(db, whom) : findClient(db, whom, whom.projectId)
}

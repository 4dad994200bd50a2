import type { Db } from '@/db/open'
import type { MemberRole } from '@/lib/access'

/** Someone of a studio, as they stand at this request: role and membership are read anew each time. */
export interface Member {
  kind: 'member'
  personId: string
  studioId: string
  role: MemberRole
  name: string
  email: string
}

/** The reader of one project's client page. */
export interface Client {
  kind: 'client'
  personId: string
  studioId: string
  projectId: string
  role: 'client'
  name: string
}

export type Actor = Member | Client

/** What an operation is given besides its arguments: where the data is, who asks, and when (ms UTC). */
export interface Context {
  db: Db
  actor: Actor
  now: number
}

/** A context before anyone is known, for signing in and for the health check. */
export type Anonymous = Omit<Context, 'actor'>

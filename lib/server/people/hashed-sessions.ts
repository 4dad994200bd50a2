/** Keeps session ids as SHA-256: a copied table signs nobody in. Everything else is the wrapped adapter's. */
import { createHash } from 'node:crypto'
import type { Adapter, DatabaseSession, DatabaseUser } from 'lucia'

/** SHA-256 of a secret, hex: how session ids and link tokens stand in the database. */
export const hashSecret = (secret: string): string => createHash('sha256').update(secret).digest('hex')

export class HashedSessions implements Adapter {
  constructor(private readonly inner: Adapter) {}

  /** The session is handed back under the id that was asked for: Lucia ends or renews it by that id. */
  async getSessionAndUser(id: string): Promise<[DatabaseSession | null, DatabaseUser | null]> {
    const [session, user] = await this.inner.getSessionAndUser(hashSecret(id))
    return [session && { ...session, id }, user]
  }

  /** Sessions of a person. Their ids are hashes, for what the cookies hold is known to the browsers alone. */
  getUserSessions = (userId: string) => this.inner.getUserSessions(userId)
  setSession = (session: DatabaseSession) => this.inner.setSession({ ...session, id: hashSecret(session.id) })
  updateSessionExpiration = (id: string, expiresAt: Date) => this.inner.updateSessionExpiration(hashSecret(id), expiresAt)
  deleteSession = (id: string) => this.inner.deleteSession(hashSecret(id))
  deleteUserSessions = (userId: string) => this.inner.deleteUserSessions(userId)
  deleteExpiredSessions = () => this.inner.deleteExpiredSessions()
}

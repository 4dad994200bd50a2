import type { Anonymous } from '../context'
import { createSession, endSession } from '../people/session'
import { findClientLink } from './find-client-link'

interface Args {
  token: string
  /** What the browser's session cookie holds already: that session ends. */
  previous?: string | null
}

/** Signs the client in and answers the secret for the session cookie. Throws AppError('not-found') for a link that is no longer good. */
export async function exchangeClientLink(access: Anonymous, { token, previous }: Args): Promise<string> {
  const { personId, studioId, projectId } = findClientLink(access, { token })
  if (previous) await endSession(access.db, previous)
  return createSession(access.db, personId, { studioId, projectId })
}

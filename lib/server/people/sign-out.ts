import 'server-only'
import { getDb } from '@/db/client'
import { clearSessionCookie, endSession, readSessionSecret } from './session'

/** Ends the session of this request and takes its cookie away. Server actions only; nothing happens when signed out. */
export async function signOut(): Promise<void> {
  const secret = await readSessionSecret()
  if (secret) await endSession(getDb(), secret)
  await clearSessionCookie()
}

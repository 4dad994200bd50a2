import 'server-only'
import { getDb } from '@/db/client'
import type { Anonymous } from '../context'

/** The context of a page or action for someone not signed in: signing in, opening a client's link. */
export function anonymousContext(): Anonymous {
  return { db: getDb(), now: Date.now() }
}

import 'server-only'
import { redirect } from 'next/navigation'
import type { Route } from 'next'
import { getDb } from '@/db/client'
import type { Actor, Context } from '../context'
import { readActor } from './session'

/**
 * The context of a page or a server action. Whoever is not signed in goes to sign in; a client who strays into the
 * studio goes to their own page, a member who strays onto the client's page to the projects.
 */
export async function requireContext(kind: Actor['kind'] = 'member'): Promise<Context> {
  const actor = await readActor()
  if (!actor) redirect('/sign-in' as Route)
  if (actor.kind !== kind) redirect((actor.kind === 'client' ? '/view' : '/projects') as Route)
  return { db: getDb(), actor, now: Date.now() }
}

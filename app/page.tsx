import type { Route } from 'next'
import { redirect } from 'next/navigation'
import { readActor } from '@/lib/server/people/session'

/** The front door: members go to their projects, clients to their garden, everyone else to sign in. */
export default async function FrontDoor() {
  const actor = await readActor()
  if (!actor) redirect('/sign-in' as Route)
  redirect((actor.kind === 'client' ? '/view' : '/projects') as Route)
}

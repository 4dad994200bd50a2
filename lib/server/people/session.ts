/**
 * Sessions: the only file that knows Lucia. A session belongs to a member (with their studio) or to a client (with
 * their studio and their one project); it lasts 30 days and is renewed while it is used.
 */
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle'
import { Lucia, TimeSpan } from 'lucia'
import { cookies, headers } from 'next/headers'
import { cache } from 'react'
import { getDb } from '@/db/client'
import type { Db } from '@/db/open'
import { people, sessions } from '@/db/schema'
import type { Actor } from '../context'
import { findActor } from './find-actor'
import { HashedSessions } from './hashed-sessions'

export const SESSION_COOKIE = 'tenth_summer_session'

function makeLucia(db: Db) {
  return new Lucia(new HashedSessions(new DrizzleSQLiteAdapter(db, sessions, people)), {
    sessionExpiresIn: new TimeSpan(30, 'd'),
    // The row's date rules: pages cannot renew a cookie, so the cookie outlives it.
    sessionCookie: { name: SESSION_COOKIE, expires: false },
    getSessionAttributes: ({ studioId, projectId }) => ({ studioId, projectId }),
  })
}

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>
    DatabaseSessionAttributes: { studioId: string; projectId: string | null }
  }
}

const made = new WeakMap<Db, ReturnType<typeof makeLucia>>()

function luciaOf(db: Db) {
  const known = made.get(db)
  if (known) return known
  const lucia = makeLucia(db)
  made.set(db, lucia)
  return lucia
}

/** Starts a session and answers the secret its cookie holds; the database keeps only its hash. */
export async function createSession(db: Db, personId: string, where: { studioId: string; projectId: string | null }): Promise<string> {
  const lucia = luciaOf(db)
  await lucia.deleteExpiredSessions()
  return (await lucia.createSession(personId, where)).id
}

/** Ends the session of this cookie; nothing happens when there is none. */
export async function endSession(db: Db, secret: string): Promise<void> {
  await luciaOf(db).invalidateSession(secret)
}

/** Who this cookie stands for now; null when the session ended or the person is no longer of the studio or project. */
export async function actorOf(db: Db, secret: string, now: number): Promise<Actor | null> {
  const { session } = await luciaOf(db).validateSession(secret)
  return session && findActor(db, { personId: session.userId, studioId: session.studioId, projectId: session.projectId, now })
}

/**
 * Whether cookies go over https only: COOKIE_SECURE=1 always, 0 never; unset, in production when the request came
 * over https (as the proxy in front of the server says).
 */
export function isCookieSecure(forwardedProto: string | null): boolean {
  const wanted = process.env.COOKIE_SECURE
  if (wanted === '1' || wanted === '0') return wanted === '1'
  return process.env.NODE_ENV === 'production' && forwardedProto?.split(',')[0]?.trim() === 'https'
}

/** Gives the browser its session: HttpOnly, SameSite=Lax. Server actions and route handlers only. */
export async function setSessionCookie(secret: string): Promise<void> {
  const { name, value, attributes } = luciaOf(getDb()).createSessionCookie(secret)
  const secure = isCookieSecure((await headers()).get('x-forwarded-proto'))
  ;(await cookies()).set(name, value, { ...attributes, httpOnly: true, sameSite: 'lax', path: '/', secure })
}

/** Takes the session from the browser. Server actions and route handlers only. */
export async function clearSessionCookie(): Promise<void> {
  ;(await cookies()).delete(SESSION_COOKIE)
}

/** What the session cookie of this request holds; null without one. */
export async function readSessionSecret(): Promise<string | null> {
  return (await cookies()).get(SESSION_COOKIE)?.value ?? null
}

/** Who asks in this request; null when nobody is signed in. Read once a request. */
export const readActor = cache(async (): Promise<Actor | null> => {
  const secret = await readSessionSecret()
  return secret ? actorOf(getDb(), secret, Date.now()) : null
})

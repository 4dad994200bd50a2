import { browser, newBrowser } from '../support/next-edge'
import { eq } from 'drizzle-orm'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import type { Db } from '@/db/open'
import { members, people, rateLimits, sessions } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { changePassword } from '@/lib/server/people/change-password'
import { hashPassword, isPasswordRight } from '@/lib/server/people/hash-password'
import { hashSecret } from '@/lib/server/people/hashed-sessions'
import { actorOf, createSession, endSession, isCookieSecure, readActor, SESSION_COOKIE, setSessionCookie } from '@/lib/server/people/session'
import { signIn } from '@/lib/server/people/sign-in'
import { MAX_PER_ACCOUNT, MAX_PER_ADDRESS } from '@/lib/server/people/throttle'
import { addStudios, contextOf, emailOf, NOW } from '../support/actors'
import { openTestDatabase } from '../support/database'

const PASSWORD = 'nine crooked fence posts'
let passwordHash: string
let db: Db

beforeAll(async () => {
  passwordHash = await hashPassword(PASSWORD)
})
beforeEach(() => {
  newBrowser()
  db = openTestDatabase()
  addStudios(db, passwordHash)
})

const attempt = (email: string, password: string, address = '192.0.2.1', previous?: string) => signIn({ db, now: NOW }, { email, password, address, previous })

async function refusalOf(work: Promise<unknown>): Promise<AppError> {
  const error = await work.then(() => null, (thrown: unknown) => thrown)
  expect(error).toBeInstanceOf(AppError)
  return error as AppError
}

describe('a session', () => {
  it('is stored under the SHA-256 of what the cookie holds, and what is stored opens nothing', async () => {
    const secret = await attempt(emailOf('designer'), PASSWORD)
    const stored = db.select().from(sessions).all()
    expect(stored.map(({ id }) => id)).toEqual([hashSecret(secret)])
    expect(JSON.stringify(stored)).not.toContain(secret)
    expect(await actorOf(db, secret, NOW)).toMatchObject({ kind: 'member', personId: 'designer', studioId: 'studio-a', role: 'designer' })
    expect(await actorOf(db, stored[0]!.id, NOW)).toBeNull()
  })

  it('ends on sign-out, and the session it replaces ends on sign-in', async () => {
    const first = await attempt(emailOf('designer'), PASSWORD)
    const second = await attempt(emailOf('designer'), PASSWORD, '192.0.2.1', first)
    expect(await actorOf(db, first, NOW)).toBeNull()
    expect(await actorOf(db, second, NOW)).not.toBeNull()
    await endSession(db, second)
    expect(await actorOf(db, second, NOW)).toBeNull()
    expect(db.select().from(sessions).all()).toEqual([])
  })

  it('ends when its time is over, and is renewed by its own row while it is used', async () => {
    const secret = await attempt(emailOf('designer'), PASSWORD)
    const row = () => db.select().from(sessions).get()
    db.update(sessions).set({ expiresAt: Math.floor(Date.now() / 1000) + 3600 }).run()
    expect(await actorOf(db, secret, NOW)).not.toBeNull()
    expect(row()!.expiresAt).toBeGreaterThan(Date.now() / 1000 + 29 * 24 * 3600)
    db.update(sessions).set({ expiresAt: Math.floor(Date.now() / 1000) - 1 }).run()
    expect(await actorOf(db, secret, NOW)).toBeNull()
    expect(row()).toBeUndefined()
  })

  it('opens nothing from the next request on when the membership was taken away, and follows a changed role', async () => {
    const secret = await attempt(emailOf('designer'), PASSWORD)
    db.update(members).set({ role: 'estimator' }).where(eq(members.personId, 'designer')).run()
    expect(await actorOf(db, secret, NOW)).toMatchObject({ role: 'estimator' })
    db.delete(members).where(eq(members.personId, 'designer')).run()
    expect(await actorOf(db, secret, NOW)).toBeNull()
  })

  it('travels in a cookie that scripts cannot read and other sites cannot send', async () => {
    vi.stubGlobal('tenthSummerDb', db)
    const secret = await createSession(db, 'designer', { studioId: 'studio-a', projectId: null })
    await setSessionCookie(secret)
    expect(browser.set).toHaveLength(1)
    expect(browser.set[0]).toMatchObject({ name: SESSION_COOKIE, value: secret, options: { httpOnly: true, sameSite: 'lax', path: '/', secure: false } })
    expect(await readActor()).toMatchObject({ personId: 'designer' })
    browser.cookies.set(SESSION_COOKIE, 'made-up')
    expect(await readActor()).toBeNull()
    vi.unstubAllGlobals()
  })

  it.each([
    ['1', 'test', null, true], ['1', 'production', 'http', true], ['0', 'production', 'https', false],
    [undefined, 'production', 'https', true], [undefined, 'production', 'https, http', true], [undefined, 'production', null, false], [undefined, 'test', 'https', false],
  ])('has a Secure cookie by COOKIE_SECURE=%s, %s, %s: %s', (wanted, mode, proto, secure) => {
    vi.stubEnv('COOKIE_SECURE', wanted)
    vi.stubEnv('NODE_ENV', mode)
    expect(isCookieSecure(proto)).toBe(secure)
    vi.unstubAllEnvs()
  })
})

describe('signing in', () => {
  it('takes the address in any case and with spaces around it', async () => {
    expect(await attempt(`  ${emailOf('owner').toUpperCase()} `, PASSWORD)).toMatch(/^\w{20,}$/)
  })

  it('answers the same for an unknown address, a wrong password, a client and a person of no studio', async () => {
    db.insert(people).values({ id: 'left', name: 'Left', email: 'left@example.test', passwordHash, createdAt: NOW }).run()
    const answers = await Promise.all(
      [['nobody@example.test', PASSWORD], [emailOf('owner'), 'some wrong password'], ['left@example.test', PASSWORD], ['', '']].map(([email, password]) => refusalOf(attempt(email!, password!))),
    )
    const [first, ...rest] = answers.map(({ code, message, problems, detail }) => ({ code, message, problems, detail }))
    for (const answer of rest) expect(answer).toEqual(first)
    expect(db.select().from(sessions).all()).toEqual([])
  })

  it('does the same hashing for an unknown address as for a wrong password', async () => {
    await isPasswordRight(null, 'warm up')
    const timeOf = async (stored: string | null) => {
      const times: number[] = []
      for (let i = 0; i < 9; i++) {
        const began = performance.now()
        expect(await isPasswordRight(stored, 'some wrong password')).toBe(false)
        times.push(performance.now() - began)
      }
      return times.sort((a, b) => a - b)[4]!
    }
    const [unknown, wrong] = [await timeOf(null), await timeOf(passwordHash)]
    // One is not a small fraction of the other: without the hash of nothing it would be a thousandth.
    expect(Math.min(unknown, wrong) / Math.max(unknown, wrong)).toBeGreaterThan(0.3)
  })

  it('takes a password typed with composed or with separate accents', async () => {
    const hash = await hashPassword('caf\u00e9 au jardin clos')
    expect(await isPasswordRight(hash, 'cafe\u0301 au jardin clos')).toBe(true)
    expect(hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  })

  it('works through many hashes two at a time and loses none', async () => {
    const answers = await Promise.all(Array.from({ length: 9 }, (_, i) => isPasswordRight(passwordHash, i % 3 === 0 ? PASSWORD : 'some wrong password')))
    expect(answers.filter(Boolean)).toHaveLength(3)
  })

  it(`is refused after ${MAX_PER_ACCOUNT} wrong passwords for an account, even with the right one, from anywhere`, async () => {
    const wrong = await Promise.all(Array.from({ length: MAX_PER_ACCOUNT }, (_, i) => refusalOf(attempt(emailOf('owner'), 'some wrong password', `192.0.2.${i}`))))
    expect(wrong.every(({ code }) => code === 'invalid')).toBe(true)
    const refused = await refusalOf(attempt(emailOf('owner'), PASSWORD, '198.51.100.1'))
    expect(refused.code).toBe('too-many')
    expect(refused.message).toMatch(/in 1?\d minutes?/)
    expect(await attempt(emailOf('designer'), PASSWORD)).toBeTruthy()
  })

  it('is refused the same way for an account that does not exist', async () => {
    for (let i = 0; i < MAX_PER_ACCOUNT; i++) await refusalOf(attempt('nobody@example.test', 'some wrong password'))
    expect((await refusalOf(attempt('nobody@example.test', PASSWORD))).code).toBe('too-many')
    expect(JSON.stringify(db.select().from(rateLimits).all())).not.toContain('nobody')
  })

  it(`is refused after ${MAX_PER_ADDRESS} attempts on different accounts from one address`, async () => {
    db.insert(rateLimits).values({ key: 'address:203.0.113.9', points: MAX_PER_ADDRESS, expire: Date.now() + 60_000 }).run()
    expect((await refusalOf(attempt(emailOf('owner'), PASSWORD, '203.0.113.9'))).code).toBe('too-many')
    expect(await attempt(emailOf('owner'), PASSWORD, '203.0.113.10')).toBeTruthy()
  })

  it('forgets an account\'s wrong passwords once the right one was given', async () => {
    for (let i = 0; i < MAX_PER_ACCOUNT - 1; i++) await refusalOf(attempt(emailOf('owner'), 'some wrong password'))
    await attempt(emailOf('owner'), PASSWORD)
    expect((await refusalOf(attempt(emailOf('owner'), 'some wrong password'))).code).toBe('invalid')
  })
})

describe('changing the password', () => {
  const NEXT = 'seven gravel paths north'
  const change = (secret: string, current: string, next: string) => changePassword(contextOf(db, 'designer'), { current, next, secret, address: '192.0.2.1' })

  it('ends every other session of the person, keeps this one, and nobody else\'s', async () => {
    const [here, tablet, colleague] = [await attempt(emailOf('designer'), PASSWORD), await attempt(emailOf('designer'), PASSWORD), await attempt(emailOf('owner'), PASSWORD)]
    await change(here, PASSWORD, NEXT)
    expect(await Promise.all([here, tablet, colleague].map(async (secret) => (await actorOf(db, secret, NOW)) !== null))).toEqual([true, false, true])
    expect((await refusalOf(attempt(emailOf('designer'), PASSWORD))).code).toBe('invalid')
    expect(await attempt(emailOf('designer'), NEXT)).toBeTruthy()
  })

  it('needs the password of now and a next one that will do, named by their fields', async () => {
    const here = await attempt(emailOf('designer'), PASSWORD)
    expect((await refusalOf(change(here, 'some wrong password', NEXT))).problems?.[0]?.path).toEqual(['current'])
    expect((await refusalOf(change(here, PASSWORD, 'password1234'))).problems?.[0]?.path).toEqual(['next'])
    expect((await refusalOf(change(here, PASSWORD, 'designer and twelve'))).problems?.[0]?.path).toEqual(['next'])
    expect(await attempt(emailOf('designer'), PASSWORD)).toBeTruthy()
  })

  it('counts guesses at the password of now like sign-ins', async () => {
    for (let i = 0; i < MAX_PER_ACCOUNT; i++) await refusalOf(change('x', 'some wrong password', NEXT))
    expect((await refusalOf(change('x', PASSWORD, NEXT))).code).toBe('too-many')
  })

  it('is not for clients', async () => {
    const refused = await refusalOf(changePassword(contextOf(db, 'client'), { current: '', next: NEXT, secret: 'x', address: '192.0.2.1' }))
    expect(refused.code).toBe('forbidden')
  })
})

import { browser, newBrowser } from '../support/next-edge'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { AppError } from '@/lib/errors'
import { callerAddress } from '@/lib/server/http/caller-address'
import { log } from '@/lib/server/http/log'
import { publicRoute, route } from '@/lib/server/http/route'
import { createSession, SESSION_COOKIE } from '@/lib/server/people/session'
import { z } from '@/lib/zod'
import { addStudios } from '../support/actors'
import { openTestDatabase } from '../support/database'

beforeEach(async () => {
  newBrowser()
  const db = openTestDatabase()
  addStudios(db)
  vi.stubGlobal('tenthSummerDb', db)
  browser.cookies.set(SESSION_COOKIE, await createSession(db, 'designer', { studioId: 'studio-a', projectId: null }))
})
afterEach(() => vi.unstubAllGlobals())

const params = { params: Promise.resolve({}) }
const post = (body: BodyInit | null, headers: Record<string, string> = {}) =>
  new Request('http://127.0.0.1:3000/api/thing', { method: 'POST', body, headers: { host: '127.0.0.1:3000', ...headers }, ...(body instanceof ReadableStream && { duplex: 'half' }) } as RequestInit)
const echo = route(({ body, context }) => ({ body, who: context.actor.personId }))

describe('a route handler', () => {
  it('answers JSON that nobody between may keep', async () => {
    const response = await echo(post('{"a":1}'), params)
    expect(response.status).toBe(200)
    expect(await response.json()).toEqual({ body: { a: 1 }, who: 'designer' })
    expect(response.headers.get('cache-control')).toBe('no-store')
    expect(response.headers.get('x-content-type-options')).toBe('nosniff')
  })

  it.each([
    [{ origin: 'https://elsewhere.example' }, 403], [{ origin: 'null' }, 403], [{ 'sec-fetch-site': 'cross-site' }, 403],
    [{ 'sec-fetch-site': 'same-site' }, 403], [{ origin: 'http://127.0.0.1:3001' }, 403], [{ origin: 'http://127.0.0.1:3000', 'sec-fetch-site': 'cross-site' }, 403],
    [{ origin: 'http://127.0.0.1:3000', 'sec-fetch-site': 'same-origin' }, 200], [{ 'sec-fetch-site': 'none' }, 200],
    [{ origin: 'https://garden.example', 'x-forwarded-host': 'garden.example' }, 200],
  ])('refuses a post of another site, not one of ours: %j -> %i', async (headers, status) => {
    const response = await echo(post('{}', headers as unknown as Record<string, string>), params)
    expect(response.status).toBe(status)
  })

  it('answers 401 without a session, before anything of the body is read', async () => {
    browser.cookies.clear()
    const response = await echo(post('not json'), params)
    expect(response.status).toBe(401)
    expect((await response.json()).error.code).toBe('signed-out')
  })

  it('stops reading at the limit, whatever length was announced', async () => {
    const small = route(() => ({}), { maxBytes: 1024 })
    expect((await small(post('x'.repeat(1025)), params)).status).toBe(413)
    const endless = new ReadableStream({ pull: (to) => to.enqueue(new Uint8Array(512)) })
    expect((await small(post(endless), params)).status).toBe(413)
    expect((await small(post('1'.repeat(1024)), params)).status).toBe(200)
  })

  it.each([['', 400], ['{"a":', 400], [new Uint8Array([0x22, 0xff, 0x22]), 400]])('says when the body cannot be read (%#)', async (body, status) => {
    expect((await echo(post(body), params)).status).toBe(status)
  })

  it('names every bad field of a body, unknown ones too', async () => {
    const handler = route(({ body }) => body, { schema: z.strictObject({ size: z.number({ error: 'A size is a number.' }) }) })
    const response = await handler(post('{"size":"big","colour":1}'), params)
    expect(response.status).toBe(422)
    const { error } = await response.json()
    expect(error.problems.map(({ path }: { path: string[] }) => path)).toEqual([['size'], ['colour']])
    expect(error.message).toContain('A size is a number.')
  })

  it('keeps what went wrong inside to the log, and gives a number to ask about', async () => {
    const logged = vi.spyOn(log, 'error')
    const handler = route(() => {
      throw new Error('SECRET /srv/file.db line 3')
    })
    const response = await handler(post('{}'), params)
    const text = await response.text()
    expect(response.status).toBe(500)
    expect(text).not.toMatch(/SECRET|at .*\.ts/)
    const { error } = JSON.parse(text)
    expect(error.message).toContain(error.id)
    expect(logged).toHaveBeenCalledWith(expect.objectContaining({ id: error.id, where: 'POST /api/thing' }), 'fault')
    logged.mockRestore()
  })

  it('lets an error carry facts beside its sentence, never over its code', async () => {
    const handler = publicRoute(() => {
      throw new AppError('conflict', undefined, { detail: { seq: 4, code: 'fake' } })
    })
    const response = await handler(post('{}'))
    expect(response.status).toBe(409)
    expect((await response.json()).error).toMatchObject({ code: 'conflict', seq: 4 })
  })
})

describe('the address a request came from', () => {
  it('is the one the nearest proxy wrote', () => {
    expect(callerAddress(new Headers({ 'x-forwarded-for': '1.1.1.1, 192.0.2.7' }))).toBe('192.0.2.7')
    expect(callerAddress(new Headers())).toBe('unknown')
  })
})

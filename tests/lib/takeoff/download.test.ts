/** The plant list as a download: what it says it is, under what name, and its first bytes. */
import { browser, newBrowser } from '../../support/next-edge'
import { beforeEach, expect, it, vi } from 'vitest'
import { GET } from '@/app/api/facades/[id]/plant-list/route'
import type { Db } from '@/db/open'
import { facades } from '@/db/schema'
import { createSession, SESSION_COOKIE } from '@/lib/server/people/session'
import { actorNamed, addStudios } from '../../support/actors'
import { openTestDatabase } from '../../support/database'

let db: Db
beforeEach(async () => {
  newBrowser()
  db = openTestDatabase()
  addStudios(db)
  vi.stubGlobal('tenthSummerDb', db)
  const { personId, studioId } = actorNamed('owner')
  browser.cookies.set(SESSION_COOKIE, await createSession(db, personId, { studioId, projectId: null }))
  return () => vi.unstubAllGlobals()
})

const ask = (query = '') => GET(new Request(`http://127.0.0.1:3000/api/facades/facade-a/plant-list${query}`), { params: Promise.resolve({ id: 'facade-a' }) })

it('is a CSV file to keep, read as nothing else', async () => {
  const answer = await ask()
  expect(answer.headers.get('content-type')).toBe('text/csv; charset=utf-8')
  expect(answer.headers.get('x-content-type-options')).toBe('nosniff')
  expect(answer.headers.get('content-disposition')).toMatch(/^attachment; filename="[\w .-]+\.csv"; filename\*=UTF-8''[\w.!~%-]+\.csv$/)
})

it('has a plain name beside the true one, and neither breaks the header', async () => {
  db.update(facades).set({ name: 'Süd "front"\r\nX: 1; (a)' }).run()
  const name = (await ask()).headers.get('content-disposition')!
  expect(name).toMatch(/^attachment; filename="[\w .-]+\.csv"; filename\*=UTF-8''[\w.!~%-]+\.csv$/)
  expect(decodeURIComponent(name.split("''")[1]!)).toContain('Süd "front"')
})

it('begins with the byte order mark only when asked', async () => {
  const bytesOf = async (query: string) => [...new Uint8Array(await (await ask(query)).arrayBuffer()).slice(0, 3)]
  expect(await bytesOf('?bom=1')).toEqual([0xef, 0xbb, 0xbf])
  expect(await bytesOf('')).toEqual([...new TextEncoder().encode('Key')])
})

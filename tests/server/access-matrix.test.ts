import { browser, newBrowser } from '../support/next-edge'
import { readdirSync, readFileSync } from 'node:fs'
import { join, relative } from 'node:path'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { Db } from '@/db/open'
import { csvTemplate } from '@/lib/plants/csv-columns'
import { createSession, SESSION_COOKIE } from '@/lib/server/people/session'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { actorNamed, addStudios, contextOf, placementAt, put } from '../support/actors'
import { openTestDatabase } from '../support/database'
import { ACTIONS, PAGES, ROUTES, VIEWERS, type RouteEndpoint, type Viewer } from '../support/endpoints'

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'] as const

function filesUnder(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.(tsx?|m?js)$/.test(entry.name))
    .map((entry) => relative(process.cwd(), join(entry.parentPath, entry.name)))
}

const files = [...filesUnder('app'), ...filesUnder('components'), ...filesUnder('lib')]
const named = (name: RegExp) => files.filter((file) => file.startsWith('app/') && name.test(file)).sort()
const isOfServerActions = (file: string) => /^\s*['"]use server['"]/m.test(readFileSync(file, 'utf8'))

const ids = { projectId: 'project-a', facadeId: 'facade-a', plantId: 'plant-a' }

let db: Db
beforeEach(() => {
  newBrowser()
  db = openTestDatabase()
  addStudios(db)
  vi.stubGlobal('tenthSummerDb', db)
  return () => vi.unstubAllGlobals()
})

async function enterAs(viewer: Viewer): Promise<void> {
  if (viewer === 'nobody') return
  const actor = actorNamed(viewer)
  browser.cookies.set(SESSION_COOKIE, await createSession(db, actor.personId, { studioId: actor.studioId, projectId: actor.kind === 'client' ? actor.projectId : null }))
}

function bodyOf({ body }: RouteEndpoint): unknown {
  if (body === 'sheet') return getSheet(contextOf(db, 'owner'), { facadeId: 'facade-a' }).sheet
  if (body === 'edits') return { base: 0, editor: 'test', edits: [put(1, placementAt('p1', 60))] }
  if (body === 'import') return { text: csvTemplate(), mode: 'good-rows' }
  if (body === 'preview') return { text: csvTemplate() }
  if (body === 'spot') return { x: 120, y: 40 }
  return {}
}

/** The file's handler asked as Next asks it: params from the folder names in brackets. */
async function ask(endpoint: RouteEndpoint, headers: Record<string, string> = {}): Promise<Response> {
  const address = new URL(endpoint.path(ids), 'http://127.0.0.1:3000')
  const names = endpoint.file.split('/').slice(1, -1).filter((part) => !part.startsWith('('))
  const parts = address.pathname.split('/').slice(1)
  const params = Object.fromEntries(names.flatMap((name, i) => (name.startsWith('[') ? [[name.slice(1, -1), parts[i]!]] : [])))
  const handlers = (await import(join(process.cwd(), endpoint.file))) as Record<string, (request: Request, args: { params: Promise<unknown> }) => Promise<Response>>
  const isReading = endpoint.method === 'GET'
  const request = new Request(address, {
    method: endpoint.method,
    headers: { host: address.host, ...(!isReading && { origin: address.origin, 'content-type': 'application/json' }), ...headers },
    ...(!isReading && { body: JSON.stringify(bodyOf(endpoint)) }),
  })
  return handlers[endpoint.method]!(request, { params: Promise.resolve(params) })
}

describe('the list of doors', () => {
  it('has every route handler, with every method it answers', () => {
    expect([...new Set(ROUTES.map(({ file }) => file))].sort()).toEqual(named(/\/route\.(tsx?|m?js)$/))
    for (const file of named(/\/route\.(tsx?|m?js)$/)) {
      const source = readFileSync(file, 'utf8')
      const answered = METHODS.filter((method) => new RegExp(`export (const|async function|function) ${method}\\b|export \\{[^}]*\\b${method}\\b`).test(source))
      expect([...new Set(ROUTES.filter((endpoint) => endpoint.file === file).map(({ method }) => method))].sort(), file).toEqual([...answered].sort())
    }
  })

  it('has every page', () => {
    expect(PAGES.map(({ file }) => file).sort()).toEqual(named(/(^|\/)page\.(tsx?|m?js)$/))
  })

  it('has every server action', () => {
    expect(ACTIONS.map(({ file }) => file).sort()).toEqual(files.filter(isOfServerActions).sort())
    for (const { file, actions } of ACTIONS) {
      const exported = [...readFileSync(file, 'utf8').matchAll(/export (?:async function|const) (\w+)/g)].map(([, name]) => name!)
      expect(Object.keys(actions).sort(), file).toEqual(exported.sort())
    }
  })
})

describe.each(ROUTES.map((endpoint) => [`${endpoint.method} ${endpoint.path(ids)}`, endpoint] as const))('%s', (_, endpoint) => {
  it.each(VIEWERS.map((viewer) => [viewer, endpoint.status[viewer]] as const))('asked by %s answers %i', async (viewer, expected) => {
    await enterAs(viewer)
    const response = await ask(endpoint)
    expect(response.status, await response.clone().text()).toBe(expected)
    if (expected >= 400) expect((await response.json()).error.message).toMatch(/\.$/)
  })

  it(`asked from a page of another site answers ${endpoint.crossSite}`, async () => {
    await enterAs('owner')
    const response = await ask(endpoint, { origin: 'https://elsewhere.example', 'sec-fetch-site': 'cross-site' })
    expect(response.status).toBe(endpoint.crossSite)
    // Whatever may be read this way, no other page is given the right to look at it.
    expect(response.headers.get('access-control-allow-origin')).toBeNull()
  })
})

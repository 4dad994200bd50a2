import { browser, newBrowser } from '../support/next-edge'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import {
  addFacadeAction, createClientLinkAction, createProjectAction, removeFacadeAction, renameFacadeAction, revokeClientLinkAction, saveProjectAction,
} from '@/app/(studio)/projects/actions'
import type { Db } from '@/db/open'
import { facades, projects } from '@/db/schema'
import { createSession, SESSION_COOKIE } from '@/lib/server/people/session'
import { getProject } from '@/lib/server/projects/get-project'
import { listClientLinks } from '@/lib/server/clients/list-client-links'
import { actorNamed, addStudios, contextOf } from '../support/actors'
import { openTestDatabase } from '../support/database'

vi.mock('next/cache', () => ({ revalidatePath: () => {} }))

let db: Db
beforeEach(() => {
  newBrowser()
  db = openTestDatabase()
  addStudios(db)
  vi.stubGlobal('tenthSummerDb', db)
  return () => vi.unstubAllGlobals()
})

async function enterAs(who: string): Promise<void> {
  const { personId, studioId } = actorNamed(who as 'designer')
  browser.cookies.set(SESSION_COOKIE, await createSession(db, personId, { studioId, projectId: null }))
}

const UNTRIED = { isSaved: false, error: null, fields: {}, typed: null }

function formOf(changes: Record<string, string | string[]> = {}): FormData {
  const fields = { name: 'Alder House', address: '', clientName: '', zone: '6b', moisture: 'medium', deer: 'none', walnut: 'none', notes: '', latitude: '', longitude: '', ...changes }
  const form = new FormData()
  for (const [name, value] of Object.entries(fields)) for (const one of [value].flat()) form.append(name, one)
  return form
}

const countProjects = () => db.select().from(projects).all().length
const projectA = () => getProject(contextOf(db, 'designer'), { projectId: 'project-a' })

describe('a new project', () => {
  it('is made and gone to', async () => {
    await enterAs('designer')
    await expect(createProjectAction(UNTRIED, formOf({ brief: ['birds', 'winter'], fireZone: 'on', latitude: '41.5', longitude: '-72.8' }))).rejects.toMatchObject({ digest: expect.stringContaining('/projects/') })
    const made = db.select().from(projects).all().find(({ name }) => name === 'Alder House')
    expect(made).toMatchObject({ zone: '6b', brief: ['birds', 'winter'], fireZone: true, latitude: 41.5, longitude: -72.8, stage: 'draft' })
  })

  it('with a bad field names it, keeps what was typed and makes nothing', async () => {
    await enterAs('designer')
    const before = countProjects()
    const state = await createProjectAction(UNTRIED, formOf({ zone: '14c', address: '9 Quarry Lane', latitude: 'north' }))
    expect(Object.keys(state.fields).sort()).toEqual(['latitude', 'zone'])
    expect(state.typed).toMatchObject({ address: '9 Quarry Lane', zone: '14c', latitude: 'north' })
    expect(countProjects()).toBe(before)
  })

  it('with a field nobody asked for is refused', async () => {
    await enterAs('designer')
    const before = countProjects()
    expect((await createProjectAction(UNTRIED, formOf({ stage: 'approved' }))).error).toBeTruthy()
    expect(countProjects()).toBe(before)
  })

  it('is not for estimators', async () => {
    await enterAs('estimator')
    expect((await createProjectAction(UNTRIED, formOf())).error).toBe('Your role does not allow this.')
  })
})

describe('the form of a project', () => {
  const save = (changes: Record<string, string>) => saveProjectAction('project-a', UNTRIED, formOf(changes))

  it('is saved over the version it was opened with', async () => {
    await enterAs('designer')
    const { version } = projectA()
    expect(await save({ name: 'Elm House', version: String(version) })).toMatchObject({ isSaved: true, error: null, fields: {}, typed: { name: 'Elm House' }, version: version + 1 })
    expect(projectA()).toMatchObject({ version: version + 1, input: { name: 'Elm House' } })
  })

  it.each(['', 'x', '99'])('opened with version %j is refused and changes nothing', async (version) => {
    await enterAs('designer')
    const before = projectA()
    const state = await save({ name: 'Elm House', version })
    expect(state).toMatchObject({ isSaved: false, error: expect.stringMatching(/meanwhile/), typed: { name: 'Elm House' } })
    expect(projectA().input).toEqual(before.input)
  })
})

describe('a facade', () => {
  const NEVER = { error: null, made: null }
  const small = (fields: Record<string, string>) => {
    const form = new FormData()
    for (const [name, value] of Object.entries(fields)) form.append(name, value)
    return form
  }
  const add = (fields: Record<string, string>, projectId = 'project-a') => addFacadeAction(projectId, NEVER, small(fields))
  const rename = (name: string) => renameFacadeAction('project-a', 'facade-a', NEVER, small({ name }))

  it('is added by name, width and gutter as they are written', async () => {
    await enterAs('designer')
    expect(await add({ name: 'South side', width: `33'-4"`, gutter: '10', $ACTION_KEY: 'k' })).toEqual(NEVER)
    expect(db.select().from(facades).all().find(({ name }) => name === 'South side')).toMatchObject({ gutter: 120, wall: [{ x: 0, y: 0 }, { x: 400, y: 0 }] })
  })

  const good = { name: 'S', width: '33 ft', gutter: '9 ft' }
  it.each([[{ name: ' ' }, 'name'], [{ width: '90000 ft' }, 'width'], [{ width: 'wide' }, 'width'], [{ width: '0' }, 'width'], [{ gutter: '-1' }, 'gutter'], [{ gutter: '' }, 'gutter']])('with %j names %s and keeps what was typed', async (change, field) => {
    await enterAs('designer')
    const before = db.select().from(facades).all().length
    const state = await add({ ...good, ...change })
    expect(Object.keys(state.fields!)).toEqual([field])
    expect(state.typed).toEqual({ ...good, ...change })
    expect(db.select().from(facades).all()).toHaveLength(before)
  })

  it('takes no other project and no other fact than asked for', async () => {
    await enterAs('designer')
    const before = db.select().from(facades).all().length
    expect((await add({ ...good, overhang: '3' })).error).toBeTruthy()
    expect((await add(good, 'project-b')).error).toMatch(/nothing here/)
    expect(db.select().from(facades).all()).toHaveLength(before)
  })

  it('is added, renamed and removed by editors only', async () => {
    await enterAs('reviewer')
    expect((await add(good)).error).toBe('Your role does not allow this.')
    expect((await rename('Front')).error).toBe('Your role does not allow this.')
    expect((await removeFacadeAction('project-a', 'facade-a')).error).toBe('Your role does not allow this.')
    await enterAs('designer')
    expect((await rename('  ')).fields).toEqual({ name: 'Give the facade a name.' })
    expect((await rename(' Street front ')).error).toBeNull()
    expect(projectA().facades.map(({ name }) => name)).toContain('Street front')
    expect((await removeFacadeAction('project-a', 'facade-a')).error).toBeNull()
    expect(projectA().facades.map(({ id }) => id)).not.toContain('facade-a')
  })
})

describe("a client's link", () => {
  it('is told once, listed while it lives, and gone when revoked', async () => {
    await enterAs('designer')
    const before = listClientLinks(contextOf(db, 'designer'), { projectId: 'project-a' }).map(({ id }) => id)
    expect((await createClientLinkAction('project-a')).made).toMatch(/^\/c\/[\w-]{40,}$/)
    const made = listClientLinks(contextOf(db, 'designer'), { projectId: 'project-a' }).find(({ id }) => !before.includes(id))!
    expect((await revokeClientLinkAction('project-a', made.id)).error).toBeNull()
    expect((await revokeClientLinkAction('project-a', made.id)).error).toMatch(/nothing here/)
  })
})

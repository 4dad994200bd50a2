import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Db } from '@/db/open'
import { activity, facades, projects, sessions, signInLinks } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { ENGINE_VERSION } from '@/lib/spacing'
import { createClientLink, LINK_DAYS } from '@/lib/server/clients/create-client-link'
import { exchangeClientLink } from '@/lib/server/clients/exchange-client-link'
import { findClientLink } from '@/lib/server/clients/find-client-link'
import { getClientView } from '@/lib/server/clients/get-client-view'
import { listClientLinks } from '@/lib/server/clients/list-client-links'
import { revokeClientLink } from '@/lib/server/clients/revoke-client-link'
import type { Context } from '@/lib/server/context'
import { createFacade } from '@/lib/server/facades/create-facade'
import { removeFacade } from '@/lib/server/facades/remove-facade'
import { renameFacade } from '@/lib/server/facades/rename-facade'
import { actorOf } from '@/lib/server/people/session'
import { createProject } from '@/lib/server/projects/create-project'
import { getProject } from '@/lib/server/projects/get-project'
import { listProjects } from '@/lib/server/projects/list-projects'
import { saveProject } from '@/lib/server/projects/save-project'
import { listQueue } from '@/lib/server/reviews/list-queue'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { addStudios, contextOf, editId, NOW, placementAt, put, type Who } from '../support/actors'
import { openTestDatabase } from '../support/database'

let db: Db
beforeEach(() => {
  db = openTestDatabase()
  addStudios(db)
})
const as = (who: Who, now = NOW): Context => contextOf(db, who, now)

function codeOf(work: () => unknown): string {
  try {
    work()
  } catch (error) {
    expect(error).toBeInstanceOf(AppError)
    return (error as AppError).code
  }
  return 'fine'
}

const FORM = { name: 'Gable End', address: '4 Gable End', clientName: 'M. Orr', zone: '5a', moisture: 'dry', deer: 'high', walnut: 'present', fireZone: true, brief: ['birds'], notes: 'gate code 1234', latitude: 41.5 }

describe('projects', () => {
  it('are made in draft and read back as they were entered', () => {
    const { id } = createProject(as('designer'), { input: FORM })
    const page = getProject(as('reviewer'), { projectId: id })
    expect(page).toMatchObject({ id, stage: 'draft', input: FORM, version: 0, facades: [] })
    expect(db.select().from(activity).all()).toMatchObject([{ deed: 'project:create', personId: 'designer', projectId: id }])
  })

  it('refuse what does not fit, field by field, and unknown fields', () => {
    const make = (change: object) => () => createProject(as('designer'), { input: { ...FORM, ...change } })
    for (const change of [{ name: ' ' }, { zone: '14a' }, { latitude: 91 }, { deer: 'many' }, { studioId: 'studio-b' }, { stage: 'accepted' }]) expect(codeOf(make(change))).toBe('invalid')
  })

  it('are told apart by studio: the other one sees none of them', () => {
    expect(listProjects(as('designer')).map(({ id }) => id).sort()).toEqual(['project-a', 'project-a2'])
    expect(listProjects(as('stranger')).map(({ id }) => id)).toEqual(['project-b'])
    for (const work of [
      () => getProject(as('stranger'), { projectId: 'project-a' }),
      () => saveProject(as('stranger'), { projectId: 'project-a', input: FORM, version: 0 }),
      () => createFacade(as('stranger'), { projectId: 'project-a', name: 'Side' }),
      () => renameFacade(as('stranger'), { facadeId: 'facade-a', name: 'Mine' }),
      () => removeFacade(as('stranger'), { facadeId: 'facade-a' }),
      () => createClientLink(as('stranger'), { projectId: 'project-a' }),
      () => listClientLinks(as('stranger'), { projectId: 'project-a' }),
      () => revokeClientLink(as('stranger'), { linkId: 'l-client' }),
    ]) expect(codeOf(work)).toBe('not-found')
  })

  it('say who saved in between, and keep what they saved', () => {
    expect(saveProject(as('designer'), { projectId: 'project-a', input: FORM, version: 0 })).toEqual({ version: 1 })
    expect(codeOf(() => saveProject(as('owner'), { projectId: 'project-a', input: { ...FORM, name: 'Other' }, version: 0 }))).toBe('conflict')
    expect(getProject(as('owner'), { projectId: 'project-a' }).input.name).toBe('Gable End')
    // Drawing does not count as saving the form.
    saveEdits(as('designer'), { facadeId: 'facade-a', base: 0, editor: 'e', edits: [put(1, placementAt('p1', 60))] })
    expect(saveProject(as('owner'), { projectId: 'project-a', input: FORM, version: 1 })).toEqual({ version: 2 })
  })

  it('check their facades again when the zone changes', () => {
    saveEdits(as('designer'), { facadeId: 'facade-a', base: 0, editor: 'e', edits: [put(1, placementAt('p1', 60))] })
    const rules = () => getSheet(as('designer'), { facadeId: 'facade-a' }).report.findings.map(({ rule }) => rule)
    expect(rules()).not.toContain('hardiness')
    saveProject(as('designer'), { projectId: 'project-a', input: { ...FORM, zone: '2a' }, version: 0 })
    expect(rules()).toContain('hardiness')
    expect(getSheet(as('designer'), { facadeId: 'facade-a' }).seq).toBe(1)
  })
})

describe('facades', () => {
  it('start as a plain wall that the check accepts, and are renamed and removed', () => {
    const { id } = createFacade(as('designer'), { projectId: 'project-a', name: ' Garden side ', width: 480 })
    const { sheet, facade, report } = getSheet(as('designer'), { facadeId: id })
    expect(facade.name).toBe('Garden side')
    expect(sheet.facade.wall).toEqual([{ x: 0, y: 0 }, { x: 480, y: 0 }])
    expect(report).toEqual({ engine: ENGINE_VERSION, findings: [] })
    renameFacade(as('owner'), { facadeId: id, name: 'Garden' })
    expect(getProject(as('owner'), { projectId: 'project-a' }).facades.map(({ name }) => name)).toContain('Garden')
    saveEdits(as('designer'), { facadeId: id, base: 0, editor: 'e', edits: [put(1, placementAt('p1', 60))] })
    removeFacade(as('designer'), { facadeId: id })
    expect(codeOf(() => getSheet(as('designer'), { facadeId: id }))).toBe('not-found')
  })

  it('refuse an empty name and a wall without width', () => {
    expect(codeOf(() => createFacade(as('designer'), { projectId: 'project-a', name: ' ' }))).toBe('invalid')
    expect(codeOf(() => createFacade(as('designer'), { projectId: 'project-a', name: 'Side', width: 0 }))).toBe('invalid')
    expect(codeOf(() => createFacade(as('designer'), { projectId: 'project-a', name: 'Side', width: 1e6 }))).toBe('invalid')
  })
})

describe('the review queue', () => {
  it('has the facades with most conflicts first and counts what the check found', () => {
    const tall = (n: number, id: string, x: number) => put(n, placementAt(id, x, { plant: 'plant-tall', y: 6 }))
    saveEdits(as('designer'), { facadeId: 'facade-a2', base: 0, editor: 'e', edits: [tall(1, 'p1', 100), tall(2, 'p2', 250)] })
    saveEdits(as('designer', NOW + 9), { facadeId: 'facade-a', base: 0, editor: 'e', edits: [{ id: editId(1), op: 'put', kind: 'aspect', value: { light: 'full-sun' } }] })
    const queue = listQueue(as('reviewer'))
    expect(queue.map(({ facadeId }) => facadeId)).toEqual(['facade-a2', 'facade-a'])
    expect(queue[0]).toMatchObject({ facadeName: 'Front of project-a2', projectName: 'House of project-a2', stage: 'draft', placements: 2, updatedBy: 'designer' })
    expect(queue[0]!.counts.conflict).toBeGreaterThan(0)
    expect(queue[1]).toMatchObject({ counts: { conflict: 0, risk: 0, held: 0, note: 0 }, placements: 0, updatedAt: NOW + 9 })
    expect(listProjects(as('reviewer')).find(({ id }) => id === 'project-a2')!.placements).toBe(2)
    expect(listProjects(as('reviewer')).find(({ id }) => id === 'project-a2')!.counts).toEqual(queue[0]!.counts)
  })

  it('checks what another engine version judged before it counts', () => {
    expect(db.select().from(facades).all().every(({ engine }) => engine === '')).toBe(true)
    listQueue(as('reviewer'))
    expect(db.select().from(facades).where(eq(facades.studioId, 'studio-a')).all().every(({ engine }) => engine === ENGINE_VERSION)).toBe(true)
    // The other studio's are left alone.
    expect(db.select().from(facades).where(eq(facades.id, 'facade-b')).get()!.engine).toBe('')
  })

  it('is not for estimators', () => {
    expect(codeOf(() => listQueue(as('estimator')))).toBe('forbidden')
  })
})

describe('a client link', () => {
  const tokenOf = ({ path }: { path: string }) => path.slice('/c/'.length)
  const enter = (token: string, now = NOW) => exchangeClientLink({ db, now }, { token })

  it('signs the client in to their one project, again and again, and is stored as a hash', async () => {
    const link = createClientLink(as('designer'), { projectId: 'project-a' })
    const token = tokenOf(link)
    expect(Buffer.from(token, 'base64url')).toHaveLength(32)
    expect(JSON.stringify(db.select().from(signInLinks).all())).not.toContain(token)
    expect(findClientLink({ db, now: NOW }, { token })).toMatchObject({ projectName: 'House of project-a', studioName: 'The studio-a' })
    for (let times = 0; times < 2; times++) {
      expect(await actorOf(db, await enter(token), NOW)).toEqual({ kind: 'client', personId: 'client', studioId: 'studio-a', projectId: 'project-a', role: 'client', name: 'client' })
    }
  })

  it('makes the client of a project that has none, by the name on its form', async () => {
    const { id } = createProject(as('designer'), { input: FORM })
    const secret = await enter(tokenOf(createClientLink(as('designer'), { projectId: id })))
    expect(await actorOf(db, secret, NOW)).toMatchObject({ kind: 'client', projectId: id, name: 'M. Orr' })
  })

  it('ends with its time, for sessions begun by it too', async () => {
    const { id } = createProject(as('designer'), { input: FORM })
    const link = createClientLink(as('designer'), { projectId: id })
    const secret = await enter(tokenOf(link))
    expect(link.expiresAt).toBe(NOW + LINK_DAYS * 86_400_000)
    expect(await actorOf(db, secret, link.expiresAt - 1)).not.toBeNull()
    expect(await actorOf(db, secret, link.expiresAt)).toBeNull()
    await expect(enter(tokenOf(link), link.expiresAt)).rejects.toThrow('no longer good')
  })

  it('is revoked with the sessions it began; a link that was never made gets the same answer', async () => {
    const link = createClientLink(as('designer'), { projectId: 'project-a' })
    const secret = await enter(tokenOf(link))
    revokeClientLink(as('owner'), { linkId: link.id })
    expect(await actorOf(db, secret, NOW)).toBeNull()
    expect(db.select().from(sessions).all()).toEqual([])
    await expect(enter(tokenOf(link))).rejects.toThrow('no longer good')
    await expect(enter('never-made')).rejects.toThrow('no longer good')
    expect(codeOf(() => revokeClientLink(as('owner'), { linkId: link.id }))).toBe('not-found')
    expect(listClientLinks(as('owner'), { projectId: 'project-a' }).map(({ id }) => id)).toEqual(['l-client'])
  })

  it('is made by owners and designers alone', () => {
    for (const who of ['reviewer', 'estimator', 'client'] as const) expect(codeOf(() => createClientLink(as(who), { projectId: 'project-a' }))).toBe('forbidden')
  })
})

describe('the client\'s view', () => {
  it('shows the fronts of their project as saved, and nothing internal or of anyone else', () => {
    const drift = { drift: 'SECRET cheap fillers', kept: { height: 20 } }
    saveEdits(as('designer'), { facadeId: 'facade-a', base: 0, editor: 'SECRET editor', edits: [put(1, placementAt('p1', 60, { plant: 'plant-tall', y: 6 })), put(2, placementAt('p2', 90, drift)), put(3, placementAt('p3', 110, drift))] })
    saveEdits(as('stranger'), { facadeId: 'facade-b', base: 0, editor: 'e', edits: [put(1, placementAt('SECRET-b', 60))] })
    saveEdits(as('designer'), { facadeId: 'facade-a2', base: 0, editor: 'e', edits: [put(1, placementAt('SECRET-a2', 60))] })
    db.update(projects).set({ latitude: 41.123456 }).run()
    const view = getClientView(as('client'))
    expect(view).toMatchObject({ studio: { name: 'The studio-a' }, project: { name: 'House of project-a' }, facades: [{ id: 'facade-a', name: 'Front of project-a' }] })
    expect(view.facades).toHaveLength(1)
    const { sheet } = view.facades[0]!
    expect(sheet.placements.map(({ id }) => id)).toEqual(['p1', 'p2', 'p3'])
    expect(sheet.placements[1]!.drift).toBe(sheet.placements[2]!.drift)
    const sent = JSON.stringify(view)
    for (const canary of ['SECRET', 'address', 'notes', '41.123456', 'Client of', 'project-a2', 'project-b', 'findings', 'standards', 'brief', 'designer']) expect(sent).not.toContain(canary)
  })

  it('is not for members', () => {
    for (const who of ['owner', 'designer', 'reviewer', 'estimator'] as const) expect(codeOf(() => getClientView(as(who)))).toBe('forbidden')
  })
})

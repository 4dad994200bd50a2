/** Two studios, everyone who may ask, and a project each with a house front: what most server tests start from. */
import type { Db } from '@/db/open'
import { clients, facades, members, people, plants, projects, signInLinks, studios } from '@/db/schema'
import type { MemberRole } from '@/lib/access'
import type { Edit } from '@/lib/sheet'
import type { Placement } from '@/lib/spacing'
import type { Actor, Context } from '@/lib/server/context'

export const NOW = Date.UTC(2026, 11, 1, 9)
export const LATER = NOW + 365 * 24 * 60 * 60 * 1000

const MEMBER_ROLES: Record<string, { studioId: string; role: MemberRole }> = {
  owner: { studioId: 'studio-a', role: 'owner' },
  designer: { studioId: 'studio-a', role: 'designer' },
  reviewer: { studioId: 'studio-a', role: 'reviewer' },
  estimator: { studioId: 'studio-a', role: 'estimator' },
  stranger: { studioId: 'studio-b', role: 'designer' },
}

export const MEMBERS = ['owner', 'designer', 'reviewer', 'estimator', 'stranger'] as const
export const CLIENTS = { client: 'project-a', otherClient: 'project-a2' } as const
/** Everyone a test can be: `stranger` designs for the other studio, `otherClient` reads another project of the first. */
export type Who = (typeof MEMBERS)[number] | keyof typeof CLIENTS

export const emailOf = (who: Who) => `${who}@example.test`

export function actorNamed(who: Who): Actor {
  if (who === 'client' || who === 'otherClient') {
    return { kind: 'client', personId: who, studioId: 'studio-a', projectId: CLIENTS[who], role: 'client', name: who }
  }
  return { kind: 'member', personId: who, ...MEMBER_ROLES[who]!, name: who, email: emailOf(who) }
}

export const contextOf = (db: Db, who: Who, now = NOW): Context => ({ db, actor: actorNamed(who), now })

const PLANT = {
  category: 'shrub', leaf: 'broadleaf-evergreen', habit: 'rounded', growth: 'slow', zoneMin: 4, zoneMax: 9,
  light: ['full-sun', 'part-shade'], water: ['medium', 'wet'], foliageColor: 'dark-green', texture: 'fine', bloomMonths: [5, 6],
  bloomColor: 'white', fallColor: 'none', fruitColor: '', fruitMonths: [], deer: 'seldom', birds: ['fruit'], native: ['northeast'],
  thorns: false, toxicity: 'toxic', juglone: 'unknown', invasive: false, prune: 'late-winter', createdAt: NOW,
} as const satisfies Partial<typeof plants.$inferInsert>

function addPlants(db: Db) {
  const small = { heightMin: 24, heightMax: 30, spreadMin: 24, spreadMax: 30 }
  const tall = { heightMin: 96, heightMax: 120, spreadMin: 72, spreadMax: 96 }
  const rows = [
    { id: 'plant-small', studioId: null, botanical: 'Ilex exempla', common: 'low holly', ...small },
    { id: 'plant-tall', studioId: null, botanical: 'Ilex altissima', common: 'tall holly', ...tall },
    { id: 'plant-a', studioId: 'studio-a', botanical: 'Ilex domestica', common: 'our holly', ...small },
    { id: 'plant-b', studioId: 'studio-b', botanical: 'Ilex aliena', common: 'their holly', ...small },
  ]
  for (const row of rows) db.insert(plants).values({ ...PLANT, ...row, light: [...PLANT.light], water: [...PLANT.water], native: [...PLANT.native], birds: [...PLANT.birds], bloomMonths: [...PLANT.bloomMonths], fruitMonths: [] }).run()
}

function addProject(db: Db, id: string, studioId: string) {
  const site = { zone: '6b', moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false, brief: [] } as const
  db.insert(projects).values({
    id, studioId, name: `House of ${id}`, address: `SECRET address of ${id}`, clientName: `Client of ${id}`, notes: `SECRET notes of ${id}`,
    ...site, brief: [], createdAt: NOW, updatedAt: NOW,
  }).run()
  const facade = {
    wall: [{ x: 0, y: 0 }, { x: 360, y: 0 }], grade: [{ x: 0, z: 0 }], fall: 0.05, gutter: 108, overhang: 16,
    siding: 'lap', exposed: 8, mulch: 2, light: 'full-sun',
  } as const
  db.insert(facades).values({ ...facade, wall: [...facade.wall], grade: [...facade.grade], id: id.replace('project', 'facade'), studioId, projectId: id, name: `Front of ${id}`, createdAt: NOW, updatedAt: NOW }).run()
}

/** Puts both studios in. @param passwordHash given to every member. */
export function addStudios(db: Db, passwordHash: string | null = null): void {
  for (const id of ['studio-a', 'studio-b']) db.insert(studios).values({ id, name: `The ${id}`, createdAt: NOW }).run()
  for (const who of MEMBERS) {
    db.insert(people).values({ id: who, name: who, email: emailOf(who), passwordHash, createdAt: NOW }).run()
    db.insert(members).values({ personId: who, ...MEMBER_ROLES[who]!, createdAt: NOW }).run()
  }
  addPlants(db)
  addProject(db, 'project-a', 'studio-a')
  addProject(db, 'project-a2', 'studio-a')
  addProject(db, 'project-b', 'studio-b')
  for (const [who, projectId] of Object.entries(CLIENTS)) {
    db.insert(people).values({ id: who, name: who, createdAt: NOW }).run()
    db.insert(clients).values({ id: `c-${who}`, personId: who, studioId: 'studio-a', projectId, createdAt: NOW }).run()
    db.insert(signInLinks).values({ id: `l-${who}`, tokenHash: `hash of ${who}`, studioId: 'studio-a', projectId, clientId: `c-${who}`, expiresAt: Date.now() + 1e10, createdBy: 'owner', createdAt: NOW }).run()
  }
}

/** A made-up edit id, the same for the same number. */
export const editId = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`

export const placementAt = (id: string, x: number, rest: Partial<Placement> = {}): Placement => ({
  id, plant: 'plant-small', x, y: 40, planted: { height: 12, spread: 12 }, ...rest,
})

export const put = (n: number, value: Placement): Edit => ({ id: editId(n), op: 'put', kind: 'placement', value })

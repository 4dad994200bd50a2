/** Puts the demonstration in through the product's own operations, so that it is judged like anybody's work. */
import { eq } from 'drizzle-orm'
import { v7 } from 'uuid'
import type { Db } from '@/db/open'
import { members, people, plants, projects, studios } from '@/db/schema'
import type { Stage } from '@/lib/project'
import { createFacade } from '@/lib/server/facades/create-facade'
import type { Context, Member } from '@/lib/server/context'
import { hashPassword } from '@/lib/server/people/hash-password'
import { createProject } from '@/lib/server/projects/create-project'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import type { Edit } from '@/lib/sheet'
import { FEN_FRONT, KILN_FRONT, PERRY_FRONT, QUARRY_FRONT, type House } from './houses'
import { DEMO_PASSWORD, OTHER_STUDIO, STUDIO, type DemoPerson } from './people'
import { FEN_PLANTING, KILN_PLANTING, QUARRY_PLANTING, type Planting } from './plantings'

/** A studio with its people; answers the first designer, in whose name the rest is drawn. */
function makeStudio(db: Db, studio: { name: string; people: DemoPerson[] }, passwordHash: string, now: number): Member {
  const studioId = v7()
  db.insert(studios).values({ id: studioId, name: studio.name, createdAt: now }).run()
  const made = studio.people.map(({ name, email, role }): Member => {
    const personId = v7()
    db.insert(people).values({ id: personId, name, email, passwordHash, createdAt: now }).run()
    db.insert(members).values({ studioId, personId, role, createdAt: now }).run()
    return { kind: 'member', personId, studioId, role, name, email }
  })
  return made.find(({ role }) => role === 'designer')!
}

function plantIds(db: Db): Map<string, string> {
  return new Map(db.select({ id: plants.id, botanical: plants.botanical }).from(plants).all().map(({ id, botanical }) => [botanical, id]))
}

function placementEdits(db: Db, planting: Planting[]): Edit[] {
  const ids = plantIds(db)
  return planting.map(({ botanical, ...placement }): Edit => {
    const plant = ids.get(botanical)
    if (!plant) throw new Error(`The library has no ${botanical}`)
    return { id: v7(), op: 'put', kind: 'placement', value: { id: v7(), plant, ...placement } }
  })
}

function houseEdits({ facade, aspect, openings, fixtures, walks, beds }: House): Edit[] {
  const put = (parts: object) => ({ id: v7(), op: 'put', ...parts }) as Edit
  return [
    put({ kind: 'facade', value: facade }),
    put({ kind: 'aspect', value: aspect }),
    ...openings.map((value) => put({ kind: 'opening', value })),
    ...fixtures.map((value) => put({ kind: 'fixture', value })),
    ...walks.map((value) => put({ kind: 'walk', value })),
    ...beds.map((value) => put({ kind: 'bed', value })),
  ]
}

interface Commission {
  input: object
  stage: Stage
  house: House
  planting: Planting[]
}

function makeProject(context: Context, { input, stage, house, planting }: Commission) {
  const { id } = createProject(context, { input })
  const { id: facadeId } = createFacade(context, { projectId: id, name: house.name })
  const edits = [...houseEdits(house), ...placementEdits(context.db, planting)]
  saveEdits(context, { facadeId, base: 0, editor: 'demonstration', edits })
  // Stages have no operation yet: reviews and proposals will move them.
  context.db.update(projects).set({ stage }).where(eq(projects.id, id)).run()
}

const SITE = { latitude: 41.6, longitude: -73.9, moisture: 'medium', deer: 'some', walnut: 'none', fireZone: false }

const COMMISSIONS: Commission[] = [
  {
    input: {
      ...SITE, name: 'Quarry Cottage', address: '9 Quarry Lane, Aldermere', clientName: 'The Oduya household', zone: '6b',
      brief: ['pollinators', 'low-upkeep'], notes: 'Wants no clipping at all. Likes blue and white.',
    },
    stage: 'approved', house: QUARRY_FRONT, planting: QUARRY_PLANTING,
  },
  {
    input: {
      ...SITE, name: 'Kiln Lane', address: '31 Kiln Lane, Aldermere', clientName: 'Mr and Mrs Tarrant', zone: '5b', deer: 'high',
      brief: ['birds', 'winter', 'children'], notes: 'Drawn from the old planting; check everything before showing it.',
    },
    stage: 'draft', house: KILN_FRONT, planting: KILN_PLANTING,
  },
  {
    input: {
      ...SITE, name: 'Perry Road', address: '112 Perry Road, Holmstead', clientName: 'Dr Sunniva Rask', zone: '7a', moisture: 'dry', walnut: 'removed',
      brief: ['deer', 'pets'], notes: 'Measured on Tuesday; the condenser may move.',
    },
    stage: 'draft', house: PERRY_FRONT, planting: [],
  },
]

const FEN: Commission = {
  input: {
    ...SITE, name: 'Osier Row', address: '4 Osier Row, Fenwick Marsh', clientName: 'Anselm Pryce', zone: '7b', moisture: 'wet', deer: 'none',
    brief: [], notes: 'Small front, one afternoon.',
  },
  stage: 'draft', house: FEN_FRONT, planting: FEN_PLANTING,
}

/** Makes both studios with their people and projects. The database must hold the plants and no studio. */
export async function makeDemo(db: Db, now: number): Promise<void> {
  const passwordHash = await hashPassword(DEMO_PASSWORD)
  const designer = makeStudio(db, STUDIO, passwordHash, now)
  for (const commission of COMMISSIONS) makeProject({ db, actor: designer, now }, commission)
  makeProject({ db, actor: makeStudio(db, OTHER_STUDIO, passwordHash, now), now }, FEN)
}

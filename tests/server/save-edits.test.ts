import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Db } from '@/db/open'
import { edits as editLog, facades, findings, placements, projects, standards } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { applyEdits, parseSheet, type Edit } from '@/lib/sheet'
import { check, ENGINE_VERSION } from '@/lib/spacing'
import { batchSchema, MAX_EDITS, saveEdits } from '@/lib/server/sheets/save-edits'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { addStudios, contextOf, editId, NOW, placementAt, put, type Who } from '../support/actors'
import { openTestDatabase } from '../support/database'

let db: Db
beforeEach(() => {
  db = openTestDatabase()
  addStudios(db)
})

interface Sent {
  base?: number
  editor?: string
  who?: Who
  facadeId?: string
  now?: number
}

function send(edits: Edit[], { base = 0, editor = 'laptop', who = 'designer', facadeId = 'facade-a', now = NOW + 5 }: Sent = {}) {
  return saveEdits(contextOf(db, who, now), { facadeId, base, editor, edits })
}

function refusalOf(work: () => unknown): AppError {
  try {
    work()
  } catch (error) {
    expect(error).toBeInstanceOf(AppError)
    return error as AppError
  }
  throw new Error('nothing was refused')
}

const open = (facadeId = 'facade-a') => getSheet(contextOf(db, 'designer'), { facadeId })
/** Every row of the database that saving may touch, as text. */
const everything = () => JSON.stringify([facades, placements, editLog, findings, projects].map((table) => db.select().from(table).all()))

const WINDOW = { id: 'w1', kind: 'window', name: 'Kitchen', x: 60, width: 72, sill: 38, head: 92 } as const
const BED = { id: 'b1', name: 'Front bed', outline: [{ x: 0, y: 0 }, { x: 360, y: 0 }, { x: 360, y: 96 }, { x: 0, y: 96 }] }

const ONE_OF_EACH: Edit[] = [
  { id: editId(1), op: 'put', kind: 'facade', value: { wall: [{ x: 0, y: 0 }, { x: 400, y: 0 }], grade: [{ x: 0, z: -1.5 }], fall: -0.02, gutter: 100, overhang: 0, siding: 'masonry', exposed: 6.25, mulch: 0 } },
  { id: editId(2), op: 'put', kind: 'aspect', value: { light: 'part-shade', facing: 181.5 } },
  { id: editId(3), op: 'put', kind: 'opening', value: WINDOW },
  { id: editId(4), op: 'put', kind: 'fixture', value: { id: 'f1', kind: 'downspout', x: 390, y: 0, width: 4, depth: 3, z: 0, height: 96, outlet: 72 } },
  { id: editId(5), op: 'put', kind: 'fixture', value: { id: 'f2', kind: 'hose-bib', x: 300, y: 0, width: 4, depth: 4, z: 20, height: 6 } },
  { id: editId(6), op: 'put', kind: 'walk', value: { ...BED, id: 'k1', name: 'Walk', outline: BED.outline.map(({ x, y }) => ({ x, y: y + 100 })) } },
  { id: editId(7), op: 'put', kind: 'bed', value: BED },
  put(8, placementAt('p1', 90)),
  put(9, placementAt('p2', 200, { plant: 'plant-a', role: 'hedge', drift: 'd1', kept: { height: 30 }, clearStem: 0, status: 'stays' })),
]

describe('saving edits', () => {
  it('writes each kind of thing so that it reads back as it was sent', () => {
    const before = open().sheet
    const { seq, report } = send(ONE_OF_EACH)
    const after = open()
    const expected = applyEdits(before, ONE_OF_EACH)
    expect(after.sheet).toEqual({ ...expected, plants: after.sheet.plants })
    expect(after.sheet.plants.map(({ id }) => id)).toEqual(['plant-small', 'plant-a'])
    expect(parseSheet(JSON.parse(JSON.stringify(after.sheet)))).toMatchObject({ ok: true })
    expect([seq, after.seq]).toEqual([1, 1])
    expect(report.engine).toBe(ENGINE_VERSION)
    expect(after.report).toEqual({ engine: ENGINE_VERSION, findings: report.findings })
  })

  it('answers the report a browser makes of the same sheet, and keeps its findings in order', () => {
    send(ONE_OF_EACH)
    const { report } = send([put(20, placementAt('p3', 96, { plant: 'plant-tall' })), put(21, placementAt('p4', 355, { plant: 'plant-tall' }))], { base: 1 })
    const { sheet } = open()
    expect(report.findings.length).toBeGreaterThan(0)
    expect(report).toEqual(check(sheet))
    const kept = db.select().from(findings).where(eq(findings.facadeId, 'facade-a')).orderBy(findings.position).all()
    expect(kept.map(({ key }) => key)).toEqual(report.findings.map(({ key }) => key))
  })

  it('checks by the studio\'s own standards', () => {
    db.insert(standards).values({ studioId: 'studio-a', name: 'wall-gap.gap', number: 20, updatedAt: NOW }).run()
    expect(open().sheet.standards).toEqual({ 'wall-gap.gap': 20 })
    expect(open('facade-a2').sheet.standards).toEqual({ 'wall-gap.gap': 20 })
    expect(getSheet(contextOf(db, 'stranger'), { facadeId: 'facade-b' }).sheet.standards).toBeUndefined()
  })

  it('raises seq once for a batch, and marks facade and project as changed', () => {
    expect(send([put(1, placementAt('p1', 60)), put(2, placementAt('p2', 120))]).seq).toBe(1)
    expect(send([put(3, placementAt('p3', 180))], { base: 1, now: NOW + 9 }).seq).toBe(2)
    expect(db.select().from(facades).where(eq(facades.id, 'facade-a')).get()).toMatchObject({ seq: 2, updatedAt: NOW + 9 })
    expect(db.select().from(projects).where(eq(projects.id, 'project-a')).get()).toMatchObject({ updatedAt: NOW + 9 })
    expect(db.select().from(projects).where(eq(projects.id, 'project-a2')).get()).toMatchObject({ updatedAt: NOW })
  })

  it('skips edits it knows: a batch sent again changes nothing and answers the same', () => {
    const batch = [put(1, placementAt('p1', 60)), put(2, placementAt('p1', 66))]
    const first = send(batch)
    const before = everything()
    expect(send(batch)).toEqual(first)
    expect(everything()).toBe(before)
    expect(send([...batch, put(3, placementAt('p2', 120))]).seq).toBe(2)
    expect(open().sheet.placements.map(({ id, x }) => [id, x])).toEqual([['p1', 66], ['p2', 120]])
  })

  it('does not bring back by an old edit sent again what a later one changed', () => {
    send([put(1, placementAt('p1', 60))])
    send([put(2, placementAt('p1', 99))], { base: 1 })
    send([put(1, placementAt('p1', 60))])
    expect(open().sheet.placements[0]!.x).toBe(99)
  })

  it('keeps the order of things: a put replaces in place, a thing removed and put again goes last', () => {
    send([put(1, placementAt('a', 40)), put(2, placementAt('b', 80)), put(3, placementAt('c', 120))])
    send([put(4, placementAt('a', 44)), { id: editId(5), op: 'remove', kind: 'placement', target: 'b' }, put(6, placementAt('b', 88)), put(7, placementAt('d', 160))], { base: 1 })
    expect(open().sheet.placements.map(({ id }) => id)).toEqual(['a', 'c', 'b', 'd'])
    expect(send([{ id: editId(8), op: 'remove', kind: 'placement', target: 'never-there' }], { base: 2 }).seq).toBe(3)
  })

  it('writes down who changed what', () => {
    send([put(1, placementAt('p1', 60)), { id: editId(2), op: 'remove', kind: 'placement', target: 'p1' }])
    expect(db.select().from(editLog).orderBy(editLog.id).all()).toMatchObject([
      { personId: 'designer', editor: 'laptop', seq: 1, kind: 'placement', target: 'p1', body: { op: 'put', value: { x: 60 } }, at: NOW + 5 },
      { kind: 'placement', target: 'p1', body: { op: 'remove' } },
    ])
  })
})

describe('two editors at one sheet', () => {
  beforeEach(() => {
    send([put(1, placementAt('p1', 60)), put(2, placementAt('p2', 120))])
  })

  it('may change different things apart: both stay', () => {
    send([put(3, placementAt('p1', 70))], { base: 1, editor: 'tablet' })
    expect(send([put(4, placementAt('p2', 130))], { base: 1 }).seq).toBe(3)
    expect(open().sheet.placements.map(({ x }) => x)).toEqual([70, 130])
  })

  it('are told when they changed the same thing, with both versions, and nothing is written', () => {
    send([put(3, placementAt('p1', 70))], { base: 1, editor: 'tablet' })
    const before = everything()
    const refused = refusalOf(() => send([put(4, placementAt('p2', 130)), put(5, placementAt('p1', 50))], { base: 1 }))
    expect(refused.code).toBe('conflict')
    expect(refused.detail).toEqual({ seq: 2, conflicts: [{ kind: 'placement', target: 'p1', theirs: placementAt('p1', 70), yours: placementAt('p1', 50) }] })
    expect(everything()).toBe(before)
  })

  it('are told what was removed under them, and of what they would remove', () => {
    send([{ id: editId(3), op: 'remove', kind: 'placement', target: 'p1' }, put(4, placementAt('p2', 121))], { base: 1, editor: 'tablet' })
    const refused = refusalOf(() => send([put(5, placementAt('p1', 50)), { id: editId(6), op: 'remove', kind: 'placement', target: 'p2' }], { base: 1 }))
    expect(refused.detail!.conflicts).toEqual([
      { kind: 'placement', target: 'p1', theirs: null, yours: placementAt('p1', 50) },
      { kind: 'placement', target: 'p2', theirs: placementAt('p2', 121), yours: null },
    ])
  })

  it('share one facade and one aspect', () => {
    const aspect = (n: number, facing: number): Edit => ({ id: editId(n), op: 'put', kind: 'aspect', value: { light: 'full-sun', facing } })
    send([aspect(3, 90)], { base: 1, editor: 'tablet' })
    const refused = refusalOf(() => send([aspect(4, 100)], { base: 1 }))
    expect(refused.detail!.conflicts).toEqual([{ kind: 'aspect', target: 'single', theirs: { light: 'full-sun', facing: 90 }, yours: { light: 'full-sun', facing: 100 } }])
  })

  it('are no conflict to themselves, and none once they have seen the other\'s change', () => {
    send([put(3, placementAt('p1', 70))], { base: 1 })
    send([put(4, placementAt('p1', 71))], { base: 1 })
    send([put(5, placementAt('p1', 72))], { base: 3, editor: 'tablet' })
    expect(open().sheet.placements[0]!.x).toBe(72)
  })
})

describe('edits that do not fit', () => {
  it.each<[string, Edit]>([
    ['sill above head', { id: editId(5), op: 'put', kind: 'opening', value: { ...WINDOW, sill: 99 } }],
    ['window beyond the wall', { id: editId(5), op: 'put', kind: 'opening', value: { ...WINDOW, x: 330 } }],
    ['bed that crosses itself', { id: editId(5), op: 'put', kind: 'bed', value: { ...BED, outline: [{ x: 0, y: 0 }, { x: 90, y: 90 }, { x: 90, y: 0 }, { x: 0, y: 90 }] } }],
    ['plant nobody knows', put(5, placementAt('p9', 200, { plant: 'plant-none' }))],
    ['plant of the other studio', put(5, placementAt('p9', 200, { plant: 'plant-b' }))],
  ])('leave nothing behind, of the whole batch: %s', (_, bad) => {
    open()
    const before = everything()
    const refused = refusalOf(() => send([put(4, placementAt('p1', 60)), bad]))
    expect(refused.code).toBe('invalid')
    expect(refused.problems!.length).toBeGreaterThan(0)
    expect(refused.message).toMatch(/Nothing was changed/)
    expect(everything()).toBe(before)
  })

  it('name the field of a plant that is not in the library by its edit', () => {
    const refused = refusalOf(() => send([put(4, placementAt('p1', 60)), put(5, placementAt('p9', 200, { plant: 'plant-b' }))]))
    expect(refused.problems).toEqual([{ path: ['edits', 1, 'value', 'plant'], message: 'This plant is not in the library.' }])
  })

  it('are refused when made on a seq that was never given out', () => {
    const refused = refusalOf(() => send([put(1, placementAt('p1', 60))], { base: 1 }))
    expect(refused).toMatchObject({ code: 'invalid', problems: [{ path: ['base'] }] })
  })

  it('are refused by shape: unknown keys, no UUID, too many, numbers that are none', () => {
    const batch = (edits: unknown[]) => batchSchema.safeParse({ base: 0, editor: 'laptop', edits })
    expect(batch([put(1, placementAt('p1', 60))]).success).toBe(true)
    expect(batch([{ ...put(1, placementAt('p1', 60)), extra: 1 }]).success).toBe(false)
    expect(batch([{ ...put(1, placementAt('p1', 60)), id: 'one' }]).success).toBe(false)
    expect(batch([put(1, placementAt('p1', Number.NaN))]).success).toBe(false)
    expect(batch([put(1, placementAt('p1', 400_000))]).success).toBe(false)
    expect(batch([]).success).toBe(false)
    const many = Array.from({ length: MAX_EDITS + 1 }, (_, i) => put(i, placementAt('p1', i)))
    expect(batch(many).success).toBe(false)
    expect(batch(many.slice(1)).success).toBe(true)
  })

  it('are refused for whoever may not edit, and a facade of the other studio is not there', () => {
    for (const who of ['reviewer', 'estimator', 'client'] as const) {
      expect(refusalOf(() => send([put(1, placementAt('p1', 60))], { who })).code).toBe('forbidden')
    }
    expect(refusalOf(() => send([put(1, placementAt('p1', 60))], { who: 'stranger' })).code).toBe('not-found')
    expect(refusalOf(() => send([put(1, placementAt('p1', 60))], { facadeId: 'facade-b' })).code).toBe('not-found')
    expect(refusalOf(() => send([put(1, placementAt('p1', 60))], { facadeId: 'none' })).code).toBe('not-found')
    expect(db.select().from(placements).all()).toEqual([])
  })
})

describe('opening a sheet', () => {
  it('checks it when no findings are kept, or another version of the engine made them', () => {
    send(ONE_OF_EACH)
    const { report } = open()
    db.update(facades).set({ engine: 'older' }).run()
    db.delete(findings).run()
    expect(open().report).toEqual(report)
    expect(db.select().from(facades).where(eq(facades.id, 'facade-a')).get()!.engine).toBe(ENGINE_VERSION)
  })

  it('names facade and project', () => {
    expect(open().facade).toEqual({ id: 'facade-a', name: 'Front of project-a', projectId: 'project-a', projectName: 'House of project-a' })
  })
})

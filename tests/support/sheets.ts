/** Sheets for tests of the check: a level, plain house front on which one thing at a time is wrong. Inches. */
import fc from 'fast-check'
import { check, type Fixture, type Finding, type Opening, type Bed, type Placement, type Point, type Sheet, type Walk } from '@/lib/spacing'
import { CATEGORIES, GROWTHS, HABITS, LEAVES, LIGHTS, type Plant } from '@/lib/plants/types'

export function makePlant(changes: Partial<Plant> = {}): Plant {
  return {
    id: 'p1', botanical: 'Exemplum simplex', common: 'example', category: 'shrub', leaf: 'deciduous',
    heightMin: 36, heightMax: 60, spreadMin: 36, spreadMax: 60, habit: 'mounded', growth: 'moderate', zoneMin: 3, zoneMax: 9,
    light: ['full-sun', 'part-shade', 'full-shade'], water: ['dry', 'medium', 'wet'], foliageColor: 'green', texture: 'medium',
    bloomMonths: [], bloomColor: '', deer: 'unknown', toxicity: 'unlisted', juglone: 'unknown', thorns: false, invasive: false,
    native: [], prune: 'none', ...changes,
  }
}

/** A plant that is already as large as it will be when planted at this size: the same at every bound. */
export const grown = (height: number, spread: number, changes: Partial<Plant> = {}): Plant =>
  makePlant({ heightMin: height / 2, heightMax: height / 2, spreadMin: spread / 2, spreadMax: spread / 2, ...changes })

export function makePlacement(changes: Partial<Placement> = {}): Placement {
  return { id: 'a1', plant: 'p1', x: 240, y: 60, planted: { height: 12, spread: 12 }, ...changes }
}

export const rectangle = (x1: number, x2: number, y1: number, y2: number): Point[] => [{ x: x1, y: y1 }, { x: x2, y: y1 }, { x: x2, y: y2 }, { x: x1, y: y2 }]

export function makeSheet(changes: Partial<Sheet> = {}): Sheet {
  return {
    version: 1, units: 'in',
    site: { zone: '6a', light: 'full-sun', moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false },
    facade: { wall: [{ x: 0, y: 0 }, { x: 480, y: 0 }], grade: [{ x: 0, z: 0 }], fall: 0, gutter: 400, overhang: 0, siding: 'lap', exposed: 8, mulch: 2 },
    openings: [], fixtures: [], walks: [], beds: [], plants: [makePlant()], placements: [], ...changes,
  }
}

export const makeWindow = (changes: Partial<Opening> = {}): Opening => ({ id: 'w1', kind: 'window', name: 'Kitchen', x: 200, width: 72, sill: 36, head: 84, ...changes })
export const makeWalk = (from: number, to = from + 48): Walk => ({ id: 'k1', name: 'Front walk', outline: rectangle(0, 480, from, to) })

export const makeDoor = (changes: Partial<Opening> = {}): Opening => ({ id: 'd1', kind: 'door', name: 'Front door', x: 200, width: 40, sill: 8, head: 88, ...changes })
export const makeFixture = (kind: Fixture['kind'], changes: Partial<Fixture> = {}): Fixture => ({ id: 'f1', kind, x: 232, y: 0, width: 16, depth: 8, z: 30, height: 24, ...changes })
export const makeBed = (changes: Partial<Bed> = {}): Bed => ({ id: 'b1', name: 'Front bed', outline: rectangle(0, 480, 0, 96), ...changes })

/** What one rule finds. */
export const found = (sheet: Sheet, rule: string): Finding[] => check(sheet).findings.filter((finding) => finding.rule === rule)

const part = (low: number, high: number) => fc.integer({ min: low * 64, max: high * 64 }).map((parts) => parts / 64)

const anyPlant = (id: string) => fc.record({
  category: fc.constantFrom(...CATEGORIES), leaf: fc.constantFrom(...LEAVES), habit: fc.constantFrom(...HABITS), growth: fc.constantFrom(...GROWTHS),
  height: part(8, 90), spread: part(8, 90), more: part(0, 60), zoneMin: fc.integer({ min: 1, max: 7 }), light: fc.subarray([...LIGHTS]), thorns: fc.boolean(),
}).map(({ height, spread, more, ...rest }) => makePlant({ ...rest, id, heightMin: height, heightMax: height + more, spreadMin: spread, spreadMax: spread + more }))

const anyPlacement = (id: string) => fc.record({
  plant: fc.constantFrom('p1', 'p2', 'p3'), x: part(-20, 500), y: part(-10, 200), planted: fc.record({ height: part(4, 30), spread: part(4, 30) }),
  role: fc.constantFrom('shrub' as const, 'shrub' as const, 'specimen' as const, 'hedge' as const, 'on-wall' as const),
  status: fc.constantFrom('new' as const, 'new' as const, 'stays' as const, 'goes' as const),
  kept: fc.option(fc.record({ height: part(8, 50), spread: part(8, 50) }), { nil: undefined }), drift: fc.option(fc.constantFrom('d1', 'd2'), { nil: undefined }),
  clearStem: fc.option(part(0, 60), { nil: undefined }),
}).map(({ kept, drift, clearStem, ...rest }): Placement => ({ id, ...rest, ...(kept && { kept }), ...(drift && { drift }), ...(clearStem !== undefined && { clearStem }) }))

/** Any front with a jog, soil that falls, windows, walks, two beds and up to nine plants. */
export const anySheet: fc.Arbitrary<Sheet> = fc.tuple(anyPlant('p1'), anyPlant('p2'), anyPlant('p3'), fc.integer({ min: 1, max: 9 }), part(-30, 30))
  .chain(([one, two, three, count, jog]) => fc.tuple(...Array.from({ length: count }, (_, i) => anyPlacement(`a${i}`))).map((placements) => makeSheet({
    facade: { ...makeSheet().facade, wall: [{ x: 0, y: 0 }, { x: 200, y: 0 }, { x: 200, y: jog }, { x: 480, y: jog }], grade: [{ x: 0, z: 0 }, { x: 480, z: -8 }], fall: 0.0625, gutter: 110, overhang: 16 },
    openings: [makeWindow({ x: 40 }), makeWindow({ id: 'w2', x: 300, sill: 24 }), makeDoor({ x: 130 })],
    fixtures: [makeFixture('electric-meter', { x: 390 }), makeFixture('house-number', { id: 'f2', x: 180, z: 60, height: 6 }), makeFixture('hose-bib', { id: 'f3', x: 20, width: 4, height: 6 })],
    walks: [makeWalk(100)],
    beds: [{ id: 'b1', name: 'Left', outline: rectangle(0, 230, 0, 100) }, { id: 'b2', name: 'Right', outline: rectangle(220, 480, 30, 100) }],
    plants: [one, two, three], placements,
  })))

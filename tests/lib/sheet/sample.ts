/** A small sound sheet for the tests of this folder, and arbitraries of the things an edit puts. */
import fc from 'fast-check'
import type { Plant } from '@/lib/plants'
import { LISTED_KINDS, type Edit } from '@/lib/sheet'
import type { Placement, Sheet } from '@/lib/spacing'

const plant: Plant = {
  id: 'p1', botanical: "Ilex glabra 'Shamrock'", common: 'inkberry', category: 'shrub', leaf: 'broadleaf-evergreen',
  heightMin: 36, heightMax: 48, spreadMin: 36, spreadMax: 48, habit: 'rounded', growth: 'slow', zoneMin: 4, zoneMax: 9,
  light: ['full-sun', 'part-shade'], water: ['medium', 'wet'], foliageColor: 'dark-green', texture: 'fine', bloomMonths: [5, 6],
  bloomColor: 'white', deer: 'seldom', toxicity: 'toxic', juglone: 'unknown', thorns: false, invasive: false, native: ['northeast'], prune: 'late-winter',
}

const rectangle = (x1: number, y1: number, x2: number, y2: number) => [{ x: x1, y: y1 }, { x: x2, y: y1 }, { x: x2, y: y2 }, { x: x1, y: y2 }]

/** A fresh copy each time: a test may change it. */
export function sampleSheet(): Sheet {
  return structuredClone({
    version: 1,
    units: 'in',
    site: { zone: '6b', light: 'part-shade', facing: 180, moisture: 'medium', deer: 'some', walnut: 'none', fireZone: false, brief: ['birds'] },
    facade: {
      wall: [{ x: 0, y: 0 }, { x: 240, y: 0 }, { x: 240, y: 24 }, { x: 528, y: 24 }],
      grade: [{ x: 0, z: 0 }, { x: 528, z: -4 }],
      fall: 0.05, gutter: 110, overhang: 16, siding: 'lap', exposed: 8, mulch: 2,
    },
    openings: [
      { id: 'w1', kind: 'window', name: 'Kitchen', x: 60, width: 72, sill: 38, head: 92 },
      { id: 'd1', kind: 'door', name: 'Front door', x: 300, width: 40, sill: 8, head: 88 },
    ],
    fixtures: [{ id: 'f1', kind: 'downspout', x: 500, y: 24, width: 4, depth: 3, z: 0, height: 108, outlet: 72 }],
    walks: [{ id: 'k1', name: 'Front walk', outline: rectangle(0, 120, 528, 168) }],
    beds: [{ id: 'b1', name: 'Front bed', outline: rectangle(0, 24, 528, 96) }],
    plants: [plant],
    placements: [{ id: 'a1', plant: 'p1', x: 96, y: 48, planted: { height: 15, spread: 15 } }],
    standards: {},
  } satisfies Sheet)
}

const length = fc.integer({ min: 1, max: 500 * 64 }).map((parts) => parts / 64)
const uuid = fc.uuid({ version: 4 })
/** Few ids, so that edits often touch what stands already. */
const thingId = fc.constantFrom('w1', 'd1', 'f1', 'k1', 'b1', 'a1', 'new1', 'new2')

const opening = fc.record({ id: thingId, kind: fc.constantFrom('window' as const, 'door' as const), name: fc.constantFrom('Bay', 'Hall'), x: length, width: length, sill: length, head: length })
const fixture = fc.record({ id: thingId, kind: fc.constantFrom('hose-bib' as const, 'vent' as const), x: length, y: length, width: length, depth: length, z: length, height: length })
const outlined = fc.record({ id: thingId, name: fc.constantFrom('Side bed', 'Path'), outline: fc.tuple(length, length).map(([w, d]) => rectangle(0, 0, w, d)) })
const placement = fc.record({
  id: thingId, plant: fc.constant('p1'), x: length, y: length, planted: fc.record({ height: length, spread: length }), status: fc.constantFrom('new' as const, 'stays' as const),
}) satisfies fc.Arbitrary<Placement>
const facade = length.map((width) => ({ ...sampleSheet().facade, wall: [{ x: 0, y: 0 }, { x: width, y: 0 }] }))
const aspect = fc.oneof(
  fc.record({ light: fc.constantFrom('full-sun' as const, 'full-shade' as const) }),
  fc.record({ light: fc.constantFrom('full-sun' as const, 'part-shade' as const), facing: fc.integer({ min: 0, max: 360 }) }),
)

const put = <K extends string, V>(kind: K, value: fc.Arbitrary<V>) => fc.record({ id: uuid, op: fc.constant('put' as const), kind: fc.constant(kind), value })

/** Any edit, of things that stand on the sample sheet and of new ones. */
export const anyEdit = fc.oneof(
  put('facade', facade), put('aspect', aspect), put('opening', opening), put('fixture', fixture), put('walk', outlined), put('bed', outlined), put('placement', placement),
  fc.record({ id: uuid, op: fc.constant('remove' as const), kind: fc.constantFrom(...LISTED_KINDS), target: thingId }),
) as fc.Arbitrary<Edit>

/** The rules about a bed as a whole: cover, evergreen-share, bloom-gaps, same-green, odd-drift, balance, native-share. */
import { describe, expect, test } from 'vitest'
import type { Placement, Sheet } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'
import { found, grown, makeBed, makePlacement, makeSheet, rectangle } from '../../../support/sheets'

const beds = [makeBed()]
/** Plants 40 in high and across, planted full-grown. */
const full = (id: string, changes: Partial<Plant> = {}) => grown(40, 40, { id, ...changes })
const at = (id: string, x: number, changes: Partial<Placement> = {}): Placement => makePlacement({ id: `${id}-${x}`, plant: id, x, y: 48, planted: { height: 40, spread: 40 }, ...changes })
const of = (rule: string, plants: Plant[], placements: Placement[], sheet: Partial<Sheet> = {}) => found(makeSheet({ beds, plants, placements, ...sheet }), rule)
const kindOf = (...args: Parameters<typeof of>) => of(...args)[0]?.kind

describe('cover', () => {
  // A bed 40 x 40 under one disc of that size is covered pi/4; a smaller disc covers less.
  const square = [makeBed({ outline: rectangle(100, 140, 28, 68) })]
  const disc = (spread: number, changes = {}) => of('cover', [grown(40, spread, { id: 'p' })], [at('p', 120, { planted: { height: 40, spread }, ...changes })], { beds: square })
  test('seven tenths under crowns will do, less is a note of the bed', () => {
    const enough = 2 * Math.sqrt((0.7 * 1600) / Math.PI)
    expect(disc(enough + 1e-6)).toEqual([])
    expect(disc(enough - 1e-6)[0]).toMatchObject({ kind: 'note', placements: [], feature: 'b1', limit: 0.7, excess: 0 })
    expect(disc(40)).toEqual([])
  })
  test('a bed without plants is judged by this alone', () => {
    expect(of('cover', [], [])[0]).toMatchObject({ measured: { expected: 0 } })
  })
  test('foliage that starts at 3 ft covers nothing, nor what is trained on the wall', () => {
    expect(of('cover', [grown(200, 60, { id: 'p' })], [at('p', 120, { planted: { height: 200, spread: 60 }, clearStem: 36 })], { beds: square })).toHaveLength(1)
    expect(disc(60, { role: 'on-wall' })).toHaveLength(1)
  })
})

describe('evergreen-share', () => {
  const plants = [full('g', { leaf: 'broadleaf-evergreen' }), full('d'), full('s', { leaf: 'semi-evergreen' }), full('h', { leaf: 'herbaceous', category: 'perennial' })]
  test('a third to two thirds by volume passes; all or none is a note', () => {
    expect(of('evergreen-share', plants, [at('g', 100), at('d', 200)])).toEqual([])
    expect(of('evergreen-share', plants, [at('g', 100), at('g', 200), at('d', 300)])).toEqual([])
    expect(of('evergreen-share', plants, [at('d', 100)])[0]).toMatchObject({ kind: 'note', limit: 0.33, measured: { expected: 0 } })
    expect(of('evergreen-share', plants, [at('g', 100)])[0]).toMatchObject({ limit: 0.67, measured: { expected: 1 } })
  })
  test('in proportion by shears alone it is held, with the unclipped share', () => {
    const kept = [at('g', 100, { kept: { height: 20, spread: 20 } }), at('g', 160, { kept: { height: 20, spread: 20 } }), at('g', 220, { kept: { height: 20, spread: 20 } }), at('d', 300)]
    expect(of('evergreen-share', plants, kept)[0]).toMatchObject({ kind: 'held', limit: 0.67, measured: { expected: 0.75 } })
  })
  test('semi-evergreen counts half, herbaceous plants not at all', () => {
    expect(of('evergreen-share', plants, [at('s', 100), at('h', 200)])).toEqual([])
    expect(of('evergreen-share', plants, [at('h', 100)])).toEqual([])
  })
})

describe('bloom-gaps', () => {
  test('every month from April to October has something, or the bed is told of', () => {
    const plants = [full('a', { bloomMonths: [4, 5, 6] }), full('b', { bloomMonths: [7, 8, 9, 10] }), full('c', { bloomMonths: [2, 3] })]
    expect(of('bloom-gaps', plants, [at('a', 100), at('b', 200)])).toEqual([])
    expect(of('bloom-gaps', plants, [at('a', 100), at('c', 200)])[0]).toMatchObject({ kind: 'note', feature: 'b1', measured: { expected: 4 }, limit: 0 })
    expect(of('bloom-gaps', plants, [at('a', 100), at('b', 200, { status: 'goes' })])).toHaveLength(1)
  })
})

describe('same-green', () => {
  const plants = [full('a', { foliageColor: 'green' }), full('b', { foliageColor: 'silver' }), full('t', { texture: 'coarse' })]
  const row = (...ids: string[]) => ids.map((id, i) => at(id, 60 + 40 * i))
  test('three of one green pass, four are a note', () => {
    expect(of('same-green', plants, row('a', 'a', 'a', 'b', 'a'))).toEqual([])
    expect(of('same-green', plants, row('a', 'a', 'a', 'a'))[0]).toMatchObject({ kind: 'note', placements: [], measured: { expected: 4 }, limit: 3 })
  })
  test('a drift side by side counts as one plant, and so does a hedge', () => {
    expect(of('same-green', plants, row('a', 'a', 'a', 'a').map((one) => ({ ...one, drift: 'd' })))).toEqual([])
    expect(of('same-green', plants, row('a', 'a', 'a', 'a').map((one) => ({ ...one, role: 'hedge' as const })))).toEqual([])
    expect(of('same-green', plants, row('a', 'a', 'a', 'a', 'a').map((one, i) => (i < 2 ? { ...one, drift: 'd' } : one)))).toHaveLength(1)
  })
  test('another texture breaks the run, and so does a gap', () => {
    expect(of('same-green', plants, row('a', 'a', 't', 'a', 'a'))).toEqual([])
    expect(of('same-green', plants, [60, 100, 140.02, 180].map((x) => at('a', x)))).toEqual([])
  })
})

describe('odd-drift', () => {
  const drift = (count: number, changes: Partial<Placement> = {}) => of('odd-drift', [full('a')], Array.from({ length: count }, (_, i) => at('a', 20 + 40 * i, { drift: 'd', ...changes })))
  test.each([[1, 0], [2, 1], [3, 0], [4, 1], [6, 1], [7, 0], [8, 1], [10, 0]])('of %i: %i notes', (count, notes) => {
    expect(drift(count)).toHaveLength(notes)
  })
  test('names the members in order, in their bed', () => {
    expect(drift(2)[0]).toMatchObject({ kind: 'note', placements: ['a-20', 'a-60'], feature: 'b1', excess: 0 })
  })
  test('hedges are not judged', () => {
    expect(drift(4, { role: 'hedge' })).toEqual([])
  })
})

describe('balance', () => {
  const plants = [full('a')]
  test('between 35 and 65 percent a side passes', () => {
    // Moments about the middle at 240: 65 left, 35 right; then 66 and 34.
    expect(of('balance', plants, [at('a', 240 - 65), at('a', 240 + 35)])).toEqual([])
    expect(of('balance', plants, [at('a', 240 - 66), at('a', 240 + 34)])[0]).toMatchObject({ kind: 'note', limit: 0.65, measured: { expected: expect.closeTo(0.66, 6) } })
    expect(of('balance', plants, [at('a', 240 - 34), at('a', 240 + 66)])[0]).toMatchObject({ limit: 0.35 })
  })
  test('in balance by shears alone it is held', () => {
    expect(of('balance', plants, [at('a', 240 - 100, { kept: { height: 20, spread: 20 } }), at('a', 240 + 40)])[0]).toMatchObject({ kind: 'held', limit: 0.65 })
  })
  test('one plant in the middle weighs on neither side', () => {
    expect(of('balance', plants, [at('a', 240)])).toEqual([])
  })
})

/** PNAS 2018, doi 10.1073/pnas.1809259115: birds raise young where native plants are 70 percent of the biomass or more. */
describe('native-share', () => {
  const birds = { site: { ...makeSheet().site, brief: ['birds' as const] } }
  const sized = (id: string, spread: number, native: Plant['native']) => grown(40, spread, { id, native })
  const mix = (native: number, sheet: Partial<Sheet> = birds) => {
    const spreads = [Math.sqrt(native) * 4, Math.sqrt(100 - native) * 4] as const
    return of('native-share', [sized('n', spreads[0], ['northeast']), sized('f', spreads[1], [])], [at('n', 100, { planted: { height: 40, spread: spreads[0] } }), at('f', 200, { planted: { height: 40, spread: spreads[1] } })], sheet)
  }
  test('65 of 100 by volume is too little, 71 is not', () => {
    expect(mix(65)[0]).toMatchObject({ kind: 'note', feature: 'b1', limit: 0.7, measured: { expected: expect.closeTo(0.65, 6) } })
    expect(mix(71)).toEqual([])
  })
  test('only where the brief asks for birds', () => {
    expect(mix(10, {})).toEqual([])
  })
})

test('a bed without plants is told of by cover alone; a studio may call any of them a risk or switch it off', () => {
  const empty = makeSheet({ beds, plants: [], site: { ...makeSheet().site, brief: ['birds'] } })
  const rules = ['evergreen-share', 'bloom-gaps', 'same-green', 'odd-drift', 'balance', 'native-share']
  for (const rule of rules) expect(found(empty, rule)).toEqual([])
  expect(kindOf('cover', [], [], { standards: { 'cover.kind': 'risk' } })).toBe('risk')
  expect(of('cover', [], [], { standards: { 'cover.kind': 'off' } })).toEqual([])
})

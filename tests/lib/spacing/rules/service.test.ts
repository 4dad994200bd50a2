import { describe, expect, test } from 'vitest'
import type { Fixture, Placement } from '@/lib/spacing'
import { found, grown, makeFixture, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

/** A dome 40 in across that stays as it is, before a level wall; the fixture's middle stands at x 240. */
const by = (fixture: Fixture, placement: Partial<Placement> = {}, height = 40) =>
  found(makeSheet({ plants: [grown(height, 40)], fixtures: [fixture], placements: [makePlacement({ planted: { height, spread: 40 }, ...placement })] }), 'service')

/** National Electrical Code 110.26(A)(2), examples as quoted by Electrical Contractor magazine: working width 30 in, or that of wider equipment. */
describe('an electric meter', () => {
  test('keeps 30 in of width, or its own where it is wider', () => {
    expect(by(makeFixture('electric-meter'), { x: 275, y: 20 })).toEqual([])
    expect(by(makeFixture('electric-meter'), { x: 274.98, y: 20 })[0]).toMatchObject({ kind: 'conflict', feature: 'f1', limit: 0 })
    const wide = makeFixture('electric-meter', { x: 214, width: 52 })
    expect(by(wide, { x: 286, y: 20 })).toEqual([])
    expect(by(wide, { x: 285.98, y: 20 })).toHaveLength(1)
  })
  test('keeps 36 in before its face, from the soil to 78 in or its top', () => {
    expect(by(makeFixture('electric-meter'), { y: 64 })).toEqual([])
    expect(by(makeFixture('electric-meter'), { y: 63.98 })).toHaveLength(1)
    const tree = (height: number, clearStem: number) => by(makeFixture('electric-meter'), { y: 60, clearStem }, height)
    expect(tree(140, 78)).toEqual([])
    expect(tree(140, 70)).toHaveLength(1)
  })
})

test.each([['gas-meter', 36], ['vent', 36], ['hose-bib', 24], ['condenser', 24]] as const)('a %s keeps %i in at its sides and before it', (kind, room) => {
  expect(by(makeFixture(kind), { x: 248 + room + 20, y: 4 })).toEqual([])
  expect(by(makeFixture(kind), { x: 248 + room + 19.98, y: 4 })).toHaveLength(1)
  expect(by(makeFixture(kind), { y: 8 + room + 20 })).toEqual([])
  expect(by(makeFixture(kind), { y: 8 + room + 19.98 })).toHaveLength(1)
})

test('a condenser keeps 5 ft above it', () => {
  const over = (clearStem: number) => by(makeFixture('condenser', { z: 0, height: 36 }), { y: 40, clearStem }, 200)
  expect(over(96)).toEqual([])
  expect(over(95)).toHaveLength(1)
})

test('an escape well keeps 3 ft, from the soil to 80 in; what is behind it is the house', () => {
  const well = makeFixture('escape-well', { z: -20, height: 20 })
  expect(by(well, { y: 64 })).toEqual([])
  expect(by(well, { y: 63.98 })).toHaveLength(1)
})

test('downspouts, numbers and lights keep no room', () => {
  for (const kind of ['downspout', 'house-number', 'entry-light'] as const) expect(by(makeFixture(kind), { y: 20 })).toEqual([])
})

test('an axis in the room breaks it at every size: its way out is added', () => {
  const [finding] = by(makeFixture('electric-meter'), { x: 240, y: 40 })
  // 4 in from the front of the room, and 20 in of foliage.
  expect(finding).toMatchObject({ kind: 'conflict', measured: { low: -24, expected: -24, high: -24 }, excess: 24, year: { latest: 0 } })
})

test('one size of three is a risk, kept small it is held', () => {
  const plant = makePlant({ heightMin: 30, heightMax: 60, spreadMin: 30, spreadMax: 60 })
  const at = (changes: Partial<Placement>) => found(makeSheet({ plants: [plant], fixtures: [makeFixture('electric-meter')], placements: [makePlacement({ x: 282, y: 20, ...changes })] }), 'service')[0]
  expect(at({})).toMatchObject({ kind: 'risk' })
  expect(at({ kept: { spread: 40 } })).toMatchObject({ kind: 'held' })
})

test('trained on the wall it is a strip a foot deep, as wide as its crown', () => {
  const wall = (x: number, y: number) => by(makeFixture('gas-meter', { y: 50 }), { x, y, role: 'on-wall' })
  // The room begins 14 in out from the wall: the strip keeps clear of it, whatever its width.
  expect(wall(240, 6)).toEqual([])
  expect(by(makeFixture('electric-meter'), { x: 275, y: 6, role: 'on-wall' })).toEqual([])
  expect(by(makeFixture('electric-meter'), { x: 274.98, y: 6, role: 'on-wall' })).toHaveLength(1)
})

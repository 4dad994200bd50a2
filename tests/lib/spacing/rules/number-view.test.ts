import { expect, test } from 'vitest'
import type { Placement } from '@/lib/spacing'
import { found, grown, makeFixture, makePlacement, makeSheet } from '../../../support/sheets'

const number = makeFixture('house-number', { z: 60, height: 8, width: 10, x: 235, depth: 1 })
const before = (height: number, changes: Partial<Placement> = {}, fixture = number) =>
  found(makeSheet({ plants: [grown(height, 40)], fixtures: [fixture], placements: [makePlacement({ planted: { height, spread: 40 }, ...changes })] }), 'number-view')

test('as tall as its lower edge leaves it in sight, a contact more does not', () => {
  expect(before(60)).toEqual([])
  expect(before(60.02)[0]).toMatchObject({ kind: 'conflict', feature: 'f1', limit: 0 })
})
test('beside it nothing is hidden; the excess is how far it laps', () => {
  // At its lower edge a dome of 120 in has a radius of 20 x sqrt(1 - 0.25).
  const radius = 20 * Math.sqrt(0.75)
  expect(before(120, { x: 245 + radius })).toEqual([])
  expect(before(120, { x: 245 + radius - 1 })[0]!.excess).toBeCloseTo(1, 6)
})
test('what is measured is the share of the face that is hidden', () => {
  expect(before(400)[0]!.measured!.expected).toBe(1)
  const [half] = before(400, { x: 240 + 20 * Math.sqrt(1 - (64 / 400) ** 2) })
  expect(half!.measured!.expected).toBeCloseTo(0.5, 1)
})
test('behind its face, above it, and farther than 20 ft it hides nothing', () => {
  expect(before(100, { y: 1 })).toEqual([])
  expect(before(100, { y: 241 })).toHaveLength(1)
  expect(before(100, { y: 241.02 })).toEqual([])
  expect(before(200, { clearStem: 68 })).toEqual([])
})
test('the entry light is looked after too, other fixtures are not; shears hold it', () => {
  expect(before(100, {}, { ...number, kind: 'entry-light' })).toHaveLength(1)
  expect(before(100, {}, { ...number, kind: 'vent' })).toEqual([])
  expect(before(100, { kept: { height: 50 } })[0]).toMatchObject({ kind: 'held' })
})

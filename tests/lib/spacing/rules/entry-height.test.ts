import { expect, test } from 'vitest'
import type { Placement, Sheet } from '@/lib/spacing'
import { found, grown, makeDoor, makePlacement, makeSheet } from '../../../support/sheets'

const by = (height: number, changes: Partial<Placement> = {}, sheet: Partial<Sheet> = {}) =>
  found(makeSheet({ openings: [makeDoor()], plants: [grown(height, 40)], placements: [makePlacement({ x: 260, y: 40, planted: { height, spread: 40 }, ...changes })], ...sheet }), 'entry-height')

/** SeaTac Municipal Code 17.56.020 B, https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html: 3 ft within 6 ft of a doorway. */
test('3 ft passes, more does not: a shrub of 40 in, 60 in from the door, breaks it', () => {
  expect(by(36)).toEqual([])
  expect(by(36.02)[0]).toMatchObject({ kind: 'risk', feature: 'd1', limit: 36, year: null })
  expect(by(40, { x: 300, y: 0 })[0]).toMatchObject({ kind: 'risk', excess: 4 })
})
test('within 6 ft of the line of the door', () => {
  expect(by(50, { x: 220, y: 72 })).toHaveLength(1)
  expect(by(50, { x: 220, y: 72.02 })).toEqual([])
})
test('one sees under foliage that starts at 6 ft', () => {
  expect(by(180, { clearStem: 72 })).toEqual([])
  expect(by(180, { clearStem: 71.98 })).toHaveLength(1)
})
test('held by shears, and by the figures a studio sets', () => {
  expect(by(50, { kept: { height: 30 } })[0]).toMatchObject({ kind: 'held' })
  expect(by(50, {}, { standards: { 'entry-height.height': 60 } })).toEqual([])
  expect(by(50, {}, { standards: { 'entry-height.near': 20 } })).toEqual([])
  expect(by(180, { clearStem: 66 }, { standards: { 'entry-height.clear': 60 } })).toEqual([])
})

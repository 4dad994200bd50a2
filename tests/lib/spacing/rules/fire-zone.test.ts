import { expect, test } from 'vitest'
import type { Placement, Sheet } from '@/lib/spacing'
import { found, grown, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const site = { ...makeSheet().site, fireZone: true }
const near = (changes: Partial<Placement> = {}, sheet: Partial<Sheet> = {}) =>
  found(makeSheet({ site, plants: [grown(40, 40)], placements: [makePlacement({ planted: { height: 40, spread: 40 }, ...changes })], ...sheet }), 'fire-zone')

test('an axis nearer than 5 ft is a conflict, whatever its size', () => {
  expect(near({ y: 59.98 })[0]).toMatchObject({ kind: 'conflict', limit: 60, measured: { expected: 59.98 }, year: null })
})
test('from 5 ft on the crown is looked at: a risk at every size', () => {
  expect(near({ y: 60 })[0]).toMatchObject({ kind: 'risk', measured: { low: 40, expected: 40, high: 40 }, excess: 20 })
  expect(near({ y: 79.98 })).toHaveLength(1)
  expect(near({ y: 80 })).toEqual([])
})
test('shears hold the crown, not the axis', () => {
  expect(near({ y: 70, kept: { spread: 20 } })[0]).toMatchObject({ kind: 'held' })
  expect(near({ y: 50, kept: { spread: 10 } })[0]).toMatchObject({ kind: 'conflict' })
})
test('only where the site is marked, and by the distance a studio sets', () => {
  expect(near({ y: 50 }, { site: { ...site, fireZone: false } })).toEqual([])
  expect(near({ y: 50 }, { standards: { 'fire-zone.distance': 30 } })).toEqual([])
})
test('one size of three is a risk too', () => {
  expect(near({ y: 78, planted: { height: 8, spread: 8 } }, { plants: [makePlant({ spreadMin: 20, spreadMax: 40 })] })[0]).toMatchObject({ kind: 'risk', excess: 2 })
})

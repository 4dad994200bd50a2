import { expect, test } from 'vitest'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const zones = (zoneMin: number | null, zoneMax: number | null, status: 'new' | 'stays' = 'new') =>
  found(makeSheet({ plants: [makePlant({ zoneMin, zoneMax })], placements: [makePlacement({ id: 'b', status }), makePlacement({ id: 'a', status })] }), 'hardiness')

test('hardiness: the zone of the garden at either end passes; colder is a conflict, warmer a risk, one finding a plant', () => {
  expect(zones(6, 6)).toEqual([])
  expect(zones(7, 9)).toMatchObject([{ kind: 'conflict', feature: 'p1', placements: ['a', 'b'], excess: 0, year: null }])
  expect(zones(3, 5)).toMatchObject([{ kind: 'risk' }])
})

test('hardiness: unknown zones and plants that stay are not judged', () => {
  expect(zones(null, null)).toEqual([])
  expect(zones(7, 9, 'stays')).toEqual([])
})

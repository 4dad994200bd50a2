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

test('hardiness: either end of the range and one zone past it; half zones count as their number', () => {
  const within = (zone: string) => found({ ...makeSheet({ plants: [makePlant({ zoneMin: 4, zoneMax: 8 })], placements: [makePlacement()] }), site: { ...makeSheet().site, zone } }, 'hardiness').map(({ kind }) => kind)
  expect(['3b', '4a', '8b', '9a'].map(within)).toEqual([['conflict'], [], [], ['risk']])
})

test('hardiness: named by the plants that are judged alone, and only where one is; a studio may soften it', () => {
  const sheet = makeSheet({ plants: [makePlant({ zoneMin: 7 })], placements: [makePlacement({ id: 'a', status: 'stays' }), makePlacement({ id: 'b' }), makePlacement({ id: 'c', status: 'goes' })] })
  expect(found(sheet, 'hardiness')).toMatchObject([{ placements: ['b'] }])
  expect(found({ ...sheet, placements: [] }, 'hardiness')).toEqual([])
  expect(found({ ...sheet, standards: { 'hardiness.kind': 'note' } }, 'hardiness')).toMatchObject([{ kind: 'note' }])
  expect(found({ ...sheet, standards: { 'hardiness.kind': 'off' } }, 'hardiness')).toEqual([])
})

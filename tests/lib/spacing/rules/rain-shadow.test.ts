import { expect, test } from 'vitest'
import type { Placement } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const under = (y: number, plant: Partial<Plant> = {}, changes: Partial<Placement> = {}) =>
  found(makeSheet({ facade: { ...makeSheet().facade, overhang: 24 }, plants: [makePlant({ water: ['medium'], ...plant })], placements: [makePlacement({ y, ...changes })] }), 'rain-shadow')

test('a foot beyond the eaves rain reaches it, a contact less it does not', () => {
  expect(under(36)).toEqual([])
  expect(under(35.98)[0]).toMatchObject({ kind: 'note', feature: 'p1', limit: 36, measured: { expected: 35.98 }, year: null })
})
test('plants for dry soil, of unknown needs, on the wall, or staying are not judged', () => {
  expect(under(20, { water: ['dry', 'medium'] })).toEqual([])
  expect(under(20, { water: [] })).toEqual([])
  expect(under(0, {}, { role: 'on-wall' })).toEqual([])
  expect(under(20, {}, { status: 'stays' })).toEqual([])
})
test('only the placements concerned are named, and the driest is measured', () => {
  const sheet = makeSheet({ facade: { ...makeSheet().facade, overhang: 24 }, plants: [makePlant({ water: ['wet'] })], placements: [makePlacement({ id: 'c', y: 30 }), makePlacement({ id: 'a', y: 20 }), makePlacement({ id: 'b', y: 60 })] })
  expect(found(sheet, 'rain-shadow')).toMatchObject([{ placements: ['a', 'c'], measured: { low: 20 }, excess: 16 }])
})

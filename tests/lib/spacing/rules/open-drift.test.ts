import { expect, test } from 'vitest'
import type { Placement } from '@/lib/spacing'
import { found, grown, makePlacement, makeSheet } from '../../../support/sheets'

const drift = (...places: (Partial<Placement> & { x: number })[]) =>
  found(makeSheet({ plants: [grown(20, 20), grown(20, 40, { id: 'p2' })], placements: places.map((place, i) => makePlacement({ id: `a${i}`, planted: { height: 20, spread: place.plant === 'p2' ? 40 : 20 }, drift: 'd', ...place })) }), 'open-drift')

test('one and a half spreads apart they still grow together, a contact more they do not', () => {
  expect(drift({ x: 100 }, { x: 130 })).toEqual([])
  expect(drift({ x: 100 }, { x: 130.02 })).toMatchObject([{ kind: 'note', placements: ['a0'], limit: 30, measured: { low: null, high: null }, year: null }, { placements: ['a1'] }])
})
test('the mean of the two spreads counts, as kept', () => {
  expect(drift({ x: 100 }, { x: 145, plant: 'p2' })).toEqual([])
  expect(drift({ x: 100 }, { x: 145, plant: 'p2', kept: { spread: 30 } })).toHaveLength(2)
})
test('the nearest mate counts: only the one that stands apart is told', () => {
  expect(drift({ x: 100 }, { x: 120 }, { x: 170 }).map(({ placements }) => placements[0])).toEqual(['a2'])
})
test('a drift of one, one whose mate goes, and plants on the wall are not judged', () => {
  expect(drift({ x: 100 })).toEqual([])
  expect(drift({ x: 100 }, { x: 200, status: 'goes' })).toEqual([])
  expect(drift({ x: 100, role: 'on-wall' }, { x: 200 })).toEqual([])
})

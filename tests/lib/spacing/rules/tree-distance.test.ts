import { expect, test } from 'vitest'
import type { Placement } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const tree = (heights: [number, number], y: number, plant: Partial<Plant> = {}, changes: Partial<Placement> = {}) =>
  found(makeSheet({ plants: [makePlant({ category: 'tree', heightMin: heights[0], heightMax: heights[1], spreadMin: 200, spreadMax: 300, ...plant })], placements: [makePlacement({ y, ...changes })] }), 'tree-distance')

/** Arbor Day Foundation, tree sizing chart, http://arborday.org/trees/righttreeandplace/size.cfm: 8, 15 and 20 ft from a one-storey wall. */
test.each([[300, 96], [360, 96], [361, 180], [840, 180], [841, 240]])('a tree of %i in wants %i in', (height, distance) => {
  expect(tree([height, height], distance)).toEqual([])
  expect(tree([height, height], distance - 0.02)[0]).toMatchObject({ kind: 'conflict', limit: distance, year: null, excess: expect.closeTo(0.02, 6) })
})
test('each size is judged by itself: only the largest breaks it, a risk', () => {
  expect(tree([300, 480], 100)[0]).toMatchObject({ kind: 'risk', limit: 180, measured: { low: 100, expected: 100, high: 100 }, excess: 80 })
})
test('a size under 12 ft is not judged, nor a tree narrower than 6 ft', () => {
  expect(tree([100, 200], 50)[0]).toMatchObject({ kind: 'risk', measured: { low: null, expected: 50, high: 50 } })
  expect(tree([300, 300], 50, { spreadMin: 60, spreadMax: 83 })).toEqual([])
  expect(tree([300, 300], 50, { spreadMin: 60, spreadMax: 84 })).toHaveLength(1)
})
test('what is planted taller counts as that tall', () => {
  expect(tree([300, 300], 100, {}, { planted: { height: 400, spread: 12 } })[0]).toMatchObject({ limit: 180 })
})
test('shrubs and trees trained on the wall are not judged, one that is kept is, never as held', () => {
  expect(tree([300, 300], 50, { category: 'shrub' })).toEqual([])
  expect(tree([300, 300], 50, {}, { role: 'on-wall' })).toEqual([])
  expect(tree([300, 300], 50, {}, { kept: { height: 60 } })[0]).toMatchObject({ kind: 'conflict' })
})

import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makeSheet, makeWalk } from '../../../support/sheets'

const by = (y: number, changes = {}, standards = {}) =>
  found(makeSheet({ standards, plants: [grown(40, 40)], walks: [makeWalk(100)], placements: [makePlacement({ y, planted: { height: 40, spread: 40 }, ...changes })] }), 'walk-edge')

describe('walk-edge', () => {
  test('touching the edge passes, 0.02 in over it does not', () => {
    expect(by(80)).toEqual([])
    expect(by(80.02)[0]).toMatchObject({ kind: 'conflict', feature: 'k1', limit: 0 })
  })
  test('the clearance a studio sets counts', () => {
    expect(by(68, {}, { 'walk-edge.clearance': 12 })).toEqual([])
    expect(by(68.02, {}, { 'walk-edge.clearance': 12 })).toHaveLength(1)
  })
  test('an axis in the walk breaks it from the first day, foliage or none', () => {
    expect(by(110)[0]).toMatchObject({ kind: 'conflict', measured: { expected: -30 }, year: { earliest: 0, expected: 0, latest: 0 } })
  })
  test('a plant trained on the wall leans out 12 in at most', () => {
    expect(by(88, { role: 'on-wall' })).toEqual([])
    expect(by(88.02, { role: 'on-wall' })).toHaveLength(1)
  })
  test('kept narrow it is held, with the unclipped figures', () => {
    expect(by(85, { kept: { spread: 30 } })[0]).toMatchObject({ kind: 'held', measured: { expected: -5 }, excess: 5 })
  })
})

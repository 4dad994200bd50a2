import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet, makeWalk, rectangle } from '../../../support/sheets'

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
  test('only foliage below the headroom counts, measured from the soil at the walk', () => {
    expect(by(90, { clearStem: 24 }, { 'walk-edge.headroom': 60 })).toHaveLength(1)
    const limbed = (clearStem: number, fall = 0) => {
      const sheet = makeSheet({ plants: [grown(200, 80)], walks: [makeWalk(100)], placements: [makePlacement({ y: 80, planted: { height: 200, spread: 80 }, clearStem })] })
      return found({ ...sheet, facade: { ...sheet.facade, fall } }, 'walk-edge')
    }
    expect(limbed(80)).toEqual([])
    expect(limbed(79.98)).toHaveLength(1)
    // The walk lies 20 in farther out: 2 in lower.
    expect(limbed(78, 0.1)).toEqual([])
    expect(limbed(77.98, 0.1)).toHaveLength(1)
  })
  test('an axis in the walk without foliage there breaks it by its distance alone', () => {
    const sheet = makeSheet({ plants: [grown(200, 80)], walks: [makeWalk(100)], placements: [makePlacement({ y: 110, planted: { height: 200, spread: 80 }, clearStem: 100 })] })
    expect(found(sheet, 'walk-edge')[0]).toMatchObject({ kind: 'conflict', excess: 10, measured: { low: -10, expected: -10, high: -10 }, year: { earliest: 0, latest: 0 } })
  })
  test('one size of three over the edge is a risk; a plant that stays is judged, one that goes is not', () => {
    const sheet = makeSheet({ plants: [makePlant({ spreadMin: 20, spreadMax: 40 })], walks: [makeWalk(100)], placements: [makePlacement({ y: 84 })] })
    expect(found(sheet, 'walk-edge')[0]).toMatchObject({ kind: 'risk', measured: { low: 6, expected: 1, high: -4 }, excess: 4 })
    expect(by(90, { status: 'stays' })).toHaveLength(1)
    expect(by(90, { status: 'goes' })).toEqual([])
  })
  test('past the corner of a walk the distance is to the corner', () => {
    const walk = (x: number) => found(makeSheet({ plants: [grown(40, 40)], walks: [{ ...makeWalk(100), outline: rectangle(0, 100, 100, 148) }], placements: [makePlacement({ x, y: 84, planted: { height: 40, spread: 40 } })] }), 'walk-edge')
    expect(walk(112)).toEqual([])
    expect(walk(111.95)).toHaveLength(1)
  })
})

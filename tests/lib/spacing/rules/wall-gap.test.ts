import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const off = (y: number, changes = {}, height = 40) =>
  found(makeSheet({ plants: [grown(height, 40)], placements: [makePlacement({ y, planted: { height, spread: 40 }, ...changes })] }), 'wall-gap')

describe('wall-gap', () => {
  test('12 in off the wall passes, 0.02 in less does not', () => {
    expect(off(32)).toEqual([])
    expect(off(31.98)[0]).toMatchObject({ kind: 'conflict', limit: 12 })
  })
  test('behind the wall the distance is negative', () => {
    expect(off(-10)[0]?.measured?.expected).toBeCloseTo(-30, 9)
  })
  test('below the exposed foundation it is a note, a hair above it no longer', () => {
    expect(off(25, {}, 6)[0]?.kind).toBe('note')
    expect(off(25, {}, 6.02)[0]?.kind).toBe('conflict')
  })
  test('kept below the foundation counts; held by shears alone it stays held', () => {
    expect(off(25, { kept: { height: 5 } })[0]?.kind).toBe('note')
    expect(off(25, { kept: { height: 5, spread: 20 } })[0]?.kind).toBe('held')
  })
  test('a plant trained on the wall is left out', () => {
    expect(off(6, { role: 'on-wall' })).toEqual([])
  })
  test('one size of three too near is a risk, kept narrow it is held with the unclipped figures', () => {
    const sheet = (changes = {}) => makeSheet({ plants: [makePlant({ spreadMin: 20, spreadMax: 40 })], placements: [makePlacement({ y: 30, ...changes })] })
    expect(found(sheet(), 'wall-gap')[0]).toMatchObject({ kind: 'risk', measured: { low: 20, expected: 15, high: 10 }, excess: 2 })
    expect(found(sheet({ kept: { spread: 36 } }), 'wall-gap')[0]).toMatchObject({ kind: 'held', measured: { high: 10 }, excess: 2 })
    expect(found(sheet({ kept: { spread: 36.04 } }), 'wall-gap')[0]).toMatchObject({ kind: 'risk' })
  })
  test('foliage above the gutter is not before the wall', () => {
    const tall = (clearStem: number) => {
      const sheet = makeSheet({ plants: [grown(200, 80)], placements: [makePlacement({ y: 40, planted: { height: 200, spread: 80 }, clearStem })] })
      return found({ ...sheet, facade: { ...sheet.facade, gutter: 110 } }, 'wall-gap')
    }
    expect(tall(110)).toEqual([])
    expect(tall(109.98)).toHaveLength(1)
  })
  test('a return of the wall counts', () => {
    const sheet = makeSheet({ plants: [grown(40, 40)], placements: [makePlacement({ x: 168, y: 60, planted: { height: 40, spread: 40 } })] })
    const jogged = (x: number) => found({ ...sheet, facade: { ...sheet.facade, wall: [{ x: 0, y: 0 }, { x, y: 0 }, { x, y: 90 }, { x: 480, y: 90 }] } }, 'wall-gap')
    expect(jogged(200)).toEqual([])
    expect(jogged(199.98)).toHaveLength(1)
  })
  test('a plant that stays is judged, one that goes is not', () => {
    expect(off(20, { status: 'stays' })).toHaveLength(1)
    expect(off(20, { status: 'goes' })).toEqual([])
  })
})

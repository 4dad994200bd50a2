import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makeSheet } from '../../../support/sheets'

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
})

import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet, makeWindow } from '../../../support/sheets'

const under = (height: number, changes = {}, window = makeWindow()) =>
  found(makeSheet({ plants: [grown(height, 40)], openings: [window], placements: [makePlacement({ planted: { height, spread: 40 }, ...changes })] }), 'sill')

describe('sill', () => {
  test('a top at the sill passes, one 0.02 in higher does not', () => {
    expect(under(36)).toEqual([])
    expect(under(36.02)[0]).toMatchObject({ kind: 'conflict', limit: 36, feature: 'w1', key: 'sill:a1:w1', year: { earliest: 0, latest: 0 } })
  })
  test('beside the window only what reaches in counts', () => {
    expect(under(60, { x: 180 })).toEqual([])
    expect(under(60, { x: 185 })).toHaveLength(1)
  })
  test('past 96 in from the wall it is a note, past 240 in nothing', () => {
    expect(under(40, { y: 96 })[0]?.kind).toBe('conflict')
    expect(under(40, { y: 96.02 })[0]?.kind).toBe('note')
    expect(under(40, { y: 240 })[0]?.kind).toBe('note')
    expect(under(40, { y: 240.02 })).toEqual([])
  })
  test('kept low it is held near the wall, and never held far out', () => {
    expect(under(50, { kept: { height: 30 } })[0]).toMatchObject({ kind: 'held', measured: { expected: 50 }, excess: 14 })
    expect(under(50, { kept: { height: 30 }, y: 120 })).toEqual([])
  })
  test('a crown that starts at the head of the window hides nothing', () => {
    expect(under(200, { clearStem: 84 })).toEqual([])
    expect(under(200, { clearStem: 83.9 })).toHaveLength(1)
  })
  test('doors have no sill, and a plant that goes is ignored', () => {
    expect(under(60, {}, makeWindow({ kind: 'door' }))).toEqual([])
    expect(under(60, { status: 'goes' })).toEqual([])
  })
  test('one size of three past the sill is a risk, with its year', () => {
    const sheet = makeSheet({ plants: [makePlant({ heightMin: 20, heightMax: 40 })], openings: [makeWindow()], placements: [makePlacement()] })
    expect(found(sheet, 'sill')[0]).toMatchObject({ kind: 'risk', measured: { low: 20, expected: 30, high: 40 }, excess: 4 })
  })
})

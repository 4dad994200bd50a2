import { describe, expect, test } from 'vitest'
import type { Placement, Sheet } from '@/lib/spacing'
import { found, grown, makeBed, makePlacement, makeSheet } from '../../../support/sheets'

/** Gutter 108 in above level soil: two thirds is 72. */
const at = (height: number, changes: Partial<Placement> = {}, sheet: Partial<Sheet> = {}) =>
  found(makeSheet({ facade: { ...makeSheet().facade, gutter: 108 }, plants: [grown(height, 40)], placements: [makePlacement({ x: 20, y: 20, planted: { height, spread: 40 }, ...changes })], ...sheet }), 'corner-height')

/** NDSU Extension, Foundation Plantings, https://www.ag.ndsu.edu/hort/info/inform/wplts/foundation.htm: 2/3 to 3/4, of 108 in 72 to 81. */
describe('too tall a corner', () => {
  test('two thirds of the gutter passes, a contact more does not', () => {
    expect(at(72)).toEqual([])
    expect(at(72.02)[0]).toMatchObject({ kind: 'risk', feature: 'left', limit: 72, measured: { low: null, expected: 72.02, high: null }, year: null })
  })
  test('a studio may allow three quarters', () => {
    const standards = { 'corner-height.share': 0.75 }
    expect(at(81, {}, { standards })).toEqual([])
    expect(at(81.02, {}, { standards })).toHaveLength(1)
  })
  test('within 4 ft in plan of either corner', () => {
    expect(at(90, { x: 48, y: 0 })).toHaveLength(1)
    expect(at(90, { x: 48.02, y: 0 })).toEqual([])
    expect(at(90, { x: 470, y: 20 })[0]).toMatchObject({ feature: 'right' })
  })
  test('kept low it is held', () => {
    expect(at(90, { kept: { height: 70 } })[0]).toMatchObject({ kind: 'held', measured: { expected: 90 } })
  })
})

describe('an empty corner', () => {
  const beds = [makeBed({ outline: [{ x: 0, y: 0 }, { x: 200, y: 0 }, { x: 200, y: 96 }, { x: 0, y: 96 }] })]
  test('is a note where a bed comes near and nothing closes it: a third of the gutter', () => {
    expect(at(36, {}, { beds })).toEqual([])
    expect(at(35.98, {}, { beds })[0]).toMatchObject({ kind: 'note', placements: [], feature: 'left', limit: 36 })
    expect(at(36, { x: 100 }, { beds })[0]).toMatchObject({ kind: 'note', measured: null, excess: 36 })
  })
  test('4 ft is enough under any gutter', () => {
    const tall = { facade: { ...makeSheet().facade, gutter: 240 }, beds }
    expect(at(48, {}, tall)).toEqual([])
    expect(at(47.98, {}, tall)).toHaveLength(1)
  })
  test('without a planted bed near it nothing is asked', () => {
    expect(at(10, { x: 400 }, { beds })).toEqual([])
    expect(at(10, {}, { beds: [] })).toEqual([])
  })
})

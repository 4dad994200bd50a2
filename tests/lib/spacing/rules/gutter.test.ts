import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const tall = (height: number, changes = {}) => {
  const sheet = makeSheet({ plants: [grown(height, 60)], placements: [makePlacement({ y: 16, planted: { height, spread: 60 }, ...changes })] })
  return found({ ...sheet, facade: { ...sheet.facade, gutter: 110, overhang: 16 } }, 'gutter')
}

describe('gutter', () => {
  test('a foot below the gutter passes, 0.02 in more does not', () => {
    expect(tall(98)).toEqual([])
    expect(tall(98.02)[0]).toMatchObject({ kind: 'conflict', limit: 98, feature: null })
  })
  test('out of the reach of the overhang it may be any height', () => {
    expect(tall(200, { y: 46.02 })).toEqual([])
    expect(tall(200, { y: 30 })).toHaveLength(1)
  })
  test('on the wall it counts with its whole crown, and kept low it is held', () => {
    expect(tall(120, { role: 'on-wall' })).toHaveLength(1)
    expect(tall(120, { kept: { height: 90 } })[0]?.kind).toBe('held')
  })
  test('one size of three is a risk; so near below the edge of the roof the whole top counts', () => {
    const sheet = makeSheet({ plants: [makePlant({ heightMin: 80, heightMax: 120 })], placements: [makePlacement({ y: 10 })] })
    const near = { ...sheet, facade: { ...sheet.facade, gutter: 110, overhang: 16 } }
    expect(found(near, 'gutter')[0]).toMatchObject({ kind: 'risk', measured: { low: 80, expected: 100, high: 120 }, excess: 22 })
  })
  test('farther out the top of the part that reaches under the roof counts', () => {
    // 18 in past the roof's edge a dome of radius 30 stands 0.8 of its height.
    expect(tall(122.5, { y: 34 })).toEqual([])
    expect(tall(122.53, { y: 34 })[0]).toMatchObject({ kind: 'conflict', limit: 98 })
  })
  test('a plant that stays is judged, one that goes is not', () => {
    expect(tall(120, { status: 'stays' })).toHaveLength(1)
    expect(tall(120, { status: 'goes' })).toEqual([])
  })
})

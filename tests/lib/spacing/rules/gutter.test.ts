import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makeSheet } from '../../../support/sheets'

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
})

import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makeSheet } from '../../../support/sheets'

const pair = (apart: number, one = {}, other = {}, plant = {}) => found(makeSheet({
  plants: [grown(40, 40, plant), grown(40, 40, { id: 'p2' })],
  placements: [makePlacement({ planted: { height: 40, spread: 40 }, ...one }), makePlacement({ id: 'a2', plant: 'p2', x: 240 + apart, planted: { height: 40, spread: 40 }, ...other })],
}), 'crowding')

describe('crowding', () => {
  test('a tenth of the smaller spread passes, 0.02 in more does not', () => {
    expect(pair(36)).toEqual([])
    const [finding] = pair(35.98)
    expect(finding).toMatchObject({ kind: 'conflict', placements: ['a1', 'a2'], limit: 0.1 })
    expect(finding?.excess).toBeCloseTo(0.02, 9)
  })
  test('one drift may take a quarter, a hedge or a groundcover half', () => {
    expect(pair(30, { drift: 'd' }, { drift: 'd' })).toEqual([])
    expect(pair(29.98, { drift: 'd' }, { drift: 'd' })).toHaveLength(1)
    expect(pair(20, { role: 'hedge' }, { role: 'hedge' })).toEqual([])
    expect(pair(19.98, { role: 'hedge' }, { role: 'hedge' })).toHaveLength(1)
    expect(pair(20, {}, {}, { category: 'groundcover' })).toEqual([])
  })
  test('crowns without a shared height do not overlap', () => {
    expect(pair(5, { clearStem: 24, kept: { height: 40 } }, { kept: { height: 24 } })[0]?.kind).toBe('held')
  })
  test('annuals, plants on the wall and two that stay are not judged; one that stays is', () => {
    expect(pair(5, {}, {}, { category: 'annual' })).toEqual([])
    expect(pair(5, { role: 'on-wall' })).toEqual([])
    expect(pair(5, { status: 'stays' }, { status: 'stays' })).toEqual([])
    expect(pair(5, { status: 'stays' })).toHaveLength(1)
  })
})

import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

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
  test('a drift is one by its name, whatever the plant; a hedge takes two', () => {
    expect(pair(30, { drift: 'd' }, { drift: 'e' })).toHaveLength(1)
    expect(pair(30, { drift: 'd' })).toHaveLength(1)
    expect(pair(20, { role: 'hedge' })).toHaveLength(1)
    expect(pair(20, { role: 'hedge', drift: 'd' }, { role: 'hedge', drift: 'd' })).toEqual([])
  })
  test('one size of three is a risk, with the share at each', () => {
    const ranged = makePlant({ heightMin: 40, heightMax: 40.001, spreadMin: 30, spreadMax: 50 })
    const sheet = makeSheet({ plants: [ranged], placements: [makePlacement(), makePlacement({ id: 'a2', x: 276 })] })
    const [finding] = found(sheet, 'crowding')
    expect(finding).toMatchObject({ kind: 'risk', limit: 0.1 })
    expect(finding?.measured?.low).toBeCloseTo(-0.2, 9)
    expect(finding?.measured?.expected).toBeCloseTo(0.1, 9)
    expect(finding?.measured?.high).toBeCloseTo(0.28, 9)
    expect(finding?.excess).toBeCloseTo(9, 9)
  })
  test('held only if the pair would break at the expected size', () => {
    const ranged = makePlant({ heightMin: 40, heightMax: 40.001, spreadMin: 30, spreadMax: 50 })
    const kept = (apart: number) => found(makeSheet({ plants: [ranged], placements: [makePlacement({ kept: { spread: 20 } }), makePlacement({ id: 'a2', x: 240 + apart, kept: { spread: 20 } })] }), 'crowding')
    expect(kept(36)).toEqual([])
    expect(kept(35.98)[0]?.kind).toBe('held')
  })
  test('the share is of the smaller unclipped spread, however it is kept', () => {
    // 40 and 80 wide, the larger kept at 60: half the sum is 50, a tenth of 40 is 4.
    const wide = (apart: number) => found(makeSheet({
      plants: [grown(40, 40), grown(40, 80, { id: 'p2' })],
      placements: [makePlacement({ planted: { height: 40, spread: 40 } }), makePlacement({ id: 'a2', plant: 'p2', x: 240 + apart, planted: { height: 40, spread: 80 }, kept: { spread: 60 } })],
    }), 'crowding')
    expect(wide(46)[0]?.kind).toBe('held')
    expect(wide(45.98)[0]?.kind).toBe('conflict')
    // Two kept at 30 of 40: half the sum is 30, and a tenth is of 40, not of 30.
    expect(pair(26, { kept: { spread: 30 } }, { kept: { spread: 30 } })[0]?.kind).toBe('held')
    expect(pair(25.98, { kept: { spread: 30 } }, { kept: { spread: 30 } })[0]?.kind).toBe('conflict')
  })
  test('bulbs are not judged, one that goes neither; a crown passes over another from its top on', () => {
    expect(pair(5, {}, {}, { category: 'bulb' })).toEqual([])
    expect(pair(5, { status: 'goes' })).toEqual([])
    const over = (clearStem: number) => found(makeSheet({
      plants: [grown(80, 80), grown(40, 40, { id: 'p2' })],
      placements: [makePlacement({ planted: { height: 80, spread: 80 }, clearStem }), makePlacement({ id: 'a2', plant: 'p2', x: 250, planted: { height: 40, spread: 40 } })],
    }), 'crowding')
    expect(over(40)).toEqual([])
    expect(over(39.98)).toHaveLength(1)
  })
})

/**
 * Published clearances, asked of the rules one figure at a time: a plant already at the size named stands just clear, then a
 * fiftieth of an inch nearer. City rules are examples of a check stated exactly, not general law.
 */
import { describe, expect, test } from 'vitest'
import type { Sheet } from '@/lib/spacing'
import { cited, findingsOf, grownPlant, placementOf, sheetOf, type Published } from './support'

const CLEMSON: Published = {
  publisher: 'Clemson Cooperative Extension', title: 'Carolina Yards: five mistakes', known: 'read',
  address: 'http://www.clemson.edu/extension/natural_resources/water/carolina_yards/five_mistakes.html',
}
const SEATAC: Published = {
  publisher: 'City of SeaTac, Washington', title: 'Municipal Code 17.56.020', known: 'read',
  address: 'https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html',
}
const TUCSON: Published = {
  publisher: 'City of Tucson, Arizona', title: 'technical standard 5-01', known: 'read',
  address: 'https://codelibrary.amlegal.com/codes/tucson/latest/tucson_az_udc/0-0-0-11447',
}
const IOWA_CITY: Published = {
  publisher: 'City of Iowa City, Iowa', title: 'city code, foliage beside walks', known: 'read',
  address: 'https://codelibrary.amlegal.com/codes/iowacityia/latest/iowacity_ia/0-0-0-24489',
}
const ADA: Published = {
  publisher: 'US Access Board', title: 'ADA Standards 403.5 and 307', known: 'read as quoted',
  address: 'https://www.corada.com/documents/guide-to-the-ada-standards/accessible-routes-402',
}

/** One grown plant on level soil. */
function one(size: { height: number; spread: number }, y: number, changes: Partial<Sheet> = {}): Sheet {
  const plant = grownPlant({ id: 'p1', ...size })
  return sheetOf({ plants: [plant], placements: [placementOf({ y, planted: size })], ...changes })
}

describe('wall-gap', () => {
  test.each([
    [60, 42],
    [72, 48],
  ])(cited('a shrub %i in wide stands with its centre %i in from the wall: half the width and 1 ft', CLEMSON), (spread, y) => {
    expect(findingsOf(one({ height: 40, spread }, y), 'wall-gap')).toEqual([])
    const [finding] = findingsOf(one({ height: 40, spread }, y - 0.02), 'wall-gap')
    expect(finding).toMatchObject({ kind: 'conflict', limit: 12 })
    expect(finding?.measured?.expected).toBeCloseTo(11.98, 6)
    expect(finding?.excess).toBeCloseTo(0.02, 6)
  })
})

describe('sill', () => {
  const window = { id: 'w1', kind: 'window' as const, name: 'Kitchen', x: 84, width: 72, sill: 36, head: 84 }

  test(cited('under a 36 in sill, 36 in out, a plant of 36 in passes and one of 37 in fails', SEATAC), () => {
    expect(findingsOf(one({ height: 36, spread: 30 }, 36, { openings: [window] }), 'sill')).toEqual([])
    const [finding] = findingsOf(one({ height: 37, spread: 30 }, 36, { openings: [window] }), 'sill')
    expect(finding).toMatchObject({ kind: 'conflict', limit: 36, feature: 'w1', placements: ['a1'] })
    expect(finding?.measured?.expected).toBeCloseTo(37, 6)
    expect(finding?.excess).toBeCloseTo(1, 6)
  })

  test(cited('the code looks 5 ft out; the rule still judges there, and only notes what stands farther than 96 in', SEATAC), () => {
    expect(findingsOf(one({ height: 37, spread: 30 }, 60, { openings: [window] }), 'sill')[0]?.kind).toBe('conflict')
    expect(findingsOf(one({ height: 37, spread: 30 }, 96, { openings: [window] }), 'sill')[0]?.kind).toBe('conflict')
    expect(findingsOf(one({ height: 37, spread: 30 }, 97, { openings: [window] }), 'sill')[0]?.kind).toBe('note')
    expect(findingsOf(one({ height: 37, spread: 30 }, 241, { openings: [window] }), 'sill')).toEqual([])
  })

  test('soil that falls lets a plant be taller: 5 % over 5 ft is 3 in (arithmetic)', () => {
    const facade = { ...sheetOf().facade, fall: 0.05 }
    expect(findingsOf(one({ height: 39, spread: 30 }, 60, { openings: [window], facade }), 'sill')).toEqual([])
    expect(findingsOf(one({ height: 39.02, spread: 30 }, 60, { openings: [window], facade }), 'sill')).toHaveLength(1)
  })
})

describe('walk-edge', () => {
  const walk = (depth = 48) => ({
    id: 'k1', name: 'Front walk', outline: [{ x: 0, y: 150 }, { x: 480, y: 150 }, { x: 480, y: 150 + depth }, { x: 0, y: 150 + depth }],
  })
  const shrub = { height: 36, spread: 36 }

  test(cited('a 36 in shrub stands 18 in or more from the walk: half its width', TUCSON), () => {
    expect(findingsOf(one(shrub, 150 - 18, { walks: [walk()] }), 'walk-edge')).toEqual([])
    const [finding] = findingsOf(one(shrub, 150 - 17.98, { walks: [walk()] }), 'walk-edge')
    expect(finding).toMatchObject({ kind: 'conflict', limit: 0, feature: 'k1' })
    expect(finding?.measured?.expected).toBeCloseTo(-0.02, 6)
  })

  test(cited('with foliage kept 12 in off, the same shrub stands 30 in or more away', IOWA_CITY), () => {
    const standards = { 'walk-edge.clearance': 12 }
    expect(findingsOf(one(shrub, 150 - 30, { walks: [walk()], standards }), 'walk-edge')).toEqual([])
    expect(findingsOf(one(shrub, 150 - 29.98, { walks: [walk()], standards }), 'walk-edge')[0]).toMatchObject({ kind: 'conflict', limit: 12 })
  })

  test(cited('the 12 in hold for the first 9 ft of height: foliage at 100 in counts with that headroom, not with 80 in', IOWA_CITY), () => {
    // An upside-down plant for the purpose: all foliage above a clear stem of 90 in.
    const plant = grownPlant({ id: 'p1', height: 200, spread: 80 })
    const placements = [placementOf({ y: 150 - 44, planted: { height: 200, spread: 80 }, clearStem: 90 })]
    const sheet = sheetOf({ plants: [plant], placements, walks: [walk()] })
    expect(findingsOf({ ...sheet, standards: { 'walk-edge.clearance': 12, 'walk-edge.headroom': 108 } }, 'walk-edge')).toHaveLength(1)
    expect(findingsOf({ ...sheet, standards: { 'walk-edge.clearance': 12 } }, 'walk-edge')).toEqual([])
  })

  test(cited('foliage 13 in over a 48 in walk leaves 35 in, under the 36 in of a route', ADA), () => {
    const [finding] = findingsOf(one(shrub, 150 - 5, { walks: [walk(48)] }), 'walk-edge')
    expect(finding?.measured?.expected).toBeCloseTo(-13, 6)
    expect(48 + finding!.measured!.expected!).toBeCloseTo(35, 6)
    expect(48 + finding!.measured!.expected!).toBeLessThan(36)
  })

  test(cited('only what hangs below 80 in is in the way: a crown that starts at 81 in is not', ADA), () => {
    const plant = grownPlant({ id: 'p1', height: 200, spread: 80 })
    const at = (clearStem: number) =>
      findingsOf(sheetOf({ plants: [plant], placements: [placementOf({ y: 130, planted: { height: 200, spread: 80 }, clearStem })], walks: [walk()] }), 'walk-edge')
    expect(at(81)).toEqual([])
    expect(at(79)).toHaveLength(1)
  })
})

/** The twelve habits by their table: how wide at the foot, where widest, and the way back from a radius to its heights. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { crownOf, radiusAt, reach, silhouette, span, type Crown, type When } from '@/lib/spacing'
import { makeCrown } from '@/lib/spacing/crown'
import { HABITS, type Category, type Habit } from '@/lib/plants/types'
import { makePlacement, makePlant, makeSheet } from '../../support/sheets'

/** Share of the half spread at the foot, share of the height where it is widest, exponents above. */
const TABLE: Record<Habit, [base: number, shoulder: number, m: number, n: number]> = {
  columnar: [0.9, 0.8, 2, 2], upright: [0.6, 0.5, 2, 2], pyramidal: [1, 0, 1, 1], rounded: [0.7, 0.45, 2, 2],
  mounded: [1, 0, 2, 2], spreading: [0.8, 0.4, 3, 2], vase: [0.3, 0.75, 2, 2], arching: [0.5, 0.6, 2, 2],
  weeping: [0.9, 0.5, 2, 2], clump: [0.4, 0.65, 2, 2], 'multi-stem': [0.6, 0.5, 2, 2], prostrate: [1, 0, 4, 2],
}
const crown = (habit: Habit, clearStem = 0, kept?: Crown['natural']) =>
  makeCrown({ x: 0, y: 0, z0: 5, habit }, { height: 100 + clearStem, spread: 80, clearStem }, kept)

describe.each(HABITS)('%s', (habit) => {
  const [base, shoulder, m, n] = TABLE[habit]

  test('is so wide at the foot, widest at the shoulder, and closed at the tip', () => {
    const one = crown(habit, 20)
    expect(radiusAt(one, 25)).toBeCloseTo(40 * base, 9)
    expect(radiusAt(one, 25 + 100 * shoulder)).toBeCloseTo(40, 9)
    expect(radiusAt(one, 125)).toBeCloseTo(0, 6)
    expect([24.9, 125.1].map((z) => radiusAt(one, z))).toEqual([0, 0])
  })
  test('halfway up its upper part it is as wide as the formula says', () => {
    expect(radiusAt(crown(habit), 5 + 100 * (shoulder + (1 - shoulder) / 2))).toBeCloseTo(40 * (1 - 0.5 ** m) ** (1 / n), 9)
  })
  test('the span of a radius ends at heights of that radius', () => {
    for (const share of [0.2, 0.5, 0.75, 0.95]) {
      const { from, to } = span(crown(habit), 40 * share)!
      expect(radiusAt(crown(habit), to)).toBeCloseTo(40 * share, 6)
      if (share > base) expect(radiusAt(crown(habit), from)).toBeCloseTo(40 * share, 6)
      else expect(from).toBe(5)
    }
  })
  test('reaches its half spread over all, and what it is at the nearer end of a part', () => {
    const widest = 5 + 100 * shoulder
    expect(reach(crown(habit), -100, 500)).toBeCloseTo(40, 9)
    expect(reach(crown(habit), widest + 10, 500)).toBeCloseTo(radiusAt(crown(habit), widest + 10), 9)
    if (shoulder > 0) expect(reach(crown(habit), -100, widest - 10)).toBeCloseTo(radiusAt(crown(habit), widest - 10), 9)
    expect([reach(crown(habit), -10, 5), reach(crown(habit), 105, 200)]).toEqual([0, 0])
  })
  test('shears cut it straight and flat, nowhere else', () => {
    const cut = crown(habit, 0, { height: 60, spread: 50 })
    for (let z = 5.5; z < 65; z += 1) expect(radiusAt(cut, z)).toBeCloseTo(Math.min(25, radiusAt(crown(habit), z)), 9)
    expect(radiusAt(cut, 65.1)).toBe(0)
    expect(cut.spread).toBeCloseTo(50, 9)
  })
  test('cut below its widest point its spread is what is left', () => {
    const cut = crown(habit, 0, { height: 20, spread: 500 })
    expect(cut.spread).toBeCloseTo(2 * radiusAt(crown(habit), 5 + Math.min(20, 100 * shoulder)), 9)
  })
  test('its outline is a closed shape of its own size', () => {
    const outline = silhouette(crown(habit, 20))
    expect(Math.max(...outline.map(({ x }) => x))).toBeCloseTo(40, 9)
    expect(Math.min(...outline.map(({ z }) => z))).toBe(25)
    expect(Math.max(...outline.map(({ z }) => z))).toBeCloseTo(125, 9)
  })
})

test('a kept size no smaller than the plant changes nothing', () => {
  fc.assert(fc.property(fc.constantFrom(...HABITS), fc.double({ min: 1, max: 3, noNaN: true }), (habit, more) => {
    expect(crown(habit, 10, { height: 110 * more, spread: 80 * more })).toEqual(crown(habit, 10))
  }), { seed: 11, numRuns: 50 })
})

describe('contacts of a hundredth', () => {
  test('a crown that shares less than 0.01 in of height or of radius shares nothing', () => {
    const dome = crown('mounded')
    expect([reach(dome, 104.991, 200), reach(dome, -5, 5.009)]).toEqual([0, 0])
    expect(reach(dome, 104.98, 200)).toBeGreaterThan(0)
    expect([span(dome, 39.991), span(dome, 40), span(dome, 41)]).toEqual([null, null, null])
    expect(span(dome, 39.98)).not.toBeNull()
  })
  test('asked of its own axis it is there from foot to tip', () => expect(span(crown('vase', 20), 0)).toEqual({ from: 25, to: 125 }))
})

describe('the clear stem', () => {
  const stem = (habit: Habit, height: number, changes = {}, { year = 'mature', category = 'tree' }: { year?: When; category?: Category } = {}) => crownOf({
    plant: makePlant({ category, habit, heightMin: height, heightMax: height }), placement: makePlacement(changes),
    facade: makeSheet().facade, zone: '6a', bound: 'expected', year,
  }).clearStem

  test('of a tree from 180 in up is 0.15 of its height at any age', () => {
    expect(stem('rounded', 180)).toBeCloseTo(27, 9)
    expect(stem('rounded', 179.9)).toBe(0)
    expect(stem('rounded', 180, {}, { year: 0 })).toBeCloseTo(1.8, 9)
  })
  test.each(['pyramidal', 'columnar', 'weeping', 'multi-stem'] as const)('of a %s tree is none', (habit) => expect(stem(habit, 300)).toBe(0))
  test('of a shrub is none', () => expect(stem('rounded', 300, {}, { category: 'shrub' })).toBe(0))
  test('as set is in inches, none too, and at most 0.6 of the height at that age', () => {
    expect(stem('rounded', 300, { clearStem: 84 })).toBe(84)
    expect(stem('rounded', 300, { clearStem: 0 })).toBe(0)
    expect(stem('rounded', 300, { clearStem: 84 }, { year: 0 })).toBeCloseTo(7.2, 9)
  })
})

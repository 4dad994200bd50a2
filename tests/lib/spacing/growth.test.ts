import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { BOUNDS, matureSize, sizeAt, sizeRange, yearOfHeight, zoneNumber, type Bound } from '@/lib/spacing'
import { CATEGORIES, GROWTHS, type Plant } from '@/lib/plants/types'
import { makePlacement, makePlant } from '../../support/sheets'

test('a single figure spreads by 15 %, a tree grows to 1.2 times its largest', () => {
  const one = makePlant({ heightMin: 100, heightMax: 100, spreadMin: 40, spreadMax: 60 })
  expect(BOUNDS.map((bound) => sizeRange(one, bound).height)).toEqual([85, 100, expect.closeTo(115, 9)])
  expect(BOUNDS.map((bound) => sizeRange({ ...one, category: 'tree' }, bound))).toMatchObject([{ height: 85, spread: 40 }, { height: 100, spread: 50 }, { height: 120, spread: 72 }])
})

test('the year of a height is the inverse of the height in a year', () => {
  fc.assert(fc.property(fc.constantFrom(...CATEGORIES), fc.constantFrom(...GROWTHS), fc.constantFrom(...BOUNDS), fc.double({ min: 0.05, max: 0.95, noNaN: true }), (category, growth, bound, share) => {
    const args = { plant: makePlant({ category, growth, heightMin: 60, heightMax: 90 }), placement: makePlacement(), zone: '7b', bound }
    const height = 12 + share * (sizeAt({ ...args, year: 'mature' }).height - 12)
    const year = yearOfHeight({ ...args, height })!
    expect(sizeAt({ ...args, year }).height).toBeCloseTo(height, 6)
  }), { seed: 12 })
})

test('nothing shrinks, and a plant that stays grows from the first day', () => {
  const placement = makePlacement({ planted: { height: 200, spread: 10 } })
  const args = { plant: makePlant(), placement, zone: '6a', bound: 'low' as const }
  expect(sizeAt({ ...args, year: 'mature' })).toEqual({ height: 200, spread: 36 })
  expect(sizeAt({ ...args, year: 2 }).spread).toBe(10)
  expect(sizeAt({ ...args, placement: { ...placement, status: 'stays' }, year: 1 }).spread).toBeGreaterThan(10)
})

test('planted larger than listed it is that large at every bound, per dimension', () => {
  const plant = makePlant({ heightMin: 40, heightMax: 60, spreadMin: 40, spreadMax: 60 })
  const at = (bound: Bound) => matureSize(plant, { planted: { height: 55, spread: 10 } }, bound)
  expect(BOUNDS.map(at)).toEqual([{ height: 55, spread: 40 }, { height: 55, spread: 50 }, { height: 60, spread: 60 }])
})

describe('speed of growth', () => {
  const args = (changes: Partial<Plant>, bound: Bound, zone = '6a') =>
    ({ plant: makePlant({ heightMin: 112, heightMax: 112, spreadMin: 30, spreadMax: 30, ...changes }), placement: makePlacement(), zone, bound })
  /** Inches a year at the moment it breaks free. */
  const speed = (changes: Partial<Plant>, bound: Bound, zone?: string) => {
    const one = args(changes, bound, zone)
    const lag = { low: 2, expected: 1, high: 0 }[bound]
    return (sizeAt({ ...one, year: lag + 1e-6 }).height - 12) / 1e-6
  }

  test.each([
    ['tree', 'deciduous', 'slow', [6, 12, 20]], ['tree', 'needle-evergreen', 'moderate', [9, 18, 32]], ['tree', 'deciduous', 'fast', [16, 30, 48]],
    ['shrub', 'deciduous', 'slow', [3, 5, 8]], ['vine', 'deciduous', 'moderate', [7, 10, 14]], ['shrub', 'broadleaf-evergreen', 'fast', [13, 18, 24]],
    ['shrub', 'needle-evergreen', 'slow', [1, 3, 6]], ['shrub', 'scale-evergreen', 'moderate', [6, 8, 12]], ['groundcover', 'needle-evergreen', 'fast', [12, 15, 20]],
  ] as const)('%s, %s, %s: %j in/yr, from years 2, 1 and 0', (category, leaf, growth, rates) => {
    BOUNDS.forEach((bound, i) => {
      expect(speed({ category, leaf, growth }, bound)).toBeCloseTo(rates[i]!, 2)
      expect(sizeAt({ ...args({ category, leaf, growth }, bound), year: 2 - i }).height).toBe(12)
    })
  })

  test('grows with the zone, within limits; half zones count a half', () => {
    expect([zoneNumber('6a'), zoneNumber('6b'), zoneNumber('13b')]).toEqual([6, 6.5, 13.5])
    expect(speed({}, 'expected', '6b') / 10).toBeCloseTo(1.04, 3)
    expect(speed({}, 'expected', '3a') / 10).toBeCloseTo(0.76, 3)
    expect(speed({}, 'expected', '1a') / 10).toBeCloseTo(0.76, 3)
    expect(speed({}, 'expected', '11a') / 10).toBeCloseTo(1.4, 3)
    expect(speed({}, 'expected', '13b') / 10).toBeCloseTo(1.4, 3)
  })

  test('the larger gain of the two sets the pace of both', () => {
    const one = args({ spreadMin: 212, spreadMax: 212 }, 'high')
    const { height, spread } = sizeAt({ ...one, year: 3 })
    const mature = sizeAt({ ...one, year: 'mature' })
    expect((height - 12) / (mature.height - 12)).toBeCloseTo((spread - 12) / (mature.spread - 12), 9)
    expect((spread - 12) / (mature.spread - 12)).toBeCloseTo(1 - Math.exp((-14 * 3) / (mature.spread - 12)), 9)
  })
})

describe('herbaceous plants', () => {
  test.each([
    ['perennial', 'slow', 3], ['grass', 'fast', 3], ['fern', 'moderate', 4], ['bulb', 'moderate', 1], ['annual', 'moderate', 1],
    ['groundcover', 'slow', 5], ['groundcover', 'moderate', 3], ['groundcover', 'fast', 2],
  ] as const)('a %s of %s growth has 95 %% of its size after %i years, at every bound and in every zone', (category, growth, years) => {
    for (const bound of BOUNDS) {
      for (const zone of ['3a', '9b']) {
        const args = { plant: makePlant({ category, growth, leaf: 'herbaceous' }), placement: makePlacement(), zone, bound }
        const mature = sizeAt({ ...args, year: 'mature' }).height
        expect((sizeAt({ ...args, year: years }).height - 12) / (mature - 12)).toBeCloseTo(0.95, 9)
      }
    }
  })
})

test('the year of a height: none if it is that tall already, never if it does not grow that tall', () => {
  const args = { plant: makePlant(), placement: makePlacement(), zone: '6a', bound: 'expected' as const }
  expect(yearOfHeight({ ...args, height: 12 })).toBe(0)
  expect(yearOfHeight({ ...args, height: 48 })).toBeNull()
  expect(yearOfHeight({ ...args, height: 12.0001 })).toBeCloseTo(1, 3)
})

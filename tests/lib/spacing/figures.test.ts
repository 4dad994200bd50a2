/** Pockets, annuals and upkeep by hand. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { annualsIn, check, distanceToPolygon, type Placement } from '@/lib/spacing'
import { anySheet, grown, makeBed, makePlacement, makePlant, makeSheet, rectangle } from '../../support/sheets'

describe('annuals', () => {
  /** Bloomin Designs, plant calculator, https://www.bloomindesigns.com/plant-calculator/: 144/s^2 to the square foot, staggered 2/sqrt 3 as many. */
  test('a circle of 100 sq ft takes what the tables give for 100 sq ft', () => {
    const across = 2 * Math.sqrt((100 * 144) / Math.PI)
    expect([8, 10, 15, 18, 36].map((spacing) => annualsIn(across - 1e-6, spacing))).toEqual([225, 144, 64, 45, 12])
    expect(annualsIn(across - 1e-6, 12, 'staggered')).toBe(116)
  })
})

describe('pockets', () => {
  const pockets = (outline: ReturnType<typeof rectangle>, placements: Partial<Placement>[] = []) =>
    check(makeSheet({ beds: [makeBed({ outline })], plants: [grown(20, 40)], placements: placements.map((place, i) => makePlacement({ id: `a${i}`, planted: { height: 20, spread: 40 }, ...place })) })).pockets

  test('of an empty square: the circle that fills it, then nothing as wide as 18 in in the corners', () => {
    const found = pockets(rectangle(0, 60, 0, 60))
    expect(found).toHaveLength(1)
    expect(found[0]).toMatchObject({ bed: 'b1', x: expect.closeTo(30, 0), y: expect.closeTo(30, 0), annuals: 20 })
    expect(found[0]!.diameter).toBeCloseTo(60, 0)
  })
  test('beside a grown plant: as far as its expected crown leaves', () => {
    // A strip 48 deep, the crown takes x 100 to 140: at either end room for a circle of the whole depth.
    const found = pockets(rectangle(40, 200, 0, 48), [{ x: 120, y: 24 }])
    expect(found.slice(0, 2).map(({ diameter }) => Math.round(diameter))).toEqual([48, 48])
  })
  test('beds that overlap share no pocket', () => {
    const sheet = makeSheet({ beds: [makeBed({ outline: rectangle(0, 60, 0, 60) }), makeBed({ id: 'b2', outline: rectangle(20, 80, 0, 60) })] })
    const [one, other] = check(sheet).pockets
    expect(Math.hypot(one!.x - other!.x, one!.y - other!.y)).toBeGreaterThanOrEqual((one!.diameter + other!.diameter) / 2 - 1e-6)
  })
  test('a strip narrower than 18 in has none', () => {
    expect(pockets(rectangle(0, 300, 0, 17.9))).toEqual([])
    expect(pockets(rectangle(0, 40, 0, 18.6))).not.toEqual([])
  })
  test('on any sheet they lie in their bed, free of crowns and of each other', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      const found = check(sheet).pockets
      for (const [i, { bed, x, y, diameter }] of found.entries()) {
        expect(diameter).toBeGreaterThanOrEqual(18)
        const { outline } = sheet.beds.find(({ id }) => id === bed)!
        expect(-distanceToPolygon({ x, y }, outline)).toBeGreaterThanOrEqual(diameter / 2 - 1e-6)
        for (const other of found.slice(0, i)) {
          expect(Math.hypot(x - other.x, y - other.y)).toBeGreaterThanOrEqual((diameter + other.diameter) / 2 - 1e-6)
        }
      }
    }), { numRuns: 30, seed: 20261201 })
  })
})

describe('upkeep', () => {
  // Moderate shrub in zone 6a: 10 in a year at first, expected 60 by 60.
  const plant = makePlant({ heightMin: 60, heightMax: 60, spreadMin: 60, spreadMax: 60 })
  const upkeep = (kept: Placement['kept'], standards = {}) => check(makeSheet({ plants: [plant], placements: [makePlacement({ ...(kept && { kept }) })], standards })).upkeep

  test('one clipping for each 6 in of a year\'s regrowth', () => {
    // From 36 in 24 are to come, k = 10/24: 24 x (1 - exp(-10/24)) = 8.2 in in a year, two clippings. From 55 in 4.3: one.
    expect(upkeep({ height: 36 })).toEqual([{ placement: 'a1', clippingsPerYear: 2, minutesPerYear: 10, minutesOverTenYears: 100 }])
    expect(upkeep({ height: 55 })[0]).toMatchObject({ clippingsPerYear: 1, minutesPerYear: 12 })
  })
  test('taller plants take longer, by the studio\'s own minutes', () => {
    expect(upkeep({ height: 48 })[0]).toMatchObject({ minutesPerYear: 24 })
    expect(upkeep({ height: 48 }, { 'upkeep.reached': 30 })[0]).toMatchObject({ minutesPerYear: 60, minutesOverTenYears: 600 })
  })
  test('what it never outgrows costs nothing, and what is not kept is not told of', () => {
    expect(upkeep({ height: 80 })[0]).toMatchObject({ clippingsPerYear: 0, minutesPerYear: 0 })
    expect(upkeep(undefined)).toEqual([])
  })
})

test('shares grow with the years, and stand in the order of the sheet', () => {
  const sheet = makeSheet({ beds: [makeBed(), makeBed({ id: 'b0', outline: rectangle(500, 600, 0, 96) })], plants: [makePlant()], placements: [makePlacement()] })
  const { cover } = check(sheet)
  expect(cover.map(({ id }) => id)).toEqual(['b1', 'b0'])
  const years = Object.values(cover[0]!.expected)
  expect([...years].sort((a, b) => a - b)).toEqual(years)
  expect(cover[0]!.low.mature).toBeLessThan(cover[0]!.high.mature)
  expect(Object.values(cover[1]!.high)).toEqual([0, 0, 0, 0, 0, 0, 0])
})

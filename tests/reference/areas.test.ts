/** Plants per area, areas and mulch against published tables. */
import { describe, expect, test } from 'vitest'
import { plantsInArea, polygonArea } from '@/lib/spacing'
import { mulchFor } from '@/lib/takeoff'

const SQ_FT = 144

/** Glover Perennials, plants per area, https://gloverperennials.com/?p=2150 (read). */
describe('a square grid, Glover Perennials', () => {
  test.each([[6, 400], [8, 225], [10, 144], [12, 100], [15, 64], [24, 25]])('100 sq ft at %i in takes %i', (spacing, plants) => {
    expect(plantsInArea(100 * SQ_FT, spacing)).toBeCloseTo(plants, 9)
  })
  test('at 18 and 36 in the table shows 44 and 11: 45 and 12 are ordered', () => {
    expect(plantsInArea(100 * SQ_FT, 18)).toBeCloseTo(44.44, 2)
    expect(plantsInArea(100 * SQ_FT, 36)).toBeCloseTo(11.11, 2)
    expect([18, 36].map((spacing) => Math.ceil(plantsInArea(100 * SQ_FT, spacing)))).toEqual([45, 12])
  })
  test('500 sq ft at 10 in takes 720', () => {
    expect(plantsInArea(500 * SQ_FT, 10)).toBeCloseTo(720, 9)
  })
})

/** scgardenguru.com, plants per square foot, http://www.scgardenguru.com/plants-needed-per-square-foot.html (read; arithmetic). */
test('6 by 4 ft at 6 in: 24 sq ft and 96 plants; a circle of 5 ft radius is 78.54 sq ft', () => {
  const area = polygonArea([{ x: 0, y: 0 }, { x: 72, y: 0 }, { x: 72, y: 48 }, { x: 0, y: 48 }])
  expect(area / SQ_FT).toBe(24)
  expect(plantsInArea(area, 6)).toBe(96)
  const circle = Array.from({ length: 720 }, (_, i) => ({ x: 60 * Math.cos((i * Math.PI) / 360), y: 60 * Math.sin((i * Math.PI) / 360) }))
  expect(Math.abs(polygonArea(circle) / SQ_FT - 78.54)).toBeLessThan(0.05)
})

/** Bloomin Designs, plant calculator, https://www.bloomindesigns.com/plant-calculator/ (read). */
test('staggered at 12 in: 115.47 to 100 sq ft, 116 ordered', () => {
  expect(plantsInArea(100 * SQ_FT, 12, 'staggered')).toBeCloseTo(115.47, 2)
  expect(Math.ceil(plantsInArea(100 * SQ_FT, 12, 'staggered'))).toBe(116)
})

/** McShane Nursery, spacing chart, http://mcshanesnursery.com/how-to-space-flowers-ground-covers-evenly/ (read): 36 plants cover 31 sq ft. */
test('36 plants staggered at 12 in cover 31.18 sq ft', () => {
  expect(36 / plantsInArea(SQ_FT, 12, 'staggered')).toBeCloseTo(31.18, 1)
})

describe('mulch', () => {
  /** Country Garden Center of Bel Air, http://countrygardencenterofbelair.com/Mulch%20Coverage.htm (read). */
  test('500 sq ft at 3 in: 125 cu ft, 4.63 cu yd, 5 ordered', () => {
    const { cubicFeet, cubicYards, order } = mulchFor(500, 3)
    expect(cubicFeet).toBeCloseTo(125, 9)
    expect(cubicYards).toBeCloseTo(4.63, 2)
    expect(order).toBe(5)
  })
  /** Jeperdue Landscaping, mulch coverage, https://www.jeperduelandscaping.com/shop/mulch/ (read). */
  test.each([[324, 1], [162, 2], [108, 3], [81, 4], [64.8, 5]])('one yard covers %f sq ft %i in deep', (area, depth) => {
    expect(mulchFor(area, depth).cubicYards).toBeCloseTo(1, 9)
    expect(mulchFor(area, depth).order).toBe(1)
  })
  /** Cornell Waste Management Institute, compost volume formula, http://compost.css.cornell.edu/market-label/guidelines/formula.htm (read; prints 434 with a rounded factor). */
  test('70,000 sq ft at 2 in take 432.1 cu yd', () => {
    expect(Math.abs(mulchFor(70_000, 2).cubicYards - 432.1)).toBeLessThan(0.1)
  })
})

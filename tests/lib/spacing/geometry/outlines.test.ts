/** Where points lie exactly on something: walls with jogs, edges, outlines that touch or fold. */
import { describe, expect, test } from 'vitest'
import { distanceToPolygon, groundAt, pointInPolygon, polygonArea, polygonCrossesItself, wallDistance, wallY, type Point } from '@/lib/spacing'

const points = (...pairs: [number, number][]): Point[] => pairs.map(([x, y]) => ({ x, y }))
const walls = (...pairs: [number, number][]) => ({ wall: points(...pairs), grade: [{ x: 0, z: 10 }], fall: 0.05 })

describe('the wall', () => {
  const back = walls([0, 30], [100, 30], [100, 0], [200, 0])
  const slanted = walls([0, 0], [100, 75])

  test('stepping back, a jog is still at the wall nearer the viewer', () => {
    expect([99.99, 100, 100.01].map((x) => wallY(back, x))).toEqual([30, 30, 0])
  })
  test('a point on a return is on the wall, one beside it as far as it is from the return', () => {
    expect(Math.abs(wallDistance(back, 100, 15))).toBe(0)
    expect(wallDistance(back, 104, 15)).toBe(4)
    expect(wallDistance(back, 96, 15)).toBe(-4)
  })
  test('past an outer corner the distance is to the corner itself', () => expect(wallDistance(back, 103, 34)).toBe(5))
  test('beyond the house corners it is never negative, however far behind the line', () => {
    expect(wallDistance(back, -3, 26)).toBe(5)
    expect(wallDistance(back, 203, -4)).toBe(5)
    expect(wallDistance(back, 200, -4)).toBe(-4)
  })
  test('a slanted wall is measured square to itself', () => {
    expect(wallY(slanted, 40)).toBe(30)
    expect(wallDistance(slanted, 40 - 6, 30 + 8)).toBeCloseTo(10, 9)
    expect(wallDistance(slanted, 40 + 6, 30 - 8)).toBeCloseTo(-10, 9)
  })
  test('soil falls with the distance to the wall, returns included, rises where the fall is negative, and is level behind', () => {
    expect(groundAt(back, 104, 15)).toBeCloseTo(9.8, 9)
    expect(groundAt({ ...back, fall: -0.05 }, 104, 15)).toBeCloseTo(10.2, 9)
    expect(groundAt(back, 96, 15)).toBe(10)
    expect(groundAt(back, -3, 26)).toBeCloseTo(9.75, 9)
  })
})

describe('outlines', () => {
  const notched = points([0, 0], [60, 0], [60, 40], [40, 40], [40, 20], [20, 20], [20, 40], [0, 40])

  test('corners, sides and slanted sides count as inside, a fiftieth past them does not', () => {
    const triangle = points([0, 0], [90, 0], [0, 30])
    expect(pointInPolygon({ x: 0, y: 0 }, triangle)).toBe(true)
    expect(pointInPolygon({ x: 45, y: 15 }, triangle)).toBe(true)
    expect(pointInPolygon({ x: 10, y: 80 / 3 }, triangle)).toBe(true)
    expect(pointInPolygon({ x: 45, y: 15.03 }, triangle)).toBe(false)
    expect(Math.abs(distanceToPolygon({ x: 45, y: 15 }, triangle))).toBeCloseTo(0, 9)
  })
  test('a notch is outside, whichever way the outline runs', () => {
    for (const outline of [notched, notched.toReversed()]) {
      expect(pointInPolygon({ x: 30, y: 30 }, outline)).toBe(false)
      expect(distanceToPolygon({ x: 30, y: 26 }, outline)).toBe(6)
      expect(distanceToPolygon({ x: 30, y: 14 }, outline)).toBe(-6)
      expect(Math.abs(polygonArea(outline))).toBe(2000)
      expect(polygonCrossesItself(outline)).toBe(false)
    }
  })
  test('a level line through corners does not miscount them', () => {
    const diamond = points([0, 0], [10, 10], [0, 20], [-10, 10])
    expect([-20, -10, 0, 10, 20].map((x) => pointInPolygon({ x, y: 10 }, diamond))).toEqual([false, true, true, true, false])
  })
  test.each([
    ['a bow tie', points([0, 0], [10, 10], [10, 0], [0, 10])],
    ['a side that folds back over the one before', points([0, 0], [20, 0], [10, 0], [10, 10], [0, 10])],
    ['a corner that touches a side', points([0, 0], [20, 0], [20, 10], [10, 0], [0, 10])],
    ['two corners at one spot', points([0, 0], [10, 10], [20, 0], [20, 20], [10, 10], [0, 20])],
    ['a line there and back', points([0, 0], [10, 0], [0, 0])],
  ])('%s crosses itself, from whichever corner it is told', (_what, outline) => {
    outline.forEach((_, i) => expect(polygonCrossesItself([...outline.slice(i), ...outline.slice(0, i)])).toBe(true))
  })
  test('corners in the middle of a straight side and points said twice do no harm', () => {
    expect(polygonCrossesItself(points([0, 0], [10, 0], [20, 0], [20, 20], [0, 20]))).toBe(false)
    expect(polygonCrossesItself(points([0, 0], [0, 0], [20, 0], [20, 20], [20, 20], [0, 20], [0, 0]))).toBe(false)
  })
})

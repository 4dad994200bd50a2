import { expect, test } from 'vitest'
import { distanceToPolygon, gradeAt, groundAt, pointInPolygon, polygonArea, polygonCrossesItself, wallDistance, wallY } from '@/lib/spacing'
import { makeSheet, rectangle } from '../../../support/sheets'

const facade = { ...makeSheet().facade, wall: [{ x: 0, y: 0 }, { x: 100, y: 0 }, { x: 100, y: 30 }, { x: 200, y: 30 }], grade: [{ x: 0, z: 0 }, { x: 100, z: -10 }], fall: 0.1 }

test('at a jog the wall is the one nearer the viewer; beyond the corners it is flat', () => {
  expect([-5, 50, 100, 150, 300].map((x) => wallY(facade, x))).toEqual([0, 0, 30, 30, 30])
})
test('the distance to the wall counts returns and is negative behind it, never beyond the corners', () => {
  expect(wallDistance(facade, 90, 20)).toBe(10)
  expect(wallDistance(facade, 150, 20)).toBe(-10)
  expect(wallDistance(facade, 203, 26)).toBe(5)
})
test('soil is linear between points, flat beyond, and falls with the distance', () => {
  expect([-9, 50, 400].map((x) => gradeAt(facade, x))).toEqual([0, -5, -10])
  expect(groundAt(facade, 50, 40)).toBeCloseTo(-9, 9)
  expect(groundAt(facade, 150, 20)).toBe(-10)
})
test('outlines: signed area, the edge inside, distance negative inside, crossings', () => {
  const square = rectangle(0, 10, 0, 10)
  expect(polygonArea(square)).toBe(100)
  expect(polygonArea(square.toReversed())).toBe(-100)
  expect([pointInPolygon({ x: 10, y: 5 }, square), pointInPolygon({ x: 10.02, y: 5 }, square)]).toEqual([true, false])
  expect(distanceToPolygon({ x: 5, y: 8 }, square)).toBe(-2)
  expect(polygonCrossesItself(square)).toBe(false)
  expect(polygonCrossesItself([square[0]!, square[2]!, square[1]!, square[3]!])).toBe(true)
})

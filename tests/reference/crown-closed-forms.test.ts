/**
 * Crown volumes and silhouettes against closed forms and printed values.
 * Source: crownmetrics (CRAN), vignette "Introduction", sections on the ellipsoid and the cone,
 * https://stat.ethz.ch/CRAN/web/packages/crownmetrics/vignettes/introduction.html (read). Its crown is 3.5 wide and 5.0 long:
 * ellipsoid volume 32.07043, silhouette 13.7445; cone volume 16.03521, silhouette 8.75. The unit plays no part.
 */
import { describe, expect, test } from 'vitest'
import { crownVolume, radiusAt, reach, silhouette, silhouetteArea, span, type Crown } from '@/lib/spacing'

const WIDTH = 3.5
const ELLIPSOID = { length: 5, volume: 32.07043, silhouette: 13.7445 }
const CONE = { length: 5, volume: 16.03521, silhouette: 8.75 }

function crown(changes: Partial<Crown>): Crown {
  return { x: 0, y: 0, z0: 0, height: 5, spread: WIDTH, clearStem: 0, habit: 'mounded', ...changes }
}

function shoelace(points: readonly { x: number; z: number }[]): number {
  const twice = points.reduce((sum, a, i) => {
    const b = points[(i + 1) % points.length]!
    return sum + a.x * b.z - b.x * a.z
  }, 0)
  return Math.abs(twice) / 2
}

describe('a pyramidal crown is a cone', () => {
  const cone = crown({ habit: 'pyramidal', height: CONE.length })

  test('volume and silhouette as printed', () => {
    expect(Math.abs(crownVolume(cone) - CONE.volume)).toBeLessThan(1e-4)
    expect(Math.abs(silhouetteArea(cone) - CONE.silhouette)).toBeLessThan(1e-4)
  })

  test('its radius falls in a straight line, so reach and span are arithmetic', () => {
    expect(radiusAt(cone, 2)).toBeCloseTo(1.75 * 0.6, 9)
    expect(reach(cone, 2, 4)).toBeCloseTo(1.75 * 0.6, 9)
    const at = span(cone, 0.7)
    expect(at?.from).toBeCloseTo(0, 6)
    expect(at?.to).toBeCloseTo(3, 6)
  })
})

describe('a mounded crown is the upper half of an ellipsoid', () => {
  test('half of the printed ellipsoid: 2.5 high', () => {
    const half = crown({ height: ELLIPSOID.length / 2 })
    expect(Math.abs(crownVolume(half) - ELLIPSOID.volume / 2)).toBeLessThan(1e-4)
    expect(Math.abs(silhouetteArea(half) - ELLIPSOID.silhouette / 2)).toBeLessThan(1e-4)
  })

  test('5 high it has the volume and silhouette of the whole printed ellipsoid', () => {
    expect(Math.abs(crownVolume(crown({})) - ELLIPSOID.volume)).toBeLessThan(1e-4)
    expect(Math.abs(silhouetteArea(crown({})) - ELLIPSOID.silhouette)).toBeLessThan(1e-4)
  })

  test('on a 3-4-5 triangle', () => {
    const dome = crown({ height: 50, spread: 100 })
    expect(radiusAt(dome, 30)).toBeCloseTo(40, 9)
    expect(reach(dome, 30, 45)).toBeCloseTo(40, 9)
    expect(span(dome, 30)?.to).toBeCloseTo(40, 6)
  })
})

test.each(['pyramidal', 'mounded'] as const)('%s: a clear stem only lifts the crown and shortens it', (habit) => {
  const lifted = crown({ habit, z0: -7, height: 9, clearStem: 4 })
  const whole = crown({ habit, height: 5 })
  expect(crownVolume(lifted)).toBeCloseTo(crownVolume(whole), 6)
  expect(silhouetteArea(lifted)).toBeCloseTo(silhouetteArea(whole), 6)
  expect(radiusAt(lifted, -7 + 3.9)).toBe(0)
  expect(radiusAt(lifted, -7 + 4 + 2)).toBeCloseTo(radiusAt(whole, 2), 9)
})

test.each(['pyramidal', 'mounded'] as const)('%s: the drawn outline encloses the silhouette', (habit) => {
  const drawn = silhouette(crown({ habit, height: 50, spread: 35 }), 400)
  const exact = habit === 'pyramidal' ? (35 * 50) / 2 : (Math.PI * 35 * 50) / 4
  expect(Math.abs(shoelace(drawn) - exact) / exact).toBeLessThan(2e-3)
})

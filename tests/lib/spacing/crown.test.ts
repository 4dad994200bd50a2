import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { crownVolume, radiusAt, reach, silhouetteArea, span, type Crown } from '@/lib/spacing'
import { makeCrown, overlapOf } from '@/lib/spacing/crown'
import { HABITS } from '@/lib/plants/types'

const size = fc.double({ min: 5, max: 200, noNaN: true })
const anyCrown = fc.record({ habit: fc.constantFrom(...HABITS), height: size, spread: size, stem: fc.double({ min: 0, max: 0.6, noNaN: true }), kept: fc.option(fc.record({ height: size, spread: size }), { nil: undefined }) })
  .map(({ habit, height, spread, stem, kept }): Crown => makeCrown({ x: 0, y: 0, z0: 3, habit }, { height, spread, clearStem: stem * height }, kept))

const levels = (crown: Crown, steps = 4000) => Array.from({ length: steps + 1 }, (_, i) => crown.z0 + crown.clearStem + ((crown.height - crown.clearStem) * i) / steps)
const sum = (crown: Crown, f: (r: number) => number) => {
  const zs = levels(crown)
  return zs.slice(1).reduce((total, z, i) => total + f(radiusAt(crown, (z + zs[i]!) / 2)) * (z - zs[i]!), 0)
}

describe('a crown of any habit, cut or not', () => {
  test('has the volume and silhouette that thin slices add up to', () => {
    fc.assert(fc.property(anyCrown, (crown) => {
      expect(crownVolume(crown) / sum(crown, (r) => Math.PI * r * r)).toBeCloseTo(1, 3)
      expect(silhouetteArea(crown) / sum(crown, (r) => 2 * r)).toBeCloseTo(1, 3)
    }), { seed: 10, numRuns: 80 })
  })

  test('reaches as far as the widest of its levels, and spans where it is that wide', () => {
    fc.assert(fc.property(anyCrown, fc.double({ min: 0, max: 1, noNaN: true }), (crown, share) => {
      const widest = Math.max(...levels(crown).map((z) => radiusAt(crown, z)))
      expect(Math.abs(reach(crown, -Infinity, Infinity) - widest)).toBeLessThan(0.05)
      expect(Math.abs(crown.spread / 2 - widest)).toBeLessThan(0.05)
      const d = (share * crown.spread) / 2
      const part = span(crown, d)
      if (!part) return
      for (const z of levels(crown, 200)) {
        if (z > part.from + 1e-6 && z < part.to - 1e-6) expect(radiusAt(crown, z)).toBeGreaterThanOrEqual(d - 1e-6)
        if (z < part.from - 1e-6 || z > part.to + 1e-6) expect(radiusAt(crown, z)).toBeLessThanOrEqual(d + 1e-6)
      }
    }), { seed: 10, numRuns: 80 })
  })

  test('overlaps another by the largest sum of radii on shared levels', () => {
    fc.assert(fc.property(anyCrown, anyCrown, (a, b) => {
      const low = Math.max(a.z0 + a.clearStem, b.z0 + b.clearStem)
      const high = Math.min(a.z0 + a.height, b.z0 + b.height)
      const overlap = overlapOf(a, b, 7)
      if (high - low <= 0.01) {
        expect(overlap).toBeNull()
        return
      }
      const sums = Array.from({ length: 3001 }, (_, i) => low + ((high - low) * i) / 3000).map((z) => radiusAt(a, z) + radiusAt(b, z))
      const most = Math.max(...sums) - 7
      expect(overlap!).toBeGreaterThanOrEqual(most - 1e-6)
      expect(overlap! - most).toBeLessThan(0.5)
      expect(overlapOf(b, a, 7)).toBeCloseTo(overlap!, 6)
    }), { seed: 10, numRuns: 150 })
  })
})

test('a range that shares only a contact with the crown has no reach', () => {
  const crown = makeCrown({ x: 0, y: 0, z0: 0, habit: 'mounded' }, { height: 30, spread: 40, clearStem: 0 })
  expect(reach(crown, -5, 0.01)).toBe(0)
  expect(reach(crown, -5, 0.02)).toBeCloseTo(20, 4)
  expect(span(crown, 19.991)).toBeNull()
  expect(span(crown, 19.98)).not.toBeNull()
})

test('a kept height lowers the clear stem to 0.6 of itself', () => {
  const crown = makeCrown({ x: 0, y: 0, z0: 0, habit: 'rounded' }, { height: 100, spread: 40, clearStem: 50 }, { height: 40 })
  expect(crown).toMatchObject({ height: 40, clearStem: 24 })
})

import fc from 'fast-check'
import { expect, test } from 'vitest'
import { BOUNDS, sizeAt, sizeRange, yearOfHeight } from '@/lib/spacing'
import { CATEGORIES, GROWTHS } from '@/lib/plants/types'
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
  }))
})

test('nothing shrinks, and a plant that stays grows from the first day', () => {
  const placement = makePlacement({ planted: { height: 200, spread: 10 } })
  const args = { plant: makePlant(), placement, zone: '6a', bound: 'low' as const }
  expect(sizeAt({ ...args, year: 'mature' })).toEqual({ height: 200, spread: 36 })
  expect(sizeAt({ ...args, year: 2 }).spread).toBe(10)
  expect(sizeAt({ ...args, placement: { ...placement, status: 'stays' }, year: 1 }).spread).toBeGreaterThan(10)
})

import { radiusAt, topOf, type Crown } from '../crown'
import { CONTACT } from '../geometry/wall'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Inches } from '../types'
import { judgeSizes, type Measure } from '../verdict'

const GOLDEN = (Math.sqrt(5) - 1) / 2

/** Largest value of a concave function on an interval, by golden-section search, to well under a thousandth of an inch. */
function largest(f: (z: number) => number, from: number, to: number): number {
  let low = from
  let high = to
  let a = high - GOLDEN * (high - low)
  let b = low + GOLDEN * (high - low)
  let fa = f(a)
  let fb = f(b)
  while (high - low > 1e-3) {
    if (fa < fb) {
      low = a
      a = b
      fa = fb
      b = low + GOLDEN * (high - low)
      fb = f(b)
    } else {
      high = b
      b = a
      fb = fa
      a = high - GOLDEN * (high - low)
      fa = f(a)
    }
  }
  return Math.max(fa, fb, f(from), f(to))
}

/** How far two crowns reach into each other at the height where they do so most; null where they share no height. */
export function overlapOf(a: Crown, b: Crown, distance: Inches): Inches | null {
  const from = Math.max(a.z0 + a.clearStem, b.z0 + b.clearStem)
  const to = Math.min(topOf(a), topOf(b))
  if (to - from <= CONTACT) return null
  return largest((z) => radiusAt(a, z) + radiusAt(b, z), from, to) - distance
}

function allowedShare(prepared: Prepared, a: Grown, b: Grown): number {
  const isGroundcover = a.plant.category === 'groundcover' || b.plant.category === 'groundcover'
  const isHedge = a.placement.role === 'hedge' && b.placement.role === 'hedge'
  if (isGroundcover || isHedge) return numberOf(prepared, 'crowding.hedge')
  const isDrift = a.placement.drift !== undefined && a.placement.drift === b.placement.drift
  return numberOf(prepared, isDrift ? 'crowding.drift' : 'crowding.unlike')
}

/** Plants of one season crowd nobody for long. */
export const isSeasonal = ({ plant: { category } }: Grown): boolean => category === 'annual' || category === 'bulb'
export const isOnWall = ({ placement: { role } }: Grown): boolean => role === 'on-wall'

export const crowding: Rule = {
  scope: 'pair',
  meta: {
    id: 'crowding',
    title: 'Crowding',
    question: 'Will it swallow its neighbour?',
    settings: [
      { name: 'crowding.unlike', label: 'Overlap allowed between unlike plants', default: 0.1, min: 0, max: 0.5, unit: 'share' },
      { name: 'crowding.drift', label: 'Overlap allowed within one drift', default: 0.25, min: 0, max: 0.75, unit: 'share' },
      { name: 'crowding.hedge', label: 'Overlap allowed in a hedge or over groundcover', default: 0.5, min: 0, max: 1, unit: 'share' },
    ],
    sources: [
      { publisher: 'Petal Pushers Farm', title: 'Plant spacing: unlike plants at half the sum of their spreads', address: 'https://petalpushersfarm.com/blog?post=20&title=Plants', known: 'read' },
      { publisher: 'Common practice', title: 'The shares of overlap allowed', address: null, known: 'practice' },
    ],
    notes: 'The share is taken of the smaller unclipped spread at the same bound and age.',
  },
  judge: (prepared, a, b) => {
    if (isSeasonal(a) || isSeasonal(b) || isOnWall(a) || isOnWall(b) || (a.stays && b.stays)) return null
    const distance = Math.hypot(a.placement.x - b.placement.x, a.placement.y - b.placement.y)
    if (distance >= a.widest + b.widest) return null
    const limit = allowedShare(prepared, a, b)
    return judgeSizes({
      rule: 'crowding', placements: [a.placement.id, b.placement.id].sort(), feature: null, limit,
      canHold: a.isKept || b.isKept,
      heldAsksExpected: true,
      measure: (bound, year, natural): Measure => {
        const overlap = overlapOf(a.crown(bound, year, natural), b.crown(bound, year, natural), distance)
        if (overlap === null) return { measured: null, excess: -Infinity }
        const smaller = Math.min(a.crown(bound, year, true).spread, b.crown(bound, year, true).spread)
        return { measured: overlap / smaller, excess: overlap - limit * smaller }
      },
    })
  },
}

import { naturalSpread, overlapOf } from '../crown'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import { isOnWall, isSeasonal, judgeSizes, type Measure } from '../verdict'

function allowedShare(prepared: Prepared, a: Grown, b: Grown): number {
  const isGroundcover = a.plant.category === 'groundcover' || b.plant.category === 'groundcover'
  const isHedge = a.placement.role === 'hedge' && b.placement.role === 'hedge'
  if (isGroundcover || isHedge) return numberOf(prepared, 'crowding.hedge')
  const isDrift = a.placement.drift !== undefined && a.placement.drift === b.placement.drift
  return numberOf(prepared, isDrift ? 'crowding.drift' : 'crowding.unlike')
}

export const crowding: Rule = {
  scope: 'pair',
  meta: {
    id: 'crowding',
    title: 'Crowding',
    question: 'Will it swallow its neighbour?',
    measures: 'share',
    settings: [
      { name: 'crowding.unlike', label: 'Overlap allowed between unlike plants', default: 0.1, min: 0, max: 0.5, unit: 'share' },
      { name: 'crowding.drift', label: 'Overlap allowed within one drift', default: 0.25, min: 0, max: 0.75, unit: 'share' },
      { name: 'crowding.hedge', label: 'Overlap allowed in a hedge or over groundcover', default: 0.5, min: 0, max: 1, unit: 'share' },
    ],
    sources: [
      { publisher: 'Petal Pushers Farm', title: 'Plant spacing: unlike plants at half the sum of their spreads', address: 'https://petalpushersfarm.com/blog?post=20&title=Plants', known: 'read' },
      { publisher: 'Common practice', title: 'The shares of overlap allowed', address: null, known: 'practice' },
    ],
    notes: 'The share is taken of the smaller unclipped spread at the same bound and age. A hedge or a groundcover counts before a drift. Crowns without a shared height do not overlap: the share is then 0.',
  },
  judge: (prepared, a, b) => {
    const square = (a.placement.x - b.placement.x) ** 2 + (a.placement.y - b.placement.y) ** 2
    if (square >= (a.widest + b.widest) ** 2) return null
    if (isSeasonal(a) || isSeasonal(b) || isOnWall(a) || isOnWall(b) || (a.stays && b.stays)) return null
    const distance = Math.sqrt(square)
    const limit = allowedShare(prepared, a, b)
    return judgeSizes({
      rule: 'crowding', placements: [a.placement.id, b.placement.id], feature: null, limit,
      canHold: a.isKept || b.isKept,
      heldAsksExpected: true,
      measure: (bound, year, natural): Measure => {
        const one = a.crown(bound, year, natural)
        const other = b.crown(bound, year, natural)
        const smaller = Math.min(naturalSpread(one), naturalSpread(other))
        const overlap = overlapOf(one, other, distance)
        return overlap === null ? { measured: 0, excess: -Infinity } : { measured: overlap / smaller, excess: overlap - limit * smaller }
      },
    })
  },
}

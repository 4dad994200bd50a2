import { footOf, topOf } from '../crown'
import { CONTACT } from '../geometry/contact'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, FindingKind } from '../types'
import { isOnWall, isSeasonal, judgeSizes, type Measure } from '../verdict'

/** Steps are compared within this, so that 12 in written as a sum of fractions is 12 in. */
const NOISE = 1e-9

/** Do the expected crowns, as kept, overlap along the wall by more than the share of the narrower? */
function laps(prepared: Prepared, front: Grown, behind: Grown): boolean {
  const a = front.mature.expected
  const b = behind.mature.expected
  const shared = (a.spread + b.spread) / 2 - Math.abs(a.x - b.x)
  const narrower = Math.min(a.spread, b.spread)
  return Math.min(shared, narrower) - numberOf(prepared, 'layer-order.share') * narrower > CONTACT
}

/** Both in beds, and no bed holds both. */
function areInBedsApart(a: Grown, b: Grown): boolean {
  const [inA, inB] = [a.beds(), b.beds()]
  return inA.length > 0 && inB.length > 0 && !inA.some((bed) => inB.includes(bed))
}

function isJudged(prepared: Prepared, front: Grown, behind: Grown): boolean {
  if (front.plant.id === behind.plant.id || (front.stays && behind.stays)) return false
  if (isSeasonal(front) || isSeasonal(behind) || isOnWall(front) || isOnWall(behind)) return false
  return laps(prepared, front, behind) && !areInBedsApart(front, behind)
}

/** A specimen is meant to stand out; perennials and grasses pass with the season. */
function namedFor({ placement, plant }: Grown): ((kind: FindingKind) => FindingKind) | undefined {
  if (placement.role === 'specimen') return () => 'note'
  const isSoft = plant.category === 'perennial' || plant.category === 'grass'
  return isSoft ? (kind) => (kind === 'conflict' ? 'risk' : kind) : undefined
}

export const layerOrder: Rule = {
  scope: 'pair',
  meta: {
    id: 'layer-order',
    title: 'Layers',
    question: 'Will it hide the plants behind it?',
    settings: [
      { name: 'layer-order.step', label: 'In front from this much nearer the viewer', default: 12, min: 1, max: 60, unit: 'in' },
      { name: 'layer-order.share', label: 'Overlap along the wall from which it counts', default: 0.25, min: 0, max: 1, unit: 'share' },
      { name: 'layer-order.tolerance', label: 'Rise allowed above the plant behind', default: 0, min: 0, max: 36, unit: 'in' },
    ],
    sources: [{ publisher: 'Trade practice', title: 'Low plants in front of tall ones', address: null, known: 'practice' }],
    notes:
      'Whether the front crown starts above the other is asked bound by bound: such a bound is not judged and has no figure. The overlap counts when it passes the share by more than a contact. A specimen in front is a note even where shears hold it.',
  },
  judge: (prepared, a, b): Finding | null => {
    const nearer = a.placement.y - b.placement.y
    if (Math.abs(nearer) < numberOf(prepared, 'layer-order.step') - NOISE) return null
    const [front, behind] = nearer > 0 ? [a, b] : [b, a]
    const limit = numberOf(prepared, 'layer-order.tolerance')
    const lowest = Math.min(topOf(behind.mature.low), topOf(behind.natural.low))
    if (front.tallest - lowest - limit <= CONTACT || !isJudged(prepared, front, behind)) return null
    return judgeSizes({
      rule: 'layer-order', placements: [front.placement.id, behind.placement.id], feature: null, limit,
      canHold: a.isKept || b.isKept,
      heldAsksExpected: true,
      as: namedFor(front),
      measure: (bound, year, natural): Measure => {
        const one = front.crown(bound, year, natural)
        const top = topOf(behind.crown(bound, year, natural))
        if (footOf(one) - top >= -CONTACT) return { measured: null, excess: -Infinity }
        return { measured: topOf(one) - top, excess: topOf(one) - top - limit }
      },
    })
  },
}

import { topOf } from '../crown'
import { pointInPolygon } from '../geometry/polygon'
import { CONTACT } from '../geometry/wall'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding } from '../types'
import { judgeSizes, type Measure } from '../verdict'
import { isOnWall, isSeasonal } from './crowding'

/** Do the expected crowns, as kept, overlap along the wall by the share of the narrower? */
function laps(prepared: Prepared, front: Grown, behind: Grown): boolean {
  const a = front.mature.expected
  const b = behind.mature.expected
  const shared = Math.min(a.x + a.spread / 2, b.x + b.spread / 2) - Math.max(a.x - a.spread / 2, b.x - b.spread / 2)
  return shared > CONTACT && shared >= numberOf(prepared, 'layer-order.share') * Math.min(a.spread, b.spread) - 1e-9
}

/** Both in beds, and no bed holds both. */
function areInBedsApart({ sheet: { beds } }: Prepared, a: Grown, b: Grown): boolean {
  const holds = (one: Grown) => beds.filter(({ outline }) => pointInPolygon(one.placement, outline))
  const inA = holds(a)
  const inB = holds(b)
  return inA.length > 0 && inB.length > 0 && !inA.some((bed) => inB.includes(bed))
}

function isJudged(prepared: Prepared, front: Grown, behind: Grown): boolean {
  if (front.plant.id === behind.plant.id || (front.stays && behind.stays)) return false
  if (isSeasonal(front) || isSeasonal(behind) || isOnWall(front) || isOnWall(behind)) return false
  if (!laps(prepared, front, behind)) return false
  const { z0, clearStem } = front.mature.expected
  return z0 + clearStem < topOf(behind.mature.expected) && !areInBedsApart(prepared, front, behind)
}

export const layerOrder: Rule = {
  scope: 'pair',
  meta: {
    id: 'layer-order',
    title: 'Layers',
    question: 'Will it hide the plants behind it?',
    settings: [
      { name: 'layer-order.step', label: 'In front from this much nearer the viewer', default: 12, min: 1, max: 60, unit: 'in' },
      { name: 'layer-order.share', label: 'Overlap along the wall from which it counts', default: 0.25, min: 0.05, max: 1, unit: 'share' },
      { name: 'layer-order.tolerance', label: 'Rise allowed above the plant behind', default: 0, min: 0, max: 36, unit: 'in' },
    ],
    sources: [{ publisher: 'Trade practice', title: 'Low plants in front of tall ones', address: null, known: 'practice' }],
    notes: 'Whether the front crown starts above the other is asked of the expected crowns as kept.',
  },
  judge: (prepared, a, b): Finding | null => {
    const step = numberOf(prepared, 'layer-order.step')
    const rise = a.placement.y - b.placement.y
    if (Math.abs(rise) < step) return null
    const [front, behind] = rise > 0 ? [a, b] : [b, a]
    if (!isJudged(prepared, front, behind)) return null
    const limit = numberOf(prepared, 'layer-order.tolerance')
    const isSoft = front.plant.category === 'perennial' || front.plant.category === 'grass'
    return judgeSizes({
      rule: 'layer-order', placements: [front.placement.id, behind.placement.id], feature: null, limit,
      canHold: a.isKept || b.isKept,
      heldAsksExpected: true,
      most: isSoft ? 'risk' : undefined,
      fixed: front.placement.role === 'specimen' ? 'note' : undefined,
      measure: (bound, year, natural): Measure => {
        const measured = topOf(front.crown(bound, year, natural)) - topOf(behind.crown(bound, year, natural))
        return { measured, excess: measured - limit }
      },
    })
  },
}

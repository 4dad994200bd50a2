import { reach } from '../crown'
import { squareToBox } from '../geometry/box'
import { CONTACT } from '../geometry/contact'
import { distanceToPolygon, nearestOnSegment } from '../geometry/polygon'
import { wallY } from '../geometry/wall'
import { numberOf, stretchOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Facade, Finding, Inches, Opening } from '../types'
import { isOnWall, judgeSizes, type Measure } from '../verdict'
import { ON_WALL_REACH } from './walk-edge'

/** Thorns count up to above a person's head. */
const HEAD_IN = 80

/** The line of a door lies in its own stretch of wall: a return that begins at its edge is none of it. */
const INSIDE = 2 * CONTACT

/** Distance in plan from an axis to the line of a door in its wall. */
export function toDoorLine(facade: Facade, { x, width }: Opening, point: { x: Inches; y: Inches }): Inches {
  const near = nearestOnSegment(point, { x, y: wallY(facade, x + INSIDE) }, { x: x + width, y: wallY(facade, x + width - INSIDE) })
  return Math.hypot(point.x - near.x, point.y - near.y)
}

function judgeDistance(prepared: Prepared, one: Grown, to: { feature: string; distance: Inches }): Finding | null {
  const limit = numberOf(prepared, 'thorns.distance')
  if (to.distance - one.widest >= limit) return null
  const most = isOnWall(one) ? ON_WALL_REACH : Infinity
  return judgeSizes({
    rule: 'thorns', placements: [one.placement.id], feature: to.feature, limit,
    canHold: one.isKept,
    as: (kind) => (kind === 'conflict' ? 'risk' : kind),
    measure: (bound, year, natural): Measure => {
      const crown = one.crown(bound, year, natural)
      const measured = to.distance - Math.min(most, reach(crown, crown.z0, crown.z0 + HEAD_IN))
      return { measured, excess: limit - measured }
    },
  })
}

export const thorns: Rule = {
  scope: 'placement',
  meta: {
    id: 'thorns',
    title: 'Thorns',
    question: 'Will its thorns reach those who pass?',
    settings: [{ name: 'thorns.distance', label: 'Kept between thorns and a walk or door', default: 36, min: 0, max: 96, unit: 'in' }],
    sources: [
      { publisher: 'Common practice', title: 'A yard between thorns and those who pass', address: null, known: 'practice' },
      { publisher: 'City of SeaTac, Washington', title: 'Municipal Code 17.56.020: barrier plants 6 ft from walks', address: 'https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html', known: 'read' },
    ],
    notes: 'A risk at most. The line of a door is its width in the wall.',
  },
  judge: (prepared, one) => {
    if (!one.plant.thorns) return []
    const { walks, doors, sheet } = prepared
    const { from, to } = stretchOf(one)
    const limit = numberOf(prepared, 'thorns.distance')
    const axis = one.placement
    const far = (one.widest + limit) ** 2
    const near = [
      ...walks.near(from - limit, to + limit).flatMap(({ thing, box }) => (squareToBox(axis, box) < far ? [{ feature: thing.id, distance: distanceToPolygon(axis, thing.outline) }] : [])),
      ...doors.near(from - limit, to + limit).map((door) => ({ feature: door.id, distance: toDoorLine(sheet.facade, door, axis) })),
    ]
    // A walk and a door may have one id: the nearer speaks for both, for a finding has one identity.
    const nearest = new Map(near.sort((a, b) => b.distance - a.distance).map((feature) => [feature.feature, feature]))
    return [...nearest.values()].flatMap((feature) => judgeDistance(prepared, one, feature) ?? [])
  },
}

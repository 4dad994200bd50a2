import { reach } from '../crown'
import { distanceToPolygon, nearestOnOutline } from '../geometry/polygon'
import { CONTACT, groundAt } from '../geometry/wall'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Walk } from '../types'
import { judgeSizes, type Measure } from '../verdict'

/** A plant trained on the wall leans out no farther than this. */
export const ON_WALL_REACH = 12

function judgeWalk(prepared: Prepared, one: Grown, walk: Walk): Finding | null {
  const axis = { x: one.placement.x, y: one.placement.y }
  const clearance = numberOf(prepared, 'walk-edge.clearance')
  const distance = distanceToPolygon(axis, walk.outline)
  if (distance - one.widest >= clearance) return null
  const isInside = distance < -CONTACT
  const near = isInside ? axis : nearestOnOutline(axis, walk.outline)
  const soil = groundAt(prepared.sheet.facade, near.x, near.y)
  const headroom = soil + numberOf(prepared, 'walk-edge.headroom')
  const most = one.placement.role === 'on-wall' ? ON_WALL_REACH : Infinity
  return judgeSizes({
    rule: 'walk-edge', placements: [one.placement.id], feature: walk.id, limit: clearance,
    canHold: one.isKept,
    measure: (bound, year, natural): Measure => {
      const measured = distance - Math.min(most, reach(one.crown(bound, year, natural), soil, headroom))
      return { measured, excess: clearance - measured, always: isInside }
    },
  })
}

export const walkEdge: Rule = {
  scope: 'placement',
  meta: {
    id: 'walk-edge',
    title: 'Walk',
    question: 'Will it lean across the walk?',
    settings: [
      { name: 'walk-edge.clearance', label: 'Kept clear beside a walk', default: 0, min: 0, max: 60, unit: 'in' },
      { name: 'walk-edge.headroom', label: 'Kept clear above a walk', default: 80, min: 60, max: 168, unit: 'in' },
    ],
    sources: [
      { publisher: 'City of Tucson, Arizona', title: 'Landscape technical standard 5-01.8: half the mature spread from the edge', address: 'https://codelibrary.amlegal.com/codes/tucson/latest/tucson_az_udc/0-0-0-11447', known: 'read' },
      { publisher: 'City of Iowa City, Iowa', title: 'Code: foliage 12 in off a walk', address: 'https://codelibrary.amlegal.com/codes/iowacityia/latest/iowacity_ia/0-0-0-24489', known: 'read' },
      { publisher: 'US Access Board', title: 'ADA Standards 307: 80 in of headroom', address: 'https://www.corada.com/documents/guide-to-the-ada-standards/accessible-routes-402', known: 'read' },
    ],
    notes: 'A trunk without foliage below the headroom reaches nothing, but its axis must still keep the clearance.',
  },
  judge: (prepared, one) =>
    prepared.sheet.walks.flatMap((walk) => {
      const found = judgeWalk(prepared, one, walk)
      return found ? [found] : []
    }),
}

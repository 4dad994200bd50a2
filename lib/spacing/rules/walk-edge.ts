import { reach } from '../crown'
import { squareToBox } from '../geometry/box'
import { groundAt } from '../geometry/ground'
import { distanceToPolygon, nearestOnOutline } from '../geometry/polygon'
import { numberOf, stretchOf, type Grown, type Outlined, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Walk } from '../types'
import { isOnWall, judgeSizes, type Measure } from '../verdict'

/** A plant trained on the wall leans out no farther than this. */
export const ON_WALL_REACH = 12

function judgeWalk(prepared: Prepared, one: Grown, { thing: walk, box }: Outlined<Walk>): Finding | null {
  const axis = one.placement
  const clearance = numberOf(prepared, 'walk-edge.clearance')
  if (squareToBox(axis, box) >= (one.widest + clearance) ** 2) return null
  const distance = distanceToPolygon(axis, walk.outline)
  if (distance - one.widest >= clearance) return null
  const near = nearestOnOutline(axis, walk.outline)
  const soil = groundAt(prepared.sheet.facade, near.x, near.y)
  const headroom = soil + numberOf(prepared, 'walk-edge.headroom')
  const most = isOnWall(one) ? ON_WALL_REACH : Infinity
  return judgeSizes({
    rule: 'walk-edge', placements: [axis.id], feature: walk.id, limit: clearance,
    canHold: one.isKept,
    // An axis in the walk breaks it at any reach: its distance is less than nothing.
    measure: (bound, year, natural): Measure => {
      const measured = distance - Math.min(most, reach(one.crown(bound, year, natural), soil, headroom))
      return { measured, excess: clearance - measured }
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
    notes: 'A trunk without foliage below the headroom reaches nothing, but its axis must still keep the clearance. Soil at the walk is that at the nearest point of its outline.',
  },
  judge: (prepared, one) => {
    const { from, to } = stretchOf(one)
    const clearance = numberOf(prepared, 'walk-edge.clearance')
    return prepared.walks.near(from - clearance, to + clearance).flatMap((walk) => judgeWalk(prepared, one, walk) ?? [])
  },
}

import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import { byBound, type Grown } from '../prepared'
import type { Rule } from '../rule'
import { BOUNDS, type Bound, type ByBound, type Inches } from '../types'
import { isOnWall } from '../verdict'

/** A bound lower than this is a shrub's height, and a crown narrower than this leans on nothing. */
const LEAST_TREE_IN = 144
const LEAST_SPREAD_IN = 72

/** Distance to a one-storey wall by mature height, inches. */
function distanceFor(height: Inches): Inches {
  if (height <= 360) return 96
  return height <= 840 ? 180 : 240
}

/** Heights as listed: smallest, middle, largest, never below the one it is planted at. */
function listedHeights({ plant, placement }: Grown): ByBound<Inches> {
  const { heightMin, heightMax } = plant
  const listed: ByBound<Inches> = { low: heightMin, expected: (heightMin + heightMax) / 2, high: heightMax }
  return byBound((bound) => Math.max(listed[bound], placement.planted.height))
}

export const treeDistance: Rule = {
  scope: 'placement',
  meta: {
    id: 'tree-distance',
    title: 'Trees by the house',
    question: 'Does a tree stand far enough from the house?',
    settings: [],
    sources: [{ publisher: 'Arbor Day Foundation', title: 'Tree sizing chart: 8, 15 and 20 ft from a one-storey wall', address: 'http://arborday.org/trees/righttreeandplace/size.cfm', known: 'read' }],
    notes: 'Judged by the heights as lists give them, for the chart is made for those. A tree planted wider than 72 in counts as that wide.',
  },
  judge: (_, one) => {
    const { plant, placement, wallDistance } = one
    const spread = Math.max((plant.spreadMin + plant.spreadMax) / 2, placement.planted.spread)
    if (plant.category !== 'tree' || isOnWall(one) || spread < LEAST_SPREAD_IN) return []
    const heights = listedHeights(one)
    const short = (bound: Bound) => (heights[bound] < LEAST_TREE_IN ? -Infinity : distanceFor(heights[bound]) - wallDistance)
    const broken = BOUNDS.filter((bound) => short(bound) > CONTACT)
    if (broken.length === 0) return []
    return [findingOf({
      rule: 'tree-distance', kind: broken.length === BOUNDS.length ? 'conflict' : 'risk', placements: [placement.id], feature: null,
      limit: distanceFor(heights.high), measured: byBound((bound) => (heights[bound] < LEAST_TREE_IN ? null : wallDistance)),
      excess: Math.max(...BOUNDS.map(short)),
    })]
  },
}

import { findingOf } from '../finding'
import { squareToBox, boxOf } from '../geometry/box'
import { CONTACT } from '../geometry/contact'
import { distanceToPolygon } from '../geometry/polygon'
import type { Rule } from '../rule'
import type { Bed, Inches, Point } from '../types'

/** Distance to the nearest bed; Infinity without beds. */
function toNearestBed(point: Point, beds: readonly Bed[]): Inches {
  let least = Infinity
  for (const { outline } of beds) {
    if (squareToBox(point, boxOf(outline)) < least * least) least = Math.min(least, Math.max(0, distanceToPolygon(point, outline)))
  }
  return least
}

export const outsideBed: Rule = {
  scope: 'placement',
  meta: {
    id: 'outside-bed',
    title: 'Outside the beds',
    question: 'Does it stand in a bed?',
    settings: [],
    fixedKind: 'conflict',
    sources: [{ publisher: 'Common practice', title: 'Plants stand in beds', address: null, known: 'practice' }],
    notes: 'The edge of a bed counts as inside. Where no bed is drawn nothing is judged.',
  },
  judge: ({ sheet: { beds } }, one) => {
    if (one.stays || beds.length === 0 || one.beds().length > 0) return []
    const excess = toNearestBed(one.placement, beds)
    return excess > CONTACT ? [findingOf({ rule: 'outside-bed', kind: 'conflict', placements: [one.placement.id], feature: null, excess })] : []
  },
}

import { footOf, radiusAt, reach, topOf, type Crown } from '../crown'
import { gapTo } from '../geometry/box'
import { nearestOnSegment } from '../geometry/polygon'
import { stretchOf, type Grown } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Fixture } from '../types'
import { judgeSizes, type Measure } from '../verdict'

/** Plants farther out than this hide nothing from those who come near. */
const FAR_IN = 240
/** Slices of the number's height in which the covered share is added up. */
const SLICES = 512

/** Share of the fixture's face that a crown hides, seen square-on. */
function coveredShare(crown: Crown, { x, width, z, height }: Fixture): number {
  let covered = 0
  for (let i = 0; i < SLICES; i++) {
    const radius = radiusAt(crown, z + ((i + 0.5) * height) / SLICES)
    covered += Math.max(0, Math.min(crown.x + radius, x + width) - Math.max(crown.x - radius, x))
  }
  return covered / (SLICES * width)
}

function judgeFace(one: Grown, fixture: Fixture): Finding | null {
  const { kind, x, width, y, depth, z, height } = fixture
  if (kind !== 'house-number' && kind !== 'entry-light') return null
  const axis = one.placement
  const face = y + depth
  const near = nearestOnSegment(axis, { x, y: face }, { x: x + width, y: face })
  if (axis.y <= face || Math.hypot(axis.x - near.x, axis.y - near.y) > FAR_IN || one.tallest <= z) return null
  const dx = gapTo(axis.x, x, x + width)
  return judgeSizes({
    rule: 'number-view', placements: [axis.id], feature: fixture.id, limit: 0,
    canHold: one.isKept,
    measure: (bound, year, natural): Measure => {
      const crown = one.crown(bound, year, natural)
      const isBeside = topOf(crown) <= z || footOf(crown) >= z + height
      if (isBeside) return { measured: 0, excess: -Infinity }
      // The share is told of the grown plant alone; the years ask only whether it laps.
      return { measured: year === 'mature' ? coveredShare(crown, fixture) : null, excess: reach(crown, z, z + height) - dx }
    },
  })
}

export const numberView: Rule = {
  scope: 'placement',
  meta: {
    id: 'number-view',
    title: 'House number and light',
    question: 'Can the house number and the entry light be seen?',
    measures: 'share',
    settings: [],
    sources: [{ publisher: 'International Code Council', title: 'International Residential Code R319, Fire Code 505: address plainly visible from the street (as quoted)', address: 'http://www.ibc-wiki.com/section-501/', known: 'read' }],
    notes: 'Seen square-on, from plants up to 20 ft in front of it. Local code decides.',
  },
  judge: (prepared, one) => {
    const { from, to } = stretchOf(one)
    return prepared.fixtures.near(from, to).flatMap((fixture) => judgeFace(one, fixture) ?? [])
  },
}

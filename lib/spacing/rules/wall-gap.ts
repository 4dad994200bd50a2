import { reach, topOf } from '../crown'
import { CONTACT } from '../geometry/contact'
import { gradeAt } from '../geometry/ground'
import { nearestOnWall } from '../geometry/wall'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import { BOUNDS, type Finding } from '../types'
import { isOnWall, judgeSizes, type Measure } from '../verdict'

/** Does it stay, at every bound and as kept, below the foundation that shows above the mulch? */
function staysLow({ sheet: { facade } }: Prepared, one: Grown): boolean {
  const soil = gradeAt(facade, nearestOnWall(facade, one.placement.x, one.placement.y).x)
  return BOUNDS.every((bound) => topOf(one.mature[bound]) - soil - (facade.exposed - facade.mulch) <= CONTACT)
}

function judgeWall(prepared: Prepared, one: Grown): Finding | null {
  const gap = numberOf(prepared, 'wall-gap.gap')
  const distance = one.wallDistance
  if (isOnWall(one) || distance - one.widest >= gap) return null
  const { gutter: top } = prepared.sheet.facade
  return judgeSizes({
    rule: 'wall-gap', placements: [one.placement.id], feature: null, limit: gap,
    canHold: one.isKept,
    as: (kind) => (kind !== 'held' && staysLow(prepared, one) ? 'note' : kind),
    measure: (bound, year, natural): Measure => {
      const crown = one.crown(bound, year, natural)
      const measured = distance - reach(crown, crown.z0, top)
      return { measured, excess: gap - measured }
    },
  })
}

export const wallGap: Rule = {
  scope: 'placement',
  meta: {
    id: 'wall-gap',
    title: 'Gap to the wall',
    question: 'Will it rub the siding?',
    settings: [{ name: 'wall-gap.gap', label: 'Kept free in front of the wall', default: 12, min: 0, max: 48, unit: 'in' }],
    sources: [
      { publisher: 'Clemson Cooperative Extension', title: 'Carolina Yards, five mistakes: half the mature width + 1 ft', address: 'http://www.clemson.edu/extension/natural_resources/water/carolina_yards/five_mistakes.html', known: 'read' },
    ],
    notes:
      'A plant that stays below the exposed foundation touches no siding: a note; where only shears keep it off the wall it stays held, for clipping is then a commitment. Soil at the wall is that at the nearest point of the wall.',
  },
  judge: (prepared, one) => {
    const found = judgeWall(prepared, one)
    return found ? [found] : []
  },
}

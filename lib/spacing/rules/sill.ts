import { span } from '../crown'
import { clamp, CONTACT, gapInX, wallY } from '../geometry/wall'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Opening } from '../types'
import { judgeSizes, type Measure } from '../verdict'

function judgeWindow(prepared: Prepared, one: Grown, window: Opening): Finding | null {
  const { x, y, id } = one.placement
  const dx = gapInX(x, window.x, window.width)
  if (one.widest <= dx) return null
  const depth = y - wallY(prepared.sheet.facade, clamp(x, window.x, window.x + window.width))
  if (depth > numberOf(prepared, 'sill.far')) return null
  const isFarOut = depth > numberOf(prepared, 'sill.sillDepth')
  const limit = window.sill - numberOf(prepared, 'sill.margin')
  return judgeSizes({
    rule: 'sill', placements: [id], feature: window.id, limit,
    canHold: one.isKept && !isFarOut,
    fixed: isFarOut ? 'note' : undefined,
    measure: (bound, year, natural): Measure => {
      const shared = span(one.crown(bound, year, natural), dx)
      if (!shared) return { measured: null, excess: -Infinity }
      // A crown that starts above the head hides no glass.
      const startsAbove = window.head - shared.from <= CONTACT
      return { measured: shared.to, excess: startsAbove ? -Infinity : shared.to - limit }
    },
  })
}

export const sill: Rule = {
  scope: 'placement',
  meta: {
    id: 'sill',
    title: 'Window sill',
    question: 'Will it stand over the sill of a window?',
    settings: [
      { name: 'sill.margin', label: 'Kept free below the sill', default: 0, min: 0, max: 24, unit: 'in' },
      { name: 'sill.sillDepth', label: 'Judged up to this far out', default: 96, min: 12, max: 240, unit: 'in' },
      { name: 'sill.far', label: 'Noted up to this far out', default: 240, min: 24, max: 600, unit: 'in' },
    ],
    sources: [
      { publisher: 'City of SeaTac, Washington', title: 'Municipal Code 17.56.020: no higher than the sill within 5 ft in front of a window', address: 'https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html', known: 'read' },
      { publisher: 'Common practice', title: 'The depths of 8 ft and 20 ft', address: null, known: 'practice' },
    ],
    notes: 'A crown that starts above the head of the window hides none of it.',
  },
  judge: (prepared, one) =>
    prepared.sheet.openings.flatMap((opening) => {
      const found = opening.kind === 'window' ? judgeWindow(prepared, one, opening) : null
      return found ? [found] : []
    }),
}

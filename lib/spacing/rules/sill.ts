import { span } from '../crown'
import { gapTo } from '../geometry/box'
import { CONTACT } from '../geometry/contact'
import { wallY } from '../geometry/wall'
import { numberOf, stretchOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Opening } from '../types'
import { judgeSizes, type Measure } from '../verdict'

/** Scopes are compared within this, so that 96 in written as a sum of fractions is 96 in. */
const NOISE = 1e-9

function judgeWindow(prepared: Prepared, one: Grown, window: Opening): Finding | null {
  const { x, y, id } = one.placement
  const dx = gapTo(x, window.x, window.x + window.width)
  const limit = window.sill - numberOf(prepared, 'sill.margin')
  if (one.widest <= dx || one.tallest - limit <= CONTACT) return null
  const depth = y - wallY(prepared.sheet.facade, Math.min(window.x + window.width, Math.max(window.x, x)))
  if (depth > numberOf(prepared, 'sill.far') + NOISE) return null
  const isFarOut = depth > numberOf(prepared, 'sill.sillDepth') + NOISE
  return judgeSizes({
    rule: 'sill', placements: [id], feature: window.id, limit,
    canHold: one.isKept && !isFarOut,
    as: isFarOut ? () => 'note' : undefined,
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
      { name: 'sill.sillDepth', label: 'Judged up to this far from the wall', default: 96, min: 12, max: 240, unit: 'in' },
      { name: 'sill.far', label: 'Noted up to this far from the wall', default: 240, min: 24, max: 600, unit: 'in' },
    ],
    sources: [
      { publisher: 'City of SeaTac, Washington', title: 'Municipal Code 17.56.020: no higher than the sill within 5 ft in front of a window', address: 'https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html', known: 'read' },
      { publisher: 'Common practice', title: 'The depths of 8 ft and 20 ft', address: null, known: 'practice' },
    ],
    notes: 'A crown that starts above the head of the window hides none of it. Where the far scope is set shorter than the near one, nothing is noted.',
  },
  judge: (prepared, one) => {
    const { from, to } = stretchOf(one)
    return prepared.windows.near(from, to).flatMap((window) => judgeWindow(prepared, one, window) ?? [])
  },
}

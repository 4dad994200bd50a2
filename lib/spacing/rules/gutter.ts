import { span } from '../crown'
import { CONTACT } from '../geometry/contact'
import { numberOf } from '../prepared'
import type { Rule } from '../rule'
import { judgeSizes, type Measure } from '../verdict'

export const gutter: Rule = {
  scope: 'placement',
  meta: {
    id: 'gutter',
    title: 'Gutter',
    question: 'Will it reach the gutter?',
    settings: [{ name: 'gutter.clearance', label: 'Kept free below the gutter', default: 12, min: 0, max: 48, unit: 'in' }],
    sources: [{ publisher: 'Common practice', title: 'A foot kept free below the gutter', address: null, known: 'practice' }],
    notes: 'A crown reaches the gutter where it comes within the overhang of the wall, returns included. A plant trained on the wall counts with its whole crown.',
  },
  judge: (prepared, one) => {
    const { facade } = prepared.sheet
    const d = Math.max(0, one.wallDistance - facade.overhang)
    const limit = facade.gutter - numberOf(prepared, 'gutter.clearance')
    if (one.widest <= d || one.tallest - limit <= CONTACT) return []
    const found = judgeSizes({
      rule: 'gutter', placements: [one.placement.id], feature: null, limit,
      canHold: one.isKept,
      measure: (bound, year, natural): Measure => {
        const shared = span(one.crown(bound, year, natural), d)
        return shared ? { measured: shared.to, excess: shared.to - limit } : { measured: null, excess: -Infinity }
      },
    })
    return found ? [found] : []
  },
}

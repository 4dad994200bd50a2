import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Grown } from '../prepared'
import type { Rule } from '../rule'
import type { Inches } from '../types'
import { isOnWall } from '../verdict'

const MOST_SPREADS = 1.5

const apart = (a: Grown, b: Grown): Inches => Math.hypot(a.placement.x - b.placement.x, a.placement.y - b.placement.y)

export const openDrift: Rule = {
  scope: 'placement',
  meta: {
    id: 'open-drift',
    title: 'Open drift',
    question: 'Will the drift grow together?',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'Plants of a drift stand no farther apart than one and a half spreads', address: null, known: 'practice' }],
    notes: 'Measured to the nearest mate; the limit is one and a half times the mean of the two expected spreads, as kept. A drift of one is not judged, nor are two that stay, nor plants trained on the wall.',
  },
  judge: ({ drifts }, one) => {
    const { drift, id } = one.placement
    if (drift === undefined || isOnWall(one)) return []
    const mates = (drifts.get(drift) ?? []).filter((mate) => mate.placement.id !== id && !isOnWall(mate) && !(one.stays && mate.stays))
    if (mates.length === 0) return []
    const nearest = mates.reduce((best, mate) => (apart(one, mate) < apart(one, best) ? mate : best))
    const distance = apart(one, nearest)
    const limit = (MOST_SPREADS * (one.mature.expected.spread + nearest.mature.expected.spread)) / 2
    if (distance - limit <= CONTACT) return []
    return [findingOf({ rule: 'open-drift', kind: 'note', placements: [id], feature: null, limit, measured: { low: null, expected: distance, high: null }, excess: distance - limit })]
  },
}

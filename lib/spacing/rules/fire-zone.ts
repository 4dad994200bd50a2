import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import { numberOf } from '../prepared'
import type { Rule } from '../rule'
import { judgeSizes, type Measure } from '../verdict'

export const fireZone: Rule = {
  scope: 'placement',
  meta: {
    id: 'fire-zone',
    title: 'Wildfire zone',
    question: 'Does it stand clear of the house in a wildfire area?',
    settings: [{ name: 'fire-zone.distance', label: 'Kept free of plants before the wall in a wildfire area', default: 60, min: 0, max: 120, unit: 'in' }],
    sources: [{ publisher: 'University of Nevada, Reno Extension', title: 'Living With Fire: the ember-resistant zone, 0 to 5 ft', address: 'https://www.livingwithfire.com/get-prepared/how-to-improve-my-defensible-space/zone-0-the-ember-resistant-zone-0-5-feet/', known: 'read' }],
    notes: 'Asked where the site is marked as a wildfire area. Local law decides. An axis at the distance itself stands clear.',
  },
  judge: (prepared, one) => {
    if (!prepared.sheet.site.fireZone) return []
    const limit = numberOf(prepared, 'fire-zone.distance')
    const { wallDistance: distance, placement } = one
    if (distance - one.widest >= limit) return []
    const about = { rule: 'fire-zone', placements: [placement.id], feature: null, limit }
    if (limit - distance > CONTACT) {
      return [findingOf({ ...about, kind: 'conflict', measured: { low: distance, expected: distance, high: distance }, excess: limit - distance })]
    }
    const found = judgeSizes({
      ...about, canHold: one.isKept,
      as: (kind) => (kind === 'conflict' ? 'risk' : kind),
      measure: (bound, year, natural): Measure => {
        const measured = distance - one.crown(bound, year, natural).spread / 2
        return { measured, excess: limit - measured }
      },
    })
    return found ? [{ ...found, year: null }] : []
  },
}

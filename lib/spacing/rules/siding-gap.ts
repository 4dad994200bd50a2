import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Rule } from '../rule'
import type { Facade } from '../types'

/** Foundation that must show above soil and mulch, inches. */
const LEAST_SHOWING: Record<Facade['siding'], number> = { lap: 6, masonry: 4 }

export const sidingGap: Rule = {
  scope: 'sheet',
  meta: {
    id: 'siding-gap',
    title: 'Foundation showing',
    question: 'Does enough foundation show above the mulch?',
    settings: [],
    fixedKind: 'risk',
    sources: [{ publisher: 'International Code Council', title: 'International Residential Code R404.1.6: 6 in, 4 in under masonry veneer (as quoted)', address: 'https://evstudio.com/separation-of-top-of-foundation-wall-and-adjacent-exterior-grade/', known: 'read' }],
    notes: 'Mulch is counted as soil, to be on the safe side. Local code and a licensed professional decide.',
  },
  judge: ({ sheet: { facade } }) => {
    const limit = LEAST_SHOWING[facade.siding]
    const showing = facade.exposed - facade.mulch
    if (limit - showing <= CONTACT) return []
    return [findingOf({ rule: 'siding-gap', kind: 'risk', placements: [], feature: null, limit, measured: { low: showing, expected: showing, high: showing }, excess: limit - showing })]
  },
}

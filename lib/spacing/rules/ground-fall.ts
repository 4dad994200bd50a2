import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Rule } from '../rule'

const OVER_IN = 120
const LEAST_DROP_IN = 6

export const groundFall: Rule = {
  scope: 'sheet',
  meta: {
    id: 'ground-fall',
    title: 'Fall of the ground',
    question: 'Does water run away from the wall?',
    settings: [],
    fixedKind: 'risk',
    sources: [
      { publisher: 'International Code Council', title: 'International Residential Code R401.3: 6 in within the first 10 ft (as quoted)', address: 'https://forum.nachi.org/t/positive-drainage/38972', known: 'read' },
      { publisher: 'US Department of Energy, Building America Solution Center', title: 'Final grade slopes away from foundation: 1/2 in per foot', address: 'https://basc.pnnl.gov/resource-guides/final-grade-slopes-away-foundation', known: 'read' },
    ],
    notes: 'The measured fall is taken to go on for 10 ft. Local code and a licensed professional decide.',
  },
  judge: ({ sheet: { facade } }) => {
    const drop = facade.fall * OVER_IN
    const excess = LEAST_DROP_IN - drop
    if (excess <= CONTACT) return []
    return [findingOf({ rule: 'ground-fall', kind: 'risk', placements: [], feature: null, limit: LEAST_DROP_IN, measured: { low: drop, expected: drop, high: drop }, excess })]
  },
}

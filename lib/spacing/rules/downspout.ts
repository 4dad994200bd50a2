import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Rule } from '../rule'

const LEAST_OUT_IN = 60

export const downspout: Rule = {
  scope: 'sheet',
  meta: {
    id: 'downspout',
    title: 'Downspouts',
    question: 'Does roof water leave far enough from the wall?',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'US Department of Energy, Building America (as summarised)', title: 'Site grading and drainage: discharge 5 ft or more from the foundation', address: 'https://www.almostanarchitect.com/library/basc-site-grading-drainage', known: 'read' }],
    notes: 'A downspout whose outlet was not measured is not judged. Local code and a licensed professional decide.',
  },
  judge: ({ sheet: { fixtures } }) =>
    fixtures.flatMap(({ id, kind, outlet }) => {
      if (kind !== 'downspout' || outlet === undefined || LEAST_OUT_IN - outlet <= CONTACT) return []
      return [findingOf({ rule: 'downspout', kind: 'note', placements: [], feature: id, limit: LEAST_OUT_IN, measured: { low: outlet, expected: outlet, high: outlet }, excess: LEAST_OUT_IN - outlet })]
    }),
}

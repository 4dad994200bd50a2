import { bloomGaps as gapsIn, plantedBeds } from '../by-bed'
import { findingOf } from '../finding'
import type { Rule } from '../rule'

export const bloomGaps: Rule = {
  scope: 'sheet',
  meta: {
    id: 'bloom-gaps',
    title: 'Gaps in flower',
    question: 'Does something flower from spring to fall?',
    measures: 'count',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'Something in flower from April to October', address: null, known: 'practice' }],
    notes: 'One finding for each bed; measured is the number of months without flower.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const gaps = gapsIn(plants.map(({ plant }) => plant)).length
      return gaps === 0 ? [] : [findingOf({ rule: 'bloom-gaps', kind: 'note', placements: [], feature: bed.id, limit: 0, measured: { low: null, expected: gaps, high: null } })]
    }),
}

import { idsOf, toBePlanted } from '../by-plant'
import { findingOf } from '../finding'
import type { Rule } from '../rule'

export const invasive: Rule = {
  scope: 'plant',
  meta: {
    id: 'invasive',
    title: 'Invasive plants',
    question: 'Is it reported to run wild?',
    settings: [],
    fixedKind: 'risk',
    sources: [{ publisher: 'Common practice', title: 'Plants reported as invasive in some state are not planted anew; state lists decide', address: null, known: 'practice' }],
    notes: 'The library marks a plant that is reported somewhere in North America; whether it may be sold and planted here is for the state list.',
  },
  judge: (_, judged) => {
    const placements = toBePlanted(judged)
    return judged.plant.invasive && placements.length > 0 ? findingOf({ rule: 'invasive', kind: 'risk', placements: idsOf(placements), feature: judged.plant.id }) : null
  },
}

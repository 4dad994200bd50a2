import { idsOf, toBePlanted } from '../by-plant'
import type { Rule } from '../rule'
import { findingOf } from '../finding'

export const light: Rule = {
  scope: 'plant',
  meta: {
    id: 'light',
    title: 'Light',
    question: 'Does it get the light it needs?',
    settings: [],
    fixedKind: 'risk',
    sources: [
      { publisher: 'K-State Research and Extension, Johnson County', title: 'Sun and shade: full sun 6 h or more, part shade 4 to 6', address: 'https://www.johnson.k-state.edu/programs/lawn-garden/agent-articles-fact-sheets-and-more/agent-articles/environment/sun-shade-conditions.html', known: 'read' },
    ],
    notes: 'A plant whose light is not known is not judged.',
  },
  judge: ({ sheet }, judged) => {
    const { plant } = judged
    const placements = toBePlanted(judged)
    if (placements.length === 0 || plant.light.length === 0 || plant.light.includes(sheet.site.light)) return null
    return findingOf({ rule: 'light', kind: 'risk', placements: idsOf(placements), feature: plant.id })
  },
}

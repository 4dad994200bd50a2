import { idsOf, toBePlanted } from '../by-plant'
import { findingOf } from '../finding'
import type { Rule } from '../rule'

export const moisture: Rule = {
  scope: 'plant',
  meta: {
    id: 'moisture',
    title: 'Soil moisture',
    question: 'Is the soil as moist as it needs?',
    settings: [],
    fixedKind: 'risk',
    sources: [{ publisher: 'Common practice', title: 'A plant set in the moisture it is listed for', address: null, known: 'practice' }],
    notes: 'A plant whose moisture is not known is not judged.',
  },
  judge: ({ sheet }, judged) => {
    const { plant } = judged
    const placements = toBePlanted(judged)
    if (placements.length === 0 || plant.water.length === 0 || plant.water.includes(sheet.site.moisture)) return null
    return findingOf({ rule: 'moisture', kind: 'risk', placements: idsOf(placements), feature: plant.id })
  },
}

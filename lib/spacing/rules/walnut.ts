import { idsOf, toBePlanted } from '../by-plant'
import { findingOf } from '../finding'
import type { Rule } from '../rule'

export const walnut: Rule = {
  scope: 'plant',
  meta: {
    id: 'walnut',
    title: 'Black walnut',
    question: 'Does it bear a black walnut near it?',
    settings: [],
    fixedKind: 'risk',
    sources: [
      { publisher: 'The Morton Arboretum', title: 'Black walnut toxicity', address: 'https://studyres.com/doc/7774047/black-walnut-toxicity', known: 'read' },
      { publisher: 'From memory', title: 'How long the soil stays harmful once the tree is gone: one season to several years, sources differ', address: null, known: 'memory' },
    ],
    notes: 'Only plants listed as sensitive are judged; one that is on no list is not known to be safe.',
  },
  judge: ({ sheet: { site } }, judged) => {
    const placements = toBePlanted(judged)
    if (site.walnut === 'none' || judged.plant.juglone !== 'sensitive' || placements.length === 0) return null
    return findingOf({ rule: 'walnut', kind: site.walnut === 'present' ? 'risk' : 'note', placements: idsOf(placements), feature: judged.plant.id })
  },
}

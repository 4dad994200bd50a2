import type { Toxicity } from '../../plants/types'
import { idsOf } from '../by-plant'
import { findingOf } from '../finding'
import type { Rule } from '../rule'
import type { FindingKind } from '../types'

const KINDS: Record<Toxicity, FindingKind | null> = { toxic: 'risk', irritant: 'note', unlisted: null }

export const toxic: Rule = {
  scope: 'plant',
  meta: {
    id: 'toxic',
    title: 'Toxic plants',
    question: 'Is it safe where children or pets play?',
    settings: [],
    fixedKind: 'risk',
    sources: [
      { publisher: 'ASPCA Animal Poison Control', title: 'Toxic and non-toxic plants', address: 'https://www.aspca.org/pet-care/animal-poison-control/toxic-and-non-toxic-plants', known: 'read' },
    ],
    notes: 'Asked where the brief names children or pets. No list is complete: a plant on none is not known to be safe. Plants that stay are judged.',
  },
  judge: ({ sheet: { site } }, { plant, placements }) => {
    const isAsked = site.brief?.some((aim) => aim === 'children' || aim === 'pets') ?? false
    const kind = KINDS[plant.toxicity]
    return isAsked && kind ? findingOf({ rule: 'toxic', kind, placements: idsOf(placements), feature: plant.id }) : null
  },
}

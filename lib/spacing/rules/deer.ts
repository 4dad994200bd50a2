import type { DeerClass } from '../../plants/types'
import { idsOf } from '../by-plant'
import { findingOf } from '../finding'
import type { Rule } from '../rule'
import type { FindingKind, Site } from '../types'

/** What a class of browsing comes to under each pressure; what is not named is no finding. */
const KINDS: Record<Site['deer'], Partial<Record<DeerClass, FindingKind>>> = {
  none: {},
  some: { frequently: 'note' },
  high: { frequently: 'risk', occasionally: 'note' },
}

export const deer: Rule = {
  scope: 'plant',
  meta: {
    id: 'deer',
    title: 'Deer',
    question: 'Will deer eat it?',
    settings: [],
    fixedKind: 'risk',
    sources: [{ publisher: 'Rutgers NJAES', title: 'Landscape plants rated by deer resistance: four classes of damage', address: 'https://njaes.rutgers.edu/deer-resistant-plants/', known: 'read' }],
    notes: 'No plant is deer-proof. A plant of no known class is not judged; one that stays is.',
  },
  judge: ({ sheet: { site } }, { plant, placements }) => {
    const kind = KINDS[site.deer][plant.deer]
    return kind ? findingOf({ rule: 'deer', kind, placements: idsOf(placements), feature: plant.id }) : null
  },
}

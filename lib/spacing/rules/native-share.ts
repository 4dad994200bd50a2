import { plantedBeds, volumeShare } from '../by-bed'
import { findingOf } from '../finding'
import type { Rule } from '../rule'

const LEAST = 0.7

export const nativeShare: Rule = {
  scope: 'sheet',
  meta: {
    id: 'native-share',
    title: 'Native plants',
    question: 'Are there native plants enough to feed birds?',
    measures: 'share',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Proceedings of the National Academy of Sciences, 2018', title: 'Nonnative plants reduce population growth of an insectivorous bird', address: 'https://doi.org/10.1073/pnas.1809259115', known: 'read' }],
    notes: 'Asked where the brief names birds. The study counts biomass; crown volume at expected maturity stands in for it. Native to any part of North America counts.',
  },
  judge: (prepared) => {
    if (!prepared.sheet.site.brief?.includes('birds')) return []
    return plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const share = volumeShare(plants, ({ plant }) => Number(plant.native.length > 0))
      if (share === null || share >= LEAST) return []
      return [findingOf({ rule: 'native-share', kind: 'note', placements: [], feature: bed.id, limit: LEAST, measured: { low: null, expected: share, high: null } })]
    })
  },
}

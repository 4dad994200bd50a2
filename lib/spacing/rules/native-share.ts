import { plantedBeds, volumeShare } from '../by-bed'
import { judgeShare } from '../expected-only'
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
    return plantedBeds(prepared).flatMap(({ bed, plants }) =>
      judgeShare({
        rule: 'native-share', bed: bed.id,
        share: (natural) => volumeShare(plants, natural, ({ plant }) => Number(plant.native.length > 0)),
        limitFor: (share) => (share < LEAST ? LEAST : null),
      }) ?? [],
    )
  },
}

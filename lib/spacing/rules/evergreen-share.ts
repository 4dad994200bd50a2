import { plantedBeds, volumeShare } from '../by-bed'
import { judgeShare } from '../expected-only'
import type { Leaf } from '../../plants/types'
import type { Rule } from '../rule'

const LEAST = 0.33
const MOST = 0.67

const WEIGHTS: Record<Leaf, number> = { deciduous: 0, 'semi-evergreen': 0.5, 'broadleaf-evergreen': 1, 'needle-evergreen': 1, 'scale-evergreen': 1, herbaceous: 0 }

export const evergreenShare: Rule = {
  scope: 'sheet',
  meta: {
    id: 'evergreen-share',
    title: 'Evergreens',
    question: 'Is there enough green in winter, and not too much of it?',
    measures: 'share',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'A third to two thirds of the woody plants evergreen', address: null, known: 'practice' }],
    notes: 'By crown volume of the woody plants at expected maturity; semi-evergreen counts half. Beds without woody plants are not judged.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const woody = plants.filter(({ plant }) => plant.leaf !== 'herbaceous')
      return judgeShare({
        rule: 'evergreen-share', bed: bed.id,
        share: (natural) => volumeShare(woody, natural, ({ plant }) => WEIGHTS[plant.leaf]),
        limitFor: (share) => (share < LEAST ? LEAST : share > MOST ? MOST : null),
      }) ?? []
    }),
}

import { grownUp, plantedBeds } from '../by-bed'
import { silhouetteArea } from '../crown'
import { judgeShare } from '../expected-only'
import { boxOf } from '../geometry/box'
import type { Grown } from '../prepared'
import type { Rule } from '../rule'

const LEAST = 0.35
const MOST = 0.65

/** Share of the moments (silhouette x distance from the middle) that lies left of the middle; null where there are none. */
function leftShare(plants: readonly Grown[], middle: number, natural: boolean): number | null {
  let [left, right] = [0, 0]
  for (const one of plants) {
    const crown = grownUp(one, natural)
    const moment = silhouetteArea(crown) * (crown.x - middle)
    if (moment < 0) left -= moment
    else right += moment
  }
  return left + right > 0 ? left / (left + right) : null
}

export const balance: Rule = {
  scope: 'sheet',
  meta: {
    id: 'balance',
    title: 'Balance',
    question: 'Does one side of the bed outweigh the other?',
    measures: 'share',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'Visual weight about the middle of a bed', address: null, known: 'practice' }],
    notes: 'Weights are silhouettes at expected maturity times their distance from the middle of the bed along the wall; measured is the share of the left side.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const { left, right } = boxOf(bed.outline)
      return judgeShare({
        rule: 'balance', bed: bed.id,
        share: (natural) => leftShare(plants, (left + right) / 2, natural),
        limitFor: (share) => (share < LEAST ? LEAST : share > MOST ? MOST : null),
      }) ?? []
    }),
}

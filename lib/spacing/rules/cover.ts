import { coveredShare, crownsOver } from '../cover'
import { grownUp } from '../by-bed'
import { judgeShare, SHARE_NOISE } from '../expected-only'
import type { Rule } from '../rule'

const LEAST_SHARE = 0.7
/** Crowns carried higher than this leave the soil below them bare. */
const LOW_FOLIAGE_IN = 36

export const cover: Rule = {
  scope: 'sheet',
  meta: {
    id: 'cover',
    title: 'Cover',
    question: 'Will the bed close?',
    measures: 'share',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'A grown bed covers most of its soil', address: null, known: 'practice' }],
    notes: 'At expected maturity, as kept; crowns whose foliage starts 36 in or more above their soil are left out, and those trained on the wall.',
  },
  judge: (prepared) =>
    prepared.sheet.beds.flatMap((bed) => {
      const near = crownsOver(prepared, bed)
      return judgeShare({
        rule: 'cover', bed: bed.id,
        share: (natural) => coveredShare(bed, near.map((one) => grownUp(one, natural)).filter(({ clearStem }) => clearStem < LOW_FOLIAGE_IN)),
        limitFor: (share) => (share < LEAST_SHARE - SHARE_NOISE ? LEAST_SHARE : null),
      }) ?? []
    }),
}

import { coveredShare, linesOf } from '../cover'
import { grownUp } from '../by-bed'
import { judgeShare } from '../expected-only'
import { boxOf } from '../geometry/box'
import type { Rule } from '../rule'
import { isOnWall } from '../verdict'

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
  judge: ({ sheet, neighbours }) =>
    sheet.beds.flatMap((bed) => {
      const { left, right } = boxOf(bed.outline)
      const near = neighbours.near(left, right).filter((one) => !isOnWall(one))
      const lines = linesOf(bed)
      return judgeShare({
        rule: 'cover', bed: bed.id,
        share: (natural) => coveredShare(lines, near.map((one) => grownUp(one, natural)).filter(({ clearStem }) => clearStem < LOW_FOLIAGE_IN)),
        limitFor: (share) => (share < LEAST_SHARE ? LEAST_SHARE : null),
      }) ?? []
    }),
}

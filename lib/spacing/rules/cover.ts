import { coveredShare, linesOf } from '../cover'
import { findingOf } from '../finding'
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
      const crowns = neighbours.near(left, right).filter((one) => !isOnWall(one)).map(({ mature }) => mature.expected).filter(({ clearStem }) => clearStem < LOW_FOLIAGE_IN)
      const share = coveredShare(linesOf(bed), crowns)
      if (share >= LEAST_SHARE) return []
      return [findingOf({ rule: 'cover', kind: 'note', placements: [], feature: bed.id, limit: LEAST_SHARE, measured: { low: null, expected: share, high: null } })]
    }),
}

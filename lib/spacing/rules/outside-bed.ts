import { distanceToPolygon } from '../geometry/polygon'
import { CONTACT } from '../geometry/wall'
import type { Rule } from '../rule'
import { finding } from '../verdict'

export const outsideBed: Rule = {
  scope: 'placement',
  meta: {
    id: 'outside-bed',
    title: 'Outside the beds',
    question: 'Does it stand in a bed?',
    settings: [],
    sources: [{ publisher: 'Common practice', title: 'Plants stand in beds', address: null, known: 'practice' }],
  },
  judge: ({ sheet: { beds } }, { placement, stays }) => {
    if (stays || beds.length === 0) return []
    const excess = Math.min(...beds.map((bed) => distanceToPolygon(placement, bed.outline)))
    if (excess <= CONTACT) return []
    return [finding({ rule: 'outside-bed', kind: 'conflict', placements: [placement.id], feature: null, excess })]
  },
}

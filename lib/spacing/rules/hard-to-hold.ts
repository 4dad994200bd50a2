import { idsOf } from '../by-plant'
import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Grown } from '../prepared'
import type { Rule } from '../rule'
import type { Inches } from '../types'

/** Below this share of its natural size a plant is cut into old wood year after year. */
const LEAST_SHARE = 0.6

/** How far a kept size goes below what can be held, and what share of the natural size it is; the worse of height and spread. */
function strain({ placement: { kept }, natural }: Grown): { share: number; excess: Inches } {
  const { height, spread } = natural.expected
  const cuts = [[kept?.height ?? Infinity, height], [kept?.spread ?? Infinity, spread]] as const
  const [worst] = cuts.map(([size, whole]) => ({ share: size / whole, excess: LEAST_SHARE * whole - size })).sort((a, b) => a.share - b.share)
  return worst!
}

export const hardToHold: Rule = {
  scope: 'plant',
  meta: {
    id: 'hard-to-hold',
    title: 'Hard to hold',
    question: 'Can shears hold it so small?',
    measures: 'share',
    settings: [],
    fixedKind: 'risk',
    sources: [{ publisher: 'Common practice', title: 'A plant held much below its natural size is the wrong plant', address: null, known: 'practice' }],
    notes: 'The share is of the expected natural size, in height or spread, whichever is kept smaller; measured is the hardest held of its placements.',
  },
  judge: (_, { plant, placements }) => {
    const held = placements.filter((one) => one.isKept && strain(one).excess > CONTACT)
    if (held.length === 0) return null
    const strains = held.map(strain)
    return findingOf({
      rule: 'hard-to-hold', kind: 'risk', placements: idsOf(held), feature: plant.id, limit: LEAST_SHARE,
      measured: { low: null, expected: Math.min(...strains.map(({ share }) => share)), high: null },
      excess: Math.max(...strains.map(({ excess }) => excess)),
    })
  },
}

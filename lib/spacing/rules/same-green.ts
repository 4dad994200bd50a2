import { plantedBeds } from '../by-bed'
import { findingOf } from '../finding'
import type { Grown } from '../prepared'
import type { Rule } from '../rule'

const MOST_ALIKE = 3

function areAlike(a: Grown, b: Grown): boolean {
  const [one, other] = [a.mature.expected, b.mature.expected]
  const touch = other.x - one.x <= (one.spread + other.spread) / 2
  return touch && a.plant.foliageColor === b.plant.foliageColor && a.plant.texture === b.plant.texture
}

/** The longest run of neighbours that are alike; plants come from left to right. */
function longestRun(plants: readonly Grown[]): number {
  let [longest, run] = [0, 0]
  plants.forEach((one, i) => {
    run = i > 0 && areAlike(plants[i - 1]!, one) ? run + 1 : 1
    longest = Math.max(longest, run)
  })
  return longest
}

export const sameGreen: Rule = {
  scope: 'sheet',
  meta: {
    id: 'same-green',
    title: 'All one green',
    question: 'Do neighbours set each other off?',
    measures: 'count',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Common practice', title: 'Neighbours differ in color or texture', address: null, known: 'practice' }],
    notes: 'The longest run of a bed is told, once for the bed. Plants touch where their expected crowns share some of the wall.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const run = longestRun(plants)
      return run <= MOST_ALIKE ? [] : [findingOf({ rule: 'same-green', kind: 'note', placements: [], feature: bed.id, limit: MOST_ALIKE, measured: { low: null, expected: run, high: null } })]
    }),
}

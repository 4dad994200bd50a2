import { plantedBeds } from '../by-bed'
import { compareText, findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Grown } from '../prepared'
import type { Rule } from '../rule'

const MOST_ALIKE = 3

function areAlike(a: Grown, b: Grown): boolean {
  const [one, other] = [a.mature.expected, b.mature.expected]
  const touch = Math.abs(other.x - one.x) - (one.spread + other.spread) / 2 <= CONTACT
  return touch && a.plant.foliageColor === b.plant.foliageColor && a.plant.texture === b.plant.texture
}

/** Meant to be one green: they count as one plant. */
const areOneMass = ({ placement: a }: Grown, { placement: b }: Grown): boolean =>
  (a.drift !== undefined && a.drift === b.drift) || (a.role === 'hedge' && b.role === 'hedge')

/** The longest run of neighbours that are alike, masses counted once; plants in the order of a walk along the wall. */
function longestRun(plants: readonly Grown[]): number {
  let [longest, run] = [0, 0]
  plants.forEach((one, i) => {
    const last = plants[i - 1]
    if (last && areAlike(last, one)) run += areOneMass(last, one) ? 0 : 1
    else run = 1
    longest = Math.max(longest, run)
  })
  return longest
}

/** Of plants at one x neither is the first: the walk is taken both ways, so that a mirrored bed is told the same. */
const walks = (plants: readonly Grown[]) => ([1, -1] as const).map((way) => [...plants].sort((a, b) => way * (a.placement.x - b.placement.x) || a.placement.y - b.placement.y || compareText(a.placement.id, b.placement.id)))

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
    notes: 'The longest run of a bed is told, once for the bed, whatever the rows. Plants touch where their expected crowns share some of the wall. Plants of one drift side by side, and those of a hedge, are meant to be one green: they count as one. Never held: shears do not change a color.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) => {
      const run = Math.max(...walks(plants).map(longestRun))
      return run <= MOST_ALIKE ? [] : [findingOf({ rule: 'same-green', kind: 'note', placements: [], feature: bed.id, limit: MOST_ALIKE, measured: { low: null, expected: run, high: null } })]
    }),
}

import { plantedBeds } from '../by-bed'
import { idsOf } from '../by-plant'
import { findingOf } from '../finding'
import { byDrift } from '../prepared'
import type { Rule } from '../rule'

const EVEN = new Set([2, 4, 6, 8])

export const oddDrift: Rule = {
  scope: 'sheet',
  meta: {
    id: 'odd-drift',
    title: 'Odd numbers',
    question: 'Is the drift an odd number?',
    measures: 'count',
    settings: [],
    fixedKind: 'note',
    sources: [{ publisher: 'Sustainable Technologies Evaluation Program, Toronto area conservation authorities', title: 'Planting design: groups of 3, 5 or 7 of one kind', address: 'https://wikidev.sustainabletechnologies.ca/index.php?diff=9742&mobileaction=toggle_view_mobile&title=Planting_design', known: 'read' }],
    notes: 'Counted bed by bed. Hedges are not judged, nor drifts of ten and more, where nobody counts.',
  },
  judge: (prepared) =>
    plantedBeds(prepared).flatMap(({ bed, plants }) =>
      [...byDrift(plants).values()].filter((drift) => EVEN.has(drift.length) && drift.every(({ placement }) => placement.role !== 'hedge')).map((drift) =>
        findingOf({ rule: 'odd-drift', kind: 'note', placements: idsOf(drift), feature: bed.id, measured: { low: null, expected: drift.length, high: null } }),
      ),
    ),
}

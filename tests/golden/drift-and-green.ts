/**
 * Eight of one plant in a row, the first four a drift. Expected 24 across.
 *
 *   y 48    g1  g2  g3      g4  g5  g6  g7  g8
 *   x       40  64  88     130 154 178 202 226
 *           '---- drift ----'
 *
 * g4 stands 42 from g3, its nearest mate: 6 more than 1.5 x 24. The others stand 24 apart.
 * The drift is of four: an even number.
 * g1, g2, g3 are one mass. Between g3 and g4 there is a gap. From g4 on five touch and look alike, g4 alone of the drift: five.
 */
import type { Expected } from './expected'

export const rules = ['open-drift', 'odd-drift', 'same-green']

export const expected: Expected[] = [
  { rule: 'open-drift', kind: 'note', placements: ['g4'], feature: null, limit: 36, measured: [null, 42, null], excess: 6, year: null },
  { rule: 'odd-drift', kind: 'note', placements: ['g1', 'g2', 'g3', 'g4'], feature: 'b1', measured: [null, 4, null], excess: 0, year: null },
  { rule: 'same-green', kind: 'note', placements: [], feature: 'b1', limit: 3, measured: [null, 5, null], excess: 0, year: null },
]

/**
 * A wall with nothing planted: soil that falls too little, mulch too high, one downspout too short.
 *
 *   wall  |        foundation showing 7, mulch 3: 4 left of the 6 under lap siding
 *         |_____
 *         |     ----____ 0.03 in per inch: 3.6 in over 10 ft of the 6
 *         |====> 24      first downspout: 36 short of 60
 *         |============> 72 second downspout
 */
import type { Expected } from './expected'

export const rules = ['ground-fall', 'siding-gap', 'downspout']

export const expected: Expected[] = [
  { rule: 'ground-fall', kind: 'risk', placements: [], feature: null, limit: 6, measured: [3.6, 3.6, 3.6], excess: 2.4, year: null },
  { rule: 'siding-gap', kind: 'risk', placements: [], feature: null, limit: 6, measured: [4, 4, 4], excess: 2, year: null },
  { rule: 'downspout', kind: 'note', placements: [], feature: 's1', limit: 60, measured: [24, 24, 24], excess: 36, year: null },
]

/**
 * A bed 240 by 96 with a deciduous dome at its left and an evergreen one at its right; the brief asks for birds.
 *
 *   y 0   ======================== wall ======================
 *   48            c1                        c2
 *   96    ----------------------------------------------------
 *   x 0           60          120           180            240
 *
 * c1: expected 48 by 48, native, flowers in May and June. c2: expected 24 tall and 36 wide, evergreen, no flower of note.
 *
 * Cover: pi (24^2 + 18^2) = 2827.433 of 23040: 0.122719 of the 0.7.
 * Volumes of half ellipsoids go as s^2 h: 110592 and 31104. Evergreen 31104 / 141696 = 0.219512 of the 0.33; native
 *   110592 / 141696 = 0.780488, more than 0.7: no finding.
 * Silhouettes go as s h: 2304 and 864, each 60 from the middle: left 0.727273, past 0.65.
 * Nothing flowers in April, July, August, September and October: five months.
 */
import type { Expected } from './expected'

export const rules = ['cover', 'evergreen-share', 'bloom-gaps', 'balance', 'native-share', 'same-green', 'odd-drift', 'open-drift']

export const expected: Expected[] = [
  { rule: 'balance', kind: 'note', placements: [], feature: 'b1', limit: 0.65, measured: [null, 0.727273, null], excess: 0, year: null },
  { rule: 'bloom-gaps', kind: 'note', placements: [], feature: 'b1', limit: 0, measured: [null, 5, null], excess: 0, year: null },
  { rule: 'cover', kind: 'note', placements: [], feature: 'b1', limit: 0.7, measured: [null, 0.122719, null], excess: 0, year: null },
  { rule: 'evergreen-share', kind: 'note', placements: [], feature: 'b1', limit: 0.33, measured: [null, 0.219512, null], excess: 0, year: null },
]

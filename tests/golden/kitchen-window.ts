/**
 * A kitchen window, two round shrubs and a column. Wall along y = 0, soil falling 0.05 in per inch, gutter 110, overhang 16.
 *
 *   z 110 ________________________________________ gutter
 *      92        +------------+
 *                |  Kitchen   |               |  a3
 *      38        +------------+               |  column
 *                     a1           a2         |
 *       0 ____________()__________()__________|___
 *      x 0       60   96    132   150        200   240
 *
 *      y 0  ==================== wall ====================
 *      30                                     a3
 *      36                          a2
 *      40              a1
 *      96  -------------------- edge of bed ---------------
 *
 * Round shrub: dome, 36 / 48 / 60 tall and 40 / 48 / 56 wide (low / expected / high).
 *
 * a1, y 40: soil -2, under the window (dx 0). Tops 34, 46, 58 against a sill of 38: two of three bounds, a risk of 20 in.
 *   Wall: 40 - 20, 24, 28 = 20, 16, 12: the last is the gap exactly, so it holds.
 *   Year: high 18 + 42 q = 40.01 at k = 14/42, no lag: q 0.52405, t 2.227. Expected 18 + 30 q = 40.01 at k = 10/30, lag 1:
 *   q 0.73367, t 4.969. Low never.
 * a2, y 36: soil -1.8, 18 in right of the window. A dome of radius r reaches out 18 up to h sqrt(1 - (18/r)^2):
 *   36 x 0.43589, 48 x 0.66144, 60 x 0.76599, less 1.8: 13.892, 29.949, 44.159. Only the high bound passes 38, by 6.159.
 *   Wall: 36 - 20, 24, 28 = 16, 12, 8: only the high bound, 4 short. 9 + 19 q = 24.01: q 0.79, t 4.682 in all three places.
 * a1 and a2 stand 54.148 apart: 55.9998 together at most, 1.852 over, 3.3 % of 56: under a tenth.
 * a3, y 30: column 96 / 108 / 120 tall, 30 / 33 / 36 wide, soil -1.5. It reaches the gutter's edge where its radius is
 *   30 - 16 = 14 at least: v = sqrt(1 - (14/r)^2), u = 0.8 + 0.2 v: 0.87180, 0.90584, 0.92571 of its height, less 1.5:
 *   82.193, 96.331, 109.585. Limit 110 - 12 = 98: the high bound, by 11.585. Wall 30 - 18 = 12: holds.
 */
import type { Expected } from './expected'

export const expected: Expected[] = [
  { rule: 'sill', kind: 'risk', placements: ['a1'], feature: 'w1', limit: 38, measured: [34, 46, 58], excess: 20, year: [2.227, 4.969, 4.969] },
  { rule: 'gutter', kind: 'risk', placements: ['a3'], feature: null, limit: 98, measured: [82.193, 96.331, 109.585], excess: 11.585 },
  { rule: 'sill', kind: 'risk', placements: ['a2'], feature: 'w1', limit: 38, measured: [13.892, 29.949, 44.159], excess: 6.159, year: [6.61, 6.61, 6.61] },
  { rule: 'wall-gap', kind: 'risk', placements: ['a2'], feature: null, limit: 12, measured: [16, 12, 8], excess: 4, year: [4.682, 4.682, 4.682] },
]

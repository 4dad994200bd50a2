/**
 * A wall that steps 36 in forward at x 144; zone 5b, part shade; soil 0 falling 0.05 in per inch of distance from the wall.
 *
 *      y 0  ======== wall ========+
 *      30                      e1 |
 *      36                         +======== wall =========
 *      40                                          (e9 goes)
 *      60   e3      e2
 *      80                e4
 *     100                              e5
 *     120  ------------------------------- e7 --------------  edge of bed
 *     150           e6                             e8 (stays)
 *      x 0  20      60  100   130 144 180  220     270   288
 *
 * e1: dome, one listed size 30: 25.5 / 30 / 34.5. The return at x 144 is nearer (14) than the wall behind (30):
 *   14 - 12.75, 15, 17.25 = 1.25, -1, -3.25 against 12: all bounds, worst 15.25.
 * e2, e3: one plant, hardy from zone 6; the site is 5: one conflict naming both. e8 is that plant too, but it stays: unnamed.
 * e4: hardy to zone 4 only, the site is warmer: a risk. e5: listed for full sun alone, the front is part shade: a risk.
 * e6: 30 in outside the bed. e7: on its edge, which counts as inside. e8 stays and is not judged there.
 * e9 goes: 4 in off the wall, and ignored. e6 stands before e2 but lower: soil -7.5 against -3, same height.
 */
import type { Expected } from './expected'

export const expected: Expected[] = [
  { rule: 'outside-bed', kind: 'conflict', placements: ['e6'], feature: null, measured: null, excess: 30, year: null },
  { rule: 'wall-gap', kind: 'conflict', placements: ['e1'], feature: null, limit: 12, measured: [1.25, -1, -3.25], excess: 15.25 },
  { rule: 'hardiness', kind: 'conflict', placements: ['e2', 'e3'], feature: 'p2', excess: 0, year: null },
  { rule: 'hardiness', kind: 'risk', placements: ['e4'], feature: 'p3', excess: 0, year: null },
  { rule: 'light', kind: 'risk', placements: ['e5'], feature: 'p4', excess: 0, year: null },
]

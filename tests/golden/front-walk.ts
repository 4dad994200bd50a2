/**
 * A clipped shrub and a tree beside a front walk. Level soil at 0, gutter 120, overhang 12, walk from y 72 to 120.
 *
 *      y 0  ================ wall =================
 *      46        c1 (kept 36 x 48)
 *      60                            c2 (tree)
 *      72  ---------------- walk ------------------
 *     120  ----------------------------------------
 *      x 0       60                 200            300
 *
 * c1: spreading, 48 / 60 / 72 tall, 60 / 72 / 84 wide, kept at 36 x 48. 26 in from the walk, 46 from the wall.
 *   As kept 26 - 24 = 2 and 46 - 24 = 22 at every bound: nothing broken. Left alone: walk 26 - 30, 36, 42 = -4, -10, -16;
 *   wall 46 - 30, 36, 42 = 16, 10, 4. So both are held by the shears, and carry the unclipped figures.
 *   Walk year, radius past 26.01: high 24 + 60 q = 52.02 at k 24/60: 1.573; expected 24 + 48 q at k 18/48, lag 1: 3.337;
 *   low 24 + 36 q at k 13/36, lag 2: 6.172.
 * c2: vase tree, 240 / 270 / 360 tall (high is 1.2 x 300), 180 / 210 / 288 wide, clear stem 0.15 h = 36, 40.5, 54.
 *   Below its shoulder radius = s/2 (0.3 + 0.7 u / 0.75). Wall, up to the gutter at 120: u 0.41176, 0.34641, 0.21569,
 *   radius 61.588, 65.448, 72.188, clearance 60 less that: -1.588, -5.448, -12.188. Against 12 in: all, worst 24.188.
 *   Walk, 12 in off, up to 80: u 0.21569, 0.17211, 0.08497, radius 45.118, 48.367, 54.620: -33.118, -36.367, -42.620.
 *   The planted tree, 96 x 36 with its shoulder at 75.6, already reaches 18 in over: year 0 throughout.
 *   Gutter: 60 - 12 = 48 out. v = sqrt(1 - (48/r)^2), u = 0.75 + 0.25 v: 0.96148, 0.97235, 0.98570; tops of the span
 *   36 + 204 u, 40.5 + 229.5 u, 54 + 306 u = 232.141, 263.654, 355.624. Limit 108: all, by up to 247.624.
 */
import type { Expected } from './expected'

export const expected: Expected[] = [
  { rule: 'gutter', kind: 'conflict', placements: ['c2'], feature: null, limit: 108, measured: [232.141, 263.654, 355.624], excess: 247.624 },
  { rule: 'walk-edge', kind: 'conflict', placements: ['c2'], feature: 'k1', limit: 0, measured: [-33.118, -36.367, -42.62], excess: 42.62, year: [0, 0, 0] },
  { rule: 'wall-gap', kind: 'conflict', placements: ['c2'], feature: null, limit: 12, measured: [-1.588, -5.448, -12.188], excess: 24.188 },
  { rule: 'walk-edge', kind: 'held', placements: ['c1'], feature: 'k1', limit: 0, measured: [-4, -10, -16], excess: 16, year: [1.573, 3.337, 6.172] },
  { rule: 'wall-gap', kind: 'held', placements: ['c1'], feature: null, limit: 12, measured: [16, 10, 4], excess: 8 },
]

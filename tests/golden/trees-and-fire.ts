/**
 * Two trees and a shrub before a house in a wildfire area. Wall along y = 0.
 *
 *   y 0   ======================== wall ======================
 *   50                          s1
 *   60    ........................ kept free of plants .........
 *   100         t1
 *   150                                         t2
 *   x          100              300             500
 *
 * t1: listed 240 to 480 tall, 200 to 300 wide. 240 and 360 want 96 in, 480 wants 180: 100 is 80 short of the last, a risk.
 *   Its crown counts 200, 250 and 1.2 x 300 = 360 wide: 100 less 100, 125, 180 leaves 0, -25, -80 of the 60 kept free.
 * t2: listed 500, 700, 900: 180, 180 and 240 wanted, 150 is 30, 30 and 90 short: a conflict. Crown 300, 350, 480 wide:
 *   150 less 150, 175, 240 leaves 0, -25, -90.
 * s1: its axis stands 50 from the wall, 10 inside the 60. A crown in the zone is a risk at most, an axis is a conflict.
 */
import type { Expected } from './expected'

export const rules = ['tree-distance', 'fire-zone']

export const expected: Expected[] = [
  { rule: 'tree-distance', kind: 'conflict', placements: ['t2'], feature: null, limit: 240, measured: [150, 150, 150], excess: 90, year: null },
  { rule: 'fire-zone', kind: 'conflict', placements: ['s1'], feature: null, limit: 60, measured: [50, 50, 50], excess: 10, year: null },
  { rule: 'fire-zone', kind: 'risk', placements: ['t2'], feature: null, limit: 60, measured: [0, -25, -90], excess: 150, year: null },
  { rule: 'fire-zone', kind: 'risk', placements: ['t1'], feature: null, limit: 60, measured: [0, -25, -80], excess: 140, year: null },
  { rule: 'tree-distance', kind: 'risk', placements: ['t1'], feature: null, limit: 180, measured: [100, 100, 100], excess: 80, year: null },
]

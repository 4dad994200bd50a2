/**
 * Two domes that only shears keep: one below the sill of the kitchen, one cut harder than it bears.
 *
 *   z 38        +------------+  sill of the kitchen
 *                    k1               k2
 *       0 ___________(==)_____________(=)______
 *      x 0      60   96     132       200     240
 *
 * Dome: 36 / 48 / 60 tall and 40 / 48 / 56 wide; soil at y 40: -2.
 *
 * k1, kept 32 by 44: its tops are 30 at most, below the sill at 38. Unclipped 34, 46, 58: by 20, so it is held.
 *   32 / 48 and 44 / 48 are more than 0.6. Wall: 40 - 20, 22, 22, all more than 12; unclipped 20, 16, 12: holds too.
 * k2, kept 26 tall: 26 / 48 = 0.541667 of its height, 0.6 x 48 - 26 = 2.8 too little.
 */
import type { Expected } from './expected'

export const rules = ['sill', 'wall-gap', 'hard-to-hold', 'walk-edge', 'gutter', 'crowding']

export const expected: Expected[] = [
  { rule: 'hard-to-hold', kind: 'risk', placements: ['k2'], feature: 'p1', limit: 0.6, measured: [null, 0.541667, null], excess: 2.8, year: null },
  { rule: 'sill', kind: 'held', placements: ['k1'], feature: 'w1', limit: 38, measured: [34, 46, 58], excess: 20, year: [2.227, 4.969, 4.969] },
]

/**
 * A side wall: an electric meter, a house number, a walk. Wall along y = 0, soil falling 0.05 in per inch.
 *
 *   z 64          +--+ meter, its room to 77.6
 *   z 56..50      |  |          [ 42 ] house number
 *      40         +--+
 *                      a1        a2 column     a3 thorns
 *       0 _____________()________|_|__________()________
 *      x 0     93 108 123  140   200  214     260     360
 *
 *      y 0  ==================== wall ====================
 *      44        ..........      edge of the meter's room
 *      40                        a2
 *      50                  a1
 *      60                                     a3
 *      120 -------------------- side walk ----------------
 *
 * Domes a1 and a3: 36 / 48 / 60 tall and 40 / 48 / 56 wide. Column a2: 96 / 108 / 120 tall, 30 / 33 / 36 wide.
 *
 * a1 at (140, 50), soil -2.5. The meter is 16 wide: its room is 30 wide about 108, so 93 to 123; out to 8 + 36 = 44; from the
 *   soil before it, 8 x -0.05 = -0.4, up to 77.6. From the axis to its corner (123, 44): sqrt(17^2 + 6^2) = 18.02776.
 *   Widest from -0.4 up, 2.1 above its soil: 20 sqrt(1 - (2.1/36)^2), 24 sqrt(1 - (2.1/48)^2), 28 sqrt(1 - (2.1/60)^2):
 *   19.96594, 23.97702, 27.98285. Left: -1.93818, -5.94926, -9.95509: at every size in the room.
 * a2 at (207, 40), soil -2, square before the number, 7 to each side of it. At its lower edge, 52 above the soil, the column is
 *   15 (0.9 + 0.1 x 52/96 / 0.8) = 14.5 and more: all hidden. Reach up to 58 above the soil, below the shoulder:
 *   15 x 0.975521, 16.5 x 0.967130, 18 x 0.960417: the last is 17.2875 past the middle.
 * a3 at (260, 60), thorny: 60 to the walk less 20, 24, 28 is 40, 36, 32 of the 36 kept: the middle one keeps it exactly.
 */
import type { Expected } from './expected'

export const rules = ['service', 'number-view', 'thorns', 'walk-edge', 'wall-gap', 'gutter', 'crowding']

export const expected: Expected[] = [
  { rule: 'number-view', kind: 'conflict', placements: ['a2'], feature: 'f2', limit: 0, measured: [1, 1, 1], excess: 17.2875 },
  { rule: 'service', kind: 'conflict', placements: ['a1'], feature: 'f1', limit: 0, measured: [-1.93818, -5.94926, -9.95509], excess: 9.95509 },
  { rule: 'thorns', kind: 'risk', placements: ['a3'], feature: 'k1', limit: 36, measured: [40, 36, 32], excess: 4 },
]

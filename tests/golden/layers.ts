/**
 * Layers and neighbours on level soil at 0, bed 360 x 120, gutter far up at 200.
 *
 *      y 0  ========================= wall =========================
 *      42           b1 back shrub
 *      70                                                   m1 mat
 *      80            f1 front shrub
 *      90                               g1    g2    g3  (one drift)
 *     116         s1 grass
 *      x 0        90 100 110           220   250   280    310       360
 *
 * b1 rounded 48 / 54 / 60 tall and wide; f1 upright 42 / 54 / 66 tall, 36 / 42 / 48 wide; distance sqrt(10^2 + 38^2) = 39.294.
 *   Rise of f1 over b1, low with low: 42 - 48, 54 - 54, 66 - 60 = -6, 0, 6: a risk of 6. In x: 73-127 and 89-131, ample.
 *   Together they are widest where f1 reaches its shoulder (low: where b1 does, 21.6):
 *     low  24 + 17.9927 = 41.9927, 2.699 over, 0.07497 of 36: allowed;
 *     expected at 27: 26.8882 + 21 = 47.8882, 8.594 over, 0.20463 of 42;
 *     high at 33: 29.4999 + 24 = 53.4999, 14.206 over, 0.29596 of 48. A tenth is allowed: worst 14.206 - 4.8 = 9.406.
 *   Wall: 42 - 24, 27, 30 = 18, 15, 12: holds.
 * g1-g3 domes 20 / 24 / 28 tall, 32 / 36 / 40 wide, 30 apart in one drift: 2, 6, 10 over; 10 is a quarter of 40 exactly.
 * m1 mat 6 / 8 / 10 tall, 48 / 60 / 72 wide, 36.056 from g3: 3.944, 11.944, 19.944 over at the soil: 0.4986 of 40 at most,
 *   and a groundcover may take 0.5. But g3 stands 20 in nearer and 262-298 overlaps 280-340 by half: 14, 16, 18 above it.
 * s1 grass, one listed size 60 x 24: 51 / 60 / 69 tall, 20.4 / 24 / 27.6 wide. In x 78-102. Before f1: 51 - 42, 60 - 54,
 *   69 - 66 = 9, 6, 3; before b1: 3, 6, 9. All bounds, but a grass in front is a risk at most.
 *   It stands 41.18 from f1: 37.8 together at most, clear.
 */
import type { Expected } from './expected'

export const expected: Expected[] = [
  { rule: 'layer-order', kind: 'conflict', placements: ['g3', 'm1'], feature: null, limit: 0, measured: [14, 16, 18], excess: 18 },
  { rule: 'crowding', kind: 'risk', placements: ['b1', 'f1'], feature: null, limit: 0.1, measured: [0.07497, 0.20463, 0.29596], excess: 9.406 },
  { rule: 'layer-order', kind: 'risk', placements: ['s1', 'b1'], feature: null, limit: 0, measured: [3, 6, 9], excess: 9 },
  { rule: 'layer-order', kind: 'risk', placements: ['s1', 'f1'], feature: null, limit: 0, measured: [9, 6, 3], excess: 9 },
  { rule: 'layer-order', kind: 'risk', placements: ['f1', 'b1'], feature: null, limit: 0, measured: [-6, 0, 6], excess: 6 },
]

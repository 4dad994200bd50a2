/**
 * A front with a door, a column at one corner and nothing at the other. Level soil, gutter 108.
 *
 *   z 108 _________________________________________________ gutter
 *      72 ...|.|.......................................... two thirds
 *            |b1                  +--+
 *      36    | |                  |  | door        b2
 *       0 ___|_|__________________|__|____________()__________
 *      x 0   24                  220 260         290       480
 *
 *      y 0  ======================== wall ======================
 *      24     b1
 *      40                                         b2
 *      96  --------------left bed      right bed --------------
 *
 * Column: expected 108 tall. Dome: expected 48 tall.
 *
 * b1 at (24, 24): 33.9 from the left corner, within 48: 108 against 2/3 x 108 = 72, 36 too tall. From the door's line at
 *   (220, 0) far more than 72.
 * b2 at (290, 40): to the door's right edge at (260, 0) sqrt(30^2 + 40^2) = 50, within 72: 48 tall against 36, 12 too tall.
 * Right corner (480, 0): a planted bed comes up to it, nothing stands within 48: min(108 / 3, 48) = 36 would close it.
 */
import type { Expected } from './expected'

export const rules = ['corner-height', 'entry-height']

export const expected: Expected[] = [
  { rule: 'corner-height', kind: 'risk', placements: ['b1'], feature: 'left', limit: 72, measured: [null, 108, null], excess: 36, year: null },
  { rule: 'entry-height', kind: 'risk', placements: ['b2'], feature: 'd1', limit: 36, measured: [null, 48, null], excess: 12, year: null },
  { rule: 'corner-height', kind: 'note', placements: [], feature: 'right', limit: 36, measured: null, excess: 36, year: null },
]

/**
 * One plant in every wrong place: zone 2b, full shade, wet soil, many deer, a walnut, children. Overhang 24.
 *
 *   y 0   ======================== wall ======================
 *   24    ........................ eaves ......................
 *   30           e1
 *   36    ........................ rain from here on ...........
 *   60                        e3 (stays)        e2
 *   x            60           120               180
 *
 * The plant: zones 3 to 9, full sun, medium soil, often eaten, sensitive to juglone, toxic, reported invasive.
 * e3 stands there and stays: it is judged by what eats it and whom it harms, and by nothing else of these.
 * e1 stands 30 from the wall, 6 short of 24 + 12.
 */
import type { Expected } from './expected'

export const rules = ['hardiness', 'light', 'moisture', 'rain-shadow', 'walnut', 'deer', 'toxic', 'invasive', 'hard-to-hold']

const site = (rule: string, kind: Expected['kind'], placements: string[]): Expected => ({ rule, kind, placements, feature: 'p1', measured: null, excess: 0, year: null })

export const expected: Expected[] = [
  site('hardiness', 'conflict', ['e1', 'e2']),
  site('deer', 'risk', ['e1', 'e2', 'e3']),
  site('invasive', 'risk', ['e1', 'e2']),
  site('light', 'risk', ['e1', 'e2']),
  site('moisture', 'risk', ['e1', 'e2']),
  site('toxic', 'risk', ['e1', 'e2', 'e3']),
  site('walnut', 'risk', ['e1', 'e2']),
  { rule: 'rain-shadow', kind: 'note', placements: ['e1'], feature: 'p1', limit: 36, measured: [30, 30, 30], excess: 6, year: null },
]

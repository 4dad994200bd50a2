/** How much of each bed lies under crowns, seen from above. */
import { sharesOf } from './by-year'
import type { Crown } from './crown'
import { boxOf } from './geometry/box'
import { sharedLength, union, type Interval } from './intervals'
import type { Prepared } from './prepared'
import type { Bed, Inches, Point, ShareOf } from './types'
import { isOnWall } from './verdict'

/** Scan lines across a bed: discs and slanted edges are added up to within a hundredth. */
const LINES = 64

interface Line {
  x: Inches
  /** Where the line lies in the bed. */
  inside: readonly Interval[]
}

function crossings(x: Inches, outline: readonly Point[]): Interval[] {
  const ys: number[] = []
  for (let i = 0, j = outline.length - 1; i < outline.length; j = i++) {
    const [a, b] = [outline[i]!, outline[j]!]
    if (a.x > x !== b.x > x) ys.push(a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x))
  }
  ys.sort((a, b) => a - b)
  return Array.from({ length: Math.floor(ys.length / 2) }, (_, i) => [ys[2 * i]!, ys[2 * i + 1]!] as const)
}

/** The lines a bed is measured by; worked out once for all ages. */
export function linesOf({ outline }: Bed): Line[] {
  const { left, right } = boxOf(outline)
  return Array.from({ length: LINES }, (_, i) => {
    const x = left + ((i + 0.5) * (right - left)) / LINES
    return { x, inside: crossings(x, outline) }
  })
}

/** Share of a bed, given by its lines, under the union of some crowns' discs, 0 to 1. */
export function coveredShare(lines: readonly Line[], crowns: readonly Crown[]): number {
  let [whole, covered] = [0, 0]
  for (const { x, inside } of lines) {
    const chords: Interval[] = []
    for (const crown of crowns) {
      const half = (crown.spread / 2) ** 2 - (crown.x - x) ** 2
      if (half > 0) chords.push([crown.y - Math.sqrt(half), crown.y + Math.sqrt(half)])
    }
    for (const [from, to] of inside) whole += to - from
    if (chords.length > 0) covered += sharedLength(inside, union(chords))
  }
  return whole > 0 ? covered / whole : 0
}

/** Of every bed, in the sheet's order, the share covered by bound and year. Plants trained on the wall are left out. */
export function coveredBeds({ sheet, neighbours }: Prepared): ShareOf[] {
  return sheet.beds.map((bed) => {
    const { left, right } = boxOf(bed.outline)
    const lines = linesOf(bed)
    const near = neighbours.near(left, right).filter((one) => !isOnWall(one))
    return sharesOf(bed.id, near, (crowns) => coveredShare(lines, crowns))
  })
}

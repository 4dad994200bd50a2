/** How much of each window the plants hide, seen square-on. */
import { sharesOf } from './by-year'
import { footOf, radiusAt, topOf, type Crown } from './crown'
import { lengthOf, union } from './intervals'
import type { Prepared } from './prepared'
import type { Opening, ShareOf } from './types'

/** Scan lines across what crowns reach of the glass: a level edge between two of them is off by half a line at most. */
const LINES = 64

/** Share of a window's rectangle under the union of some crowns, 0 to 1, within 0.01 of exact. */
export function hiddenShare({ x, width, sill, head }: Opening, crowns: readonly Crown[]): number {
  const near = crowns.filter((crown) => Math.abs(crown.x - (x + width / 2)) < (crown.spread + width) / 2 && topOf(crown) > sill && footOf(crown) < head)
  if (near.length === 0 || head <= sill || width <= 0) return 0
  const bottom = Math.max(sill, Math.min(...near.map(footOf)))
  const top = Math.min(head, Math.max(...near.map(topOf)))
  let hidden = 0
  for (let i = 0; i < LINES; i++) {
    const z = bottom + ((i + 0.5) * (top - bottom)) / LINES
    hidden += lengthOf(union(near.map((crown) => {
      const radius = radiusAt(crown, z)
      return [Math.max(x, crown.x - radius), Math.min(x + width, crown.x + radius)] as const
    })))
  }
  return ((hidden / LINES) * (top - bottom)) / ((head - sill) * width)
}

/** Of every window, in the sheet's order, the share hidden by bound and year. */
export function hiddenWindows({ sheet, neighbours }: Prepared): ShareOf[] {
  return sheet.openings
    .filter(({ kind }) => kind === 'window')
    .map((window) => {
      const near = neighbours.near(window.x, window.x + window.width).filter(({ tallest }) => tallest > window.sill)
      return sharesOf(window.id, near, (crowns) => hiddenShare(window, crowns))
    })
}

/** How much of each bed lies under crowns, seen from above: exact. */
import { sharesOf } from './by-year'
import type { Crown } from './crown'
import { boxOf, gapTo } from './geometry/box'
import { areaUnder } from './geometry/discs'
import { polygonArea } from './geometry/polygon'
import type { Grown, Prepared } from './prepared'
import type { Bed, ShareOf } from './types'
import { isOnWall } from './verdict'

/** Those whose crowns could ever lie over a bed; plants trained on the wall are left out. */
export function crownsOver({ neighbours }: Pick<Prepared, 'neighbours'>, { outline }: Bed): Grown[] {
  const { left, right, back, front } = boxOf(outline)
  return neighbours.near(left, right).filter((one) => !isOnWall(one) && gapTo(one.placement.y, back, front) < one.widest)
}

/** Share of a bed under the union of some crowns' discs, 0 to 1. */
export function coveredShare({ outline }: Bed, crowns: readonly Crown[]): number {
  const area = Math.abs(polygonArea(outline))
  if (area === 0) return 0
  return Math.min(1, areaUnder(crowns.map(({ x, y, spread }) => ({ x, y, r: spread / 2 })), outline) / area)
}

/** Of every bed, in the sheet's order, the share covered by bound and year. */
export const coveredBeds = (prepared: Prepared): ShareOf[] =>
  prepared.sheet.beds.map((bed) => sharesOf(bed.id, crownsOver(prepared, bed), (crowns) => coveredShare(bed, crowns)))

/** What stands in a bed, and the figures its composition is judged by: crowns at expected maturity, as kept. */
import { crownVolume, type Crown } from './crown'
import type { Grown, Prepared } from './prepared'
import type { Bed } from './types'
import type { Plant } from '../plants/types'

export interface Planted {
  bed: Bed
  /** From left to right. */
  plants: Grown[]
}

const alongWall = (a: Grown, b: Grown) => a.placement.x - b.placement.x || (a.placement.id < b.placement.id ? -1 : 1)

function workOut({ sheet, grown }: Prepared): Planted[] {
  const byBed = new Map<Bed, Grown[]>(sheet.beds.map((bed) => [bed, []]))
  for (const one of [...grown].sort(alongWall)) for (const bed of one.beds()) byBed.get(bed)?.push(one)
  return [...byBed].flatMap(([bed, plants]) => (plants.length > 0 ? [{ bed, plants }] : []))
}

/** Five rules ask the same of one sheet. */
const known = new WeakMap<Prepared, Planted[]>()

/** The beds that have plants, each with those whose axis stands in it. */
export function plantedBeds(prepared: Prepared): Planted[] {
  let found = known.get(prepared)
  if (!found) known.set(prepared, (found = workOut(prepared)))
  return found
}

/** The crown at expected maturity, as kept or as it would be unclipped. */
export const grownUp = (one: Grown, natural: boolean): Crown => (natural ? one.natural : one.mature).expected

/** Share of some plants' crown volume that `weightOf` counts (0 to 1 each); null where there is no volume. */
export function volumeShare(plants: readonly Grown[], natural: boolean, weightOf: (one: Grown) => number): number | null {
  let whole = 0
  let counted = 0
  for (const one of plants) {
    const volume = crownVolume(grownUp(one, natural))
    whole += volume
    counted += volume * weightOf(one)
  }
  return whole > 0 ? counted / whole : null
}

const FIRST_MONTH = 4
const LAST_MONTH = 10

/** Months from April to October, 4 to 10, in which none of some plants flowers. */
export function bloomGaps(plants: readonly Pick<Plant, 'bloomMonths'>[]): number[] {
  const flowering = new Set(plants.flatMap(({ bloomMonths }) => bloomMonths))
  return Array.from({ length: LAST_MONTH - FIRST_MONTH + 1 }, (_, i) => FIRST_MONTH + i).filter((month) => !flowering.has(month))
}

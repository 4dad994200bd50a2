/** A sheet made ready to be judged: crowns at maturity, soil and wall distances, standards - each worked out once. */
import type { Plant } from '../plants/types'
import { crownOf, type When } from './growth'
import type { Crown } from './crown'
import { groundAt, wallDistance } from './geometry/wall'
import { BOUNDS, type Bound, type ByBound, type Inches, type Placement, type Sheet } from './types'

/** One placement, grown. */
export interface Grown {
  placement: Placement
  plant: Plant
  wallDistance: Inches
  /** Has it a kept size? */
  isKept: boolean
  stays: boolean
  /** Crowns at maturity, as kept and as they would be unclipped (the same where nothing is kept). */
  mature: ByBound<Crown>
  natural: ByBound<Crown>
  /** Largest radius it can have at any age: a quick bound for what it can touch. */
  widest: Inches
  crown(bound: Bound, year: When, natural: boolean): Crown
}

export interface Prepared {
  sheet: Sheet
  standards: Record<string, number | string>
  /** All that stand or will stand, in the sheet's order: plants that go are ignored by everything. */
  grown: Grown[]
  byId: Map<string, Grown>
  plants: Map<string, Plant>
}

const byBound = <T>(of: (bound: Bound) => T): ByBound<T> => ({ low: of('low'), expected: of('expected'), high: of('high') })

/** Grows one placement on a sheet. */
export function growPlacement(sheet: Sheet, plant: Plant, placement: Placement): Grown {
  const base = { plant, placement, facade: sheet.facade, zone: sheet.site.zone }
  const isKept = placement.kept?.height !== undefined || placement.kept?.spread !== undefined
  const natural = byBound((bound) => crownOf({ ...base, bound, year: 'mature', natural: true }))
  const mature = isKept ? byBound((bound) => crownOf({ ...base, bound, year: 'mature' })) : natural
  // Crowns at other ages share the axis: only their size is worked out anew.
  const z0 = groundAt(sheet.facade, placement.x, placement.y)
  const level = { ...base, facade: { ...sheet.facade, grade: [{ x: 0, z: z0 }], fall: 0 } }
  return {
    placement, plant, isKept, natural, mature,
    stays: placement.status === 'stays',
    wallDistance: wallDistance(sheet.facade, placement.x, placement.y),
    widest: Math.max(...BOUNDS.map((bound) => natural[bound].spread / 2)),
    crown: (bound, year, unclipped) =>
      year === 'mature' ? (unclipped ? natural : mature)[bound] : crownOf({ ...level, bound, year, natural: unclipped }),
  }
}

/** Makes a sheet ready to be judged by the standards in force on it. */
export function growSheet(sheet: Sheet, standards: Prepared['standards']): Prepared {
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  const grown = sheet.placements.flatMap((placement) => {
    const plant = plants.get(placement.plant)
    return plant && placement.status !== 'goes' ? [growPlacement(sheet, plant, placement)] : []
  })
  return { sheet, standards, grown, byId: new Map(grown.map((one) => [one.placement.id, one])), plants }
}

/** A standard that is a number. */
export const numberOf = ({ standards }: Prepared, name: string): number => standards[name] as number

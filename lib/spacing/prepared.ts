/** A sheet made ready to be judged: crowns at maturity, soil, wall distances, neighbourhoods, standards - each worked out once. */
import type { Plant } from '../plants/types'
import { makeCrown, type Crown } from './crown'
import { boxOf, type Box } from './geometry/box'
import { groundAt } from './geometry/ground'
import { pointInPolygon } from './geometry/polygon'
import { Strips, type Nearby } from './geometry/strips'
import { wallDistance } from './geometry/wall'
import { clearStemOf, courseOf, sizeOn, type When } from './growth'
import type { Bed, Bound, ByBound, Fixture, Inches, Opening, Placement, Sheet, Walk } from './types'

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
  /** Largest radius and highest top it can have at any age: quick bounds for what it can touch. */
  widest: Inches
  tallest: Inches
  /** The beds its axis stands in, the edge included. */
  beds(): readonly Bed[]
  crown(bound: Bound, year: When, natural: boolean): Crown
}

/** Something with an outline, and the box around it. */
export interface Outlined<T> {
  thing: T
  box: Box
}

export interface Prepared {
  sheet: Sheet
  standards: Record<string, number | string>
  /** All that stand or will stand, in the sheet's order: plants that go are ignored by everything. */
  grown: Grown[]
  plants: Map<string, Plant>
  /** What is found by its place along the wall: placements by the most they can ever take. */
  neighbours: Nearby<Grown>
  /** Mates by the name of their drift. */
  drifts: ReadonlyMap<string, readonly Grown[]>
  windows: Nearby<Opening>
  doors: Nearby<Opening>
  fixtures: Nearby<Fixture>
  walks: Nearby<Outlined<Walk>>
  beds: Nearby<Outlined<Bed>>
}

export const byBound = <T>(of: (bound: Bound) => T): ByBound<T> => ({ low: of('low'), expected: of('expected'), high: of('high') })

/** The stretch along the wall that a placement can ever take. */
export const stretchOf = ({ placement: { x }, widest }: Grown) => ({ from: x - widest, to: x + widest })

type Fixed = Omit<Prepared, 'grown' | 'neighbours' | 'drifts'>

function bedsAt({ beds }: Fixed, placement: Placement): () => readonly Bed[] {
  let found: readonly Bed[] | null = null
  return () => {
    found ??= beds.near(placement.x, placement.x).flatMap(({ thing }) => (pointInPolygon(placement, thing.outline) ? [thing] : []))
    return found
  }
}

/** Grows one placement on a sheet. */
export function growPlacement(fixed: Fixed, plant: Plant, placement: Placement): Grown {
  const { facade, site } = fixed.sheet
  const { x, y, kept } = placement
  const axis = { x, y, z0: groundAt(facade, x, y), habit: plant.habit }
  const clearStem = clearStemOf(plant, placement)
  const courses = byBound((bound) => courseOf({ plant, placement, zone: site.zone, bound }))
  const grow = (bound: Bound, year: When, natural: boolean) => {
    const { height, spread } = sizeOn(courses[bound], year)
    return makeCrown(axis, { height, spread, clearStem: clearStem(height) }, natural ? undefined : kept)
  }
  const isKept = kept?.height !== undefined || kept?.spread !== undefined
  const natural = byBound((bound) => grow(bound, 'mature', true))
  const mature = isKept ? byBound((bound) => grow(bound, 'mature', false)) : natural
  return {
    placement, plant, isKept, natural, mature,
    stays: placement.status === 'stays',
    wallDistance: wallDistance(facade, x, y),
    widest: natural.high.spread / 2,
    tallest: axis.z0 + natural.high.height,
    beds: bedsAt(fixed, placement),
    crown: (bound, year, unclipped) => (year === 'mature' ? (unclipped ? natural : mature)[bound] : grow(bound, year, unclipped || !isKept)),
  }
}

const outlined = <T extends Walk | Bed>(things: readonly T[]): Strips<Outlined<T>> =>
  new Strips(things.map((thing) => ({ thing, box: boxOf(thing.outline) })), ({ box }) => ({ from: box.left, to: box.right }))

/** Plants by the name of their drift; those of none are left out. */
export function byDrift(grown: readonly Grown[]): Map<string, Grown[]> {
  const drifts = new Map<string, Grown[]>()
  for (const one of grown) {
    const { drift } = one.placement
    if (drift === undefined) continue
    const mates = drifts.get(drift)
    if (mates) mates.push(one)
    else drifts.set(drift, [one])
  }
  return drifts
}

/** Makes a sheet ready to be judged by the standards in force on it. */
export function growSheet(sheet: Sheet, standards: Prepared['standards']): Prepared {
  const wide = <T extends Opening | Fixture>(things: readonly T[]) => new Strips(things, ({ x, width }) => ({ from: x, to: x + width }))
  const fixed: Fixed = {
    sheet, standards,
    plants: new Map(sheet.plants.map((plant) => [plant.id, plant])),
    windows: wide(sheet.openings.filter(({ kind }) => kind === 'window')),
    doors: wide(sheet.openings.filter(({ kind }) => kind === 'door')),
    fixtures: wide(sheet.fixtures),
    walks: outlined(sheet.walks),
    beds: outlined(sheet.beds),
  }
  const grown = sheet.placements.flatMap((placement) => {
    const plant = fixed.plants.get(placement.plant)
    return plant && placement.status !== 'goes' ? [growPlacement(fixed, plant, placement)] : []
  })
  return { ...fixed, grown, neighbours: new Strips(grown, stretchOf), drifts: byDrift(grown) }
}

/** A standard that is a number. */
export const numberOf = ({ standards }: Pick<Prepared, 'standards'>, name: string): number => standards[name] as number

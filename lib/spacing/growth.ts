/**
 * How large a plant is, and when. Library sizes are ranges; growth from the planted size is monomolecular, so the
 * year a size is reached has a closed form. Inches and decimal years since planting.
 */
import type { Growth, Plant } from '../plants/types'
import { makeCrown, MOST_CLEAR, type Crown } from './crown'
import { groundAt } from './geometry/ground'
import type { Bound, ByBound, Facade, Inches, Placement, Size, Source } from './types'

export type When = number | 'mature'

type Woody = 'tree' | 'shrub' | 'conifer'
type Triple = ByBound<number>
const rates = (low: number, expected: number, high: number): Triple => ({ low, expected, high })

/** Speed of growth at the moment a plant breaks free, inches a year. */
const RATES: Record<Woody, Record<Growth, Triple>> = {
  tree: { slow: rates(6, 12, 20), moderate: rates(9, 18, 32), fast: rates(16, 30, 48) },
  shrub: { slow: rates(3, 5, 8), moderate: rates(7, 10, 14), fast: rates(13, 18, 24) },
  conifer: { slow: rates(1, 3, 6), moderate: rates(6, 8, 12), fast: rates(12, 15, 20) },
}
/** Years before a planted woody plant breaks free: the slow plant takes longest. */
const LAGS: Triple = { low: 2, expected: 1, high: 0 }
/** Years in which a herbaceous plant comes to 95 % of its size. */
const YEARS_TO_SIZE = { perennial: 3, grass: 3, fern: 4, bulb: 1, annual: 1 } as const
const GROUNDCOVER_YEARS: Record<Growth, number> = { slow: 5, moderate: 3, fast: 2 }

/** Where the growth figures come from. */
export const GROWTH_SOURCES: Source[] = [
  { publisher: 'US Forest Service', title: 'Urban tree database, RDS-2016-0005', address: 'https://doi.org/10.2737/RDS-2016-0005', known: 'read' },
  { publisher: 'Missouri Department of Conservation', title: 'Tree growth information (12 and 24 in a year)', address: 'https://mdc.mo.gov/trees-plants/tree-seedlings/tree-growth-information', known: 'read' },
  { publisher: 'USDA', title: 'PLANTS characteristics, height at base age (shrubs 10 years)', address: 'https://plants.sc.egov.usda.gov/', known: 'read' },
  { publisher: 'American Conifer Society', title: 'Conifer sizes and growth rates', address: 'https://conifersociety.org/conifers/learn/conifer-sizes-growth-rates/', known: 'read' },
]

function rangeOf(min: Inches, max: Inches, isTree: boolean): Triple {
  const isSingle = min === max
  return {
    low: isSingle ? 0.85 * min : min,
    expected: (min + max) / 2,
    high: isTree ? 1.2 * max : isSingle ? 1.15 * max : max,
  }
}

/**
 * The published mature size at one end of its range. A single figure gives 0.85 and 1.15 of itself; a tree's high
 * end is 1.2 x its largest figure, for lists give typical sizes and street trees measured by the US Forest Service
 * outgrow them.
 */
export function sizeRange(plant: Plant, bound: Bound): Size {
  const isTree = plant.category === 'tree'
  return {
    height: rangeOf(plant.heightMin, plant.heightMax, isTree)[bound],
    spread: rangeOf(plant.spreadMin, plant.spreadMax, isTree)[bound],
  }
}

/** The mature size of a placement: nothing shrinks, so a larger planted size stands. */
export function matureSize(plant: Plant, placement: Pick<Placement, 'planted'>, bound: Bound): Size {
  const { height, spread } = sizeRange(plant, bound)
  return { height: Math.max(height, placement.planted.height), spread: Math.max(spread, placement.planted.spread) }
}

/** A hardiness zone as a number, half zones as .0 and .5: 6b is 6.5. */
export const zoneNumber = (zone: string): number => parseInt(zone, 10) + (zone.endsWith('b') ? 0.5 : 0)

const isHerbaceous = (plant: Plant) => plant.category in YEARS_TO_SIZE || (plant.category === 'groundcover' && !isConifer(plant))
const isConifer = (plant: Plant) =>
  (plant.leaf === 'needle-evergreen' || plant.leaf === 'scale-evergreen') && (plant.category === 'shrub' || plant.category === 'groundcover')

function yearsToSize(plant: Plant): number {
  return plant.category === 'groundcover' ? GROUNDCOVER_YEARS[plant.growth] : YEARS_TO_SIZE[plant.category as keyof typeof YEARS_TO_SIZE]
}

/** How one placement grows at one bound, from its planted to its mature size: `share(t) = 1 - exp(-k max(0, t - lag))`. */
export interface Course {
  planted: Size
  mature: Size
  /** Per year; Infinity where there is nothing to gain. */
  k: number
  /** Years until it breaks free. */
  lag: number
}

/** The course of a placement at one bound. Herbaceous plants take the same time at every bound, and do not wait. */
export function courseOf({ plant, placement, zone, bound }: Omit<SizeArgs, 'year'>): Course {
  const { planted } = placement
  const mature = matureSize(plant, placement, bound)
  const gain = Math.max(mature.height - planted.height, mature.spread - planted.spread)
  if (gain <= 0) return { planted, mature, k: Infinity, lag: 0 }
  if (isHerbaceous(plant)) return { planted, mature, k: Math.log(20) / yearsToSize(plant), lag: 0 }
  const woody: Woody = plant.category === 'tree' ? 'tree' : isConifer(plant) ? 'conifer' : 'shrub'
  // The hardiness zone stands in, roughly, for the length of the season.
  const season = Math.min(1.4, Math.max(0.76, 1 + 0.08 * (zoneNumber(zone) - 6)))
  return { planted, mature, k: (RATES[woody][plant.growth][bound] * season) / gain, lag: placement.status === 'stays' ? 0 : LAGS[bound] }
}

/** Natural size on a course at some year. */
export function sizeOn({ planted, mature, k, lag }: Course, year: When): Size {
  if (year === 'mature' || k === Infinity) return mature
  const share = 1 - Math.exp(-k * Math.max(0, year - lag))
  return {
    height: planted.height + (mature.height - planted.height) * share,
    spread: planted.spread + (mature.spread - planted.spread) * share,
  }
}

export interface SizeArgs {
  plant: Plant
  placement: Placement
  zone: string
  bound: Bound
  year: When
}

/** Natural size at some year, before any clipping. */
export const sizeAt = (args: SizeArgs): Size => sizeOn(courseOf(args), args.year)

/** Year at which a height is reached; null where the plant never grows that tall. The closed inverse of `sizeAt`. */
export function yearOfHeight({ height, ...args }: Omit<SizeArgs, 'year'> & { height: Inches }): number | null {
  const { planted, mature, k, lag } = courseOf(args)
  if (height <= planted.height) return 0
  if (height >= mature.height) return null
  return lag - Math.log(1 - (height - planted.height) / (mature.height - planted.height)) / k
}

const FOLIAGE_TO_GROUND: ReadonlySet<string> = new Set(['pyramidal', 'columnar', 'weeping', 'multi-stem'])

/** Share of its height that a tree of some size is limbed up by when nobody says. */
const LIMBED_UP = 0.15
const LIMBED_FROM: Inches = 180

/** The clear stem of a placement at a height: as set, at most 0.6 of it; else by kind. */
export function clearStemOf(plant: Plant, placement: Placement): (height: Inches) => Inches {
  const set = placement.clearStem
  if (set !== undefined) return (height) => Math.min(set, MOST_CLEAR * height)
  const isLimbed = plant.category === 'tree' && !FOLIAGE_TO_GROUND.has(plant.habit) && matureSize(plant, placement, 'expected').height >= LIMBED_FROM
  return (height) => (isLimbed ? LIMBED_UP * height : 0)
}

export interface CrownArgs extends SizeArgs {
  facade: Pick<Facade, 'wall' | 'grade' | 'fall'>
  /** Leave the kept size out: the plant as it would grow unclipped. */
  natural?: boolean
}

/** The crown of a placement at some year and bound, standing on its soil. */
export function crownOf(args: CrownArgs): Crown {
  const { plant, placement, facade, natural } = args
  const size = sizeAt(args)
  const axis = { x: placement.x, y: placement.y, z0: groundAt(facade, placement.x, placement.y), habit: plant.habit }
  return makeCrown(axis, { ...size, clearStem: clearStemOf(plant, placement)(size.height) }, natural ? undefined : placement.kept)
}

/**
 * The vocabulary of the check. Lengths are inches, years are decimal years since planting.
 * Facade frame, seen from in front: x along the wall to the right, y out from the wall's base
 * line towards the viewer, z up.
 */
import type { Light, Plant, Water } from '../plants/types'

/** A length in inches. */
export type Inches = number

export interface Point {
  x: Inches
  y: Inches
}

export interface GradePoint {
  x: Inches
  z: Inches
}

export const BOUNDS = ['low', 'expected', 'high'] as const
/** Which end of the published size range is meant. */
export type Bound = (typeof BOUNDS)[number]

export interface Size {
  height: Inches
  spread: Inches
}

export const DEER_PRESSURES = ['none', 'some', 'high'] as const
export const WALNUTS = ['none', 'present', 'removed'] as const
export const AIMS = ['birds', 'pollinators', 'deer', 'children', 'pets', 'low-upkeep', 'winter'] as const
export type Aim = (typeof AIMS)[number]

export interface Site {
  /** Hardiness zone with half, 1a to 13b. */
  zone: string
  light: Light
  /** Degrees clockwise from north that the wall looks towards, 0-360. */
  facing?: number
  latitude?: number
  longitude?: number
  moisture: Water
  deer: (typeof DEER_PRESSURES)[number]
  walnut: (typeof WALNUTS)[number]
  fireZone: boolean
  brief?: Aim[]
}

export const SIDINGS = ['lap', 'masonry'] as const

export interface Facade {
  /** Wall line in plan, left to right; first and last points are the house corners. */
  wall: Point[]
  /** Soil along the wall, x strictly increasing. */
  grade: GradePoint[]
  /** Inches the soil drops per inch away from the wall; negative if it rises. */
  fall: number
  gutter: Inches
  overhang: Inches
  siding: (typeof SIDINGS)[number]
  /** Foundation showing above the soil. */
  exposed: Inches
  mulch: Inches
}

export const OPENING_KINDS = ['window', 'door'] as const

export interface Opening {
  id: string
  kind: (typeof OPENING_KINDS)[number]
  name: string
  /** Left edge. */
  x: Inches
  width: Inches
  /** Heights on the z axis. */
  sill: Inches
  head: Inches
}

export const FIXTURE_KINDS = [
  'electric-meter', 'gas-meter', 'condenser', 'hose-bib', 'vent', 'downspout', 'house-number', 'entry-light', 'escape-well',
] as const

export interface Fixture {
  id: string
  kind: (typeof FIXTURE_KINDS)[number]
  /** Left edge, and the back face's distance from the base line. */
  x: Inches
  y: Inches
  width: Inches
  depth: Inches
  z: Inches
  height: Inches
  /** Downspouts: how far from the wall the water leaves. */
  outlet?: Inches
}

export interface Walk {
  id: string
  name: string
  outline: Point[]
}

export interface Bed {
  id: string
  name: string
  outline: Point[]
}

export const ROLES_IN_BED = ['shrub', 'specimen', 'anchor', 'filler', 'hedge', 'on-wall'] as const
export type PlacementRole = (typeof ROLES_IN_BED)[number]
export const STATUSES = ['new', 'stays', 'goes'] as const
export type PlacementStatus = (typeof STATUSES)[number]

export interface Placement {
  id: string
  /** Id of a plant in the sheet's `plants`. */
  plant: string
  x: Inches
  y: Inches
  planted: Size
  role?: PlacementRole
  drift?: string
  kept?: Partial<Size>
  clearStem?: Inches
  status?: PlacementStatus
}

/** Everything drawn on one facade: the document the check reads. */
export interface Sheet {
  version: 1
  units: 'in'
  site: Site
  facade: Facade
  openings: Opening[]
  fixtures: Fixture[]
  walks: Walk[]
  beds: Bed[]
  plants: Plant[]
  placements: Placement[]
  /** Studio settings that differ from the rules' defaults: "<rule>.<setting>" to number, "<rule>.kind" to off/note/risk. */
  standards?: Record<string, number | string>
}

export const FINDING_KINDS = ['conflict', 'risk', 'held', 'note'] as const
export type FindingKind = (typeof FINDING_KINDS)[number]

export type ByBound<T> = Record<Bound, T>

/** A year after planting, or the answer "later than thirty years". */
export type Year = number | 'after-30'

/** First year of a breach: earliest, expected, latest of the bounds that break. */
export interface YearRange {
  earliest: Year
  expected: Year
  latest: Year
}

/** A way out the engine has itself checked. */
export type Remedy =
  | { kind: 'move'; placement: string; x: Inches; y: Inches }
  | { kind: 'swap'; placements: string[]; plant: string }
  | { kind: 'keep'; placement: string; kept: Size; clippings: number }
  | { kind: 'specimen'; placement: string }

export interface Finding {
  /** Stable identity: rule, placements and feature. Survives moving another plant. */
  key: string
  rule: string
  kind: FindingKind
  /** Sorted by id, but layer-order: [front, behind]. */
  placements: string[]
  feature: string | null
  limit: number | null
  measured: { low: number | null; expected: number | null; high: number | null } | null
  /** Largest over the bounds, inches; 0 for rules without a length. */
  excess: number
  year: YearRange | null
  remedies: Remedy[]
}

/** Share of a window hidden or a bed covered, by year after planting and at maturity. */
export type ShareByYear = Record<'0' | '1' | '3' | '5' | '10' | '20' | 'mature', number>

export interface ShareOf extends ByBound<ShareByYear> {
  id: string
}

export interface Pocket {
  bed: string
  x: Inches
  y: Inches
  diameter: Inches
  annuals: number
}

export interface Upkeep {
  placement: string
  clippingsPerYear: number
  minutesPerYear: number
  minutesOverTenYears: number
}

export interface Report {
  engine: string
  findings: Finding[]
  windows: ShareOf[]
  cover: ShareOf[]
  pockets: Pocket[]
  upkeep: Upkeep[]
}

/** How a figure is known. */
export type Known = 'read' | 'practice' | 'memory'

export interface Source {
  publisher: string
  title: string
  address: string | null
  known: Known
}

export interface Setting {
  /** "<rule>.<name>", as standards name it. */
  name: string
  label: string
  default: number
  min: number
  max: number
  unit: 'in' | 'share' | 'min'
}

export interface RuleMeta {
  id: string
  /** The question the rule answers, as a person would ask it. */
  question: string
  /** Short label for lists. */
  title: string
  settings: Setting[]
  /** What limit and measured are, where they are no lengths. */
  measures?: 'share' | 'count'
  /** Present for rules whose kind does not come from the bounds: the worst they say. A studio may switch them to off, note or risk. */
  fixedKind?: 'conflict' | 'risk' | 'note'
  sources: Source[]
  /** Where this rule settles what the source leaves open. */
  notes?: string
}

/** What a spot can hold: the largest crown that breaks nothing there, and the plants of a library that fit it. */
import type { Plant } from '../plants/types'
import { crownVolume, makeCrown } from './crown'
import { compareText } from './finding'
import { groundAt } from './geometry/ground'
import { sizeRange } from './growth'
import { tellOfPlacement, tellOfPlant } from './judge'
import { growPlacement, type Grown, type Prepared } from './prepared'
import type { Finding, Inches, Placement, Point, Size } from './types'

/** The probe's place on the sheet: never a real placement's id. */
const PROBE = '?'
/** The frontier is worked out at every third inch of spread up to 20 ft, and to the inch of height. */
const STEP_IN = 3
const LEAST_IN = 6
const MOST_IN = 240
/** Plants that pass a limit by no more than this are near misses. */
const NEAR_IN = 12
const MOST_MISSES = 12

/** A mounded crown of which nothing is left to grow: the same at every bound. */
function probePlant(): Plant {
  return {
    id: PROBE, botanical: '', common: '', category: 'shrub', leaf: 'deciduous', heightMin: 1, heightMax: 1, spreadMin: 1, spreadMax: 1, habit: 'mounded', growth: 'slow',
    zoneMin: null, zoneMax: null, light: [], water: [], foliageColor: 'green', texture: 'medium', bloomMonths: [], bloomColor: '', deer: 'unknown',
    toxicity: 'unlisted', juglone: 'unknown', thorns: false, invasive: false, native: [], prune: 'none',
  }
}

/** Where something might be planted; `instead` leaves out the placement that stands there now. */
export interface Spot extends Point {
  instead?: string
}

export interface Fit {
  plant: string
  /** Share of the volume of the largest crown the spot holds that the expected plant fills. */
  fill: number
}

export interface NearMiss {
  plant: string
  /** The one conflict or risk that is in the way. */
  finding: Finding
}

export interface Fits {
  /** For each spread, ascending, the tallest mounded crown that breaks nothing; [] where nothing fits. */
  frontier: Size[]
  /** The crown of the frontier with the most volume; null where nothing fits. */
  largest: Size | null
  /** Plants without conflict and risk there, those that fill it best first. */
  fits: Fit[]
  /** Plants kept out by one thing alone, and by little. */
  misses: NearMiss[]
}

const isBad = ({ kind }: Finding) => kind === 'conflict' || kind === 'risk'

/** The sheet without what stands there now. */
function cleared(prepared: Prepared, instead: string | undefined): Prepared {
  if (instead === undefined) return prepared
  const { neighbours } = prepared
  const near = (from: Inches, to: Inches) => neighbours.near(from, to).filter(({ placement }) => placement.id !== instead)
  return { ...prepared, neighbours: { near } }
}

const placementAt = ({ x, y }: Spot, plant: string, planted: Size): Placement => ({ id: PROBE, plant, x, y, planted })

/** A plant too low for its place hides behind others; that bounds its height from below, all else from above. */
const isHiddenBehind = ({ rule, placements }: Finding) => rule === 'layer-order' && placements[1] === PROBE

const hasObjection = (prepared: Prepared, one: Grown, counts: (finding: Finding) => boolean): boolean =>
  tellOfPlacement(prepared, one, (finding) => isBad(finding) && counts(finding))

/** The tallest whole-inch height at which a crown of this spread breaks nothing; 0 where even the lowest does, null where it would only be hidden. */
function tallest(prepared: Prepared, spot: Spot, spread: Inches): Inches | null {
  const plant = probePlant()
  const grow = (height: Inches) => growPlacement(prepared, plant, placementAt(spot, PROBE, { height, spread }))
  const isTooTall = (height: Inches) => hasObjection(prepared, grow(height), (finding) => !isHiddenBehind(finding))
  if (isTooTall(LEAST_IN)) return 0
  let [sound, broken] = [LEAST_IN, MOST_IN + 1]
  while (broken - sound > 1) {
    const middle = Math.floor((sound + broken) / 2)
    if (isTooTall(middle)) broken = middle
    else sound = middle
  }
  return hasObjection(prepared, grow(sound), isHiddenBehind) ? null : sound
}

function frontierAt(prepared: Prepared, spot: Spot): Size[] {
  const frontier: Size[] = []
  for (let spread = LEAST_IN; spread <= MOST_IN; spread += STEP_IN) {
    const height = tallest(prepared, spot, spread)
    // A wider crown breaks all that a narrower one of the height does.
    if (height === 0) break
    if (height !== null) frontier.push({ height, spread })
  }
  return frontier
}

function volumeOf(prepared: Prepared, { x, y }: Spot, plant: Pick<Plant, 'habit'>, size: Size): number {
  const axis = { x, y, z0: groundAt(prepared.sheet.facade, x, y), habit: plant.habit }
  return crownVolume(makeCrown(axis, { ...size, clearStem: 0 }))
}

/** The conflicts and risks a plant would have there, the first two: more than one is no near miss. */
function objectionsTo(prepared: Prepared, spot: Spot, plant: Plant): Finding[] {
  const size = sizeRange(plant, 'low')
  const placement = placementAt(spot, plant.id, { height: Math.min(size.height, LEAST_IN), spread: Math.min(size.spread, LEAST_IN) })
  const one = growPlacement(prepared, plant, placement)
  const found: Finding[] = []
  const hear = (finding: Finding) => isBad(finding) && found.push(finding) > 1
  if (!tellOfPlant(prepared, { plant, placements: [one] }, hear)) tellOfPlacement(prepared, one, hear)
  return found
}

const isNear = ({ excess, measured }: Finding) => measured !== null && excess > 0 && excess <= NEAR_IN

/**
 * What a spot of a sheet can hold: the frontier of spreads and heights, and the plants of a library that break nothing
 * there, planted small. Plants that stay or will stand are neighbours; those that go are not. Rules of the whole sheet
 * (composition, ground) are not asked.
 */
export function fitsHere(all: Prepared, spot: Spot, library: readonly Plant[]): Fits {
  const prepared = cleared(all, spot.instead)
  const frontier = frontierAt(prepared, spot)
  const largest = frontier.reduce<Size | null>((best, size) => (best && volumeOf(prepared, spot, probePlant(), best) >= volumeOf(prepared, spot, probePlant(), size) ? best : size), null)
  const room = largest ? volumeOf(prepared, spot, probePlant(), largest) : 0
  const fits: Fit[] = []
  const misses: NearMiss[] = []
  for (const plant of library) {
    const [first, second] = objectionsTo(prepared, spot, plant)
    if (!first) fits.push({ plant: plant.id, fill: room > 0 ? volumeOf(prepared, spot, plant, sizeRange(plant, 'expected')) / room : 0 })
    else if (!second && isNear(first)) misses.push({ plant: plant.id, finding: first })
  }
  fits.sort((a, b) => Math.abs(1 - a.fill) - Math.abs(1 - b.fill) || compareText(a.plant, b.plant))
  misses.sort((a, b) => a.finding.excess - b.finding.excess || compareText(a.plant, b.plant))
  return { frontier, largest, fits, misses: misses.slice(0, MOST_MISSES) }
}

/** What a kept size costs: how often it is clipped, and how long that takes. */
import type { Plant } from '../plants/types'
import { courseOf, matureSize, sizeOn } from './growth'
import { numberOf, type Prepared } from './prepared'
import type { Inches, Placement, RuleMeta, Size, Upkeep } from './types'

/** New shoots are let grow so long before they are cut back. */
const SHOOT_IN = 6
/** Over so many years a commitment of care is told. */
export const UPKEEP_YEARS = 10
/** Up to here one clips standing on the soil without reaching, and up to here without a ladder. */
const LOW_IN = 36
const REACHED_IN = 72

const minutes = (name: string, label: string, byDefault: number) => ({ name: `upkeep.${name}`, label, default: byDefault, min: 0, max: 480, unit: 'min' as const })

/** The settings of clipping, listed among the standards like a rule's. */
export const UPKEEP_META: RuleMeta = {
  id: 'upkeep',
  title: 'Clipping',
  question: 'What does it cost to keep a plant clipped?',
  settings: [
    minutes('low', 'Minutes for one clipping, kept up to 3 ft', 5),
    minutes('reached', 'Minutes for one clipping, kept up to 6 ft', 12),
    minutes('ladder', 'Minutes for one clipping, kept taller', 25),
  ],
  sources: [{ publisher: 'Common practice', title: 'Clipping time of one shrub by hand shears, with clearing up', address: null, known: 'practice' }],
  notes: 'One clipping for each 6 in of new growth in a year: what an established plant of the kept size gains towards its expected one, in height or to one side, whichever is more.',
}

/** How far a plant just clipped grows past its kept size in one year, as an established one of that size would: upward, or to one side. */
function regrowth(plant: Plant, placement: Placement, zone: string): Inches {
  const whole = matureSize(plant, placement, 'expected')
  const planted = { height: Math.min(whole.height, placement.kept?.height ?? Infinity), spread: Math.min(whole.spread, placement.kept?.spread ?? Infinity) }
  const after = sizeOn(courseOf({ plant, placement: { ...placement, planted, status: 'stays' }, zone, bound: 'expected' }), 1)
  const past = (extent: keyof Size) => (placement.kept?.[extent] === undefined ? 0 : after[extent] - planted[extent])
  return Math.max(past('height'), past('spread') / 2)
}

function minutesFor(prepared: Pick<Prepared, 'standards'>, { height }: Size): number {
  return numberOf(prepared, height <= LOW_IN ? 'upkeep.low' : height <= REACHED_IN ? 'upkeep.reached' : 'upkeep.ladder')
}

/** What it takes to hold one placement at its kept size: nothing where it never grows past it. */
export function upkeepOf(prepared: Pick<Prepared, 'sheet' | 'standards'>, plant: Plant, placement: Placement): Upkeep {
  const clippingsPerYear = Math.ceil(regrowth(plant, placement, prepared.sheet.site.zone) / SHOOT_IN)
  const { mature } = courseOf({ plant, placement, zone: prepared.sheet.site.zone, bound: 'expected' })
  const height = Math.min(mature.height, placement.kept?.height ?? Infinity)
  const minutesPerYear = clippingsPerYear * minutesFor(prepared, { height, spread: mature.spread })
  return { placement: placement.id, clippingsPerYear, minutesPerYear, minutesOverTenYears: minutesPerYear * UPKEEP_YEARS }
}

/** The upkeep of every kept placement, in the sheet's order. */
export const upkeepOfSheet = (prepared: Prepared): Upkeep[] =>
  prepared.grown.filter(({ isKept }) => isKept).map(({ plant, placement }) => upkeepOf(prepared, plant, placement))

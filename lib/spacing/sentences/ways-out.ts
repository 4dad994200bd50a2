/** What ways out and near misses say. */
import { formatLength } from '../../measure'
import type { Plant } from '../../plants/types'
import type { Finding, Remedy, Sheet } from '../types'
import { Names } from './names'
import { lengthText } from './words'

const COUNTS = ['no', 'one', 'two', 'three', 'four', 'five', 'six']
const times = (count: number) => `${COUNTS[count] ?? count} ${count === 1 ? 'clipping' : 'clippings'} a year`

/** A step on the plan: "14 in to the right and 6 in out from the wall". */
function stepText(dx: number, dy: number): string {
  const along = dx === 0 ? '' : `${lengthText(dx)} to the ${dx > 0 ? 'right' : 'left'}`
  const out = dy === 0 ? '' : `${lengthText(dy)} ${dy > 0 ? 'out from' : 'towards'} the wall`
  return [along, out].filter(Boolean).join(' and ')
}

/** "it" where a finding speaks of one plant; else the plant by name. */
const whom = (finding: Finding, placement: string, names: Names) => (finding.placements.length === 1 ? 'it' : names.plant(placement))

/** A way out in words. `plants` are those that may be swapped in, beside the sheet's own. */
export function describeRemedy(remedy: Remedy, finding: Finding, sheet: Sheet, plants: readonly Plant[] = []): string {
  const names = Names.of(sheet)
  switch (remedy.kind) {
    case 'move': {
      const from = sheet.placements.find(({ id }) => id === remedy.placement)
      return `Move ${whom(finding, remedy.placement, names)} ${stepText(remedy.x - (from?.x ?? remedy.x), remedy.y - (from?.y ?? remedy.y))}.`
    }
    case 'keep':
      return `Keep ${whom(finding, remedy.placement, names)} clipped at ${lengthText(remedy.kept.height)} high and ${lengthText(remedy.kept.spread)} wide: ${times(remedy.clippings)}.`
    case 'specimen':
      return 'Let it be a specimen: it is meant to stand out.'
    case 'swap': {
      const plant = [...sheet.plants, ...plants].find(({ id }) => id === remedy.plant)
      if (!plant) return 'Swap it for a plant that is no longer in the library.'
      const all = remedy.placements.length > 1 && finding.feature !== null ? `all ${remedy.placements.length}` : whom(finding, remedy.placements[0]!, names)
      return `Swap ${all} for ${plant.botanical}, ${formatLength(plant.heightMax)} high and ${formatLength(plant.spreadMax)} wide at most.`
    }
  }
}

/** Said where every way out was tried and none helps. */
export const NO_WAY_OUT = 'No way out found: no place within 4 ft, no clipping and no plant of the library mends it without harm elsewhere.'

/** Why a plant just misses: "2 in too wide for Front walk at its largest". */
export function describeMiss(finding: Finding, sheet: Sheet): string {
  const names = Names.of(sheet)
  const by = lengthText(finding.excess)
  const end = finding.kind === 'risk' ? ' at its largest' : ''
  const near = finding.placements.find((id) => sheet.placements.some((placement) => placement.id === id))
  switch (finding.rule) {
    case 'sill':
      return `${by} too tall for the sill of ${names.feature(finding.feature)}${end}`
    case 'gutter':
      return `${by} too tall for the gutter${end}`
    case 'walk-edge':
      return `${by} too wide for ${names.feature(finding.feature)}${end}`
    case 'wall-gap':
      return `${by} too wide for the wall${end}`
    case 'crowding':
      return `${by} too wide beside ${names.plant(near)}${end}`
    case 'layer-order':
      return finding.placements[0] === near ? `hidden by ${by} behind ${names.plant(near)}${end}` : `${by} too tall before ${names.plant(near)}${end}`
    default:
      return `${by} too large for its place${end}`
  }
}

/** The check: every rule over a sheet, or over one placement as it is moved. */
import type { Plant } from '../plants/types'
import { compareFindings } from './finding'
import { allFindings, findingsOfPlacement } from './judge'
import { growPlacement, growSheet, type Prepared } from './prepared'
import { resolveStandards } from './standards'
import type { Finding, Placement, Report, Sheet } from './types'
import { upkeepOfSheet } from './upkeep'

/** Raised whenever an answer can change: findings are kept with the version that made them. */
export const ENGINE_VERSION = '1.1.0'

/** Makes a sheet ready to be judged, once; `checkPlacement` then asks it as often as a hand moves. */
export const prepare = (sheet: Sheet): Prepared => growSheet(sheet, resolveStandards(sheet))

/**
 * Judges a whole sheet by every rule. Findings come in one order: kind, excess, rule, placements, feature; they never
 * depend on `library`, from which swaps are drawn. Trusts its input: parse sheets from outside with `parseSheet` first.
 * Windows, cover, pockets, upkeep and remedies are not worked out by this version: they are empty.
 */
export function check(sheet: Sheet, _options: { library?: readonly Plant[] } = {}): Report {
  const prepared = prepare(sheet)
  return { engine: ENGINE_VERSION, findings: allFindings(prepared), windows: [], cover: [], pockets: [], upkeep: upkeepOfSheet(prepared) }
}

/**
 * Findings of the size and neighbour rules that name one placement, were it as given: a moved one (its id stands
 * on the sheet) or a new one. Equal to the full check's of the sheet with it in place. [] for a plant that goes
 * or is not known to the sheet.
 */
export function checkPlacement(prepared: Prepared, placement: Placement): Finding[] {
  const plant = prepared.plants.get(placement.plant)
  if (!plant || placement.status === 'goes') return []
  return [...findingsOfPlacement(prepared, growPlacement(prepared, plant, placement))].sort(compareFindings)
}

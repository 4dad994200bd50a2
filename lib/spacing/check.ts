/** The check: every rule over a sheet, or over one placement as it is moved. */
import type { Plant } from '../plants/types'
import { coveredBeds } from './cover'
import { allFindings, findingsOfPlacement } from './judge'
import { pocketsOfSheet } from './pockets'
import { growPlacement, growSheet, type Prepared } from './prepared'
import { resolveStandards } from './standards'
import type { Finding, Placement, Report, Sheet } from './types'
import { upkeepOfSheet } from './upkeep'
import { hiddenWindows } from './windows'

/** Raised whenever an answer can change: findings are kept with the version that made them. */
export const ENGINE_VERSION = '2.0.0'

/** Makes a sheet ready to be judged, once; `checkPlacement` then asks it as often as a hand moves. */
export const prepare = (sheet: Sheet): Prepared => growSheet(sheet, resolveStandards(sheet))

/** Worked out when it is first asked for, once. */
function lazily<T>(work: () => T): () => T {
  let done: { value: T } | null = null
  return () => (done ??= { value: work() }).value
}

/**
 * Judges a whole sheet by every rule. Findings come in one order: kind, excess, rule, placements, feature; they never
 * depend on `library`, from which swaps are drawn. Trusts its input: parse sheets from outside with `parseSheet` first.
 * Windows, cover, pockets and upkeep are worked out when they are first read, for most who check want the findings.
 * Ways out are looked for finding by finding, with `waysOut`: remedies are empty.
 */
export function check(sheet: Sheet, _options: { library?: readonly Plant[] } = {}): Report {
  const prepared = prepare(sheet)
  const [windows, cover, pockets, upkeep] = [lazily(() => hiddenWindows(prepared)), lazily(() => coveredBeds(prepared)), lazily(() => pocketsOfSheet(prepared)), lazily(() => upkeepOfSheet(prepared))]
  return {
    engine: ENGINE_VERSION,
    findings: allFindings(prepared),
    get windows() { return windows() },
    get cover() { return cover() },
    get pockets() { return pockets() },
    get upkeep() { return upkeep() },
  }
}

/**
 * Findings of the size and neighbour rules that name one placement, were it as given: a moved one (its id stands
 * on the sheet) or a new one. Equal to the full check's of the sheet with it in place. [] for a plant that goes
 * or is not known to the sheet.
 */
export function checkPlacement(prepared: Prepared, placement: Placement): Finding[] {
  const plant = prepared.plants.get(placement.plant)
  if (!plant || placement.status === 'goes') return []
  return findingsOfPlacement(prepared, growPlacement(prepared, plant, placement))
}

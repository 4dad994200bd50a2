/** Ways out of a finding, each tried on the sheet before it is offered. */
import type { Plant } from '../../plants/types'
import type { Finding, Placement, Remedy, Sheet } from '../types'
import { applyRemedy } from './apply'
import { findKeep } from './keep'
import { findMove } from './move'
import { findSwaps } from './swap'
import { Trial } from './trial'

export { applyRemedy, changedPlacements } from './apply'

export interface WaysOutOptions {
  /** Plants that may be swapped in; the sheet's own where none is given. */
  library?: readonly Plant[]
}

/** The placement that goes least far of those a finding names. */
function moves(trial: Trial, finding: Finding, placements: readonly Placement[]): Remedy[] {
  const found = placements.flatMap((placement) => findMove(trial, finding, placement) ?? [])
  return found.sort((a, b) => a.distance - b.distance).slice(0, 1).map(({ remedy }) => remedy)
}

function specimen(trial: Trial, finding: Finding): Remedy[] {
  if (finding.rule !== 'layer-order') return []
  const remedy: Remedy = { kind: 'specimen', placement: finding.placements[0]! }
  return trial.isBetter(applyRemedy(trial.sheet, remedy), finding.key) ? [remedy] : []
}

/** Size and neighbour findings: each placement may be moved, swapped, clipped by itself. */
function ofSize(trial: Trial, finding: Finding, placements: readonly Placement[], library: readonly Plant[]): Remedy[] {
  return [
    ...moves(trial, finding, placements),
    ...specimen(trial, finding),
    ...placements.flatMap((placement) => findKeep(trial, finding, placement) ?? []),
    ...placements.flatMap((placement) => findSwaps(trial, finding, [placement], library)),
  ]
}

/** Does the finding speak of a plant in this garden, wherever it stands? Then all its placements are swapped together. */
const isOfSite = (trial: Trial, { feature }: Finding): boolean => feature !== null && trial.prepared.plants.has(feature)

/**
 * Ways out of one finding of a sheet: move, specimen, keep, swap, in that order. Each was applied to the sheet and
 * checked whole: the finding is then no conflict and no risk, and no other came or grew worse. [] where none was found,
 * for findings that name no placements, and for held ones and notes, which need none.
 */
export function waysOut(sheet: Sheet, finding: Finding, { library = sheet.plants }: WaysOutOptions = {}): Remedy[] {
  if (finding.kind !== 'conflict' && finding.kind !== 'risk') return []
  const placements = finding.placements.flatMap((id) => sheet.placements.find((placement) => placement.id === id) ?? [])
  if (placements.length === 0) return []
  const trial = new Trial(sheet)
  return isOfSite(trial, finding) ? findSwaps(trial, finding, placements, library) : ofSize(trial, finding, placements, library)
}

import { matureSize } from '../growth'
import type { Finding, Placement, Remedy } from '../types'
import { upkeepOf } from '../upkeep'
import { applyRemedy } from './apply'
import type { Trial } from './trial'

/** Once it is clear of its neighbours, a size refused by the whole sheet is seldom mended by a smaller one. */
const MOST_CHECKS = 5
/** Smaller than this no shrub is worth its shears. */
const LEAST_KEPT_IN = 12

/** Topping harms a tree, and what dies back each year has nothing to clip. */
function canBeClipped(trial: Trial, { plant: id }: Placement): boolean {
  const plant = trial.prepared.plants.get(id)
  return plant !== undefined && plant.category !== 'tree' && plant.leaf !== 'herbaceous' && plant.prune !== 'none'
}

/**
 * The largest size, in whole inches and in the natural proportion, at which one placement of a finding is held and
 * nothing grows worse, with what it costs. Null where no clipping helps, and for trees and herbaceous plants.
 */
export function findKeep(trial: Trial, finding: Finding, placement: Placement): Extract<Remedy, { kind: 'keep' }> | null {
  const plant = trial.prepared.plants.get(placement.plant)
  if (!plant || finding.year === null || !canBeClipped(trial, placement)) return null
  const natural = matureSize(plant, placement, 'expected')
  const most = matureSize(plant, placement, 'high')
  const share = natural.spread / natural.height
  let checks = 0
  for (let height = Math.ceil(most.height) - 1; height >= LEAST_KEPT_IN; height--) {
    const kept = { height, spread: Math.floor(height * share) }
    if (kept.spread < LEAST_KEPT_IN) return null
    const changed = { ...placement, kept }
    if (trial.isRefused(plant, changed, finding.key)) continue
    const remedy = { kind: 'keep' as const, placement: placement.id, kept, clippings: upkeepOf(trial.prepared, plant, changed).clippingsPerYear }
    if (trial.isBetter(applyRemedy(trial.sheet, remedy), finding.key)) return remedy
    if (++checks >= MOST_CHECKS) return null
  }
  return null
}

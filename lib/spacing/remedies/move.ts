import { pointInPolygon } from '../geometry/polygon'
import { boxOf } from '../geometry/box'
import type { Finding, Inches, Placement, Remedy, Sheet } from '../types'
import { applyRemedy } from './apply'
import type { Trial } from './trial'

/** How far a plant may be moved and still be the plant the designer meant there. */
const FARTHEST_IN = 48
/** Whole checks spent on places that pass the quick look, before the search gives up. */
const MOST_CHECKS = 60

interface Step {
  dx: Inches
  dy: Inches
}

const distance2 = ({ dx, dy }: Step) => dx * dx + dy * dy

function* steps(): Generator<Step> {
  for (let dx = -FARTHEST_IN; dx <= FARTHEST_IN; dx++) {
    for (let dy = -FARTHEST_IN; dy <= FARTHEST_IN; dy++) {
      const step = { dx, dy }
      if (distance2(step) > 0 && distance2(step) <= FARTHEST_IN * FARTHEST_IN) yield step
    }
  }
}

/** Nearest first; of equals the one farther from the wall, then the one on the given hand. */
const inOrder = (hand: 1 | -1) => [...steps()].sort((a, b) => distance2(a) - distance2(b) || b.dy - a.dy || hand * (b.dx - a.dx))
const ordered: Partial<Record<1 | -1, Step[]>> = {}

/** The hand on which the middle of its bed lies; of no bed, of the whole front. */
function handOf({ beds, facade }: Sheet, { x, y }: Placement): 1 | -1 {
  const bed = beds.find(({ outline }) => pointInPolygon({ x, y }, outline))
  const [left, right] = bed ? [boxOf(bed.outline).left, boxOf(bed.outline).right] : [facade.wall[0]!.x, facade.wall.at(-1)!.x]
  return x <= (left + right) / 2 ? 1 : -1
}

export interface FoundMove {
  remedy: Extract<Remedy, { kind: 'move' }>
  distance: Inches
}

/**
 * The nearest place within 48 in, on a grid of 1 in about where it stands, at which one placement of a finding is rid
 * of it and nothing grows worse. Null where there is none, and for a plant that stays.
 */
export function findMove(trial: Trial, finding: Finding, placement: Placement): FoundMove | null {
  const plant = trial.prepared.plants.get(placement.plant)
  if (!plant || placement.status === 'stays') return null
  const hand = handOf(trial.sheet, placement)
  let checks = 0
  for (const step of (ordered[hand] ??= inOrder(hand))) {
    const remedy = { kind: 'move' as const, placement: placement.id, x: placement.x + step.dx, y: placement.y + step.dy }
    if (trial.isRefused(plant, { ...placement, x: remedy.x, y: remedy.y }, finding.key)) continue
    if (trial.isBetter(applyRemedy(trial.sheet, remedy), finding.key)) return { remedy, distance: Math.sqrt(distance2(step)) }
    if (++checks >= MOST_CHECKS) return null
  }
  return null
}

/** New placements and the order people walk them in. */
import type { Plant } from '@/lib/plants'
import { roundLength } from '@/lib/measure'
import { sizeRange, wallDistance, wallY, type Facade, type Inches, type Placement, type Sheet, type Size } from '@/lib/spacing'

/** Container stock as it usually comes: a third of the expected size, between a small pot and what two people can plant. */
const PLANTED_SHARE = 1 / 3
const LEAST_PLANTED_IN = 4
const MOST_PLANTED_IN = { tree: 120, other: 36 }

/** The size a plant is taken to be planted at until somebody says otherwise, whole inches. */
export function usualPlantedSize(plant: Plant): Size {
  const { height, spread } = sizeRange(plant, 'expected')
  const most = plant.category === 'tree' ? MOST_PLANTED_IN.tree : MOST_PLANTED_IN.other
  const usual = (mature: number) => Math.round(Math.min(Math.max(mature * PLANTED_SHARE, LEAST_PLANTED_IN), most))
  return { height: usual(height), spread: usual(spread) }
}

/** A plant put at a point of the plan, to the 1/64 in. */
export function newPlacement({ id, plant, x, y }: { id: string; plant: Plant; x: number; y: number }): Placement {
  return { id, plant: plant.id, x: roundLength(x), y: roundLength(y), planted: usualPlantedSize(plant) }
}

/** Placements from left to right along the wall; at one x the one nearer the wall first. */
export function alongWall(sheet: Pick<Sheet, 'placements'>): Placement[] {
  return [...sheet.placements].sort((a, b) => a.x - b.x || a.y - b.y || (a.id < b.id ? -1 : 1))
}

/** The placement `by` steps on from one along the wall; null beyond the ends. From none: the first or the last. */
export function neighbourOf(sheet: Pick<Sheet, 'placements'>, id: string | null, by: 1 | -1): string | null {
  const order = alongWall(sheet)
  const at = order.findIndex((placement) => placement.id === id)
  if (at < 0) return (by > 0 ? order[0] : order.at(-1))?.id ?? null
  return order[at + by]?.id ?? null
}

const HALVINGS = 40

/**
 * The y at which a point of this x stands `distance` from the wall, returns of jogs counted, to the 1/64 in.
 * Behind the wall the distance is negative.
 */
export function outFromWall(facade: Facade, x: Inches, distance: Inches): Inches {
  let near = wallY(facade, x) + distance
  if (distance <= 0) return roundLength(near)
  // Straight out from the foremost wall nothing is nearer than the distance.
  let far = facade.wall.reduce((most, { y }) => Math.max(most, y), -Infinity) + distance
  if (wallDistance(facade, x, near) >= distance) return roundLength(near)
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (near + far) / 2
    if (wallDistance(facade, x, middle) >= distance) far = middle
    else near = middle
  }
  return roundLength(far)
}

/** Which plant a pointer means. Small plants answer to at least 44 px of screen, so that a finger finds them. */
import type { PlantDrawing, Scene } from '@/lib/drawing'
import type { Axes } from './drag-session'
import type { Spot } from './view'

/** Half of the least target, screen pixels. */
export const LEAST_HIT_PX = 22

/** Which view a point of the scene lies in: below the elevation is plan. */
export function axesAt(scene: Scene, { y }: Spot): Axes {
  return y < scene.elevation.box.y + scene.elevation.box.height ? 'x' : 'both'
}

/** How far a point is from a plant's axis, as a share of what the plant answers to: 1 and less is a hit. */
function shareInPlan({ at, hit }: PlantDrawing, spot: Spot, least: number): number {
  const radius = Math.max(hit.width / 2, least)
  return Math.hypot(spot.x - at.x, spot.y - at.y) / radius
}

function isInElevation({ hit }: PlantDrawing, spot: Spot, least: number): boolean {
  const [cx, cy] = [hit.x + hit.width / 2, hit.y + hit.height / 2]
  return Math.abs(spot.x - cx) <= Math.max(hit.width / 2, least) && Math.abs(spot.y - cy) <= Math.max(hit.height / 2, least)
}

function keyAt(scene: Scene, spot: Spot, radius: number): string | null {
  for (const shape of [...scene.elevation.labels, ...scene.plan.labels]) {
    const isKey = shape.kind === 'mark' && shape.mark === 'key' && shape.placements?.length === 1
    if (isKey && Math.hypot(spot.x - shape.x, spot.y - shape.y) <= radius) return shape.placements![0]!
  }
  return null
}

/**
 * The placement under a point of the scene; null on empty ground. In plan the nearest axis for its size wins, in
 * elevation the plant nearest the viewer; the selected plant wins wherever it is hit.
 * @param scale screen pixels per inch.
 */
export function placementAt(scene: Scene, spot: Spot, { scale, selected }: { scale: number; selected: string | null }): string | null {
  const least = LEAST_HIT_PX / scale
  const keyed = keyAt(scene, spot, Math.min(least, 14 / scale))
  if (keyed) return keyed
  if (axesAt(scene, spot) === 'both') {
    const near = scene.plan.plants
      .map((plant) => ({ id: plant.placement, share: shareInPlan(plant, spot, least) }))
      .filter(({ share }) => share <= 1)
      .sort((a, b) => a.share - b.share)
    return near.find(({ id, share }) => id === selected && share <= 0.7)?.id ?? near[0]?.id ?? null
  }
  const hits = scene.elevation.plants.filter((plant) => isInElevation(plant, spot, least))
  return hits.find(({ placement }) => placement === selected)?.placement ?? hits.at(-1)?.placement ?? null
}

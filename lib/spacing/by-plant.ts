import type { Plant } from '../plants/types'
import type { Prepared } from './prepared'

/** The plants of a sheet that are judged by its site, each with its placements; those that stay are not. */
export function judgedPlants({ grown }: Prepared): { plant: Plant; placements: string[] }[] {
  const found = new Map<string, { plant: Plant; placements: string[] }>()
  for (const { plant, placement, stays } of grown) {
    if (stays) continue
    const entry = found.get(plant.id) ?? { plant, placements: [] }
    entry.placements.push(placement.id)
    found.set(plant.id, entry)
  }
  return [...found.values()].map(({ plant, placements }) => ({ plant, placements: placements.sort() }))
}

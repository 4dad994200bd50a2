import type { Plant } from '../plants/types'
import { compareText } from './finding'
import type { Prepared } from './prepared'

/** The plants of a sheet that are judged by its site, each with its placements, sorted; those that stay are not. */
export function judgedPlants({ grown }: Prepared): { plant: Plant; placements: string[] }[] {
  const found = new Map<string, { plant: Plant; placements: string[] }>()
  for (const { plant, placement, stays } of grown) {
    if (stays) continue
    const entry = found.get(plant.id)
    if (entry) entry.placements.push(placement.id)
    else found.set(plant.id, { plant, placements: [placement.id] })
  }
  return [...found.values()].map(({ plant, placements }) => ({ plant, placements: placements.sort(compareText) }))
}

import type { Plant } from '../plants/types'
import { compareText } from './finding'
import type { Grown, Prepared } from './prepared'

/** A plant of the sheet with those of its placements that the site judges. */
export interface JudgedPlant {
  plant: Plant
  placements: Grown[]
}

/** Ids of placements, sorted: as findings name them. */
export const idsOf = (placements: readonly Grown[]): string[] => placements.map(({ placement }) => placement.id).sort(compareText)

/** The plants of a sheet that are judged by its site, each with its placements; those that stay are not. */
export function judgedPlants({ grown }: Prepared): JudgedPlant[] {
  const found = new Map<string, JudgedPlant>()
  for (const one of grown) {
    if (one.stays) continue
    const entry = found.get(one.plant.id)
    if (entry) entry.placements.push(one)
    else found.set(one.plant.id, { plant: one.plant, placements: [one] })
  }
  return [...found.values()]
}

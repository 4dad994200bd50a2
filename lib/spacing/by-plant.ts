import type { Plant } from '../plants/types'
import { compareText } from './finding'
import type { Grown, Prepared } from './prepared'

/** A plant of the sheet with its placements, those that stay among them. */
export interface JudgedPlant {
  plant: Plant
  placements: Grown[]
}

/** The ones that are yet to be planted: what stands and stays has shown that it can live there. */
export const toBePlanted = ({ placements }: JudgedPlant): Grown[] => placements.filter(({ stays }) => !stays)

/** Ids of placements, sorted: as findings name them. */
export const idsOf = (placements: readonly Grown[]): string[] => placements.map(({ placement }) => placement.id).sort(compareText)

/** The plants of a sheet, each with its placements. */
export function judgedPlants({ grown }: Prepared): JudgedPlant[] {
  const found = new Map<string, JudgedPlant>()
  for (const one of grown) {
    const entry = found.get(one.plant.id)
    if (entry) entry.placements.push(one)
    else found.set(one.plant.id, { plant: one.plant, placements: [one] })
  }
  return [...found.values()]
}

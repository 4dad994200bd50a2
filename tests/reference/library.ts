/** The library's plants as the check reads them, straight from the seed. */
import { readFileSync } from 'node:fs'
import { plantSchema, type Plant } from '@/lib/plants'
import { parsePlantCsv } from '@/lib/plants/csv'

export function readPlants(): Plant[] {
  const { rows } = parsePlantCsv(readFileSync('seed/plants.csv', 'utf8'))
  const facts = new Set(Object.keys(plantSchema.shape))
  return rows.map(({ line, plant }) => ({ ...Object.fromEntries(Object.entries(plant).filter(([fact]) => facts.has(fact))), id: `lib${line}` }) as Plant)
}

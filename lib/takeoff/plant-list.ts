/** The plant list: the drawing's placements counted, by plant and size at planting. Inches. */
import type { Plant } from '../plants/types'
import { plantKeys } from '../sheet'
import type { Inches, Placement, Sheet } from '../spacing'

export interface PlantListRow {
  /** The drawing's key letter. */
  key: string
  quantity: number
  botanical: string
  common: string
  plantedHeight: Inches
  plantedSpread: Inches
  matureHeight: { min: Inches; max: Inches }
  matureSpread: { min: Inches; max: Inches }
  /** Middle distance from each to the nearest other of its plant, of whatever size; null where the drawing has one alone. */
  spacing: Inches | null
  /** These stand there already and stay: nothing to buy. */
  isExisting: boolean
  remarks: string
}

const groupOf = ({ plant, planted, status }: Placement) => JSON.stringify([plant, planted.height, planted.spread, status === 'stays'])

function gathered(placements: readonly Placement[], nameOf: (placement: Placement) => string): Map<string, Placement[]> {
  const groups = new Map<string, Placement[]>()
  for (const placement of placements) {
    const group = groups.get(nameOf(placement))
    if (group) group.push(placement)
    else groups.set(nameOf(placement), [placement])
  }
  return groups
}

function middle(numbers: number[]): number {
  const sorted = [...numbers].sort((a, b) => a - b)
  const half = Math.floor(sorted.length / 2)
  return sorted.length % 2 === 1 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2
}

/** From each of the group to the nearest other of its plant, whatever the size of that one at planting. */
function spacingOf(group: readonly Placement[], like: readonly Placement[]): Inches | null {
  if (like.length < 2) return null
  return middle(group.map((one) => {
    let nearest = Infinity
    for (const other of like) if (other !== one) nearest = Math.min(nearest, Math.hypot(one.x - other.x, one.y - other.y))
    return nearest
  }))
}

const inchesText = (length: number) => `${Math.round(length * 10) / 10} in`

function keptText({ kept }: Placement): string | null {
  const parts = [kept?.height !== undefined && `${inchesText(kept.height)} high`, kept?.spread !== undefined && `${inchesText(kept.spread)} wide`].filter(Boolean)
  return parts.length > 0 ? `keep clipped at ${parts.join(', ')}` : null
}

const ROLE_TEXT: Partial<Record<NonNullable<Placement['role']>, string>> = { hedge: 'hedge', 'on-wall': 'trained on the wall', specimen: 'specimen' }

function remarksOf(placements: Placement[]): string {
  const said = placements.flatMap((one) => [
    one.status === 'stays' ? 'existing, stays' : null,
    one.role ? (ROLE_TEXT[one.role] ?? null) : null,
    keptText(one),
    one.drift ? `drift ${one.drift}` : null,
  ])
  return [...new Set(said.filter((word) => word !== null))].join('; ')
}

function rowOf(plant: Plant, key: string, placements: Placement[], like: Placement[]): PlantListRow {
  const { planted } = placements[0]!
  return {
    key, quantity: placements.length, botanical: plant.botanical, common: plant.common,
    plantedHeight: planted.height, plantedSpread: planted.spread,
    matureHeight: { min: plant.heightMin, max: plant.heightMax },
    matureSpread: { min: plant.spreadMin, max: plant.spreadMax },
    spacing: spacingOf(placements, like), isExisting: placements[0]!.status === 'stays', remarks: remarksOf(placements),
  }
}

/**
 * Counts a sheet: one row for each plant and size at planting, in the order of the keys; what stays has rows of its
 * own, what goes has none. The quantities together are the placements drawn.
 */
export function buildPlantList(sheet: Pick<Sheet, 'plants' | 'placements'>): PlantListRow[] {
  const keys = plantKeys(sheet)
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  const drawn = sheet.placements.filter(({ status }) => status !== 'goes')
  const alike = gathered(drawn, ({ plant }) => plant)
  const order = [...keys.keys()]
  return [...gathered(drawn, groupOf).values()]
    .sort((a, b) => order.indexOf(a[0]!.plant) - order.indexOf(b[0]!.plant))
    .flatMap((placements) => {
      const plant = plants.get(placements[0]!.plant)
      return plant ? [rowOf(plant, keys.get(plant.id) ?? '', placements, alike.get(plant.id) ?? [])] : []
    })
}

/** How many plants the rows hold together. */
export const totalOf = (rows: readonly PlantListRow[]): number => rows.reduce((sum, { quantity }) => sum + quantity, 0)

/** How many of them are new, to be bought and planted, and how many stand there already. */
export const partsOf = (rows: readonly PlantListRow[]): { fresh: number; existing: number } => ({
  fresh: totalOf(rows.filter((row) => !row.isExisting)),
  existing: totalOf(rows.filter((row) => row.isExisting)),
})

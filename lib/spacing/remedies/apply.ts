/** What a way out changes. The one place that knows it: the trials, the editor and the tests all ask here. */
import type { Plant } from '../../plants/types'
import { sizeRange } from '../growth'
import type { Placement, Remedy, Sheet } from '../types'

/** Another plant in the same place: never planted larger than it grows, and not bound to the shears of the one before. */
export function swapped({ kept: _, clearStem: __, ...placement }: Placement, plant: Plant): Placement {
  const { height, spread } = sizeRange(plant, 'low')
  const { planted } = placement
  return { ...placement, plant: plant.id, planted: { height: Math.min(planted.height, height), spread: Math.min(planted.spread, spread) } }
}

/** The placements as the way out would have them; those it does not name are left out. */
export function changedPlacements(sheet: Pick<Sheet, 'placements'>, remedy: Remedy, plant?: Plant): Placement[] {
  const named = new Set(remedy.kind === 'swap' ? remedy.placements : [remedy.placement])
  return sheet.placements.filter(({ id }) => named.has(id)).map((placement): Placement => {
    switch (remedy.kind) {
      case 'move':
        return { ...placement, x: remedy.x, y: remedy.y }
      case 'swap':
        return plant ? swapped(placement, plant) : placement
      case 'keep':
        return { ...placement, kept: remedy.kept }
      case 'specimen':
        return { ...placement, role: 'specimen' }
    }
  })
}

/** The sheet with a way out applied. `plant` is the one swapped in; the sheet gains it where it has it not. */
export function applyRemedy(sheet: Sheet, remedy: Remedy, plant?: Plant): Sheet {
  const changed = new Map(changedPlacements(sheet, remedy, plant).map((placement) => [placement.id, placement]))
  const isKnown = !plant || sheet.plants.some(({ id }) => id === plant.id)
  return {
    ...sheet,
    plants: isKnown ? sheet.plants : [...sheet.plants, plant],
    placements: sheet.placements.map((placement) => changed.get(placement.id) ?? placement),
  }
}

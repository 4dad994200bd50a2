/**
 * What stands on the demonstration's drawings. Each line is a plant by its botanical name, where its axis stands
 * (along the wall, out from the base line), its size when planted, and what else is said of it; inches.
 */
import type { Placement } from '@/lib/spacing'

export interface Planting extends Omit<Placement, 'id' | 'plant'> {
  botanical: string
}

type Extra = Partial<Pick<Placement, 'role' | 'drift' | 'kept' | 'status' | 'clearStem'>>

/** Where the axis stands and the size at planting: x, y, height, spread. */
type Spot = [x: number, y: number, height: number, spread: number]

const at = (botanical: string, [x, y, height, spread]: Spot, extra: Extra = {}): Planting => ({
  botanical, x, y, planted: { height, spread }, ...extra,
})

/** Finished: every plant keeps its place at its largest. */
export const QUARRY_PLANTING: Planting[] = [
  at("Ilex glabra 'Shamrock'", [22, 40, 18, 18], { role: 'anchor' }),
  at("Hydrangea paniculata 'Ilvobo'", [72, 44, 15, 18]),
  at("Hydrangea paniculata 'Ilvobo'", [120, 44, 15, 18]),
  at("Buxus sempervirens 'Vardar Valley'", [168, 46, 12, 14]),
  at("Nepeta × faassenii 'Kit Cat'", [26, 84, 6, 9], { drift: 'catmint left' }),
  at("Nepeta × faassenii 'Kit Cat'", [50, 84, 6, 9], { drift: 'catmint left' }),
  at("Nepeta × faassenii 'Kit Cat'", [74, 84, 6, 9], { drift: 'catmint left' }),
  at("Coreopsis verticillata 'Zagreb'", [104, 86, 6, 8], { drift: 'tickseed' }),
  at("Coreopsis verticillata 'Zagreb'", [124, 86, 6, 8], { drift: 'tickseed' }),
  at("Coreopsis verticillata 'Zagreb'", [144, 86, 6, 8], { drift: 'tickseed' }),
  at("Abelia × grandiflora 'Rose Creek'", [296, 44, 15, 16]),
  at("Hydrangea paniculata 'Ilvobo'", [348, 44, 15, 18]),
  at("Ilex glabra 'Shamrock'", [402, 44, 15, 18]),
  at("Clethra alnifolia 'Ruby Spice'", [470, 46, 24, 18], { role: 'anchor' }),
  at("Heuchera 'Plum Pudding'", [280, 86, 5, 8], { drift: 'alumroot' }),
  at("Heuchera 'Plum Pudding'", [298, 86, 5, 8], { drift: 'alumroot' }),
  at("Heuchera 'Plum Pudding'", [316, 86, 5, 8], { drift: 'alumroot' }),
  at("Nepeta × faassenii 'Kit Cat'", [346, 88, 6, 9], { drift: 'catmint right' }),
  at("Nepeta × faassenii 'Kit Cat'", [370, 88, 6, 9], { drift: 'catmint right' }),
  at("Nepeta × faassenii 'Kit Cat'", [394, 88, 6, 9], { drift: 'catmint right' }),
]

/** As found on the draft: small on the day, and at least six kinds of trouble later. */
export const KILN_PLANTING: Planting[] = [
  at("Rhododendron catawbiense 'Roseum Elegans'", [96, 52, 24, 24]),
  at("Taxus × media 'Densiformis'", [34, 22, 18, 21]),
  at("Camellia hiemalis 'Shishigashira'", [146, 40, 18, 18]),
  at("Spiraea × vanhouttei", [60, 92, 24, 24]),
  at("Hosta 'Halcyon'", [28, 96, 8, 12]),
  at("Thuja occidentalis 'Techny'", [250, 46, 48, 18], { role: 'anchor' }),
  at("Hydrangea paniculata 'Limelight'", [300, 76, 24, 20]),
  at("Hydrangea paniculata 'Limelight'", [340, 76, 24, 20]),
  at("Taxus × media 'Hicksii'", [404, 66, 36, 15], { kept: { height: 52, spread: 30 } }),
  at("Juniperus × pfitzeriana 'Pfitzeriana'", [470, 96, 15, 24]),
  at("Spiraea japonica 'Gold Mound'", [372, 124, 10, 12]),
  at("Heuchera villosa 'Autumn Bride'", [270, 106, 6, 9], { drift: 'alumroot' }),
  at("Heuchera villosa 'Autumn Bride'", [292, 106, 6, 9], { drift: 'alumroot' }),
  at("Heuchera villosa 'Autumn Bride'", [314, 106, 6, 9], { drift: 'alumroot' }),
]

export const FEN_PLANTING: Planting[] = [
  at("Buxus 'Green Velvet'", [40, 40, 15, 15]),
  at("Buxus 'Green Velvet'", [240, 40, 15, 15]),
  at("Nepeta racemosa 'Walker's Low'", [140, 70, 8, 12]),
]

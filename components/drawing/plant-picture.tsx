import { drawPlantElevation } from '@/lib/drawing'
import type { Plant } from '@/lib/plants'
import { crownOf, type Bound, type Facade, type Placement } from '@/lib/spacing'
import { PlantShapes } from './scene-svg'

interface Props {
  plant: Plant
  placement: Placement
  facade: Facade
  zone: string
  year: number | 'mature'
  month: number
  bound?: Bound
  /** Unique on its page. */
  name: string
}

const SIZE_PX = 96
const AIR = 1.18

/** One plant alone on its ground line, framed for its full size: it grows within its frame as the years go on. */
export function PlantPicture({ plant, placement, facade, zone, year, month, bound = 'expected', name }: Props) {
  const grown = crownOf({ plant, placement, facade, zone, bound, year: 'mature' })
  const crown = crownOf({ plant, placement, facade, zone, bound, year })
  const size = Math.max(grown.height, grown.spread, crown.height, crown.spread) * AIR
  const drawing = drawPlantElevation({ plant, placement, crown, month }, (z) => -z)
  const left = crown.x - size / 2
  const ground = -crown.z0
  return (
    <svg viewBox={`${left} ${ground - size * 0.92} ${size} ${size}`} width="100%" aria-hidden="true" focusable="false">
      <PlantShapes drawing={drawing} pen={{ name, inch: size / SIZE_PX }} part="plant" />
      <path d={`M${left + size * 0.04} ${ground}H${left + size * 0.96}`} stroke="var(--color-ink)" strokeWidth={1.4} vectorEffect="non-scaling-stroke" />
    </svg>
  )
}

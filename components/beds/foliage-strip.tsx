import { lookOf } from '@/lib/drawing'
import { matureSize, type Bed, type Placement } from '@/lib/spacing'
import type { Plant } from '@/lib/plants'

const TALL = 26

interface Standing {
  placement: Placement
  plant: Plant
}

const COLOR_WORDS = (color: string) => color.replace('variegated-', 'variegated ').replace('-', ' ')

/** Foliage colors along the wall in a month, each as wide as its expected crown, those nearer the viewer in front. */
export function FoliageStrip({ bed, standing, month }: { bed: Bed; standing: readonly Standing[]; month: number }) {
  const xs = bed.outline.map(({ x }) => x)
  const [left, right] = [Math.min(...xs), Math.max(...xs)]
  const along = [...standing].sort((a, b) => a.placement.x - b.placement.x)
  return (
    <figure>
      <figcaption>Foliage along the wall</figcaption>
      <svg viewBox={`${left} 0 ${right - left} ${TALL}`} preserveAspectRatio="none" aria-hidden="true" className="mt-1 h-8 w-full border border-rule">
        {[...standing].sort((a, b) => a.placement.y - b.placement.y).map(({ placement, plant }) => {
          const spread = Math.min(matureSize(plant, placement, 'expected').spread, placement.kept?.spread ?? Infinity)
          return <rect key={placement.id} x={placement.x - spread / 2} y={2} width={spread} height={TALL - 4} fill={`var(--color-${lookOf(plant, month).fill})`} stroke="var(--color-ink)" strokeWidth="1" vectorEffect="non-scaling-stroke" />
        })}
      </svg>
      <p className="sr-only">From left to right: {along.map(({ plant }) => `${plant.common || plant.botanical}, ${COLOR_WORDS(plant.foliageColor)}`).join('; ')}.</p>
    </figure>
  )
}

import { PlantShapes } from '@/components/drawing/scene-svg'
import { drawPlantElevation } from '@/lib/drawing'
import { formatLength } from '@/lib/measure'
import type { LibraryPlant } from '@/lib/plants'
import { crownOf, silhouette, type Bound, type Crown, type Facade, type Placement } from '@/lib/spacing'

/** What stands beside the plant: a person of 6 ft, and a door of 6'-8" by 3'-0", the stock size of the trade. */
const PERSON_IN = 72
const DOOR = { width: 36, height: 80 }
const GAP_IN = 14
/** Width the figure is drawn for; texts and lines keep their size at it. */
const FIGURE_PX = 680

const FLAT: Facade = {
  wall: [{ x: -2_000, y: 0 }, { x: 2_000, y: 0 }], grade: [{ x: 0, z: 0 }], fall: 0, gutter: 108, overhang: 0, siding: 'masonry', exposed: 0, mulch: 0,
}

function crownFor(plant: LibraryPlant, bound: Bound): { crown: Crown; placement: Placement } {
  const placement: Placement = { id: plant.id, plant: plant.id, x: 0, y: 0, planted: { height: plant.heightMin, spread: plant.spreadMin } }
  const zone = `${plant.zoneMin ?? 7}a`
  return { placement, crown: crownOf({ plant, placement, facade: FLAT, zone, bound, year: 'mature' }) }
}

/** A summer month in which it flowers, else July. */
const monthShown = ({ bloomMonths }: LibraryPlant): number => bloomMonths.find((month) => month >= 5 && month <= 9) ?? 7

const THIN = { stroke: 'var(--color-ink-soft)', strokeWidth: 1.2, vectorEffect: 'non-scaling-stroke' as const }
const DASHED = { fill: 'none', stroke: 'var(--color-ink)', strokeWidth: 1.4, vectorEffect: 'non-scaling-stroke' as const }

const outlineOf = (crown: Crown) => `M${silhouette(crown, 24).map(({ x, z }) => `${x.toFixed(1)} ${(-z).toFixed(1)}`).join('L')}Z`

/** Somebody of 6 ft standing with their feet at 0 0, in an outline of 72 units. */
const PERSON = 'M0-72c3.2 0 5 2.4 5 5.4S3.3-61 2.4-60v2.6c5 .7 8 2.5 8.6 6.6l1.6 16.4c.2 2-.4 3.4-1.6 3.6s-2-.7-2.3-2.4L6.6-46.5 6.4-34 5.6-2 7.5 0H1.4L.6-30h-1.2L-1.4 0h-6.1l1.9-2-.8-32-.2-12.5-2.1 13.3c-.3 1.7-1.1 2.6-2.3 2.4s-1.8-1.6-1.6-3.6L-11-50.8c.6-4.1 3.6-5.9 8.6-6.6V-60C-3.3-61-5-63.6-5-66.6S-3.2-72 0-72Z'

function Person({ x }: { x: number }) {
  return <path d={PERSON} transform={`translate(${x} 0)`} fill="var(--color-rule)" {...THIN} />
}

function Door({ x }: { x: number }) {
  const { width, height } = DOOR
  return (
    <g>
      <path fill="var(--color-sheet)" {...THIN} d={`M${x} 0V${-height}H${x + width}V0`} />
      <path fill="none" {...THIN} d={`M${x + 6} ${-height + 8}h${width - 12}v26h${12 - width}ZM${x + 6} ${-height + 42}h${width - 12}v28h${12 - width}Z`} />
      <circle cx={x + width - 4} cy={-36} r={1.4} fill="var(--color-ink)" />
    </g>
  )
}

/** Heights at the left edge, every so many feet that a handful stands there. */
function Ruler({ x, top, inch, right }: { x: number; top: number; inch: number; right: number }) {
  const step = [1, 2, 5, 10, 20, 50].find((feet) => top / (feet * 12) <= 8) ?? 100
  const marks = Array.from({ length: Math.floor(top / (step * 12)) }, (_, i) => (i + 1) * step)
  return marks.map((feet) => (
    <g key={feet}>
      <path d={`M${x} ${-feet * 12}H${right}`} stroke="var(--color-rule)" strokeWidth={1} vectorEffect="non-scaling-stroke" />
      <text x={x - 6 * inch} y={-feet * 12 + 4.5 * inch} textAnchor="end" fontSize={13 * inch} fill="var(--color-ink-soft)" fontFamily="var(--font-mono, monospace)">{feet} ft</text>
    </g>
  ))
}

const sizeText = ({ height, spread }: Crown) => `${formatLength(Math.round(height))} high, ${formatLength(Math.round(spread))} wide`

const isSingle = (plant: LibraryPlant) => plant.heightMin === plant.heightMax || plant.spreadMin === plant.spreadMax

/** How the three sizes come from the figures on record: the same way as in the check. */
function basisOf(plant: LibraryPlant): string {
  const single = isSingle(plant) ? ' Where one figure is on record, low is 15 % under it and high 15 % over it.' : ''
  if (plant.category === 'tree') return `Low and expected are the smallest and the middle of the figures on record; high is a fifth over the largest, since measured street trees outgrow such lists.${single.replace(' and high 15 % over it', '')}`
  return `The smallest, middle and largest of the figures on record.${single}`
}

/** What is said under the figure, and read aloud in its place. */
function Legend({ low, expected, high }: Record<Bound, Crown>) {
  const lines = [['Low', 'short dashes', low], ['Expected', 'drawn', expected], ['High', 'long dashes', high]] as const
  return (
    <dl className="mt-3 grid gap-x-6 gap-y-1 sm:grid-cols-3">
      {lines.map(([word, mark, crown]) => (
        <div key={word}>
          <dt className="font-bold">{word} <span className="font-normal text-ink-soft">({mark})</span></dt>
          <dd className="font-mono text-sm">{sizeText(crown)}</dd>
        </div>
      ))}
    </dl>
  )
}

/** A plant full grown, to one scale with a person and a door: smallest, expected and largest of the sizes on record. */
export function SizeFigure({ plant }: { plant: LibraryPlant }) {
  const { crown: expected, placement } = crownFor(plant, 'expected')
  const low = crownFor(plant, 'low').crown
  const high = crownFor(plant, 'high').crown
  const half = Math.max(high.spread, expected.spread, low.spread) / 2
  const left = -half - GAP_IN * 2 - DOOR.width - 26
  const height = Math.max(high.height, DOOR.height) * 1.06
  const bare = half - left + GAP_IN
  const inch = bare / (FIGURE_PX - 60)
  const width = bare + 60 * inch
  const drawing = drawPlantElevation({ plant, placement, crown: expected, month: monthShown(plant) }, (z) => -z)
  const doorX = left + 2
  return (
    <figure className="m-0">
      <svg
        viewBox={`${left - 60 * inch} ${-height - 14 * inch} ${width} ${height + 22 * inch}`} width="100%" role="img" className="max-h-140"
        aria-label={`The plant full grown beside a person of 6 feet and a door of 6 feet 8 inches. Expected: ${sizeText(expected)}.`}
      >
        <Ruler x={left} top={height} inch={inch} right={half + GAP_IN} />
        <Door x={doorX} />
        <Person x={doorX + DOOR.width + 15} />
        <PlantShapes drawing={drawing} pen={{ name: 'size', inch }} part="plant" />
        <path d={outlineOf(low)} {...DASHED} strokeDasharray="3 4" />
        <path d={outlineOf(high)} {...DASHED} strokeDasharray="10 5" />
        <path d={`M${left} 0H${half + GAP_IN}`} stroke="var(--color-ink)" strokeWidth={2} vectorEffect="non-scaling-stroke" />
      </svg>
      <figcaption>
        <Legend low={low} expected={expected} high={high} />
        <p className="mt-2 text-sm text-ink-soft">{`${basisOf(plant)} Beside it a person of ${formatLength(PERSON_IN)} and a door of ${formatLength(DOOR.height)}, all to one scale.`}</p>
      </figcaption>
    </figure>
  )
}

/**
 * House fronts for the bench: repeatable, planted as closely as real beds are (three rows, in each a plant every 4 ft 6 in,
 * tall ones mostly behind), with a window each 10 ft and a walk along the whole front.
 */
import type { Opening, Placement, Sheet, Size, Walk, Bed } from '@/lib/spacing'
import type { Category, Growth, Habit, Leaf, Plant } from '@/lib/plants/types'
import { placementOf, plantOf, randomFrom, sheetOf } from '../reference/support'

const BAY = 480
const PER_PLACEMENT = 18

interface Kind { category: Category; leaf: Leaf; habit: Habit; growth: Growth; height: [number, number]; spread: [number, number] }

const kind = (habit: Habit, growth: Growth, height: [number, number], spread: [number, number]): Kind =>
  ({ category: 'shrub', leaf: 'deciduous', habit, growth, height, spread })

/** Tall kinds first, low ones last: rows draw from their own part of the list. */
const KINDS: Kind[] = [
  { ...kind('vase', 'moderate', [180, 240], [144, 200]), category: 'tree' },
  { ...kind('columnar', 'slow', [96, 120], [24, 36]), leaf: 'scale-evergreen' },
  kind('upright', 'fast', [60, 84], [36, 54]),
  kind('vase', 'moderate', [54, 72], [40, 50]),
  kind('arching', 'moderate', [48, 62], [48, 62]),
  kind('rounded', 'slow', [36, 48], [36, 48]),
  kind('spreading', 'moderate', [30, 44], [48, 66]),
  kind('mounded', 'moderate', [24, 36], [30, 42]),
  { ...kind('mounded', 'slow', [18, 30], [24, 36]), leaf: 'needle-evergreen' },
  { ...kind('clump', 'fast', [30, 42], [24, 30]), category: 'grass', leaf: 'herbaceous' },
  { ...kind('mounded', 'moderate', [16, 22], [18, 26]), category: 'perennial', leaf: 'herbaceous' },
]

/** First and last kind of the back, middle and front row. */
const ROWS: [number, number][] = [[0, 5], [3, 9], [7, 10]]

function plants(): Plant[] {
  return KINDS.map(({ height, spread, ...rest }, i) => plantOf({
    id: `p${i + 1}`, ...rest, heightMin: height[0], heightMax: height[1], spreadMin: spread[0], spreadMax: spread[1],
  }))
}

function plantedSize({ height, spread }: Kind): Size {
  return { height: Math.min(96, height[0] * 0.4), spread: spread[0] * 0.4 }
}

function along(bays: number) {
  const openings: Opening[] = []
  const walks: Walk[] = []
  const beds: Bed[] = []
  const box = (x: number, y0: number, y1: number) => [{ x, y: y0 }, { x: x + BAY, y: y0 }, { x: x + BAY, y: y1 }, { x, y: y1 }]
  for (let bay = 0; bay < bays; bay += 1) {
    const x = bay * BAY
    for (let i = 0; i < 4; i += 1) openings.push({ id: `w${4 * bay + i + 1}`, kind: 'window', name: 'Window', x: x + 24 + 120 * i, width: 60, sill: 38, head: 92 })
    walks.push({ id: `k${bay + 1}`, name: 'Walk', outline: box(x, 106, 154) })
    beds.push({ id: `b${bay + 1}`, name: 'Bed', outline: box(x, 0, 106) })
  }
  return { openings, walks, beds }
}

/** A front of `count` placements; the same count is the same front, always. */
export function frontOf(count: number): Sheet {
  const random = randomFrom(7_919 + count)
  const on64 = (value: number) => Math.round(value * 64) / 64
  const length = count * PER_PLACEMENT
  const bays = Math.ceil(length / BAY)
  const right = bays * BAY
  const placements: Placement[] = Array.from({ length: count }, (_, i) => {
    const row = i % 3
    const [first, last] = ROWS[row]!
    const index = first + Math.floor(random() * (last - first + 1))
    const { category } = KINDS[index]!
    const kept = category === 'shrub' && random() < 0.2
    return placementOf({
      id: `a${String(i + 1).padStart(5, '0')}`, plant: `p${index + 1}`,
      x: on64(5 + i * PER_PLACEMENT + (random() - 0.5) * 8), y: on64(32 + row * 27 + (random() - 0.5) * 9),
      planted: plantedSize(KINDS[index]!),
      ...(kept ? { kept: { height: 32, spread: 30 } } : {}),
      ...(row === 0 && random() < 0.3 ? { drift: `d${Math.floor(i / 12)}` } : {}),
    })
  })
  return sheetOf({
    facade: {
      wall: [{ x: 0, y: 0 }, { x: right, y: 0 }], grade: [{ x: 0, z: 0 }, { x: right, z: -3 }],
      fall: 0.04, gutter: 112, overhang: 16, siding: 'lap', exposed: 8, mulch: 2,
    },
    ...along(bays), plants: plants(), placements,
  })
}

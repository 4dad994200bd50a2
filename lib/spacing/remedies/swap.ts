import type { Plant } from '../../plants/types'
import { compareText } from '../finding'
import { sizeRange } from '../growth'
import type { Finding, Placement, Remedy } from '../types'
import { applyRemedy, swapped } from './apply'
import type { Trial } from './trial'

/** So many are offered. */
const MOST_OFFERED = 3

const IS_OF_A_SEASON = (plant: Plant) => plant.category === 'annual' || plant.category === 'bulb'
const isWoody = ({ leaf }: Plant) => leaf !== 'herbaceous'

/** What a designer would miss first: the kind of plant, whether it keeps its leaves, its colour, its flower, its size. */
const WEIGHTS = { category: 6, leaf: 4, foliage: 2, texture: 1, bloomColor: 1, bloomMonths: 2, size: 3 } as const

const months = (a: Plant, b: Plant) => {
  const all = new Set([...a.bloomMonths, ...b.bloomMonths])
  return all.size === 0 ? 0 : 1 - a.bloomMonths.filter((month) => b.bloomMonths.includes(month)).length / all.size
}

/** How far apart two plants are to the eye; 0 for the same. */
function unlikeness(a: Plant, b: Plant): number {
  const [sizeA, sizeB] = [sizeRange(a, 'expected'), sizeRange(b, 'expected')]
  const size = Math.abs(Math.log(sizeA.height / sizeB.height)) + Math.abs(Math.log(sizeA.spread / sizeB.spread))
  return (
    WEIGHTS.category * Number(a.category !== b.category) + WEIGHTS.leaf * Number(a.leaf !== b.leaf) +
    WEIGHTS.foliage * Number(a.foliageColor !== b.foliageColor) + WEIGHTS.texture * Number(a.texture !== b.texture) +
    WEIGHTS.bloomColor * Number(a.bloomColor !== b.bloomColor) + WEIGHTS.bloomMonths * months(a, b) + WEIGHTS.size * size
  )
}

/** Could it take the other's part at all? Woody for woody, and nothing of one season for what should last. */
const canStandFor = (plant: Plant, other: Plant) =>
  plant.id !== other.id && plant.botanical !== other.botanical && isWoody(plant) === isWoody(other) && IS_OF_A_SEASON(plant) === IS_OF_A_SEASON(other)

/** Up to three plants of the library that have no conflict and no risk in the place of those given, most alike first. */
export function findSwaps(trial: Trial, finding: Finding, placements: readonly Placement[], library: readonly Plant[]): Remedy[] {
  const plant = trial.prepared.plants.get(placements[0]?.plant ?? '')
  if (!plant || placements.some(({ status }) => status === 'stays')) return []
  const likest = library
    .filter((other) => canStandFor(other, plant))
    .map((other) => ({ other, unlike: unlikeness(other, plant) }))
    .sort((a, b) => a.unlike - b.unlike || compareText(a.other.botanical, b.other.botanical) || compareText(a.other.id, b.other.id))
  const offered: Remedy[] = []
  for (const { other } of likest) {
    if (!placements.every((placement) => trial.isFreeOfFindings(other, swapped(placement, other)))) continue
    const remedy: Remedy = { kind: 'swap', placements: placements.map(({ id }) => id), plant: other.id }
    if (trial.isBetter(applyRemedy(trial.sheet, remedy, other), finding.key)) offered.push(remedy)
    if (offered.length === MOST_OFFERED) break
  }
  return offered
}

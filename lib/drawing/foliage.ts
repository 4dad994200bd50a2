/** What a plant wears in a month: leaf colour, bare wood, or a dry mound; and its flowers. */
import type { Plant } from '../plants'
import type { Ink } from './palette'

/** leaves: full; thin: half kept over winter; bare: branches; dormant: cut down or died back. */
export type Dress = 'leaves' | 'thin' | 'bare' | 'dormant'

export interface Look {
  dress: Dress
  fill: Ink
  /** Inks of flowers this month; [] when not in flower. */
  bloom: Ink[]
}

const BLOOM: Record<Plant['bloomColor'], Ink[]> = {
  white: ['bloom-white'], pink: ['bloom-pink'], red: ['bloom-red'], orange: ['bloom-orange'], yellow: ['bloom-yellow'],
  green: ['bloom-green'], blue: ['bloom-blue'], purple: ['bloom-purple'], multi: ['bloom-pink', 'bloom-yellow', 'bloom-purple'], '': [],
}

const FRUIT: Record<string, Ink> = { red: 'bloom-red', orange: 'bloom-orange', yellow: 'bloom-yellow', white: 'bloom-white', blue: 'bloom-blue', purple: 'bloom-purple', pink: 'bloom-pink', green: 'bloom-green', black: 'ink', brown: 'bark' }

/** The ink of a fruit colour as the library names it; soft ink for others. */
export const fruitInk = (color: string): Ink => FRUIT[color] ?? 'ink-soft'

const isEvergreen = ({ leaf }: Plant) => leaf === 'broadleaf-evergreen' || leaf === 'needle-evergreen' || leaf === 'scale-evergreen'
const isWinter = (month: number) => month <= 3 || month === 12

function turning({ foliageColor }: Plant): Ink {
  if (foliageColor === 'purple' || foliageColor === 'red') return 'foliage-red'
  if (foliageColor === 'bronze') return 'foliage-bronze'
  return 'foliage-fall'
}

function leafInk(plant: Plant, month: number): Ink {
  const own: Ink = `foliage-${plant.foliageColor}`
  if (isEvergreen(plant)) return own
  const green = plant.foliageColor === 'green' || plant.foliageColor === 'dark-green'
  if (month === 4 && green) return 'foliage-fresh'
  if (month < 10 || plant.leaf === 'semi-evergreen') return own
  if (plant.leaf === 'herbaceous') return plant.category === 'grass' ? 'foliage-straw' : own
  return turning(plant)
}

/**
 * How a plant looks in a month (1-12). The months are those of a temperate garden: leaves from April, turning in
 * October and November, bare December to March. The sheet does not carry a fall colour, so leaves turn to one
 * warm tone, reds stay red: common practice of drawing, not a promise.
 */
export function lookOf(plant: Plant, month: number): Look {
  const bloom = plant.bloomMonths.includes(month) ? BLOOM[plant.bloomColor] : []
  const fill = leafInk(plant, month)
  if (isEvergreen(plant)) return { dress: 'leaves', fill, bloom }
  if (plant.leaf === 'herbaceous') {
    const away = (isWinter(month) || month === 11) && bloom.length === 0
    return { dress: away ? 'dormant' : 'leaves', fill: away ? 'foliage-straw' : fill, bloom }
  }
  if (!isWinter(month)) return { dress: 'leaves', fill, bloom }
  return plant.leaf === 'semi-evergreen' ? { dress: 'thin', fill: 'foliage-bronze', bloom } : { dress: 'bare', fill, bloom }
}

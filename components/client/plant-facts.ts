/** What a client reads of each plant: plain names, plain sizes. */
import { plantKeys } from '@/lib/sheet'
import type { Plant } from '@/lib/plants'
import { crownOf, type Placement } from '@/lib/spacing'
import type { ClientSheet } from './types'

export interface PlantFacts {
  key: string
  plant: Plant
  placement: Placement
  count: number
  name: string
  sizes: string
  flower: string
  /** Kept clipped, or already standing; '' when there is nothing to say. */
  remark: string
}

const MONTHS = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December']

/** Keeps a figure and its unit on one line. */
const NBSP = '\u00a0'

/** A length as one says it over a fence: `15 in`, `4 ft`, `6 ft 6 in`; from 2 ft to the nearest 3 in. */
export function aboutLength(inches: number): string {
  if (inches < 23.5) return `${Math.max(1, Math.round(inches))}${NBSP}in`
  const rounded = Math.round(inches / 3) * 3
  const [feet, rest] = [Math.floor(rounded / 12), rounded % 12]
  return rest === 0 ? `${feet}${NBSP}ft` : `${feet}${NBSP}ft ${rest}${NBSP}in`
}

/** Months in order as words: `May and June`, `June to September`; months apart are listed. */
export function monthWords(months: readonly number[]): string {
  const words = months.flatMap((month) => MONTHS[month - 1] ?? [])
  if (words.length <= 1) return words[0] ?? ''
  const inRow = months.every((month, i) => i === 0 || month === (months[i - 1]! % 12) + 1)
  if (inRow && words.length > 2) return `${words[0]} to ${words.at(-1)}`
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

function sizesOf(plant: Plant, placement: Placement, { facade, site }: ClientSheet): string {
  const grown = crownOf({ plant, placement, facade, zone: site.zone, bound: 'expected', year: 10 })
  const then = `about ${aboutLength(grown.height)} tall and ${aboutLength(grown.spread)} wide in its tenth summer`
  const start = placement.status === 'stays' ? 'today' : 'when planted'
  return `${aboutLength(placement.planted.height)} tall ${start}, ${then}.`
}

function flowerOf({ bloomMonths, bloomColor }: Plant): string {
  if (bloomMonths.length === 0) return 'Grown for its leaves.'
  const colour = bloomColor === '' ? 'In flower' : bloomColor === 'multi' ? 'Flowers in several colors' : `${capital(bloomColor)} flowers`
  return `${colour} in ${monthWords(bloomMonths)}.`
}

function remarkOf({ kept, status }: Placement): string {
  if (status === 'stays') return 'Already here, and it stays.'
  const height = kept?.height
  return height === undefined ? '' : `We keep it clipped at ${aboutLength(height)}.`
}

/** Every plant that will stand here, in the order of the keys. Plants that go are left out. */
export function plantFacts(sheet: ClientSheet): PlantFacts[] {
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  return [...plantKeys(sheet)].flatMap(([id, key]): PlantFacts[] => {
    const plant = plants.get(id)
    const standing = sheet.placements.filter((placement) => placement.plant === id && placement.status !== 'goes')
    const placement = standing[0]
    if (!plant || !placement) return []
    return [{
      key, plant, placement, count: standing.length, name: capital(plant.common || plant.botanical),
      sizes: sizesOf(plant, placement, sheet), flower: flowerOf(plant), remark: remarkOf(placement),
    }]
  })
}

/** The values of facts in words for people. */
import { formatLength } from '../measure'
import { FACT_LABELS, type Fact } from './facts'
import { monthsInWords } from './months'
import type { LibraryPlant } from './types'

const OWN_WORDS: Record<string, string> = {
  '': 'Any',
  clump: 'Clump-forming',
  'multi-stem': 'Multi-stemmed',
  'part-shade': 'Part shade',
  'cut-back': 'Cut back once a year',
  shear: 'Shear lightly',
  deadhead: 'Take off spent flowers',
  minimal: 'Little needed',
  'after-bloom': 'Right after bloom',
  'late-winter': 'In late winter',
  'variegated-white': 'Green and white',
  'variegated-yellow': 'Green and yellow',
}

/** A value of a list, such as `broadleaf-evergreen`, as a word: "Broadleaf evergreen". */
export const wordOf = (value: string): string => OWN_WORDS[value] ?? value.charAt(0).toUpperCase() + value.slice(1).replaceAll('-', ' ')

export const DEER_WORDS = {
  rarely: 'Rarely browsed', seldom: 'Seldom browsed', occasionally: 'Sometimes browsed', frequently: 'Often browsed', unknown: 'Not known',
} as const

const listOf = (values: readonly string[], none: string) =>
  values.length === 0 ? none : values.map((value, i) => (i === 0 ? wordOf(value) : wordOf(value).toLowerCase())).join(', ')

/** A range of lengths: "3'-0\" to 4'-0\"", or one length where both are the same. */
export const rangeText = (min: number, max: number): string => (min === max ? formatLength(min) : `${formatLength(min)} to ${formatLength(max)}`)

/** The zones a plant is hardy in; in words where it has none. */
export function zonesText({ zoneMin, zoneMax }: Pick<LibraryPlant, 'zoneMin' | 'zoneMax'>): string {
  if (zoneMin === null && zoneMax === null) return 'One season'
  return zoneMin === zoneMax ? `${zoneMin}` : `${zoneMin ?? 'any'} to ${zoneMax ?? 'any'}`
}

/** A row of a plant's page: what is said, and the facts it rests on. */
export interface FactLine {
  label: string
  value: string
  facts: Fact[]
}

function flowersText({ bloomMonths, bloomColor }: LibraryPlant) {
  const color = bloomColor === 'multi' ? 'Several colors' : wordOf(bloomColor)
  return bloomMonths.length === 0 ? 'None of note' : `${bloomColor === '' ? 'In flower' : color}, ${monthsInWords(bloomMonths)}`
}

function fruitText({ fruitColor, fruitMonths }: LibraryPlant) {
  return [wordOf(fruitColor || 'none of note'), monthsInWords(fruitMonths)].filter(Boolean).join(', ')
}

const line = (value: string, ...facts: Fact[]): FactLine => ({ label: FACT_LABELS[facts[0]!], value, facts })
const named = (label: string, value: string, ...facts: Fact[]): FactLine => ({ label, value, facts })

/** Every fact of a plant in groups as people look for them. */
export function factGroups(plant: LibraryPlant): { title: string; lines: FactLine[] }[] {
  return [
    {
      title: 'Size and form',
      lines: [
        named('Mature height', rangeText(plant.heightMin, plant.heightMax), 'height_min', 'height_max'),
        named('Mature spread', rangeText(plant.spreadMin, plant.spreadMax), 'spread_min', 'spread_max'),
        line(wordOf(plant.category), 'category'), line(wordOf(plant.habit), 'habit'), line(wordOf(plant.growth), 'growth'),
        line(wordOf(plant.leaf), 'leaf'), line(wordOf(plant.texture), 'texture'), line(wordOf(plant.prune), 'prune'),
      ],
    },
    {
      title: 'Where it grows',
      lines: [
        named('Hardiness zones', zonesText(plant), 'zone_min', 'zone_max'),
        line(listOf(plant.light, 'Not recorded'), 'light'), line(listOf(plant.water, 'Not recorded'), 'water'),
        line(DEER_WORDS[plant.deer], 'deer'), line(plant.juglone === 'unknown' ? 'Not known' : wordOf(plant.juglone), 'juglone'),
        line(listOf(plant.native, 'No region of the United States on record'), 'native'), line(listOf(plant.birds, 'Nothing of note'), 'birds'),
      ],
    },
    {
      title: 'Through the year',
      lines: [
        line(wordOf(plant.foliageColor), 'foliage_color'), named('Flower', flowersText(plant), 'bloom_months', 'bloom_color'),
        line(fruitText(plant), 'fruit'), line(plant.fallColor === 'none' ? 'None of note' : wordOf(plant.fallColor === 'multi' ? 'several' : plant.fallColor), 'fall_color'),
      ],
    },
    {
      title: 'Cautions',
      lines: [
        line(wordOf(plant.toxicity), 'toxicity'), line(plant.thorns ? 'Yes' : 'None', 'thorns'), line(plant.invasive ? 'Listed as invasive' : 'Not listed as invasive', 'invasive'),
      ],
    },
  ]
}

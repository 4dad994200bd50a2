/** Columns of a plant import, in the order of the template. */
import { FACTS } from './facts'

/** Columns that may be missing. */
const OPTIONAL = ['source_title', 'source_url', 'memory_fields'] as const

export const CSV_COLUMNS = ['botanical', 'common', ...FACTS, ...OPTIONAL] as const
export type CsvColumn = (typeof CSV_COLUMNS)[number]

export const REQUIRED_COLUMNS: readonly CsvColumn[] = CSV_COLUMNS.filter((column) => !(OPTIONAL as readonly string[]).includes(column))

/** The fields of a plant that a column fills: to name the column of a bad field. */
const COLUMN_OF_FIELD: Record<string, CsvColumn> = {
  botanical: 'botanical', common: 'common', category: 'category', leaf: 'leaf', heightMin: 'height_min', heightMax: 'height_max',
  spreadMin: 'spread_min', spreadMax: 'spread_max', habit: 'habit', growth: 'growth', zoneMin: 'zone_min', zoneMax: 'zone_max',
  light: 'light', water: 'water', foliageColor: 'foliage_color', texture: 'texture', bloomMonths: 'bloom_months',
  bloomColor: 'bloom_color', fallColor: 'fall_color', fruitColor: 'fruit', fruitMonths: 'fruit', deer: 'deer', birds: 'birds',
  native: 'native', thorns: 'thorns', toxicity: 'toxicity', juglone: 'juglone', invasive: 'invasive', prune: 'prune',
  memoryFacts: 'memory_fields',
}

/** The column of a bad field by its path in the plant. */
export function columnOf(path: readonly PropertyKey[]): string {
  if (path[0] === 'sources') return path[2] === 'title' ? 'source_title' : 'source_url'
  return COLUMN_OF_FIELD[String(path[0])] ?? ''
}

/** A header as people write it, as the column's name: "Height min" is height_min. */
export const headerKey = (header: string): string => header.trim().toLowerCase().replace(/[\s-]+/g, '_')

const EXAMPLE: Record<CsvColumn, string> = {
  botanical: "Rosa 'Example of a Name'", common: 'example rose', category: 'shrub', leaf: 'deciduous',
  height_min: '36', height_max: '48', spread_min: '36', spread_max: '42', habit: 'rounded', growth: 'moderate',
  zone_min: '4', zone_max: '9', light: 'full-sun|part-shade', water: 'medium', foliage_color: 'dark-green', texture: 'medium',
  bloom_months: '6-9', bloom_color: 'pink', fall_color: 'none', fruit: 'red 9-11', deer: 'frequently', birds: 'fruit', native: '',
  thorns: 'yes', toxicity: 'unlisted', juglone: 'unknown', invasive: 'no', prune: 'late-winter',
  source_title: 'Grower catalogue 2026', source_url: 'https://www.example.com/roses', memory_fields: 'texture|growth',
}

/** An empty import with one line that shows how each column is written; CRLF, ready for a spreadsheet. */
export const csvTemplate = (): string =>
  [CSV_COLUMNS, CSV_COLUMNS.map((column) => EXAMPLE[column])].map((cells) => `${cells.join(',')}\r\n`).join('')

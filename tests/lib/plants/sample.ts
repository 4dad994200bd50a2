import { CSV_COLUMNS, type CsvColumn } from '@/lib/plants/csv-columns'
import type { PlantInput } from '@/lib/plants'

const CELLS: Record<CsvColumn, string> = {
  botanical: "Ilex glabra 'Testing'", common: 'testing inkberry', category: 'shrub', leaf: 'broadleaf-evergreen',
  height_min: '36', height_max: '48', spread_min: '30', spread_max: '40', habit: 'rounded', growth: 'slow', zone_min: '5', zone_max: '9',
  light: 'full-sun|part-shade', water: 'medium|wet', foliage_color: 'dark-green', texture: 'fine', bloom_months: '5-6', bloom_color: 'white',
  fall_color: 'none', fruit: 'black 9-2', deer: 'seldom', birds: 'fruit|shelter', native: 'northeast', thorns: 'no', toxicity: 'toxic',
  juglone: 'unknown', invasive: 'no', prune: 'late-winter', source_title: 'A grower|A garden', source_url: 'https://example.com/a|https://example.com/b',
  memory_fields: 'texture|growth',
}

const quoted = (cell: string) => (/[",\n\r;]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell)

/** A line of a file: a sound plant, with some cells changed. */
export const lineOf = (changed: Partial<Record<CsvColumn, string>> = {}, columns: readonly CsvColumn[] = CSV_COLUMNS) =>
  columns.map((column) => quoted({ ...CELLS, ...changed }[column])).join(',')

export const HEADER = CSV_COLUMNS.join(',')

/** A file of plants named A, B, C..., one for each set of changed cells. */
export const fileOf = (...lines: Partial<Record<CsvColumn, string>>[]) =>
  [HEADER, ...lines.map((cells, i) => lineOf({ botanical: `Ilex probata '${String.fromCharCode(65 + i)}'`, ...cells }))].join('\n')

export const plantInput = (changed: Partial<PlantInput> = {}): PlantInput => ({
  botanical: "Ilex glabra 'Testing'", common: 'testing inkberry', category: 'shrub', leaf: 'broadleaf-evergreen',
  heightMin: 36, heightMax: 48, spreadMin: 30, spreadMax: 40, habit: 'rounded', growth: 'slow', zoneMin: 5, zoneMax: 9,
  light: ['full-sun', 'part-shade'], water: ['medium', 'wet'], foliageColor: 'dark-green', texture: 'fine', bloomMonths: [5, 6],
  bloomColor: 'white', fallColor: 'none', fruitColor: 'black', fruitMonths: [9, 10, 11, 12, 1, 2], deer: 'seldom', birds: ['fruit', 'shelter'],
  native: ['northeast'], thorns: false, toxicity: 'toxic', juglone: 'unknown', invasive: false, prune: 'late-winter',
  sources: [{ title: 'A grower', url: 'https://example.com/a' }, { title: 'A garden', url: 'https://example.com/b' }],
  memoryFacts: ['growth', 'texture'],
  ...changed,
})

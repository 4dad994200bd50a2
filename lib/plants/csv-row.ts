/** One line of an import as a plant, or what is wrong with it. */
import { Cells, type CsvProblem } from './csv-cells'
import { columnOf } from './csv-columns'
import { FACTS } from './facts'
import { MAX_PLANT_IN, plantInputSchema, type PlantInput } from './schema'
import {
  BIRD_VALUES, BLOOM_COLORS, CATEGORIES, DEER_CLASSES, FALL_COLORS, FOLIAGE_COLORS, GROWTHS, HABITS, JUGLONES, LEAVES,
  LIGHTS, NATIVE_REGIONS, PRUNES, TEXTURES, TOXICITIES, WATERS,
} from './types'

function readSources(cells: Cells): PlantInput['sources'] {
  const titles = cells.pieces('source_title')
  const urls = cells.pieces('source_url')
  if (urls.length > titles.length) cells.refuse('source_url', `${urls.length} addresses stand for ${titles.length} titles: give each source a title.`)
  return titles.map((title, i) => ({ title, url: urls[i] ?? '' }))
}

function readMemoryFacts(cells: Cells): PlantInput['memoryFacts'] {
  return cells.pieces('memory_fields').flatMap((piece) => {
    const fact = FACTS.find((known) => known === piece.toLowerCase())
    if (!fact) cells.refuse('memory_fields', `"${piece.slice(0, 40)}" is not a column of facts: name columns of this file, with | between.`)
    return fact ?? []
  })
}

function readCells(cells: Cells): PlantInput {
  return {
    botanical: cells.text('botanical'),
    common: cells.text('common'),
    category: cells.choice('category', CATEGORIES),
    leaf: cells.choice('leaf', LEAVES),
    heightMin: cells.length('height_min', Number.MIN_VALUE),
    heightMax: cells.length('height_max', MAX_PLANT_IN),
    spreadMin: cells.length('spread_min', Number.MIN_VALUE),
    spreadMax: cells.length('spread_max', MAX_PLANT_IN),
    habit: cells.choice('habit', HABITS),
    growth: cells.choice('growth', GROWTHS),
    zoneMin: cells.zone('zone_min'),
    zoneMax: cells.zone('zone_max'),
    light: cells.choices('light', LIGHTS),
    water: cells.choices('water', WATERS),
    foliageColor: cells.choice('foliage_color', FOLIAGE_COLORS),
    texture: cells.choice('texture', TEXTURES),
    bloomMonths: cells.months('bloom_months'),
    bloomColor: cells.choice('bloom_color', BLOOM_COLORS),
    fallColor: cells.choice('fall_color', FALL_COLORS),
    ...cells.fruit('fruit'),
    deer: cells.choice('deer', DEER_CLASSES),
    birds: cells.choices('birds', BIRD_VALUES),
    native: cells.choices('native', NATIVE_REGIONS),
    thorns: cells.yesNo('thorns'),
    toxicity: cells.choice('toxicity', TOXICITIES),
    juglone: cells.choice('juglone', JUGLONES),
    invasive: cells.yesNo('invasive'),
    prune: cells.choice('prune', PRUNES),
    sources: readSources(cells),
    memoryFacts: readMemoryFacts(cells),
  }
}

/** Reads one line, its cells by column name. Every bad cell is named; the schema of a plant has the last word. */
export function readPlantRow(line: number, byColumn: ReadonlyMap<string, string>): { plant: PlantInput } | { problems: CsvProblem[] } {
  const cells = new Cells(line, byColumn)
  const read = readCells(cells)
  const judged = plantInputSchema.safeParse(read)
  const known = new Set(cells.problems.map(({ column }) => column))
  const further = judged.success ? [] : judged.error.issues.map(({ path, message }) => ({ line, column: columnOf(path), message }))
  const problems = [...cells.problems, ...further.filter(({ column }) => !known.has(column))]
  return judged.success && problems.length === 0 ? { plant: judged.data } : { problems }
}

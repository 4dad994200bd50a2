/** Reads a file of plants: comma-separated, one plant a line, headed by the columns of the template. */
import Papa from 'papaparse'
import type { CsvProblem } from './csv-cells'
import { CSV_COLUMNS, headerKey, REQUIRED_COLUMNS } from './csv-columns'
import { readPlantRow } from './csv-row'
import { nameKey } from './name-key'
import type { PlantInput } from './schema'

export type { CsvProblem }

export const MAX_CSV_ROWS = 2_000
export const MAX_CSV_BYTES = 1_048_576

export interface CsvRow {
  /** Where the plant starts in the file; the header is line 1. */
  line: number
  plant: PlantInput
}

export interface PlantCsv {
  rows: CsvRow[]
  problems: CsvProblem[]
  /** Plants in the file, good and bad. */
  total: number
  /** False when the file as a whole cannot be taken: then there are no rows. */
  isReadable: boolean
}

interface RawRow {
  line: number
  lastLine: number
  cells: string[]
  /** A quotation mark out of place. */
  fault?: 'open' | 'stray'
}

const unreadable = (line: number, column: string, message: string): PlantCsv => ({
  rows: [], problems: [{ line, column, message }], total: 0, isReadable: false,
})

/** Whichever of comma, semicolon and tab stands most often in the header: spreadsheets of other countries write others. */
function delimiterOf(text: string): string {
  const header = text.slice(0, text.indexOf('\n') + 1 || undefined)
  const counted = [',', ';', '\t'].map((mark) => ({ mark, count: header.split(mark).length }))
  return counted.reduce((best, next) => (next.count > best.count ? next : best)).mark
}

const breaksIn = (text: string) => text.split('\n').length - 1

/** Rows with the lines they stand on; a quoted cell may run over several. Text has \n line ends only. */
function readRows(text: string): RawRow[] {
  const rows: RawRow[] = []
  let from = 0
  let line = 1
  Papa.parse<string[]>(text, {
    delimiter: delimiterOf(text),
    newline: '\n',
    step: ({ data, errors, meta }, parser) => {
      const passed = breaksIn(text.slice(from, meta.cursor))
      const ended = text[meta.cursor - 1] === '\n' ? 1 : 0
      const quotes = errors.filter(({ type }) => type === 'Quotes')
      const fault = quotes.some(({ code }) => code === 'MissingQuotes') ? 'open' : quotes.length > 0 ? 'stray' : undefined
      if (data.some((cell) => cell.trim() !== '')) rows.push({ line, lastLine: line + passed - ended, cells: data, ...(fault && { fault }) })
      from = meta.cursor
      line += passed
      // One more than allowed is enough to know that there are too many.
      if (rows.length > MAX_CSV_ROWS + 1) parser.abort()
    },
  })
  return rows
}

function headerProblems({ line, cells }: RawRow): CsvProblem[] {
  const keys = cells.map(headerKey)
  const at = (column: string, message: string): CsvProblem => ({ line, column, message })
  const unknown = keys.flatMap((key, i) => (key === '' || (CSV_COLUMNS as readonly string[]).includes(key) ? [] : at(cells[i]!.trim().slice(0, 40), 'This column is not known here. Rename it as in the template, or take it out.')))
  const twice = keys.filter((key, i) => key !== '' && keys.indexOf(key) !== i).map((key) => at(key, 'This column stands twice.'))
  const missing = REQUIRED_COLUMNS.filter((column) => !keys.includes(column)).map((column) => at(column, 'This column is missing. Its cells may be as in the template, the column must be there.'))
  return [...unknown, ...twice, ...missing]
}

function cellsByColumn(header: RawRow, row: RawRow): ReadonlyMap<string, string> {
  return new Map(header.cells.map((name, i) => [headerKey(name), row.cells[i] ?? '']))
}

/** What is wrong with a row before its cells are read. */
function shapeProblem(header: RawRow, { line, lastLine, cells, fault }: RawRow): CsvProblem | null {
  if (fault) {
    const where = lastLine > line ? ` Lines ${line} to ${lastLine} were taken for one.` : ''
    return { line, column: '', message: `A quotation mark is out of place: inside a quoted cell it is written twice.${where}` }
  }
  const named = header.cells.length
  if (cells.length < named) return { line, column: '', message: `This line has ${cells.length} cells where the header names ${named}.` }
  const stray = cells.findIndex((cell, i) => cell.trim() !== '' && (header.cells[i] ?? '').trim() === '')
  return stray < 0 ? null : { line, column: '', message: `Cell ${stray + 1} stands under no column: is there a comma in a cell without quotation marks?` }
}

function readPlants(header: RawRow, body: RawRow[]): Pick<PlantCsv, 'rows' | 'problems'> {
  const rows: CsvRow[] = []
  const problems: CsvProblem[] = []
  const seen = new Map<string, number>()
  for (const raw of body) {
    const shape = shapeProblem(header, raw)
    const read = shape ? { problems: [shape] } : readPlantRow(raw.line, cellsByColumn(header, raw))
    if ('problems' in read) {
      problems.push(...read.problems)
      continue
    }
    const key = nameKey(read.plant.botanical)
    const first = seen.get(key)
    if (first === undefined) {
      seen.set(key, raw.line)
      rows.push({ line: raw.line, plant: read.plant })
    } else problems.push({ line: raw.line, column: 'botanical', message: `This plant stands on line ${first} already.` })
  }
  return { rows, problems }
}

/**
 * Reads plants from CSV text. Sizes are inches or any length that says its unit; lists stand with | between; months
 * as 6-9, or 11-2 over the turn of the year. A byte order mark, any line ends, and semicolons or tabs in place of
 * commas are taken as they come. Every bad cell is a problem with its line and column; a line with one is left out of
 * `rows`, as is the second line of a plant. At most 2,000 plants and 1 MB. Never throws.
 */
export function parsePlantCsv(source: string): PlantCsv {
  if (new TextEncoder().encode(source).byteLength > MAX_CSV_BYTES) return unreadable(1, '', 'The file is larger than 1 MB. Split it and bring in the parts.')
  const text = source.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n')
  if (text.includes('\u0000')) return unreadable(1, '', 'This is not a text file. In the spreadsheet, save as CSV UTF-8 and bring in that file.')
  const [header, ...body] = readRows(text)
  if (!header) return unreadable(1, '', 'The file is empty.')
  const inHeader = headerProblems(header)
  if (inHeader.length > 0) return { rows: [], problems: inHeader, total: 0, isReadable: false }
  const open = [header, ...body].find(({ fault }) => fault === 'open')
  if (open) return unreadable(open.line, '', 'A quotation mark opens on this line and is never closed: the rest of the file cannot be told apart.')
  if (body.length === 0) return unreadable(header.line, '', 'There is no plant under the header.')
  if (body.length > MAX_CSV_ROWS) return unreadable(1, '', 'The file holds more than 2,000 plants. Split it and bring in the parts.')
  return { ...readPlants(header, body), total: body.length, isReadable: true }
}

/** The plant list as CSV by RFC 4180: CRLF, quotes doubled, numbers as numbers. */
import Papa from 'papaparse'
import type { PlantListRow } from './plant-list'

/** A cell that a spreadsheet would run begins so, also after a line break, and also in full width. */
const RUNS = /^[\s\u00a0\u3000]*[=+\-@\uff1d\uff0b\uff0d\uff20\t\r]/

/** Text made harmless: an apostrophe before each line that a spreadsheet would run. */
export function harmless(text: string): string {
  return text
    .split(/(\r\n|\r|\n)/)
    .map((part, i) => (i % 2 === 0 && RUNS.test(part) ? `'${part}` : part))
    .join('')
    .replace(/^([\t\r\n])/, "'$1")
}

const COLUMNS: [string, (row: PlantListRow) => string | number | null][] = [
  ['Key', (row) => row.key],
  ['Quantity', (row) => row.quantity],
  ['Botanical name', (row) => row.botanical],
  ['Common name', (row) => row.common],
  ['Height at planting, in', (row) => row.plantedHeight],
  ['Spread at planting, in', (row) => row.plantedSpread],
  ['Mature height from, in', (row) => row.matureHeight.min],
  ['Mature height to, in', (row) => row.matureHeight.max],
  ['Mature spread from, in', (row) => row.matureSpread.min],
  ['Mature spread to, in', (row) => row.matureSpread.max],
  ['Spacing, in', (row) => (row.spacing === null ? null : Math.round(row.spacing * 100) / 100)],
  ['Remarks', (row) => row.remarks],
]

const cell = (value: string | number | null) => (typeof value === 'string' ? harmless(value) : value)

/**
 * The rows as CSV text with a header line.
 * @param options.bom begin with the byte order mark that makes some spreadsheets read UTF-8.
 */
export function plantListCsv(rows: readonly PlantListRow[], { bom }: { bom: boolean }): string {
  const fields = COLUMNS.map(([name]) => name)
  const data = rows.map((row) => COLUMNS.map(([, read]) => cell(read(row))))
  return (bom ? '\ufeff' : '') + Papa.unparse({ fields, data }, { newline: '\r\n' }) + '\r\n'
}

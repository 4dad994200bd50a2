/** Reads the cells of one line of an import; every bad cell gets a sentence. */
import { parseLength } from '../measure'
import type { CsvColumn } from './csv-columns'
import { parseMonths } from './months'

/** A cell by its line (the header is line 1) and column name; column '' means the line or the file. */
export interface CsvProblem {
  line: number
  column: string
  message: string
}

const LONGEST_ECHO = 40
const echo = (text: string) => (text.length > LONGEST_ECHO ? `"${text.slice(0, LONGEST_ECHO)}..."` : `"${text}"`)
const listed = (values: readonly string[]) => values.filter(Boolean).join(', ')
const option = (text: string) => text.trim().toLowerCase().replace(/[\s_]+/g, '-')

/** One line. Readers answer a harmless value where they note a problem: a line with problems is not used. */
export class Cells {
  readonly problems: CsvProblem[] = []

  constructor(
    private readonly line: number,
    private readonly cells: ReadonlyMap<string, string>,
  ) {}

  refuse(column: CsvColumn, message: string): void {
    this.problems.push({ line: this.line, column, message })
  }

  /** Plain text on one line: breaks inside a quoted cell become spaces. */
  text(column: CsvColumn): string {
    const text = (this.cells.get(column) ?? '').replace(/\s+/g, ' ').trim()
    if (text.includes('\uFFFD')) this.refuse(column, `${echo(text)} has a character that could not be read. Save the file as CSV UTF-8.`)
    return text
  }

  /** A length; bare numbers are inches. `otherwise` is answered for a bad one: it must not disturb its pair. */
  length(column: CsvColumn, otherwise: number): number {
    const text = this.text(column)
    const read = text === '' ? { ok: false as const, message: 'Empty: give a number of inches.' } : parseLength(text)
    if (read.ok) return read.inches
    this.refuse(column, read.message)
    return otherwise
  }

  zone(column: CsvColumn): number | null {
    const text = this.text(column)
    if (text === '') return null
    if (/^\d{1,2}$/.test(text)) return Number(text)
    this.refuse(column, `${echo(text)} is not a zone: a whole number from 1 to 13, or empty for a plant grown for one season.`)
    return null
  }

  choice<T extends string>(column: CsvColumn, values: readonly T[]): T {
    const text = this.text(column)
    const found = values.find((value) => value === option(text))
    if (found !== undefined) return found
    this.refuse(column, `${text === '' ? 'Empty' : `${echo(text)} is not known here`}: give one of ${listed(values)}.`)
    return values[0]!
  }

  choices<T extends string>(column: CsvColumn, values: readonly T[]): T[] {
    const found = new Set<T>()
    for (const piece of this.pieces(column)) {
      const value = values.find((known) => known === option(piece))
      if (value) found.add(value)
      else this.refuse(column, `${echo(piece)} is not known here: give any of ${listed(values)}, with | between.`)
    }
    return [...found]
  }

  yesNo(column: CsvColumn): boolean {
    const text = this.text(column).toLowerCase()
    if (['yes', 'y', 'true'].includes(text)) return true
    if (!['no', 'n', 'false'].includes(text)) this.refuse(column, `${text === '' ? 'Empty' : echo(text)}: give yes or no.`)
    return false
  }

  months(column: CsvColumn): number[] {
    const text = this.text(column)
    const months = parseMonths(text)
    if (!months) this.refuse(column, `${echo(text)} is not a span of months: write 6-9, or 11-2 over the turn of the year.`)
    return months ?? []
  }

  /** "red 9-10": a colour, then months. */
  fruit(column: CsvColumn): { fruitColor: string; fruitMonths: number[] } {
    const text = this.text(column)
    const [, color = '', span = ''] = /^([^\d]*)(.*)$/.exec(text) ?? []
    const months = parseMonths(span)
    if (months && (color.trim() !== '' || span === '')) return { fruitColor: color.trim().toLowerCase(), fruitMonths: months }
    this.refuse(column, `${echo(text)} is not a fruit: write its color, then its months, such as red 9-10.`)
    return { fruitColor: '', fruitMonths: [] }
  }

  /** The pieces of a list, with | between. */
  pieces(column: CsvColumn): string[] {
    const text = this.text(column)
    return text === '' ? [] : text.split('|').map((piece) => piece.trim())
  }
}

import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { MAX_CSV_BYTES, MAX_CSV_ROWS, parsePlantCsv } from '@/lib/plants/csv'
import { CSV_COLUMNS, csvTemplate } from '@/lib/plants/csv-columns'
import { fileOf, HEADER, lineOf, plantInput } from './sample'

const sorted = <T extends { memoryFacts: string[] }>(plant: T) => ({ ...plant, memoryFacts: [...plant.memoryFacts].sort() })
const problemsOf = (text: string) => parsePlantCsv(text).problems
const placesOf = (text: string) => problemsOf(text).map(({ line, column }) => [line, column])

describe('a sound file', () => {
  it('gives each plant with the line it stands on', () => {
    const { rows, problems, total } = parsePlantCsv(`${HEADER}\n${lineOf()}\n`)
    expect(problems).toEqual([])
    expect(total).toBe(1)
    expect(rows.map(({ line }) => line)).toEqual([2])
    expect(sorted(rows[0]!.plant)).toEqual(sorted(plantInput()))
  })

  it('is read the same with a byte order mark, Windows or old Mac line ends, semicolons, or tabs', () => {
    const lines = [HEADER, lineOf(), lineOf({ botanical: "Ilex glabra 'Other'" })]
    const plain = parsePlantCsv(lines.join('\n'))
    expect(plain.rows).toHaveLength(2)
    for (const text of [`\uFEFF${lines.join('\n')}`, lines.join('\r\n'), lines.join('\r'), `${lines.join('\r\n')}\r\n\r\n`]) expect(parsePlantCsv(text)).toEqual(plain)
    for (const mark of [';', '\t']) expect(parsePlantCsv(lines.join('\n').replaceAll(',', mark))).toEqual(plain)
  })

  it('takes columns in any order, headers as people write them, and empty columns at the end', () => {
    const turned = [...CSV_COLUMNS].reverse()
    const header = turned.map((column) => ` ${column.replaceAll('_', ' ').toUpperCase()} `).join(',')
    const { rows, problems } = parsePlantCsv(`${header},,\n${lineOf({}, turned)},,\n`)
    expect(problems).toEqual([])
    expect(rows).toHaveLength(1)
  })

  it('counts the lines of quoted line breaks and of blank lines', () => {
    const text = `${HEADER}\n${lineOf({ common: 'two\nline\nname' })}\n\n,,,\n${lineOf({ botanical: 'Ilex', habit: 'lumpy' })}\n`
    expect(parsePlantCsv(text).rows[0]).toMatchObject({ line: 2, plant: { common: 'two line name' } })
    expect(placesOf(text)).toEqual([[7, 'habit']])
    expect(placesOf(text.replaceAll('\n', '\r\n'))).toEqual([[7, 'habit']])
  })

  it('reads lengths with their unit, and lists and options however they are spaced or capitalised', () => {
    const text = fileOf({ height_min: "3'", height_max: '4 ft', spread_min: '76.2 cm', light: 'Full sun | part shade', thorns: 'YES' })
    expect(parsePlantCsv(text).rows[0]?.plant).toMatchObject({ heightMin: 36, heightMax: 48, spreadMin: 30, light: ['full-sun', 'part-shade'], thorns: true })
  })

  it('reads months over the turn of the year, single months, and fruit with its color', () => {
    const { rows } = parsePlantCsv(fileOf({ bloom_months: '11-2', fruit: 'blue 8' }, { bloom_months: '', bloom_color: '', fruit: '' }))
    expect(rows[0]?.plant).toMatchObject({ bloomMonths: [11, 12, 1, 2], fruitColor: 'blue', fruitMonths: [8] })
    expect(rows[1]?.plant).toMatchObject({ bloomMonths: [], fruitColor: '', fruitMonths: [] })
  })

  it('may leave out the columns of sources: then nothing claims to have been read', () => {
    const columns = CSV_COLUMNS.filter((column) => !['source_title', 'source_url', 'memory_fields'].includes(column))
    expect(parsePlantCsv(`${columns.join(',')}\n${lineOf({}, columns)}`).rows[0]?.plant).toMatchObject({ sources: [], memoryFacts: [] })
  })

  it('is what the template is', () => {
    expect(parsePlantCsv(csvTemplate())).toMatchObject({ problems: [], total: 1 })
  })

  it('is what the shared library is: 344 plants', () => {
    const { rows, problems } = parsePlantCsv(readFileSync('seed/plants.csv', 'utf8'))
    expect(problems).toEqual([])
    expect(rows).toHaveLength(344)
  })
})

describe('a bad cell', () => {
  it.each([
    ['height_max', 'tall'], ['height_max', ''], ['height_min', '0'], ['height_min', '-3'], ['height_max', '5000'], ['spread_max', 'NaN'],
    ['height_min', '49'], ['spread_min', '41'], ['zone_min', '6b'], ['zone_max', '14'], ['zone_min', '10'], ['category', 'bush'], ['leaf', ''],
    ['light', 'full-sun|bright'], ['bloom_months', '13'], ['bloom_months', '4-'], ['bloom_months', 'May'], ['fruit', '9-10'], ['fruit', 'red 9-40'],
    ['thorns', 'maybe'], ['thorns', ''], ['botanical', ''], ['botanical', 'x'.repeat(121)], ['source_url', 'javascript:alert(1)|'], ['source_url', 'a|b|c'],
    ['source_title', '|'], ['memory_fields', 'texture|scent'], ['common', 'caf\uFFFD'],
  ] as const)('is named by line and column: %s = "%s"', (column, cell) => {
    const text = fileOf({}, { [column]: cell }, {})
    const { rows, problems, total } = parsePlantCsv(text)
    expect(problems.map(({ line }) => line).every((line) => line === 3)).toBe(true)
    expect(problems.map((problem) => problem.column)).toContain(column)
    expect(rows.map(({ line }) => line)).toEqual([2, 4])
    expect(total).toBe(3)
    for (const { message } of problems) expect(message).toMatch(/^[A-Z"\d].*\.$/)
  })

  it('does not hide the other bad cells of its line', () => {
    expect(placesOf(fileOf({ habit: 'lumpy', thorns: '?', height_max: 'x' }))).toEqual([[2, 'height_max'], [2, 'habit'], [2, 'thorns']])
  })
})

describe('a bad line', () => {
  it('has fewer cells than the header, or cells under no column', () => {
    const text = [HEADER, lineOf(), 'Ilex,holly', `${lineOf({ botanical: 'Ilex a' })},more`].join('\n')
    expect(placesOf(text)).toEqual([[3, ''], [4, '']])
    expect(problemsOf(text)[0]?.message).toContain(`2 cells where the header names ${CSV_COLUMNS.length}`)
  })

  it('names a plant that stands above already, however it is spelled', () => {
    const text = fileOf({ botanical: "Abelia × grandiflora 'Rose'" }, {}, { botanical: 'abelia x  grandiflora ‘rose’' })
    expect(problemsOf(text)).toEqual([{ line: 4, column: 'botanical', message: 'This plant stands on line 2 already.' }])
  })

  it('has a quotation mark out of place', () => {
    const text = [HEADER, lineOf(), `"Ilex 6" tall",${lineOf().split(',').slice(1).join(',')}`, lineOf({ botanical: 'Ilex z' })].join('\n')
    const { problems, rows } = parsePlantCsv(text)
    expect(problems.map(({ line }) => line)).toEqual([3])
    expect(rows[0]?.line).toBe(2)
  })
})

describe('a file that cannot be taken as a whole', () => {
  it.each([
    ['nothing in it', '', /empty/],
    ['only blank lines', '\n\r\n , ,\n', /empty/],
    ['only a header', `${HEADER}\n\n`, /no plant/],
    ['a quotation mark never closed', `${HEADER}\n${lineOf()}\n"Ilex,${lineOf()}\n${lineOf()}`, /never closed/],
    ['no text but a workbook', 'PK\u0003\u0004\u0000\u0000', /not a text file/],
    ['more than 1 MB', `${HEADER}\n${'é'.repeat(MAX_CSV_BYTES / 2)}`, /larger than 1 MB/],
  ])('%s', (_what, text, message) => {
    const { rows, problems, isReadable } = parsePlantCsv(text)
    expect({ rows, isReadable }).toEqual({ rows: [], isReadable: false })
    expect(problems).toHaveLength(1)
    expect(problems[0]?.message).toMatch(message)
  })

  it('has a column that is unknown, missing or there twice', () => {
    const header = HEADER.replace('growth,', '').replace('habit', 'habbit').replace('common', 'botanical')
    const { problems, isReadable } = parsePlantCsv(`${header}\n${lineOf()}`)
    expect(isReadable).toBe(false)
    expect(problems.map(({ line, column }) => [line, column])).toEqual([[1, 'habbit'], [1, 'botanical'], [1, 'common'], [1, 'habit'], [1, 'growth']])
  })

  it('holds one plant more than 2,000; 2,000 are taken', () => {
    const short = CSV_COLUMNS.slice(0, -3)
    const lines = Array.from({ length: MAX_CSV_ROWS + 1 }, (_, i) => lineOf({ botanical: `Ilex n${i}` }, short))
    expect(parsePlantCsv([short.join(','), ...lines.slice(1)].join('\n'))).toMatchObject({ total: MAX_CSV_ROWS, problems: [] })
    expect(problemsOf([short.join(','), ...lines].join('\n'))[0]?.message).toContain('more than 2,000')
  })
})

it('never throws, whatever the text', () => {
  const pieces = fc.constantFrom('"', ',', '\n', '\r\n', ';', '|', HEADER, lineOf(), 'Ilex', '\t', 'é', '=1+1', '\uFEFF')
  fc.assert(fc.property(fc.array(fc.oneof(pieces, fc.string()), { maxLength: 30 }), (parts) => {
    const { rows, problems, total } = parsePlantCsv(parts.join(''))
    const bad = new Set(problems.map(({ line }) => line))
    expect(rows.length).toBeLessThanOrEqual(total)
    expect(rows.every(({ line }) => !bad.has(line))).toBe(true)
  }), { numRuns: 300 })
})

/** A sheet is read whole or refused with the path of each bad field and a sentence. */
import { describe, expect, test } from 'vitest'
import { MAX_LENGTH_IN } from '@/lib/measure'
import { parseSheet, pathText } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { sampleSheet } from './sample'

/** What is wrong with the sample sheet after a change, as "path: sentence". */
function problemsAfter(change: (sheet: Sheet) => void): string[] {
  const sheet = sampleSheet()
  change(sheet)
  const parsed = parseSheet(sheet)
  return parsed.ok ? [] : parsed.problems.map(({ path, message }) => `${pathText(path)}: ${message}`)
}

// Tests put what the types forbid.
const loose = (thing: object) => thing as Record<string, unknown>

test('a sound sheet is read as it is, without rounding', () => {
  const sheet = sampleSheet()
  sheet.openings[0]!.x = 60.123456789
  expect(parseSheet(JSON.parse(JSON.stringify(sheet)))).toEqual({ ok: true, sheet })
})

test('optional fields may be missing', () => {
  const sheet = sampleSheet()
  delete sheet.site.facing
  delete sheet.site.brief
  delete sheet.standards
  delete sheet.fixtures[0]!.outlet
  expect(parseSheet(sheet).ok).toBe(true)
})

describe('unknown keys are refused with their path', () => {
  test.each<[string, (sheet: Sheet) => void]>([
    ['extra', (sheet) => void (loose(sheet).extra = 1)],
    ['site.colour', (sheet) => void (loose(sheet.site).colour = 'red')],
    ['facade.wall[1].z', (sheet) => void (loose(sheet.facade.wall[1]!).z = 0)],
    ['openings[1].glass', (sheet) => void (loose(sheet.openings[1]!).glass = true)],
    ['plants[0].price', (sheet) => void (loose(sheet.plants[0]!).price = 3)],
    ['placements[0].planted.width', (sheet) => void (loose(sheet.placements[0]!.planted).width = 3)],
    ['standards.sill.colour', (sheet) => void (sheet.standards = { 'sill.colour': 1 })],
  ])('%s', (path, change) => expect(problemsAfter(change).map((text) => text.split(': ')[0])).toEqual([path]))

  test('each of several is named', () => {
    expect(problemsAfter((sheet) => Object.assign(sheet.facade, { roof: 1, chimney: 2 }))).toEqual([
      'facade.roof: There is no field "roof" here.',
      'facade.chimney: There is no field "chimney" here.',
    ])
  })
})

describe('impossible single fields', () => {
  test.each<[string, string, (sheet: Sheet) => void]>([
    ['not a number', 'facade.gutter', (sheet) => void (sheet.facade.gutter = NaN)],
    ['not finite', 'openings[0].width', (sheet) => void (sheet.openings[0]!.width = Infinity)],
    ['text for a number', 'facade.overhang', (sheet) => void (loose(sheet.facade).overhang = '16')],
    ['missing', 'facade.mulch', (sheet) => void delete loose(sheet.facade).mulch],
    ['a width of 0', 'openings[0].width', (sheet) => void (sheet.openings[0]!.width = 0)],
    ['longer than 1,000 ft', 'facade.wall[3].x', (sheet) => void (sheet.facade.wall[3]!.x = MAX_LENGTH_IN + 1)],
    ['a fall of 45 degrees', 'facade.fall', (sheet) => void (sheet.facade.fall = 1)],
    ['one corner only', 'facade.wall', (sheet) => void sheet.facade.wall.splice(1)],
    ['no soil at all', 'facade.grade', (sheet) => void (sheet.facade.grade = [])],
    ['a zone that is none', 'site.zone', (sheet) => void (sheet.site.zone = '14a')],
    ['another version', 'version', (sheet) => void (loose(sheet).version = 2)],
    ['centimetres', 'units', (sheet) => void (loose(sheet).units = 'cm')],
    ['a kind that is none', 'fixtures[0].kind', (sheet) => void (loose(sheet.fixtures[0]!).kind = 'tap')],
  ])('%s', (_, path, change) => {
    const problems = problemsAfter(change)
    expect(problems.map((text) => text.split(': ')[0])).toContain(path)
    for (const text of problems) expect(text).toMatch(/\.$|expected|option/)
  })

  test.each([null, undefined, 7, 'sheet', [], {}])('%o is no sheet', (input) => expect(parseSheet(input).ok).toBe(false))
})

describe('fields at odds with each other', () => {
  const bowTie = [{ x: 0, y: 0 }, { x: 100, y: 100 }, { x: 100, y: 0 }, { x: 0, y: 100 }]
  test.each<[string, (sheet: Sheet) => void]>([
    ['openings[0].sill: The sill must be below the head.', (sheet) => void (sheet.openings[0]!.sill = 92)],
    ['openings[0].width: Kitchen runs beyond the right corner of the wall.', (sheet) => void (sheet.openings[0]!.width = 468.5)],
    ['openings[0].x: Kitchen starts beyond the left corner of the wall.', (sheet) => void (sheet.openings[0]!.x = -0.5)],
    ['openings[0].x: Kitchen lies beyond the right corner of the wall.', (sheet) => void (sheet.openings[0]!.x = 528)],
    ['facade.gutter: The gutter must be above the soil.', (sheet) => void (sheet.facade.gutter = 0)],
    ['facade.grade[1].x: Soil points run from left to right, each at its own x.', (sheet) => void (sheet.facade.grade[1]!.x = 0)],
    ['beds[0].outline: Front bed: the outline crosses itself.', (sheet) => void (sheet.beds[0]!.outline = bowTie)],
    ['walks[0].outline: Front walk: the outline encloses no ground.', (sheet) => void (sheet.walks[0]!.outline = [{ x: 0, y: 0 }, { x: 9, y: 0 }, { x: 18, y: 0 }])],
    ['placements[0].plant: This plant is not among the plants of the sheet.', (sheet) => void (sheet.placements[0]!.plant = 'p9')],
    ['openings[1].id: The id w1 stands twice.', (sheet) => void (sheet.openings[1]!.id = 'w1')],
    ['standards.wall-gap.gap: Gap to the wall', (sheet) => void (sheet.standards = { 'wall-gap.gap': -1 })],
    ['standards.nothing.here: There is no such setting.', (sheet) => void (sheet.standards = { 'nothing.here': 1 })],
    ['facade.wall[3].x: At a jog two wall points share one x, never three.', (sheet) => void (sheet.facade.wall[3]!.x = 240)],
  ])('%s', (expected, change) => {
    const problems = problemsAfter(change)
    const path = expected.split(': ')[0]!
    expect(problems.some((text) => (expected.startsWith('standards.wall') ? text.startsWith(`${path}: `) : text === expected))).toBe(true)
  })

  test('a wall without width', () => {
    const problems = problemsAfter((sheet) => {
      sheet.facade.wall = [{ x: 0, y: 0 }, { x: 0, y: 24 }]
      sheet.openings = []
    })
    expect(problems).toEqual(['facade.wall: The wall has no width: its right corner must lie right of its left one.'])
  })

  test('at the boundary all is well: an opening as wide as the wall, a sill just below the head', () => {
    expect(problemsAfter((sheet) => Object.assign(sheet.openings[0]!, { x: 0, width: 528, sill: 91.999 }))).toEqual([])
  })
})

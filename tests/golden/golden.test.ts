/** Whole beds, read from JSON as people would hand them in, against findings worked out by hand beside a drawing of each. */
import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { check, type Finding, type Sheet } from '@/lib/spacing'
import { parseSheet } from '@/lib/sheet'
import { WORKED_RULES, type Expected, type Three } from './expected'
import { expected as shears, rules as shearRules } from './by-shears'
import { expected as corners, rules as cornerRules } from './corners-and-door'
import { expected as drifts, rules as driftRules } from './drift-and-green'
import { expected as frontWalk } from './front-walk'
import { expected as ground, rules as groundRules } from './ground-and-water'
import { expected as joggedWall } from './jogged-wall'
import { expected as kitchenWindow } from './kitchen-window'
import { expected as layers } from './layers'
import { expected as meter, rules as meterRules } from './meter-and-number'
import { expected as shares, rules as shareRules } from './shares-of-a-bed'
import { expected as trees, rules as treeRules } from './trees-and-fire'
import { expected as wrongPlace, rules as siteRules } from './wrong-place'

function read(name: string): Sheet {
  const parsed = parseSheet(JSON.parse(readFileSync(`tests/golden/${name}.json`, 'utf8')))
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems))
  return parsed.sheet
}

const judged = (sheet: Sheet, rules: readonly string[] = WORKED_RULES) => check(sheet).findings.filter(({ rule }) => rules.includes(rule))
const line = ({ rule, kind, placements, feature }: Expected | Finding) => `${kind} ${rule} ${placements.join('+')} ${feature ?? '-'}`

function near(actual: number | null | undefined, expected: number | null, what: string) {
  if (expected === null) return expect(actual, what).toBeNull()
  expect(Math.abs((actual ?? Number.NaN) - expected), `${what}: ${actual} for ${expected}`).toBeLessThanOrEqual(0.001)
}

function compareYears(finding: Finding, [earliest, expected, latest]: Three) {
  for (const [name, worked] of [['earliest', earliest], ['expected', expected], ['latest', latest]] as const) {
    const year = finding.year?.[name]
    expect(year, `${line(finding)}, ${name}`).toBeGreaterThanOrEqual(worked - 0.001)
    expect(year, `${line(finding)}, ${name}`).toBeLessThanOrEqual(worked + 0.051)
  }
}

function compare(finding: Finding, hand: Expected) {
  const what = line(finding)
  near(finding.excess, hand.excess, `${what}, excess`)
  if (hand.limit !== undefined) near(finding.limit, hand.limit, `${what}, limit`)
  if (hand.measured === null) expect(finding.measured).toBeNull()
  if (hand.measured) {
    near(finding.measured?.low, hand.measured[0], `${what}, low`)
    near(finding.measured?.expected, hand.measured[1], `${what}, expected`)
    near(finding.measured?.high, hand.measured[2], `${what}, high`)
  }
  if (hand.year === null) expect(finding.year).toBeNull()
  if (hand.year) compareYears(finding, hand.year)
}

describe.each<[name: string, worked: Expected[], rules: readonly string[]]>([
  ['kitchen-window', kitchenWindow, WORKED_RULES],
  ['front-walk', frontWalk, WORKED_RULES],
  ['layers', layers, WORKED_RULES],
  ['jogged-wall', joggedWall, WORKED_RULES],
  ['meter-and-number', meter, meterRules],
  ['corners-and-door', corners, cornerRules],
  ['ground-and-water', ground, groundRules],
  ['shares-of-a-bed', shares, shareRules],
  ['wrong-place', wrongPlace, siteRules],
  ['trees-and-fire', trees, treeRules],
  ['drift-and-green', drifts, driftRules],
  ['by-shears', shears, shearRules],
])('%s', (name, worked, rules) => {
  test('finds what the hand found, in that order, and nothing else', () => {
    expect(judged(read(name), rules).map(line)).toEqual(worked.map(line))
  })

  test.each(worked.map((hand, i) => [line(hand), hand, i] as const))('%s: its figures', (_title, hand, i) => {
    const finding = judged(read(name), rules)[i]
    expect(finding && line(finding)).toBe(line(hand))
    compare(finding!, hand)
  })
})

describe('front-walk, changed', () => {
  const sheet = read('front-walk')
  const withTree = (changes: Partial<Sheet['placements'][number]>): Sheet => ({
    ...sheet, placements: sheet.placements.map((placement) => (placement.id === 'c2' ? { ...placement, ...changes } : placement)),
  })

  test('limbed up to 84 in, above the 80 in of headroom, the tree leaves the walk alone once it is tall', () => {
    const walk = judged(withTree({ clearStem: 84 })).filter(({ rule }) => rule === 'walk-edge')
    expect(walk.map(line)).toEqual(['held walk-edge c1 k1'])
  })

  test('taken out, it is ignored by everything', () => {
    expect(judged(withTree({ status: 'goes' })).map(line)).toEqual(['held walk-edge c1 k1', 'held wall-gap c1 -'])
  })
})

describe('layers, changed', () => {
  test('as a specimen the drift plant may stand before the mat: a note', () => {
    const sheet = read('layers')
    const placements = sheet.placements.map((placement) => (placement.id === 'g3' ? { ...placement, role: 'specimen' as const } : placement))
    const found = judged({ ...sheet, placements }).find(({ rule, placements: [front] }) => rule === 'layer-order' && front === 'g3')
    expect(found && line(found)).toBe('note layer-order g3+m1 -')
  })
})

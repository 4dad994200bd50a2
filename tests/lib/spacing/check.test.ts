import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { check, checkPlacement, prepare, RULES, type Finding, type Sheet } from '@/lib/spacing'
import { anySheet } from '../../support/sheets'

const SITE = new Set(RULES.filter(({ scope }) => scope === 'sheet' || scope === 'plant').map(({ meta }) => meta.id))

/** The same examples on every run. */
const runs = (numRuns: number) => ({ seed: 20_260, numRuns })

/** A number without the noise of sums taken in another frame; the odd part keeps fractions of an inch off its rounding. */
const steady = (value: number | null | undefined) => (value === null || value === undefined ? '-' : (value + Math.PI * 1e-6).toFixed(4))

/** Findings in one list whatever frame they were found in: heights on the z axis told from the level given. */
const rough = (findings: readonly Finding[], level = 0) =>
  findings.map(({ key, kind, rule, excess, limit, measured }) => {
    const from = rule === 'sill' || rule === 'gutter' ? level : 0
    const told = (value: number | null | undefined) => steady(typeof value === 'number' ? value - from : value)
    return [key, kind, steady(excess), told(limit), told(measured?.low), told(measured?.expected), told(measured?.high)].join(' ')
  }).sort()

const moved = (sheet: Sheet, by: { x: number; z: number }): Sheet => ({
  ...sheet,
  facade: { ...sheet.facade, gutter: sheet.facade.gutter + by.z, wall: sheet.facade.wall.map((p) => ({ ...p, x: p.x + by.x })), grade: sheet.facade.grade.map((p) => ({ x: p.x + by.x, z: p.z + by.z })) },
  openings: sheet.openings.map((o) => ({ ...o, x: o.x + by.x, sill: o.sill + by.z, head: o.head + by.z })),
  fixtures: sheet.fixtures.map((f) => ({ ...f, x: f.x + by.x, z: f.z + by.z })),
  walks: sheet.walks.map((w) => ({ ...w, outline: w.outline.map((p) => ({ ...p, x: p.x + by.x })) })),
  beds: sheet.beds.map((b) => ({ ...b, outline: b.outline.map((p) => ({ ...p, x: p.x + by.x })) })),
  placements: sheet.placements.map((p) => ({ ...p, x: p.x + by.x })),
})

const mirrored = (sheet: Sheet): Sheet => ({
  ...sheet,
  facade: { ...sheet.facade, wall: sheet.facade.wall.map((p) => ({ ...p, x: -p.x })).reverse(), grade: sheet.facade.grade.map((p) => ({ ...p, x: -p.x })).reverse() },
  openings: sheet.openings.map((o) => ({ ...o, x: -o.x - o.width })),
  fixtures: sheet.fixtures.map((f) => ({ ...f, x: -f.x - f.width })),
  walks: sheet.walks.map((w) => ({ ...w, outline: w.outline.map((p) => ({ ...p, x: -p.x })) })),
  beds: sheet.beds.map((b) => ({ ...b, outline: b.outline.map((p) => ({ ...p, x: -p.x })) })),
  placements: sheet.placements.map((p) => ({ ...p, x: -p.x })),
})

const swapped = (feature: string | null) => (feature === 'left' ? 'right' : feature === 'right' ? 'left' : feature)
const rest = (share: number | null) => (share === null ? null : 1 - share)

/** A finding that tells left from right, as it stands in a mirror. */
function otherHand(finding: Finding): Finding {
  if (finding.rule === 'corner-height') return { ...finding, key: finding.key.replace(/(left|right)$/, (hand) => swapped(hand)!), feature: swapped(finding.feature) }
  if (finding.rule !== 'balance') return finding
  const { low, expected, high } = finding.measured!
  return { ...finding, limit: rest(finding.limit), measured: { low: rest(low), expected: rest(expected), high: rest(high) } }
}

describe('one moved placement', () => {
  test('has the findings of size and neighbour rules that the full check gives it, in the same order', () => {
    fc.assert(fc.property(anySheet, fc.integer({ min: -640, max: 640 }), (sheet, by) => {
      const ready = prepare(sheet)
      for (const placement of sheet.placements) {
        const next = { ...placement, x: placement.x + by / 64, y: placement.y + by / 128 }
        const whole = check({ ...sheet, placements: sheet.placements.map((one) => (one.id === next.id ? next : one)) }).findings
        expect(checkPlacement(ready, next)).toEqual(whole.filter(({ rule, placements }) => !SITE.has(rule) && placements.includes(next.id)))
      }
    }), runs(60))
  })

  test('of an unknown plant or one that goes has none', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      const one = sheet.placements[0]!
      expect(checkPlacement(prepare(sheet), { ...one, plant: 'nobody' })).toEqual([])
      expect(checkPlacement(prepare(sheet), { ...one, status: 'goes' })).toEqual([])
    }), runs(5))
  })
})

describe('findings do not change', () => {
  test('when the whole front is shifted along the wall and up', () => {
    fc.assert(fc.property(anySheet, fc.integer({ min: -900, max: 900 }), fc.integer({ min: -90, max: 90 }), (sheet, x, z) => {
      expect(rough(check(moved(sheet, { x, z })).findings, z)).toEqual(rough(check(sheet).findings))
    }), runs(60))
  })

  test('when it is mirrored', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      expect(rough(check(mirrored(sheet)).findings.map(otherHand))).toEqual(rough(check(sheet).findings))
    }), runs(60))
  })

  test('when lists are put in another order: not even theirs', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      const turned = { ...sheet, placements: sheet.placements.toReversed(), plants: sheet.plants.toReversed(), openings: sheet.openings.toReversed(), beds: sheet.beds.toReversed() }
      expect(check(turned).findings).toEqual(check(sheet).findings)
    }), runs(60))
  })

  test('by a library to draw swaps from', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      expect(check(sheet, { library: [] })).toEqual(check(sheet))
    }), runs(10))
  })
})

test('findings have distinct keys and stand in one order', () => {
  fc.assert(fc.property(anySheet, (sheet) => {
    const { findings } = check(sheet)
    expect(new Set(findings.map(({ key }) => key)).size).toBe(findings.length)
    const ranks = findings.map(({ kind }) => ['conflict', 'risk', 'held', 'note'].indexOf(kind))
    expect(ranks).toEqual(ranks.toSorted((a, b) => a - b))
  }), runs(60))
})

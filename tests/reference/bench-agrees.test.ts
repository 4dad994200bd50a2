/**
 * The three versions the bench compares must be answers to the same questions: same findings, same kinds. Timings are not
 * tested. The polygon version shares no code with the engine (polygon-clipping, https://github.com/mfogel/polygon-clipping).
 */
import { describe, expect, test } from 'vitest'
import { check, checkPlacement, prepare, type Sheet } from '@/lib/spacing'
import { allPairs } from '../bench/all-pairs'
import { byPolygons } from '../bench/by-polygons'
import { ASKED_RULES, lineOf } from '../bench/questions'
import { frontOf } from '../bench/scenes'

const engine = (sheet: Sheet) => check(sheet).findings.filter(({ rule }) => ASKED_RULES.includes(rule))

describe.each([60, 200])('%i placements', (count) => {
  const sheet = frontOf(count)
  const told = engine(sheet).map(lineOf).sort()

  test('the front gives work to every rule', () => {
    for (const rule of ASKED_RULES) expect(told.filter((line) => line.startsWith(`${rule} `)).length, rule).toBeGreaterThan(0)
  })

  test('every pair, same arithmetic: the same verdicts, and years within a twentieth', () => {
    const verdicts = allPairs(sheet)
    expect(verdicts.map(lineOf).sort()).toEqual(told)
    const years = new Map(verdicts.map((verdict) => [lineOf(verdict), verdict.years]))
    for (const finding of engine(sheet)) {
      const found = years.get(lineOf(finding))!
      const { earliest, latest } = finding.year!
      for (const [said, asked] of [[earliest, Math.min(...found)], [latest, Math.max(...found)]] as const) {
        if (said === 'after-30') expect(asked, lineOf(finding)).toBe(Infinity)
        else expect(Math.abs(said - asked), `${lineOf(finding)}: ${said} for ${asked}`).toBeLessThanOrEqual(0.0501)
      }
    }
  })

  test('polygon library: the same verdicts', { timeout: 240_000 }, () => {
    expect(byPolygons(sheet).map(lineOf).sort()).toEqual(told)
  })

  test('one moved placement: its findings of these rules equal those of a full check', () => {
    const prepared = prepare(sheet)
    for (const [i, placement] of sheet.placements.entries()) {
      if (i % 7 !== 0) continue
      const moved = { ...placement, x: placement.x + 9, y: placement.y - 2 }
      const whole = check({ ...sheet, placements: sheet.placements.map((p) => (p.id === moved.id ? moved : p)) }).findings
      const expected = whole.filter(({ rule, placements }) => ASKED_RULES.includes(rule) && placements.includes(moved.id))
      const actual = checkPlacement(prepared, moved).filter(({ rule }) => ASKED_RULES.includes(rule))
      const plain = (list: typeof actual) => list.map(({ remedies: _remedies, ...rest }) => rest)
      expect(plain(actual)).toEqual(plain(expected))
    }
  })
})

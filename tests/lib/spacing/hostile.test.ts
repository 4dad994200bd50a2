/** Whatever is handed in as a sheet: refused with the path of each fault, or judged. Never an exception, never long. */
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { parseSheet } from '@/lib/sheet'
import { check, describe as say } from '@/lib/spacing'
import { anySheet, makePlacement, makeSheet, rectangle } from '../../support/sheets'

const LONGEST_MS = 2_000
/** Two thousand with every run of the tests; HOSTILE_SHEETS=10000 asks ten thousand. */
const SPOILED = Number(process.env.HOSTILE_SHEETS ?? 2_000)

/** Values nobody should put in a sheet. */
const poison = fc.constantFrom<unknown>(
  Number.NaN, Infinity, -Infinity, 1e308, -1e308, 1e-320, -0, '', 'twelve', null, undefined, [], {}, true, [[]], { x: 1 }, '\u0000', '__proto__', 'a'.repeat(10_000), 10 ** 16, -5,
)

type Path = (string | number)[]

function pathsOf(value: unknown, path: Path = []): Path[] {
  if (value === null || typeof value !== 'object') return [path]
  return [path, ...Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, [...path, Array.isArray(value) ? Number(key) : key]))]
}

function replaced(value: unknown, path: Path, by: unknown): unknown {
  const [step, ...rest] = path
  if (step === undefined) return by
  const copy = Array.isArray(value) ? [...value] : { ...(value as object) }
  ;(copy as Record<string | number, unknown>)[step] = replaced((copy as Record<string | number, unknown>)[step], rest, by)
  return copy
}

/** Judges what can be parsed; answers what was wrong with the answer, '' for nothing. */
function faultOf(input: unknown): string {
  const began = performance.now()
  const parsed = parseSheet(input)
  if (parsed.ok) {
    const report = check(parsed.sheet)
    const figures = JSON.stringify(report)
    if (!figures.includes('"pockets"')) return 'no figures'
    if (report.findings.some((finding) => !say(finding, parsed.sheet).sentence)) return 'an empty sentence'
  } else if (parsed.problems.length === 0 || parsed.problems.some(({ path, message }) => !Array.isArray(path) || message === '')) return 'a refusal without a path or a reason'
  const took = performance.now() - began
  return took > LONGEST_MS ? `took ${Math.round(took)} ms` : ''
}

test('thousands of sheets with one to three values spoiled', () => {
  fc.assert(
    fc.property(anySheet, fc.array(fc.tuple(fc.nat(), poison), { minLength: 1, maxLength: 3 }), (sheet, spoils) => {
      const spoilt = spoils.reduce<unknown>((input, [pick, by]) => {
        const paths = pathsOf(input)
        return replaced(input, paths[pick % paths.length]!, by)
      }, sheet)
      expect(faultOf(spoilt)).toBe('')
    }),
    { numRuns: SPOILED, seed: 20261201 },
  )
}, 240_000)

test('anything at all that JSON can hold', () => {
  fc.assert(fc.property(fc.jsonValue(), (input) => { expect(faultOf(input)).toBe('') }), { numRuns: 1_000, seed: 20261201 })
})

test('two thousand plants, a wall without width, crossing beds, twins', () => {
  const many = makeSheet({ beds: [{ id: 'b', name: 'All', outline: rectangle(0, 480, 0, 200) }], placements: Array.from({ length: 2_000 }, (_, i) => makePlacement({ id: `a${i}`, x: (i % 100) * 4.8, y: 10 + Math.floor(i / 100) * 8 })) })
  expect(parseSheet(many).ok).toBe(true)
  expect(faultOf({ ...many, placements: many.placements.slice(0, 400) })).toBe('')
  expect(faultOf(makeSheet({ facade: { ...many.facade, wall: [{ x: 0, y: 0 }, { x: 0, y: 0 }] } }))).toBe('')
  expect(faultOf(makeSheet({ beds: [{ id: 'b', name: 'Bow', outline: [{ x: 0, y: 0 }, { x: 90, y: 90 }, { x: 90, y: 0 }, { x: 0, y: 90 }] }] }))).toBe('')
  expect(faultOf(makeSheet({ placements: [makePlacement(), makePlacement()] }))).toBe('')
  const began = performance.now()
  check(many)
  console.info(`2,000 plants on top of one another: ${Math.round(performance.now() - began)} ms`)
})

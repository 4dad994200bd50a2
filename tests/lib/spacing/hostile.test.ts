/** Whatever is handed in as a sheet: refused with the path of each fault, or judged. Never an exception, never long. */
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { MAX_PAIRS, parseSheet } from '@/lib/sheet'
import { check, describe as say, pairsThatMeet } from '@/lib/spacing'
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
  const parsed = parseSheet(input)
  if (parsed.ok) {
    const report = check(parsed.sheet)
    const figures = JSON.stringify(report)
    if (!figures.includes('"pockets"')) return 'no figures'
    if (report.findings.some((finding) => !say(finding, parsed.sheet).sentence)) return 'an empty sentence'
  } else if (parsed.problems.length === 0 || parsed.problems.some(({ path, message }) => !Array.isArray(path) || message === '')) return 'a refusal without a path or a reason'
  return ''
}

/** Time the processor gave to it, so that other work on the machine does not count; the best of three, once code is compiled. */
function isQuick(input: unknown): boolean {
  for (let i = 0; i < 3; i++) {
    const began = process.cpuUsage()
    faultOf(input)
    const { user, system } = process.cpuUsage(began)
    if ((user + system) / 1_000 <= LONGEST_MS) return true
  }
  return false
}

function faultOrSlow(input: unknown): string {
  const began = performance.now()
  const fault = faultOf(input)
  const isSlow = performance.now() - began > LONGEST_MS && !isQuick(input)
  return fault || (isSlow ? `took over ${LONGEST_MS} ms` : '')
}

test('thousands of sheets with one to three values spoiled', () => {
  fc.assert(
    fc.property(anySheet, fc.array(fc.tuple(fc.nat(), poison), { minLength: 1, maxLength: 3 }), (sheet, spoils) => {
      const spoilt = spoils.reduce<unknown>((input, [pick, by]) => {
        const paths = pathsOf(input)
        return replaced(input, paths[pick % paths.length]!, by)
      }, sheet)
      expect(faultOrSlow(spoilt)).toBe('')
    }),
    { numRuns: SPOILED, seed: 20261201 },
  )
}, 240_000)

test('anything at all that JSON can hold', () => {
  fc.assert(fc.property(fc.jsonValue(), (input) => { expect(faultOrSlow(input)).toBe('') }), { numRuns: 1_000, seed: 20261201 })
})

const heap = (count: number, apart: number) =>
  makeSheet({
    beds: [{ id: 'b', name: 'All', outline: rectangle(0, 480, 0, 200) }],
    placements: Array.from({ length: count }, (_, i) => makePlacement({ id: `a${i}`, x: (i % 100) * apart, y: 10 + Math.floor(i / 100) * 8 })),
  })

test('a heap of two thousand plants is refused in a sentence, and what is just not refused is judged in time', () => {
  const refused = parseSheet(heap(2_000, 4.8))
  expect(refused).toMatchObject({ ok: false, problems: [{ path: ['placements'] }] })
  expect(refused.ok ? '' : refused.problems[0]!.message).toMatch(/^Too many plants stand in one place: \d{3},\d{3} pairs/)
  let count = 400
  while (pairsThatMeet(heap(count, 4.8)) > MAX_PAIRS) count--
  const most = heap(count, 4.8)
  expect(pairsThatMeet(most)).toBeGreaterThan(0.97 * MAX_PAIRS)
  expect(parseSheet(most).ok).toBe(true)
  expect(faultOrSlow(most)).toBe('')
})

test('two thousand plants as beds hold them are judged in time', () => {
  const wide = makeSheet({
    facade: { ...makeSheet({}).facade, wall: [{ x: 0, y: 0 }, { x: 11_900, y: 0 }] },
    placements: Array.from({ length: 2_000 }, (_, i) => makePlacement({ id: `a${i}`, x: 20 + Math.floor(i / 4) * 23, y: 20 + (i % 4) * 24 })),
  })
  expect(parseSheet(wide).ok).toBe(true)
  expect(faultOrSlow(wide)).toBe('')
})

test('a wall without width, crossing beds, twins', () => {
  const sheet = makeSheet({})
  expect(faultOf(makeSheet({ facade: { ...sheet.facade, wall: [{ x: 0, y: 0 }, { x: 0, y: 0 }] } }))).toBe('')
  expect(faultOf(makeSheet({ beds: [{ id: 'b', name: 'Bow', outline: [{ x: 0, y: 0 }, { x: 90, y: 90 }, { x: 90, y: 0 }, { x: 0, y: 90 }] }] }))).toBe('')
  expect(faultOf(makeSheet({ placements: [makePlacement(), makePlacement()] }))).toBe('')
})

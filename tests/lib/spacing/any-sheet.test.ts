/** Whatever sheet a parser lets through is judged: never an error, never a figure that is no number. */
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { parseSheet } from '@/lib/sheet'
import { outlineProblem } from '@/lib/sheet/problems'
import { check, checkPlacement, describe as say, prepare, RULES, type Sheet } from '@/lib/spacing'
import { CATEGORIES, GROWTHS, HABITS, LEAVES, LIGHTS } from '@/lib/plants/types'
import { makePlant, makeSheet } from '../../support/sheets'

const runs = { seed: 404, numRuns: 150 }
/** Ordinary lengths and the strangest that are still allowed. */
const place = fc.oneof(fc.double({ min: -300, max: 600, noNaN: true }), fc.constantFrom(0, -0, 100, 1e-9, -12_000, 12_000))
const most = 3_500
const extent = fc.oneof(fc.double({ min: 0.1, max: 300, noNaN: true }), fc.constantFrom(1e-6, 0.01, 0.02, most))
const outline = fc.record({ x: place, y: place, width: extent, depth: extent, skew: fc.constantFrom(0, 7) })
  .map(({ x, y, width, depth, skew }) => [{ x, y }, { x: x + width, y: y + skew }, { x: x + width, y: y + depth + skew }, { x: x - skew, y: y + depth }])
  .filter((points) => outlineProblem(points) === null && points.every(({ x, y }) => Math.max(Math.abs(x), Math.abs(y)) <= 12_000))
const things = fc.array(outline, { maxLength: 3 })

const plant = (id: string) => fc.record({
  category: fc.constantFrom(...CATEGORIES), leaf: fc.constantFrom(...LEAVES), habit: fc.constantFrom(...HABITS), growth: fc.constantFrom(...GROWTHS),
  height: extent, spread: extent, more: fc.constantFrom(0, 0.001, 50), zones: fc.constantFrom([null, null] as const, [1, 13] as const, [9, 9] as const), light: fc.subarray([...LIGHTS]),
}).map(({ height, spread, more, zones, ...rest }) => makePlant({ ...rest, id, zoneMin: zones[0], zoneMax: zones[1], heightMin: height, heightMax: height + more, spreadMin: spread, spreadMax: spread + more }))

const placement = fc.record({
  plant: fc.constantFrom('p1', 'p2'), x: place, y: place, planted: fc.record({ height: extent, spread: extent }),
  role: fc.constantFrom('shrub' as const, 'specimen' as const, 'anchor' as const, 'filler' as const, 'hedge' as const, 'on-wall' as const),
  status: fc.constantFrom('new' as const, 'stays' as const, 'goes' as const),
  kept: fc.record({ height: extent, spread: extent }, { requiredKeys: [] }), clearStem: fc.oneof(fc.constant(0), extent), drift: fc.constantFrom('d', 'e%:+'),
}, { requiredKeys: ['plant', 'x', 'y', 'planted'] })

const standards = fc.record(Object.fromEntries([
  ...RULES.flatMap(({ meta }) => meta.settings.map(({ name, min, max }) => [name, fc.constantFrom(min, max, (min + max) / 2)])),
  ...RULES.flatMap(({ meta }) => (meta.fixedKind ? [[`${meta.id}.kind`, fc.constantFrom('off', 'note', 'risk')]] : [])),
]) as Record<string, fc.Arbitrary<number | string>>, { requiredKeys: [] }).map((set) => ({ ...set }) as Record<string, number | string>)

const hostile: fc.Arbitrary<Sheet> = fc.record({
  jog: fc.constantFrom(-60, -0.005, 0, 0.005, 60), fall: fc.constantFrom(-0.5, 0, 0.0625, 0.5), overhang: fc.constantFrom(0, 24, 12_000),
  exposed: fc.constantFrom(0, 8, 12_000), gutter: fc.constantFrom(30, 110, 12_000), zone: fc.constantFrom('1a', '6b', '13b'), light: fc.constantFrom(...LIGHTS),
  sill: fc.constantFrom(-12_000, 0, 36, 83.999), walks: things, beds: things, plants: fc.tuple(plant('p1'), plant('p2')),
  placements: fc.array(placement, { maxLength: 8 }), standards,
}).map(({ jog, fall, overhang, exposed, gutter, zone, light, sill, walks, beds, placements, ...rest }) => makeSheet({
  ...rest,
  site: { ...makeSheet().site, zone, light },
  facade: { ...makeSheet().facade, wall: [{ x: 0, y: 0 }, { x: 100, y: 0 }, { x: 100, y: jog }, { x: 480, y: jog }], grade: [{ x: -50, z: 20 }, { x: 300, z: -200 }], fall, overhang, exposed, gutter },
  openings: [{ id: 'w1', kind: 'window', name: 'Kitchen', x: 90, width: 72, sill, head: 84 }],
  walks: walks.map((points, i) => ({ id: `k${i}`, name: `Walk ${i}`, outline: points })),
  beds: beds.map((points, i) => ({ id: `b${i}`, name: `Bed ${i}`, outline: points })),
  placements: placements.map((one, i) => ({ ...one, id: `a:${i}%` })),
}))

const sound = hostile.filter((sheet) => parseSheet(sheet).ok)

test('most of these sheets are ones the parser lets through', () => {
  expect(fc.sample(hostile, runs).filter((sheet) => parseSheet(sheet).ok).length).toBeGreaterThan(140)
})

test('any of them is judged and told, in figures', () => {
  fc.assert(fc.property(sound, (sheet) => {
    const { findings } = check(sheet)
    expect(new Set(findings.map(({ key }) => key)).size).toBe(findings.length)
    for (const finding of findings) {
      const figures = [finding.excess, finding.limit, ...Object.values(finding.measured ?? {}), ...Object.values(finding.year ?? {})]
      for (const figure of figures) expect(figure === null || figure === 'after-30' || Number.isFinite(figure), finding.key).toBe(true)
      expect(finding.excess).toBeGreaterThanOrEqual(0)
      expect(say(finding, sheet).sentence).toMatch(/^[A-Z][^?]*\.$/)
      expect(say(finding, sheet).sentence).not.toMatch(/null|undefined|NaN|Infinity/)
    }
  }), runs)
})

test('one placement of it has what the full check gives it', () => {
  fc.assert(fc.property(sound, (sheet) => {
    const ready = prepare(sheet)
    const site = new Set(RULES.filter(({ scope }) => scope === 'sheet' || scope === 'plant').map(({ meta }) => meta.id))
    const whole = check(sheet).findings.filter(({ rule }) => !site.has(rule))
    for (const one of sheet.placements) {
      expect(checkPlacement(ready, one)).toEqual(whole.filter(({ placements }) => placements.includes(one.id)))
    }
  }), runs)
})

test('a new placement has what the full check gives it once it stands on the sheet', () => {
  fc.assert(fc.property(sound, placement, (sheet, more) => {
    const added = { ...more, id: 'new' }
    const site = new Set(RULES.filter(({ scope }) => scope === 'sheet' || scope === 'plant').map(({ meta }) => meta.id))
    const whole = check({ ...sheet, placements: [...sheet.placements, added] }).findings
    expect(checkPlacement(prepare(sheet), added)).toEqual(whole.filter(({ rule, placements }) => !site.has(rule) && placements.includes('new')))
  }), runs)
})

test('the sheet is left as it was', () => {
  fc.assert(fc.property(sound, (sheet) => {
    const before = JSON.stringify(sheet)
    check(sheet)
    expect(JSON.stringify(sheet)).toBe(before)
  }), { ...runs, numRuns: 30 })
})

/** Ways out: each one, applied, is rid of its finding and does no harm; and the plain cases worked by hand. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { applyRemedy, check, describeRemedy, waysOut, type Finding, type Remedy, type Sheet } from '@/lib/spacing'
import { anySheet, grown, makePlacement, makePlant, makeSheet, makeWalk, makeWindow, rectangle } from '../../support/sheets'

const BAD = { conflict: 2, risk: 1, held: 0, note: 0 }
const badness = (findings: readonly Finding[]) => new Map(findings.map(({ key, kind }) => [key, BAD[kind]]))

/** What is wrong with a way out, applied to its sheet; [] when it keeps its word. */
function broken(sheet: Sheet, finding: Finding, remedy: Remedy): string[] {
  const plant = remedy.kind === 'swap' ? sheet.plants.find(({ id }) => id === remedy.plant) : undefined
  const before = badness(check(sheet).findings)
  const after = badness(check(applyRemedy(sheet, remedy, plant)).findings)
  return [...after].filter(([key, bad]) => bad > 0 && (key === finding.key || bad > (before.get(key) ?? 0))).map(([key]) => `${remedy.kind}: ${key}`)
}

const bad = (sheet: Sheet) => check(sheet).findings.filter(({ kind }) => kind === 'conflict' || kind === 'risk')
const first = (sheet: Sheet, rule: string) => bad(sheet).find((finding) => finding.rule === rule)!
const of = <K extends Remedy['kind']>(remedies: readonly Remedy[], kind: K) => remedies.filter((remedy): remedy is Extract<Remedy, { kind: K }> => remedy.kind === kind)

test('whatever the sheet, a way out that is offered is one', () => {
  fc.assert(
    fc.property(anySheet, fc.nat(), (sheet, pick) => {
      const findings = bad(sheet)
      if (findings.length === 0) return
      const finding = findings[pick % findings.length]!
      for (const remedy of waysOut(sheet, finding)) expect(broken(sheet, finding, remedy)).toEqual([])
    }),
    { numRuns: 40, seed: 20261201 },
  )
})

describe('move', () => {
  const lean = (changes = {}) => makeSheet({ plants: [grown(30, 40)], walks: [makeWalk(100)], placements: [makePlacement({ y: 85, planted: { height: 30, spread: 40 }, ...changes })] })

  test('goes the least way that helps: straight back from the walk', () => {
    const sheet = lean()
    expect(of(waysOut(sheet, first(sheet, 'walk-edge')), 'move')).toEqual([{ kind: 'move', placement: 'a1', x: 240, y: 80 }])
  })
  test('is not offered for a plant that stays, nor farther than 4 ft', () => {
    const stays = lean({ status: 'stays' })
    expect(of(waysOut(stays, first(stays, 'walk-edge')), 'move')).toEqual([])
    const wide = makeSheet({ plants: [grown(30, 240)], walks: [makeWalk(100)], placements: [makePlacement({ y: 85, planted: { height: 30, spread: 240 } })] })
    expect(of(waysOut(wide, first(wide, 'walk-edge')), 'move')).toEqual([])
  })
  test('of two that crowd, the one with the shorter way goes', () => {
    const sheet = makeSheet({
      plants: [grown(36, 40)],
      placements: [makePlacement({ id: 'a1', x: 200, planted: { height: 36, spread: 40 } }), makePlacement({ id: 'a2', x: 230, planted: { height: 36, spread: 40 } })],
    })
    const [move] = of(waysOut(sheet, first(sheet, 'crowding')), 'move')
    // 40 in across, a tenth allowed: 36 in apart will do, 6 more than they have.
    expect(Math.hypot(move!.x - (move!.placement === 'a1' ? 200 : 230), move!.y - 60)).toBeLessThanOrEqual(6)
    expect(broken(sheet, first(sheet, 'crowding'), move!)).toEqual([])
  })
  test('of equal ways the one out from the wall is taken', () => {
    const sheet = makeSheet({ plants: [grown(30, 40)], placements: [makePlacement({ y: 30, planted: { height: 30, spread: 40 } })] })
    expect(of(waysOut(sheet, first(sheet, 'wall-gap')), 'move')).toEqual([{ kind: 'move', placement: 'a1', x: 240, y: 32 }])
  })
})

describe('keep', () => {
  const tall = (changes = {}, plant = {}) =>
    makeSheet({ plants: [makePlant({ heightMin: 48, heightMax: 48, spreadMin: 48, spreadMax: 48, prune: 'shear', ...plant })], openings: [makeWindow()], placements: [makePlacement(changes)] })

  test('is the largest whole size in proportion that holds, and says what it costs', () => {
    const sheet = tall()
    const finding = first(sheet, 'sill')
    const [keep] = of(waysOut(sheet, finding), 'keep')
    expect(keep).toMatchObject({ kept: { height: 36, spread: 36 } })
    expect(keep!.clippings).toBeGreaterThan(0)
    const after = check(applyRemedy(sheet, keep!)).findings.find(({ key }) => key === finding.key)
    expect(after?.kind).toBe('held')
    expect(describeRemedy(keep!, finding, sheet)).toMatch(/^Keep it clipped at 3'-0" high and 3'-0" wide: \w+ clippings? a year\.$/)
  })
  test('is never offered for trees, whose topping harms them, nor for what dies back', () => {
    for (const plant of [{ category: 'tree' as const }, { leaf: 'herbaceous' as const, category: 'perennial' as const }, { prune: 'none' as const }]) {
      const sheet = tall({}, plant)
      expect(of(waysOut(sheet, first(sheet, 'sill')), 'keep')).toEqual([])
    }
  })
})

describe('specimen', () => {
  const layers = makeSheet({
    plants: [grown(50, 40), grown(36, 40, { id: 'p2' })],
    placements: [makePlacement({ y: 100, planted: { height: 50, spread: 40 } }), makePlacement({ id: 'a2', plant: 'p2', y: 50, planted: { height: 36, spread: 40 } })],
  })
  test('makes a note of a layer finding, and is offered for nothing else', () => {
    const finding = first(layers, 'layer-order')
    const remedies = waysOut(layers, finding)
    expect(of(remedies, 'specimen')).toEqual([{ kind: 'specimen', placement: 'a1' }])
    expect(check(applyRemedy(layers, remedies.find(({ kind }) => kind === 'specimen')!)).findings.find(({ key }) => key === finding.key)?.kind).toBe('note')
  })
})

describe('swap', () => {
  const tall = makePlant({ heightMin: 60, heightMax: 72 })
  const like = makePlant({ id: 'p2', botanical: 'Exemplum minus', heightMin: 24, heightMax: 30 })
  const unlike = makePlant({ id: 'p3', botanical: 'Exemplum album', heightMin: 24, heightMax: 30, foliageColor: 'silver', leaf: 'broadleaf-evergreen' })
  const soft = makePlant({ id: 'p4', botanical: 'Exemplum molle', heightMin: 24, heightMax: 30, category: 'perennial', leaf: 'herbaceous' })
  const sheet = makeSheet({ plants: [tall], openings: [makeWindow()], placements: [makePlacement()] })

  test('offers what fits, the most alike first, woody for woody', () => {
    const swaps = of(waysOut(sheet, first(sheet, 'sill'), { library: [soft, unlike, like, tall] }), 'swap')
    expect(swaps.map(({ plant }) => plant)).toEqual(['p2', 'p3'])
    expect(describeRemedy(swaps[0]!, first(sheet, 'sill'), sheet, [like])).toBe(`Swap it for Exemplum minus, 2'-6" high and 5'-0" wide at most.`)
  })
  test('a plant that cannot live here is swapped in all its places at once', () => {
    const tender = makePlant({ zoneMin: 8 })
    const two = makeSheet({ plants: [tender], placements: [makePlacement({ x: 120 }), makePlacement({ id: 'a2', x: 360 })] })
    const [swap] = of(waysOut(two, first(two, 'hardiness'), { library: [like] }), 'swap')
    expect(swap).toEqual({ kind: 'swap', placements: ['a1', 'a2'], plant: 'p2' })
  })
  test('is planted no larger than it grows', () => {
    const small = makePlant({ id: 'p5', botanical: 'Exemplum parvum', heightMin: 8, heightMax: 10, spreadMin: 8, spreadMax: 10 })
    const changed = applyRemedy(sheet, { kind: 'swap', placements: ['a1'], plant: 'p5' }, small)
    expect(changed.placements[0]).toMatchObject({ plant: 'p5', planted: { height: 8, spread: 8 } })
  })
})

test('held findings and notes need no way out, and what names no plant has none', () => {
  const held = makeSheet({ plants: [grown(50, 40)], openings: [makeWindow()], placements: [makePlacement({ planted: { height: 50, spread: 40 }, kept: { height: 30 } })] })
  const finding = check(held).findings.find(({ rule }) => rule === 'sill')!
  expect(finding.kind).toBe('held')
  expect(waysOut(held, finding)).toEqual([])
  expect(waysOut(held, { ...finding, kind: 'risk', placements: [] })).toEqual([])
})

test('a bed so full that nothing helps has no way out', () => {
  const sheet = makeSheet({
    plants: [grown(60, 40, { prune: 'none' })], openings: [makeWindow({ x: 0, width: 480 })], walks: [makeWalk(40, 500)],
    beds: [{ id: 'b1', name: 'Strip', outline: rectangle(0, 480, 0, 40) }], placements: [makePlacement({ y: 20, planted: { height: 60, spread: 40 } })],
  })
  expect(waysOut(sheet, first(sheet, 'sill'))).toEqual([])
})

/** What fits here: every plant offered breaks nothing in the full check, every crown of the frontier stands to the inch. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Plant } from '@/lib/plants/types'
import { check, describeMiss, fitsHere, prepare, RULES, type Placement, type Sheet } from '@/lib/spacing'
import { anySheet, grown, makePlacement, makePlant, makeSheet, makeWalk, makeWindow } from '../../support/sheets'

const NEW = 'new'
const withPlant = (sheet: Sheet, plant: Plant, placement: Placement): Sheet => ({ ...sheet, plants: [...sheet.plants.filter(({ id }) => id !== plant.id), plant], placements: [...sheet.placements, placement] })
const isBad = ({ kind }: { kind: string }) => kind === 'conflict' || kind === 'risk'
/** Rules that fitting asks: those of one placement, of neighbours, and of the site. */
const ASKED = new Set(RULES.filter(({ scope }) => scope !== 'sheet').map(({ meta }) => meta.id))
const against = (sheet: Sheet) => check(sheet).findings.filter((finding) => isBad(finding) && ASKED.has(finding.rule) && finding.placements.includes(NEW))
/** The crown as a plant that is planted full-grown. */
const asCrown = (height: number, spread: number) => ({ plant: grown(height, spread, { id: 'crown', light: [], zoneMin: null, zoneMax: null }), planted: { height, spread } })

test('whatever the sheet and the spot, what is offered fits in the full check, and what is missed has one objection', () => {
  fc.assert(
    fc.property(anySheet, fc.integer({ min: 10, max: 470 }), fc.integer({ min: 10, max: 130 }), (sheet, x, y) => {
      const library = sheet.plants.map((plant, i) => ({ ...plant, id: `lib${i}` }))
      const { fits, misses, frontier } = fitsHere(prepare(sheet), { x, y }, library)
      const small = (plant: Plant) => makePlacement({ id: NEW, plant: plant.id, x, y, planted: { height: Math.min(6, plant.heightMin * 0.85), spread: Math.min(6, plant.spreadMin * 0.85) } })
      for (const plant of library) {
        const found = against(withPlant(sheet, plant, small(plant)))
        expect(fits.some((fit) => fit.plant === plant.id)).toBe(found.length === 0)
        if (misses.some((miss) => miss.plant === plant.id)) expect(found).toHaveLength(1)
      }
      for (const { height, spread } of frontier.slice(0, 3)) {
        const { plant, planted } = asCrown(height, spread)
        expect(against(withPlant(sheet, plant, makePlacement({ id: NEW, plant: plant.id, x, y, planted })))).toEqual([])
      }
    }),
    { numRuns: 60, seed: 20261201 },
  )
})

describe('the frontier', () => {
  // 60 in out from a plain wall, a walk at 100: 40 in to the walk, 48 to the gap before the wall, a sill at 36 behind.
  const sheet = makeSheet({ openings: [makeWindow()], walks: [makeWalk(100)] })
  const { frontier, largest } = fitsHere(prepare(sheet), { x: 240, y: 60 }, [])

  test('is as tall as the sill and as wide as the way to the walk', () => {
    expect(frontier.every(({ height }) => height === 36)).toBe(true)
    expect(frontier.at(-1)).toEqual({ height: 36, spread: 78 })
    expect(largest).toEqual({ height: 36, spread: 78 })
  })
  test('an inch more breaks something', () => {
    for (const [height, spread] of [[37, 78], [36, 81]] as const) {
      const { plant, planted } = asCrown(height, spread)
      expect(against(withPlant(sheet, plant, makePlacement({ id: NEW, plant: plant.id, planted })))).not.toEqual([])
    }
  })
  test('nothing fits on a walk', () => {
    expect(fitsHere(prepare(sheet), { x: 240, y: 120 }, [makePlant()])).toMatchObject({ frontier: [], largest: null, fits: [] })
  })
  test('what stands there now is left out when something is to stand there instead', () => {
    const taken = { ...sheet, plants: [grown(36, 70)], placements: [makePlacement({ planted: { height: 36, spread: 70 } })] }
    expect(fitsHere(prepare(taken), { x: 240, y: 60 }, []).largest?.spread ?? 0).toBeLessThan(78)
    expect(fitsHere(prepare(taken), { x: 240, y: 60, instead: 'a1' }, []).largest).toEqual({ height: 36, spread: 78 })
  })
})

describe('the library', () => {
  const sheet = makeSheet({ openings: [makeWindow()], walks: [makeWalk(100)] })
  const sized = (id: string, height: number, spread: number) => makePlant({ id, botanical: id, heightMin: height, heightMax: height + 0.5, spreadMin: spread, spreadMax: spread + 0.5 })

  test('those that fill the spot best come first', () => {
    const { fits } = fitsHere(prepare(sheet), { x: 240, y: 60 }, [sized('tiny', 10, 10), sized('full', 35, 70), sized('half', 30, 50)])
    expect(fits.map(({ plant }) => plant)).toEqual(['full', 'half', 'tiny'])
    expect(fits[0]!.fill).toBeGreaterThan(0.7)
  })
  test('near misses say why, nearest first; two faults or large ones are no near miss', () => {
    const { fits, misses } = fitsHere(prepare(sheet), { x: 240, y: 60 }, [sized('tall', 38, 40), sized('wide', 30, 82), sized('both', 60, 120), sized('far', 80, 40)])
    expect(fits).toEqual([])
    expect(misses.map(({ plant, finding }) => [plant, describeMiss(finding, sheet)])).toEqual([
      ['wide', '1 1/2 in too wide for Front walk'],
      ['tall', '2 1/2 in too tall for the sill of Kitchen'],
    ])
  })
})

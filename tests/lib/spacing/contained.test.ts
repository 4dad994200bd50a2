/** A crown inside another one (same axis, at no height wider) breaks no limit of house and walk that the other keeps. */
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { check, type Finding, type Sheet } from '@/lib/spacing'
import { anySheet } from '../../support/sheets'

const CLEARANCES = new Set(['sill', 'walk-edge', 'wall-gap', 'gutter', 'service', 'number-view', 'thorns', 'fire-zone'])
const BAD = { conflict: 3, risk: 2, held: 0, note: 1 }

const badness = (findings: readonly Finding[]) => new Map(findings.filter(({ rule }) => CLEARANCES.has(rule)).map(({ key, kind }) => [key, BAD[kind]]))

/** Every plant lower and narrower, domes and cones alone: their smaller ones lie inside their larger ones. */
const shrunk = (sheet: Sheet, tall: number, wide: number): Sheet => ({
  ...sheet,
  plants: sheet.plants.map((plant) => ({ ...plant, heightMin: plant.heightMin * tall, heightMax: plant.heightMax * tall, spreadMin: plant.spreadMin * wide, spreadMax: plant.spreadMax * wide })),
})

test('on any sheet', () => {
  const share = fc.integer({ min: 20, max: 100 }).map((part) => part / 100)
  fc.assert(
    fc.property(anySheet, fc.constantFrom('mounded' as const, 'pyramidal' as const), share, share, (sheet, habit, tall, wide) => {
      // Shears and clear stems go with the height; both plants are left to themselves, their foliage to the ground.
      const placements = sheet.placements.map(({ kept: _, clearStem: __, ...placement }) => ({ ...placement, clearStem: 0 }))
      const large: Sheet = { ...sheet, placements, plants: sheet.plants.map((plant) => ({ ...plant, habit })) }
      const before = badness(check(large).findings)
      for (const [key, bad] of badness(check(shrunk(large, tall, wide)).findings)) expect(bad, key).toBeLessThanOrEqual(before.get(key) ?? 0)
    }),
    { numRuns: 200, seed: 20261201 },
  )
})

import { expect, test } from 'vitest'
import { check, describe, yearsText } from '@/lib/spacing'
import { anySheet, grown, makePlacement, makeSheet, makeWindow } from '../../support/sheets'
import fc from 'fast-check'

test('years are rounded up, with their range', () => {
  expect(yearsText({ earliest: 3.2, expected: 5.1, latest: 8.6 })).toBe('by about year 6 (4-9)')
  expect(yearsText({ earliest: 0, expected: 0, latest: 0 })).toBe('from the day it is planted')
  expect(yearsText({ earliest: 'after-30', expected: 'after-30', latest: 'after-30' })).toBe('after year 30')
})

test('a plant past the sill is told with its inches and its window', () => {
  const sheet = makeSheet({ plants: [grown(50, 40)], openings: [makeWindow()], placements: [makePlacement({ planted: { height: 50, spread: 40 } })] })
  expect(describe(check(sheet).findings[0]!, sheet).sentence).toMatch(/14 in past the sill of Kitchen/i)
})

test('every finding has a title and a whole sentence without holes', () => {
  fc.assert(fc.property(anySheet, (sheet) => {
    for (const finding of check(sheet).findings) {
      const { title, sentence } = describe(finding, sheet)
      expect(title).not.toBe('')
      expect(sentence).toMatch(/^[A-Z].*\.$/)
      expect(sentence).not.toMatch(/null|undefined|NaN|Infinity/)
    }
  }), { seed: 13, numRuns: 40 })
})

/** The rules that compare a plant's facts with the site: moisture, walnut, deer, toxic, invasive. */
import { describe, expect, test } from 'vitest'
import type { Placement, Site } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const on = (rule: string, site: Partial<Site>, plant: Partial<Plant>, changes: Partial<Placement> = {}) =>
  found(makeSheet({ site: { ...makeSheet().site, ...site }, plants: [makePlant(plant)], placements: [makePlacement(changes)] }), rule)
const kinds = (...args: Parameters<typeof on>) => on(...args).map(({ kind }) => kind)

describe('moisture', () => {
  test('a plant listed for other soil is a risk, one of unknown needs is not judged', () => {
    expect(kinds('moisture', { moisture: 'wet' }, { water: ['dry', 'medium'] })).toEqual(['risk'])
    expect(kinds('moisture', { moisture: 'wet' }, { water: ['wet'] })).toEqual([])
    expect(kinds('moisture', { moisture: 'wet' }, { water: [] })).toEqual([])
  })
  test('one that stays has shown that it can', () => {
    expect(kinds('moisture', { moisture: 'wet' }, { water: ['dry'] }, { status: 'stays' })).toEqual([])
  })
})

describe('walnut', () => {
  test('sensitive plants: a risk while the tree stands, a note once it is gone', () => {
    expect(kinds('walnut', { walnut: 'present' }, { juglone: 'sensitive' })).toEqual(['risk'])
    expect(kinds('walnut', { walnut: 'removed' }, { juglone: 'sensitive' })).toEqual(['note'])
    expect(kinds('walnut', { walnut: 'none' }, { juglone: 'sensitive' })).toEqual([])
  })
  test('tolerant and unknown ones are not judged, nor what stays', () => {
    for (const juglone of ['tolerant', 'unknown'] as const) expect(kinds('walnut', { walnut: 'present' }, { juglone })).toEqual([])
    expect(kinds('walnut', { walnut: 'present' }, { juglone: 'sensitive' }, { status: 'stays' })).toEqual([])
  })
})

/** Classes of Rutgers NJAES, Landscape Plants Rated by Deer Resistance, https://njaes.rutgers.edu/deer-resistant-plants/. */
describe('deer', () => {
  test.each([
    ['high', 'frequently', ['risk']], ['high', 'occasionally', ['note']], ['high', 'seldom', []], ['high', 'rarely', []], ['high', 'unknown', []],
    ['some', 'frequently', ['note']], ['some', 'occasionally', []], ['none', 'frequently', []],
  ] as const)('%s pressure, %s damaged', (deer, damaged, expected) => {
    expect(kinds('deer', { deer }, { deer: damaged })).toEqual(expected)
  })
  test('what stays is eaten too', () => {
    expect(kinds('deer', { deer: 'high' }, { deer: 'frequently' }, { status: 'stays' })).toEqual(['risk'])
  })
})

describe('toxic', () => {
  test.each([['toxic', ['risk']], ['irritant', ['note']], ['unlisted', []]] as const)('%s, where children or pets are', (toxicity, expected) => {
    expect(kinds('toxic', { brief: ['children'] }, { toxicity })).toEqual(expected)
    expect(kinds('toxic', { brief: ['pets', 'birds'] }, { toxicity })).toEqual(expected)
    expect(kinds('toxic', { brief: ['birds'] }, { toxicity })).toEqual([])
    expect(kinds('toxic', {}, { toxicity })).toEqual([])
  })
  test('what stays can be eaten too', () => {
    expect(kinds('toxic', { brief: ['pets'] }, { toxicity: 'toxic' }, { status: 'stays' })).toEqual(['risk'])
  })
})

test('invasive: reported ones are a risk, but not what stands there already', () => {
  expect(kinds('invasive', {}, { invasive: true })).toEqual(['risk'])
  expect(kinds('invasive', {}, { invasive: false })).toEqual([])
  expect(kinds('invasive', {}, { invasive: true }, { status: 'stays' })).toEqual([])
})

test('one finding for a plant, naming its placements in order; those that go are not named', () => {
  const sheet = makeSheet({ plants: [makePlant({ invasive: true })], placements: [makePlacement({ id: 'b' }), makePlacement({ id: 'a' }), makePlacement({ id: 'c', status: 'goes' })] })
  expect(found(sheet, 'invasive')).toMatchObject([{ key: 'invasive:a+b:p1', feature: 'p1', placements: ['a', 'b'], limit: null, measured: null, excess: 0, year: null }])
})

test('a studio may switch each of them off, or call it a note', () => {
  const sheet = makeSheet({ plants: [makePlant({ invasive: true })], placements: [makePlacement()] })
  expect(found({ ...sheet, standards: { 'invasive.kind': 'off' } }, 'invasive')).toEqual([])
  expect(found({ ...sheet, standards: { 'invasive.kind': 'note' } }, 'invasive')[0]!.kind).toBe('note')
})

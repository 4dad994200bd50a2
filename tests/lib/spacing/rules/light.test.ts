import { expect, test } from 'vitest'
import type { Light } from '@/lib/plants/types'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

const lit = (light: Light[], standards = {}, status: 'new' | 'stays' = 'new') => found(makeSheet({ standards, plants: [makePlant({ light })], placements: [makePlacement({ status })] }), 'light')

test('light: a front in a class the plant is not listed for is a risk', () => {
  expect(lit(['full-sun', 'part-shade'])).toEqual([])
  expect(lit(['part-shade'])).toMatchObject([{ kind: 'risk', feature: 'p1', placements: ['a1'] }])
})

test('light: unknown light and plants that stay are not judged; a studio may make it a note or leave it out', () => {
  expect(lit([])).toEqual([])
  expect(lit(['part-shade'], {}, 'stays')).toEqual([])
  expect(lit(['part-shade'], { 'light.kind': 'note' })[0]?.kind).toBe('note')
  expect(lit(['part-shade'], { 'light.kind': 'off' })).toEqual([])
})

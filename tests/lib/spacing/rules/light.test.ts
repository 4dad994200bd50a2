import { expect, test } from 'vitest'
import { LIGHTS, type Light } from '@/lib/plants/types'
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

test('light: each class of a front passes a plant listed for it, and none other', () => {
  for (const here of LIGHTS) {
    for (const wanted of LIGHTS) {
      const sheet = makeSheet({ plants: [makePlant({ light: [wanted] })], placements: [makePlacement({ id: 'b' }), makePlacement({ id: 'a' }), makePlacement({ id: 'c', status: 'goes' })] })
      expect(found({ ...sheet, site: { ...sheet.site, light: here } }, 'light').map(({ placements }) => placements)).toEqual(here === wanted ? [] : [['a', 'b']])
    }
  }
})

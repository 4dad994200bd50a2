/** Published classes of cold and of light, asked of `hardiness` and `light`. */
import { describe, expect, test } from 'vitest'
import { LIGHTS, type Light } from '@/lib/plants/types'
import { cited, findingsOf, placementOf, plantOf, sheetOf, type Published } from './support'

const USDA: Published = {
  publisher: 'US Department of Agriculture', title: 'Plant Hardiness Zone Map 2023, bands of 5 F', known: 'read as quoted',
  address: 'https://planthardiness.ars.usda.gov/',
}
const K_STATE: Published = {
  publisher: 'K-State Research and Extension, Johnson County', title: 'Sun and shade conditions', known: 'read',
  address: 'https://www.johnson.k-state.edu/programs/lawn-garden/agent-articles-fact-sheets-and-more/agent-articles/environment/sun-shade-conditions.html',
}

/** Average yearly extreme minimum in degrees F to half zone: bands of 5 F from -60, a lower edge belongs to the warmer half. */
function zoneOf(fahrenheit: number): string {
  const band = Math.floor((fahrenheit + 60) / 5)
  return `${Math.floor(band / 2) + 1}${band % 2 === 0 ? 'a' : 'b'}`
}

describe('hardiness', () => {
  test.each([
    [-60, '1a'], [-20.1, '4b'], [-20, '5a'], [-0.1, '6b'], [0, '7a'], [5, '7b'], [17, '8b'],
  ])(cited('%f F is zone %s; a plant listed for that zone alone suits it, its neighbours do not', USDA), (fahrenheit, zone) => {
    expect(zoneOf(fahrenheit)).toBe(zone)
    const number = Number.parseInt(zone, 10)
    const ask = (zoneMin: number, zoneMax: number) => {
      const sheet = sheetOf({ plants: [plantOf({ zoneMin, zoneMax })], placements: [placementOf()] })
      return findingsOf({ ...sheet, site: { ...sheet.site, zone } }, 'hardiness').map(({ kind }) => kind)
    }
    expect(ask(number, number)).toEqual([])
    expect(ask(1, 13)).toEqual([])
    // Too cold here for a plant of the next warmer zone; too warm for one of the next colder.
    expect(ask(number + 1, 13)).toEqual(['conflict'])
    if (number > 1) expect(ask(1, number - 1)).toEqual(['risk'])
  })

  test('a plant grown for one season has no zone and is not judged', () => {
    expect(findingsOf(sheetOf({ plants: [plantOf({ category: 'annual', leaf: 'herbaceous', zoneMin: null, zoneMax: null })], placements: [placementOf()] }), 'hardiness')).toEqual([])
  })
})

/** Hours of direct sun to class: full sun from 6 hours, part shade from 4, full shade below. */
function lightOf(hours: number): Light {
  return hours >= 6 ? 'full-sun' : hours >= 4 ? 'part-shade' : 'full-shade'
}

describe('light', () => {
  test.each([
    [6, 'full-sun'], [5.9, 'part-shade'], [4, 'part-shade'], [3.9, 'full-shade'],
  ] as const)(cited('%f hours of direct sun are %s; only a plant listed for it suits', K_STATE), (hours, light) => {
    expect(lightOf(hours)).toBe(light)
    for (const listed of LIGHTS) {
      const sheet = sheetOf({ plants: [plantOf({ light: [listed] })], placements: [placementOf()] })
      const kinds = findingsOf({ ...sheet, site: { ...sheet.site, light } }, 'light').map(({ kind }) => kind)
      expect(kinds, `${listed} plant`).toEqual(listed === light ? [] : ['risk'])
    }
  })
})

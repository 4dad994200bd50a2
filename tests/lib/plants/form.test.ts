import { describe, expect, it } from 'vitest'
import { EMPTY_FORM, FACTS, factGroups, formValuesOf, plantFormSchema, plantSourcesOf, wordOf, zonesText, type LibraryPlant } from '@/lib/plants'
import { plantInput } from './sample'

const problemsOf = (changed: object) => {
  const read = plantFormSchema.safeParse({ ...formValuesOf(plantInput()), ...changed })
  return read.success ? [] : read.error.issues.map(({ path, message }) => [path.join('.'), message])
}

describe('the plant form', () => {
  it('gives back the plant it was opened with', () => {
    expect(plantFormSchema.parse(formValuesOf(plantInput()))).toEqual(plantInput())
    const season = plantInput({ zoneMin: null, zoneMax: null, heightMin: 10.5, bloomMonths: [11, 12, 1, 2], sources: [], memoryFacts: [] })
    expect(plantFormSchema.parse(formValuesOf(season))).toEqual(season)
  })

  it('takes lengths as people write them, and flowering over the turn of the year from boxes in order', () => {
    const values = { ...formValuesOf(plantInput()), heightMin: '3 ft', heightMax: '1.5 m', bloomMonths: ['1', '2', '11', '12'] }
    expect(plantFormSchema.parse(values)).toMatchObject({ heightMin: 36, heightMax: 59.0625, bloomMonths: [11, 12, 1, 2] })
  })

  it('says at each field what does not fit', () => {
    expect(problemsOf({ heightMin: '' })).toEqual([['heightMin', 'Give the smallest height.']])
    expect(problemsOf({ heightMin: '60' })).toEqual([['heightMin', 'The smallest height is more than the largest.']])
    expect(problemsOf({ zoneMin: '6b' }).map(([path]) => path)).toEqual(['zoneMin'])
    expect(problemsOf({ zoneMax: '14' }).map(([path]) => path)).toEqual(['zoneMax'])
    expect(problemsOf({ sources: [{ title: '', url: 'javascript:alert(1)' }] }).map(([path]) => path)).toEqual(['sources.0.title', 'sources.0.url'])
    expect(problemsOf({ botanical: ' ', spreadMax: 'wide' }).map(([path]) => path)).toEqual(['botanical', 'spreadMax'])
    expect(problemsOf({ studioId: 'other' })).toHaveLength(1)
  })

  it('starts with nothing claimed: sizes, names and zones are for the person to give', () => {
    const read = plantFormSchema.safeParse(EMPTY_FORM)
    expect(read.error?.issues.map(({ path }) => path[0])).toEqual(['botanical', 'heightMin', 'heightMax', 'spreadMin', 'spreadMax'])
  })
})

describe('the facts of a plant in words', () => {
  const plant: LibraryPlant = (({ sources, memoryFacts, ...facts }) => ({ ...facts, id: 'p', studioId: null, sources: plantSourcesOf({ sources, memoryFacts }) }))(plantInput())

  it('stand each in one line, none left out', () => {
    const shown = factGroups(plant).flatMap(({ lines }) => lines.flatMap(({ facts }) => facts))
    expect([...shown].sort()).toEqual([...FACTS].sort())
  })

  it('are words, not codes', () => {
    for (const { lines } of factGroups(plant)) for (const { label, value } of lines) expect(`${label}: ${value}`).toMatch(/^[A-Z][^_]*: \S/)
    expect(wordOf('broadleaf-evergreen')).toBe('Broadleaf evergreen')
    expect(zonesText({ zoneMin: null, zoneMax: null })).toBe('One season')
  })
})

import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  enteredSourcesOf, EVERY_PLANT, FACTS, formatMonths, isNarrowed, knownBy, monthsInWords, nameKey, parseMonths, plantInputSchema,
  plantQueryText, plantSourcesOf, readPlantQuery, searchExpression,
} from '@/lib/plants'
import { plantInput } from './sample'

describe('months', () => {
  it('go over the turn of the year and come back as they were written', () => {
    for (const text of ['', '5', '6-9', '11-2', '12-1', '1-12', '4-5|9']) expect(formatMonths(parseMonths(text)!)).toBe(text)
    expect(parseMonths('11-2')).toEqual([11, 12, 1, 2])
    expect(monthsInWords([11, 12, 1, 2])).toBe('Nov to Feb')
    expect(monthsInWords([4, 5, 9])).toBe('Apr to May and Sep')
  })

  it('keep any set of months through writing and reading', () => {
    fc.assert(fc.property(fc.uniqueArray(fc.integer({ min: 1, max: 12 })), (months) => {
      expect(parseMonths(formatMonths(months))?.sort()).toEqual([...months].sort())
    }))
  })

  it('are refused when they cannot be months', () => {
    for (const text of ['0', '13', '4-13', 'May', '4--5', '4-5-6', '-3']) expect(parseMonths(text)).toBeNull()
  })
})

describe('sources', () => {
  it('stand jointly for what is not from memory', () => {
    const kept = plantSourcesOf(plantInput())
    expect(kept.map(({ title, evidence }) => [title, evidence])).toEqual([['A grower', 'read'], ['A garden', 'read'], ['From memory', 'memory']])
    expect(knownBy('height_max', kept)).toHaveLength(2)
    expect(knownBy('growth', kept).map(({ evidence }) => evidence)).toEqual(['memory'])
    for (const fact of FACTS) expect(new Set(knownBy(fact, kept).map(({ evidence }) => evidence)).size).toBe(1)
  })

  it('leave everything to memory where there is none', () => {
    expect(plantSourcesOf({ sources: [], memoryFacts: [] })).toEqual([{ title: 'From memory', url: '', evidence: 'memory', facts: [...FACTS] }])
  })

  it('come back as they were entered', () => {
    const { sources, memoryFacts } = plantInput()
    const back = enteredSourcesOf(plantSourcesOf({ sources, memoryFacts }))
    expect(back.sources).toEqual(sources)
    expect([...back.memoryFacts].sort()).toEqual([...memoryFacts].sort())
    expect(enteredSourcesOf(plantSourcesOf({ sources: [], memoryFacts: ['growth'] }))).toEqual({ sources: [], memoryFacts: [] })
  })

  it('are web addresses or none', () => {
    for (const url of ['', 'https://example.com/a b', 'http://example.com']) expect(plantInputSchema.safeParse(plantInput({ sources: [{ title: 'A', url }] })).success).toBe(true)
    for (const url of ['javascript:alert(1)', 'example.com', 'data:text/html,x', 'https://']) expect(plantInputSchema.safeParse(plantInput({ sources: [{ title: 'A', url }] })).success).toBe(false)
  })
})

it('a name is the same name in other spellings', () => {
  expect(nameKey(' Abelia X grandiflora  ‘Rose Creek’')).toBe(nameKey("Abelia × grandiflora 'Rose Creek'"))
  expect(nameKey('Ilex vomitoria')).not.toBe(nameKey('Ilex opaca'))
})

describe('the words of a search', () => {
  it('become beginnings of words, whatever marks stand between', () => {
    expect(searchExpression('ilex gla')).toBe('"ilex"* "gla"*')
    expect(searchExpression(`"Ilex" OR (gla*) NEAR/2 'sham`)).toBe('"Ilex"* "OR"* "gla"* "NEAR"* "2"* "sham"*')
    expect(searchExpression('Abelia x grandiflora')).toBe('"Abelia"* "grandiflora"*')
    expect(searchExpression('x')).toBe('"x"*')
  })

  it('ask for nothing where there is no word', () => {
    for (const text of ['', '  ', '"', "'*'", '×', '()-^:']) expect(searchExpression(text)).toBeNull()
  })
})

describe('a query in an address', () => {
  it('asks for every plant when it says nothing', () => {
    expect(readPlantQuery({})).toEqual({ query: EVERY_PLANT, problems: [] })
    expect(plantQueryText(EVERY_PLANT)).toBe('')
    expect(isNarrowed({ ...EVERY_PLANT, sort: 'height', page: 3 })).toBe(false)
    expect(isNarrowed({ ...EVERY_PLANT, zone: 6 })).toBe(true)
  })

  it('takes lengths with their unit and zones with their half', () => {
    const { query, problems } = readPlantQuery({ q: ' ilex ', heightMax: '4 ft', spreadMax: '48', zone: '6b', leaf: 'evergreen', page: '2' })
    expect(problems).toEqual([])
    expect(query).toMatchObject({ q: 'ilex', heightMax: 48, spreadMax: 48, zone: 6, leaf: 'evergreen', page: 2 })
    expect(readPlantQuery(Object.fromEntries(new URLSearchParams(plantQueryText(query)))).query).toEqual(query)
  })

  it('leaves out what it cannot read, and says so', () => {
    const { query, problems } = readPlantQuery({ heightMax: 'tall', zone: '14', category: 'bush', page: '-1', sort: 'price', spreadMax: '0', other: 'x', q: ['a', 'b'] })
    expect(query).toEqual({ ...EVERY_PLANT, q: 'a' })
    expect(problems.map(({ field }) => field)).toEqual(['category', 'heightMax', 'spreadMax', 'zone', 'sort', 'page'])
  })
})

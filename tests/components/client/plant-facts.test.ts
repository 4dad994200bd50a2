import { describe, expect, it } from 'vitest'
import { aboutLength, monthWords, plantFacts } from '@/components/client/plant-facts'
import { hrefOf, readShown } from '@/components/client/view-state'
import { ordinaryBed, placementOf, plantOf, sheetOf } from '../../lib/drawing/scenes'

const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('what a client reads of a plant', () => {
  it('gives lengths as one says them', () => {
    expect([0.2, 15.4, 23.4, 24, 50, 78].map((length) => plain(aboutLength(length)))).toEqual(['1 in', '15 in', '23 in', '2 ft', '4 ft 3 in', '6 ft 6 in'])
  })

  it('gives months in a row as a span, also over the new year', () => {
    expect(monthWords([5])).toBe('May')
    expect(monthWords([5, 6])).toBe('May and June')
    expect(monthWords([12, 1, 2])).toBe('December to February')
    expect(monthWords([4, 5, 9])).toBe('April, May and September')
  })

  it('lists each plant once with its key and number, without those that go', () => {
    const facts = plantFacts(ordinaryBed())
    expect(facts.map(({ key }) => key)).toEqual(['A', 'B', 'C', 'D'])
    expect(facts.map(({ count }) => count)).toEqual([2, 2, 2, 6])
    expect(plantFacts(sheetOf([placementOf('a', 60, 60, { status: 'goes' })]))).toEqual([])
  })

  it('says what is kept clipped, and what stays', () => {
    const facts = plantFacts(sheetOf([placementOf('a', 60, 60, { kept: { height: 34 } })], [plantOf()]))
    expect(plain(facts[0]!.remark)).toBe('We keep it clipped at 2 ft 9 in.')
    expect(plantFacts(sheetOf([placementOf('a', 60, 60, { status: 'stays' })]))[0]!.remark).toBe('Already here, and it stays.')
  })
})

describe('the address of what is shown', () => {
  it('reads back what it wrote', () => {
    const shown = { year: 5, season: 'winter' as const, part: '0.2' }
    expect(readShown(Object.fromEntries(new URLSearchParams(hrefOf(shown))))).toEqual(shown)
  })

  it('is the tenth summer, whole, for anything it does not understand', () => {
    const asked = { year: 10, season: 'summer', part: null }
    for (const query of [{}, { year: 'x' }, { year: '-1' }, { year: '21' }, { year: '2.5' }, { season: 'mud' }, { part: '<b>' }, { year: ['a', '3'] }]) {
      expect(readShown(query)).toEqual(asked)
    }
  })
})

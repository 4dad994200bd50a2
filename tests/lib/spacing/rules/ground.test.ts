/** The rules about ground and water: ground-fall, siding-gap, downspout. */
import { describe, expect, test } from 'vitest'
import type { Facade, Fixture } from '@/lib/spacing'
import { found, makeFixture, makeSheet } from '../../../support/sheets'

const facade = (rule: string, changes: Partial<Facade>) => found(makeSheet({ facade: { ...makeSheet().facade, ...changes } }), rule)

describe('ground-fall', () => {
  /** International Residential Code R401.3 as quoted at https://forum.nachi.org/t/positive-drainage/38972: 6 in within 10 ft. */
  test('6 in over 10 ft will do, less will not', () => {
    expect(facade('ground-fall', { fall: 0.05 })).toEqual([])
    expect(facade('ground-fall', { fall: 5.98 / 120 })[0]).toMatchObject({ kind: 'risk', limit: 6, placements: [], feature: null, year: null })
  })
  /** US DOE Building America, https://basc.pnnl.gov/resource-guides/final-grade-slopes-away-foundation: 1/2 in per foot is 5 in. */
  test('half an inch to the foot falls an inch short of it', () => {
    const [finding] = facade('ground-fall', { fall: 0.5 / 12 })
    expect(finding!.measured!.expected).toBeCloseTo(5, 9)
    expect(finding!.excess).toBeCloseTo(1, 9)
  })
})

describe('siding-gap', () => {
  /** International Residential Code R404.1.6 as quoted at https://evstudio.com/separation-of-top-of-foundation-wall-and-adjacent-exterior-grade/. */
  test('6 in above the mulch, 4 under masonry', () => {
    expect(facade('siding-gap', { exposed: 8, mulch: 2 })).toEqual([])
    expect(facade('siding-gap', { exposed: 7.98, mulch: 2 })[0]).toMatchObject({ kind: 'risk', limit: 6 })
    expect(facade('siding-gap', { exposed: 6, mulch: 2, siding: 'masonry' })).toEqual([])
    expect(facade('siding-gap', { exposed: 5.98, mulch: 2, siding: 'masonry' })[0]).toMatchObject({ limit: 4 })
  })
  test('2 in of compost raise the soil, 3 in of mulch on it leave 3 of 8 in', () => {
    expect(facade('siding-gap', { exposed: 8 - 2, mulch: 3 })[0]).toMatchObject({ measured: { expected: 3 }, excess: 3 })
  })
})

describe('downspout', () => {
  const spout = (outlet: number | undefined, kind: Fixture['kind'] = 'downspout') => found(makeSheet({ fixtures: [makeFixture(kind, outlet === undefined ? {} : { outlet })] }), 'downspout')
  /** US DOE Building America as summarised at https://www.almostanarchitect.com/library/basc-site-grading-drainage: 5 ft or more. */
  test('5 ft from the wall will do, less is a note', () => {
    expect(spout(60)).toEqual([])
    expect(spout(59.98)[0]).toMatchObject({ kind: 'note', feature: 'f1', limit: 60, placements: [] })
  })
  test('one that was not measured is not judged, nor anything else', () => {
    expect(spout(undefined)).toEqual([])
    expect(spout(10, 'vent')).toEqual([])
  })
})

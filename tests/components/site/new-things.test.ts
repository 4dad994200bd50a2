/** A new thing is sound beside whatever is there. */
import { describe, expect, test } from 'vitest'
import { problemsWith, type Thing } from '@/components/site/measuring'
import { copyOfOpening, freeName, newBed, newFixture, newOpening, newWalk, withSoilPoint } from '@/components/site/new-things'
import { FIXTURE_KINDS, type Sheet } from '@/lib/spacing'
import { sampleSheet } from '../../lib/sheet/sample'

const bare = (width: number): Sheet => {
  const sheet = sampleSheet()
  sheet.facade.wall = [{ x: 0, y: 0 }, { x: width, y: 0 }]
  sheet.facade.grade = [{ x: 0, z: 0 }]
  return { ...sheet, openings: [], fixtures: [], walks: [], beds: [], placements: [] }
}

describe.each([['a measured front', sampleSheet()], ['a bare front', bare(528)], ['a front of 20 in', bare(20)]])('on %s', (_, sheet) => {
  const things: Thing[] = [
    { kind: 'opening', value: newOpening(sheet, 'window', 'n1') },
    { kind: 'opening', value: newOpening(sheet, 'door', 'n2') },
    { kind: 'walk', value: newWalk(sheet, 'n3') },
    { kind: 'bed', value: newBed(sheet, 'n4') },
    ...FIXTURE_KINDS.map((kind): Thing => ({ kind: 'fixture', value: newFixture(sheet, kind, 'n5') })),
  ]
  test.each(things.map((thing) => [thing.kind, thing] as const))('a new %s is sound', (_kind, thing) => expect(problemsWith(sheet, thing)).toEqual([]))
})

test('a new window stands in the first free stretch of wall, its heights taken from the soil there', () => {
  expect(newOpening(sampleSheet(), 'window', 'n')).toMatchObject({ name: 'Window 1', x: 12, width: 36 })
  const sheet = sampleSheet()
  sheet.facade.grade = [{ x: 0, z: 10 }]
  expect(newOpening(sheet, 'window', 'n')).toMatchObject({ sill: 46, head: 94 })
})

test('names count on', () => expect(freeName('Bed', [{ name: 'Bed 1' }, { name: 'bed 2' }])).toBe('Bed 3'))

test('a copy stands beside its model, or in its place where the wall ends', () => {
  const sheet = sampleSheet()
  expect(copyOfOpening(sheet, sheet.openings[0]!, 'n')).toMatchObject({ id: 'n', name: 'Kitchen 2', x: 144, width: 72 })
  const last = { ...sheet.openings[0]!, x: 440 }
  expect(copyOfOpening(sheet, last, 'n').x).toBe(440)
})

test('a new soil point completes the line to the corner, then halves its widest gap', () => {
  const { facade } = sampleSheet()
  expect(withSoilPoint({ ...facade, grade: [{ x: 0, z: 3 }] })).toEqual([{ x: 0, z: 3 }, { x: 528, z: 3 }])
  expect(withSoilPoint({ ...facade, grade: [{ x: 0, z: 0 }, { x: 100, z: 0 }, { x: 528, z: -4 }] })[2]).toEqual({ x: 314, z: -2 })
})

import { expect, test } from 'vitest'
import type { Placement, Sheet } from '@/lib/spacing'
import { found, grown, makeDoor, makePlacement, makePlant, makeSheet, makeWalk } from '../../../support/sheets'

const thorny = (changes: Partial<Placement> = {}, sheet: Partial<Sheet> = {}) =>
  found(makeSheet({ plants: [grown(40, 40, { thorns: true })], walks: [makeWalk(140)], placements: [makePlacement({ planted: { height: 40, spread: 40 }, ...changes })], ...sheet }), 'thorns')

test('a yard is kept to a walk; at every size it is a risk and no more', () => {
  expect(thorny({ y: 84 })).toEqual([])
  expect(thorny({ y: 84.02 })[0]).toMatchObject({ kind: 'risk', feature: 'k1', limit: 36, measured: { low: expect.closeTo(35.98, 6) } })
})
test('and to the line of a door', () => {
  const doors = { walks: [], openings: [makeDoor()] }
  expect(thorny({ x: 220, y: 56 }, doors)).toEqual([])
  expect(thorny({ x: 220, y: 55.98 }, doors)[0]).toMatchObject({ feature: 'd1' })
  expect(thorny({ x: 296, y: 0 }, doors)).toEqual([])
  expect(thorny({ x: 295.98, y: 0 }, doors)).toHaveLength(1)
})
test('a return of the wall at the edge of a door is not its line', () => {
  const wall = [{ x: 0, y: 0 }, { x: 240, y: 0 }, { x: 240, y: 40 }, { x: 480, y: 40 }]
  const jogged = { walks: [], openings: [makeDoor()], facade: { ...makeSheet().facade, wall } }
  expect(thorny({ x: 260, y: 60 }, jogged)).toEqual([])
})
test('a walk and a door of one id are one finding, by the nearer', () => {
  const both = { walks: [{ ...makeWalk(140), id: 'x' }], openings: [makeDoor({ id: 'x' })] }
  expect(thorny({ x: 220, y: 90 }, both)).toMatchObject([{ key: 'thorns:a1:x', excess: 6 }])
})
test('a studio may ask another distance', () => {
  expect(thorny({ y: 84.02 }, { standards: { 'thorns.distance': 30 } })).toEqual([])
})
test('plants without thorns are not asked, nor thorns above a head', () => {
  expect(found(makeSheet({ plants: [grown(40, 40)], walks: [makeWalk(140)], placements: [makePlacement({ y: 130 })] }), 'thorns')).toEqual([])
  expect(found(makeSheet({ plants: [grown(200, 40, { thorns: true })], walks: [makeWalk(140)], placements: [makePlacement({ y: 100, planted: { height: 200, spread: 40 }, clearStem: 80 })] }), 'thorns')).toEqual([])
})
test('shears hold it; on the wall it reaches a foot', () => {
  expect(thorny({ y: 90, kept: { spread: 20 } })[0]).toMatchObject({ kind: 'held' })
  const narrow = { walks: [makeWalk(48)] }
  expect(thorny({ y: 0, role: 'on-wall' }, narrow)).toEqual([])
  expect(thorny({ y: 0.02, role: 'on-wall' }, narrow)).toHaveLength(1)
})
test('one size of three is a risk by its years', () => {
  const plants = [makePlant({ thorns: true, heightMin: 20, heightMax: 40, spreadMin: 20, spreadMax: 40 })]
  expect(thorny({ y: 88, planted: { height: 10, spread: 10 } }, { plants })[0]).toMatchObject({ kind: 'risk', measured: { low: 42, expected: 37, high: 32 } })
})

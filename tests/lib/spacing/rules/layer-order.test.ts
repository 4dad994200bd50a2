import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makeSheet, rectangle } from '../../../support/sheets'

interface Case { front?: object; behind?: object; plant?: object; sheet?: object }
const layers = (height: number, { front, behind, plant, sheet }: Case = {}) => found(makeSheet({
  plants: [grown(height, 40, plant), grown(36, 40, { id: 'p2' })],
  placements: [makePlacement({ y: 100, planted: { height, spread: 40 }, ...front }), makePlacement({ id: 'a2', plant: 'p2', y: 50, planted: { height: 36, spread: 40 }, ...behind })],
  ...sheet,
}), 'layer-order')

describe('layer-order', () => {
  test('as tall as the one behind passes, 0.02 in taller does not; front stands first', () => {
    expect(layers(36)).toEqual([])
    expect(layers(36.02)[0]).toMatchObject({ kind: 'conflict', placements: ['a1', 'a2'], limit: 0 })
  })
  test('in front from 12 in nearer the viewer', () => {
    expect(layers(50, { front: { y: 62 } })).toHaveLength(1)
    expect(layers(50, { front: { y: 61.98 } })).toEqual([])
  })
  test('a quarter of the narrower must be lapped by more than a contact', () => {
    expect(layers(50, { front: { x: 270 } })).toEqual([])
    expect(layers(50, { front: { x: 269.98 } })).toHaveLength(1)
  })
  test('a perennial is a risk at most, a specimen a note whatever it would be', () => {
    expect(layers(50, { plant: { category: 'perennial' } })[0]?.kind).toBe('risk')
    expect(layers(50, { front: { role: 'specimen' } })[0]?.kind).toBe('note')
    expect(layers(50, { front: { role: 'specimen', kept: { height: 30 } } })[0]?.kind).toBe('note')
    expect(layers(50, { front: { kept: { height: 30 } } })[0]?.kind).toBe('held')
  })
  test('in beds apart, or above the other from its first leaf, it is not judged', () => {
    const beds = [{ id: 'b1', name: 'Back', outline: rectangle(0, 480, 0, 70) }, { id: 'b2', name: 'Front', outline: rectangle(0, 480, 80, 120) }]
    expect(layers(50, { sheet: { beds } })).toEqual([])
    expect(layers(50, { sheet: { beds: [beds[0]] } })).toHaveLength(1)
    expect(layers(80, { front: { clearStem: 36 } })).toEqual([])
    expect(layers(80, { front: { clearStem: 35.9 } })).toHaveLength(1)
  })
  test('the rise allowed by a studio counts, on both sides of it', () => {
    const sheet = { standards: { 'layer-order.tolerance': 6 } }
    expect(layers(42, { sheet })).toEqual([])
    expect(layers(42.02, { sheet })[0]).toMatchObject({ kind: 'conflict', limit: 6 })
  })
  test('a grass is a risk at most too, but held as any', () => {
    expect(layers(50, { plant: { category: 'grass' } })[0]?.kind).toBe('risk')
    expect(layers(50, { plant: { category: 'perennial' }, front: { kept: { height: 30 } } })[0]?.kind).toBe('held')
  })
  test('one kind of plant, annuals and bulbs, plants on the wall and two that stay are not judged', () => {
    expect(layers(50, { behind: { plant: 'p1', planted: { height: 30, spread: 40 } } })).toEqual([])
    expect(layers(50, { plant: { category: 'annual' } })).toEqual([])
    expect(layers(50, { plant: { category: 'bulb' } })).toEqual([])
    expect(layers(50, { behind: { role: 'on-wall' } })).toEqual([])
    expect(layers(50, { front: { status: 'stays' }, behind: { status: 'stays' } })).toEqual([])
    expect(layers(50, { front: { status: 'stays' } })).toHaveLength(1)
    expect(layers(50, { front: { status: 'goes' } })).toEqual([])
  })
  test('soil counts: on ground that falls the front may be so much taller', () => {
    const facade = { ...makeSheet().facade, fall: 0.1 }
    expect(layers(41, { sheet: { facade } })).toEqual([])
    expect(layers(41.02, { sheet: { facade } })).toHaveLength(1)
  })
  test('a plant behind that is clipped below the front makes it rise', () => {
    expect(layers(30, { behind: { kept: { height: 20 } } })[0]).toMatchObject({ kind: 'conflict', excess: 10 })
  })
  test('kept narrow it laps nothing', () => expect(layers(50, { front: { x: 268, kept: { spread: 10 } } })).toEqual([]))
})

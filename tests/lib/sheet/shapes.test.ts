import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { outlineOf, rectangleOf, steppedWallOf, wallOf, withWidth } from '@/lib/sheet'
import { sampleSheet } from './sample'

const length = fc.integer({ min: 1, max: 5_000 })

describe('rectangles', () => {
  test('an outline of four numbers is read back, wherever its corners start and whichever way they run', () => {
    fc.assert(
      fc.property(fc.tuple(length, length, length, length), fc.nat(3), fc.boolean(), ([x, width, y, depth], turn, backwards) => {
        const rectangle = { fromX: x, toX: x + width, fromY: y, toY: y + depth }
        const outline = outlineOf(rectangle)
        const turned = [...outline.slice(turn), ...outline.slice(0, turn)]
        expect(rectangleOf(backwards ? turned.reverse() : turned)).toEqual(rectangle)
      }),
    )
  })

  test.each([
    ['a triangle', [{ x: 0, y: 0 }, { x: 9, y: 0 }, { x: 0, y: 9 }]],
    ['a trapezium', [{ x: 0, y: 0 }, { x: 9, y: 0 }, { x: 8, y: 9 }, { x: 0, y: 9 }]],
    ['a bow tie', [{ x: 0, y: 0 }, { x: 9, y: 9 }, { x: 9, y: 0 }, { x: 0, y: 9 }]],
    ['a line', [{ x: 0, y: 0 }, { x: 9, y: 0 }, { x: 9, y: 0 }, { x: 0, y: 0 }]],
    ['nothing', []],
  ])('%s is none', (_, outline) => expect(rectangleOf(outline)).toBeNull())
})

describe('the wall line', () => {
  test('is told as stretches and jogs', () => {
    expect(steppedWallOf(sampleSheet().facade.wall)).toEqual({ steps: [{ from: 0, out: 0 }, { from: 240, out: 24 }], end: 528 })
  })

  test('comes back from its stretches', () => {
    const { wall } = sampleSheet().facade
    expect(wallOf(steppedWallOf(wall)!)).toEqual(wall)
  })

  test('askew is told by points alone', () => expect(steppedWallOf([{ x: 0, y: 0 }, { x: 100, y: 10 }])).toBeNull())
  test('with a return at its very corner is told by points alone', () => {
    expect(steppedWallOf([{ x: 0, y: 0 }, { x: 0, y: 9 }, { x: 50, y: 9 }])).toBeNull()
    expect(steppedWallOf([{ x: 0, y: 0 }, { x: 50, y: 0 }, { x: 50, y: 9 }])).toBeNull()
  })

  test('made wider takes the soil at its right corner along', () => {
    const wider = withWidth(sampleSheet().facade, 600)
    expect(wider.wall.at(-1)).toEqual({ x: 600, y: 24 })
    expect(wider.grade.at(-1)).toEqual({ x: 600, z: -4 })
  })
})

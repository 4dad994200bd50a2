/** Pan, zoom, hits, keys and what is said aloud. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { Announcer, changeInWords } from '@/components/drawing-table/editor/announce'
import { commandFor, COMMANDS } from '@/components/drawing-table/editor/commands'
import { fitView, keepInSight, pinchView, toScene, toScreen, zoomView } from '@/components/drawing-table/editor/view'
import type { Finding } from '@/lib/spacing'
import { HandClock } from './harness'

const spot = fc.record({ x: fc.integer({ min: -2000, max: 2000 }), y: fc.integer({ min: -2000, max: 2000 }) })
const view = fc.record({ scale: fc.double({ min: 0.1, max: 20, noNaN: true }), x: fc.integer({ min: -5000, max: 5000 }), y: fc.integer({ min: -5000, max: 5000 }) })
const close = (a: { x: number; y: number }, b: { x: number; y: number }) => {
  expect(a.x).toBeCloseTo(b.x, 3)
  expect(a.y).toBeCloseTo(b.y, 3)
}

describe('the window on the drawing', () => {
  test('what is under the pointer stays under it, however near one goes', () => {
    fc.assert(fc.property(view, spot, fc.double({ min: 0.01, max: 100, noNaN: true }), (from, at, factor) => {
      close(toScreen(zoomView(from, at, factor), toScene(from, at)), at)
    }))
  })

  test('the middle between two fingers stays between them', () => {
    fc.assert(fc.property(view, fc.tuple(spot, spot), fc.tuple(spot, spot), (from, was, is) => {
      const middle = ([a, b]: readonly [typeof was[0], typeof was[0]]) => ({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 })
      close(toScreen(pinchView(from, was, is), toScene(from, middle(was))), middle(is))
    }))
  })

  test('fitted, the whole drawing is in sight; panned away, some of it stays', () => {
    const box = { x: -20, y: -150, width: 568, height: 420 }
    const size = { width: 800, height: 600 }
    const fitted = fitView(box, size)
    const corner = toScreen(fitted, { x: box.x + box.width, y: box.y + box.height })
    expect(toScreen(fitted, box).x).toBeGreaterThanOrEqual(0)
    expect(corner.x).toBeLessThanOrEqual(size.width)
    expect(corner.y).toBeLessThanOrEqual(size.height)
    const away = keepInSight({ ...fitted, x: -100_000, y: 100_000 }, box, size)
    expect(toScreen(away, { x: box.x + box.width, y: 0 }).x).toBeCloseTo(80)
    expect(toScreen(away, box).y).toBeCloseTo(size.height - 80)
  })
})

describe('keys', () => {
  const key = (name: string, more: Partial<Record<'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey', boolean>> = {}) =>
    ({ key: name, ctrlKey: false, metaKey: false, shiftKey: false, altKey: false, ...more })
  const id = (event: ReturnType<typeof key>, onDrawing = true) => commandFor(event, { onDrawing })?.id ?? null

  test('the ones people know', () => {
    expect(id(key('z', { ctrlKey: true }))).toBe('undo')
    expect(id(key('Z', { metaKey: true, shiftKey: true }))).toBe('redo')
    expect(id(key('ArrowLeft'))).toBe('nudge-left')
    expect(id(key('ArrowLeft', { shiftKey: true }))).toBe('nudge-left-far')
    expect(id(key('Tab', { shiftKey: true }))).toBe('previous')
    expect(id(key('?', { shiftKey: true }))).toBe('help')
    expect(id(key('Delete'))).toBe('remove')
    expect(id(key('p', { ctrlKey: true }))).toBeNull()
    expect(id(key('p', { altKey: true }))).toBeNull()
  })

  test('outside the drawing only undo and redo are heard', () => {
    expect(id(key('z', { ctrlKey: true }), false)).toBe('undo')
    expect(id(key('Delete'), false)).toBeNull()
    expect(id(key('Tab'), false)).toBeNull()
  })

  test('no two commands share a key', () => {
    const strokes = COMMANDS.flatMap(({ strokes: own }) => own.map(({ key: name, ctrl = false, shift = false }) => `${name} ${ctrl} ${shift}`))
    expect(new Set(strokes).size).toBe(strokes.length)
  })
})

describe('what is said aloud', () => {
  const finding = (key: string, kind: Finding['kind'] = 'conflict') => ({ key, kind }) as Finding
  const tell = ({ key }: Finding) => `It is ${key}.`

  test('one new finding in full, several by number, cleared ones by number', () => {
    expect(changeInWords([], [finding('a')], tell)).toBe('New conflict: It is a.')
    expect(changeInWords([], [finding('a'), finding('b'), finding('c', 'risk')], tell)).toBe('New: 2 conflicts, 1 risk.')
    expect(changeInWords([finding('a')], [], tell)).toBe('Cleared: 1 conflict.')
    expect(changeInWords([finding('a')], [finding('a')], tell)).toBe('')
  })

  test('at most one sentence a second, the latest', async () => {
    const clock = new HandClock()
    const said: string[] = []
    const announcer = new Announcer(clock, (words) => said.push(words))
    for (const words of ['one', 'two', 'three']) announcer.say(words)
    expect(said).toEqual(['one'])
    await clock.pass(1_000)
    expect(said).toEqual(['one', 'three'])
    await clock.pass(5_000)
    announcer.say('four')
    expect(said).toEqual(['one', 'three', 'four'])
  })
})

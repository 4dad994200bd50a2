/** Finds room for words and keys: each takes the first free place of those it could stand at, and keeps it. */
import type { Ink } from './palette'
import { path, segment } from './path'
import type { Box, Face, Shape, TextShape } from './types'

/** Width of a letter as a share of the size, wide enough for either face. */
const LETTER: Record<Face, number> = { text: 0.56, mono: 0.61, heading: 0.54 }

export interface Words {
  text: string
  sizePx: number
  ink: Ink
  font: Face
  italic?: boolean
}

export interface Spot {
  x: number
  y: number
  anchor: TextShape['anchor']
}

export interface Labeler {
  pxPerInch: number
  /** Inches of a number of screen pixels. */
  px: (pixels: number) => number
  /** Takes room that nothing else may use. */
  block: (box: Box) => void
  /** Sets words at the first free spot (baseline points); null when none is free and `must` is not set. */
  setWords: (words: Words, spots: readonly Spot[], must?: boolean) => TextShape | null
  /** A key in a ring near a point, with a leader when it had to step aside. */
  setKey: (key: KeyLabel) => Shape[]
  boxes: () => readonly Box[]
}

export interface KeyLabel {
  text: string
  at: { x: number; y: number }
  radiusPx: number
  placements: string[]
  /** Where it would best stand, in order; the places round the point come after. */
  prefer: { x: number; y: number }[]
  /** Keep off the point itself (plan: the cross stands there). */
  beside: boolean
}

const overlaps = (a: Box, b: Box) => a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height
const holds = (a: Box, b: Box) => b.x >= a.x && b.y >= a.y && b.x + b.width <= a.x + a.width && b.y + b.height <= a.y + a.height

/** The room words take, scene inches. */
export function boxOfWords({ text, sizePx, font }: Words, { x, y, anchor }: Spot, pxPerInch: number): Box {
  const width = (text.length * sizePx * LETTER[font] + 4) / pxPerInch
  const left = anchor === 'start' ? x : anchor === 'middle' ? x - width / 2 : x - width
  return { x: left, y: y - (sizePx * 0.86) / pxPerInch, width, height: (sizePx * 1.16) / pxPerInch }
}

function ringSpots(key: KeyLabel, px: (pixels: number) => number): { x: number; y: number }[] {
  const { at, radiusPx } = key
  const spots = key.beside ? [...key.prefer] : [...key.prefer, at]
  const first = key.beside ? radiusPx + 6 : radiusPx * 1.2
  for (let step = 0; step < 14; step += 1) {
    const far = px(first + step * radiusPx * 0.9)
    const directions = step < 2 ? 8 : 16
    for (let i = 0; i < directions; i += 1) {
      // Upwards and to the right first, then round.
      const angle = -Math.PI / 4 + (i % 2 ? -1 : 1) * Math.ceil(i / 2) * ((2 * Math.PI) / directions)
      spots.push({ x: at.x + Math.cos(angle) * far, y: at.y + Math.sin(angle) * far })
    }
  }
  return spots
}

/** A labeler for one view at one scale. */
export function createLabeler(frame: Box, pxPerInch: number): Labeler {
  const taken: Box[] = []
  const px = (pixels: number) => pixels / pxPerInch
  const free = (box: Box) => holds(frame, box) && !taken.some((other) => overlaps(box, other))

  function setWords(words: Words, spots: readonly Spot[], must = false): TextShape | null {
    const spot = spots.find((at) => free(boxOfWords(words, at, pxPerInch))) ?? (must ? spots[0] : undefined)
    if (!spot) return null
    taken.push(boxOfWords(words, spot, pxPerInch))
    return { kind: 'text', ...words, ...spot, halo: true }
  }

  function setKey(key: KeyLabel): Shape[] {
    const size = px(key.radiusPx * 2 + 2)
    const around = (at: { x: number; y: number }): Box => ({ x: at.x - size / 2, y: at.y - size / 2, width: size, height: size })
    const spots = ringSpots(key, px)
    const at = spots.find((spot) => free(around(spot))) ?? spots.find((spot) => holds(frame, around(spot))) ?? key.at
    taken.push(around(at))
    const away = Math.hypot(at.x - key.at.x, at.y - key.at.y)
    const leader: Shape[] = away > px(key.radiusPx * (key.beside ? 2 : 1.4))
      ? [path(segment(key.at.x, key.at.y, at.x, at.y), { stroke: 'ink', strokePx: 0.8 }), { kind: 'mark', mark: 'dot', x: key.at.x, y: key.at.y, ink: 'ink', radiusPx: 1.8 }]
      : []
    return [...leader, { kind: 'mark', mark: 'key', x: at.x, y: at.y, text: key.text, ink: 'ink', radiusPx: key.radiusPx, placements: key.placements }]
  }

  return { pxPerInch, px, block: (box) => taken.push(box), setWords, setKey, boxes: () => taken }
}

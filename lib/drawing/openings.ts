/** Windows and doors: seen square-on, and as cut in plan. */
import { gradeAt, wallY, type Facade, type Opening } from '../spacing'
import type { Layout } from './layout'
import { WALL_IN } from './layout'
import { circle, path, polygon, rect, segment } from './path'
import type { PathShape } from './types'

const CASING_IN = 3.5
const FRAME_IN = 2
/** Panes are drawn about this wide and this high. */
const PANE_IN = 26

function divisions(length: number, most: number): number {
  return Math.min(Math.max(Math.round(length / PANE_IN), 1), most)
}

function muntins(x: number, width: number, top: number, height: number): string {
  const columns = divisions(width, 5)
  const rows = Math.max(2, divisions(height, 3))
  const upright = Array.from({ length: columns - 1 }, (_, i) => x + (width * (i + 1)) / columns)
  const level = Array.from({ length: rows - 1 }, (_, i) => top + (height * (i + 1)) / rows)
  return [...upright.map((at) => segment(at, top, at, top + height)), ...level.map((at) => segment(x, at, x + width, at))].join('')
}

function drawWindow(opening: Opening, layout: Layout, facade: Facade): PathShape[] {
  const { x, width } = opening
  const top = layout.elevationY(opening.head)
  const bottom = layout.elevationY(opening.sill)
  const inset = Math.min(FRAME_IN, width / 8, (bottom - top) / 8)
  const [gl, gt, gw, gh] = [x + inset, top + inset, width - 2 * inset, bottom - top - 2 * inset]
  const glint = polygon([{ x: gl + gw * 0.12, y: gt + gh }, { x: gl + gw * 0.42, y: gt }, { x: gl + gw * 0.62, y: gt }, { x: gl + gw * 0.32, y: gt + gh }])
  const head = facade.siding === 'masonry'
    ? path(rect(x - 6, top - 8, x + width + 6, top), { fill: 'foundation', stroke: 'ink-soft', strokePx: 0.8 })
    : path(rect(x - CASING_IN - 1.5, top - CASING_IN - 2, x + width + CASING_IN + 1.5, top - CASING_IN), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.8 })
  return [
    path(rect(x - CASING_IN, top - CASING_IN, x + width + CASING_IN, bottom), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.8 }),
    head,
    path(rect(x, top, x + width, bottom), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.8 }),
    path(rect(gl, gt, gl + gw, gt + gh), { fill: 'glass' }),
    path(glint, { fill: 'glass-light', opacity: 0.8, clip: [rect(gl, gt, gl + gw, gt + gh)] }),
    path(rect(gl, gt, gl + gw, gt + Math.min(3, gh / 4)), { fill: 'foliage-shade', opacity: 0.14 }),
    path(muntins(gl, gw, gt, gh), { stroke: 'trim', strokePx: 2.4 }),
    path(muntins(gl, gw, gt, gh), { stroke: 'ink-soft', strokePx: 0.4, opacity: 0.55 }),
    path(rect(gl, gt, gl + gw, gt + gh), { stroke: 'ink-soft', strokePx: 0.7 }),
    path(rect(x - CASING_IN - 2, bottom, x + width + CASING_IN + 2, bottom + 2.5), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.9 }),
  ]
}

function panels(x: number, width: number, top: number, bottom: number): PathShape[] {
  const height = bottom - top
  const gap = width * 0.13
  const column = (width - 3 * gap) / 2
  const rows: [number, number][] = [[0.36, 0.62], [0.68, 0.94]]
  const low = rows.flatMap(([from, to]) => [0, 1].map((at) => {
    const l = x + gap + at * (column + gap)
    return rect(l, top + height * from, l + column, top + height * to)
  })).join('')
  return [
    path(low, { fill: 'door-panel', stroke: 'ink', strokePx: 0.6, opacity: 0.85 }),
    path(rect(x + gap, top + height * 0.06, x + width - gap, top + height * 0.3), { fill: 'glass', stroke: 'ink', strokePx: 0.6 }),
  ]
}

function drawDoor(opening: Opening, layout: Layout, facade: Facade): PathShape[] {
  const { x, width } = opening
  const top = layout.elevationY(opening.head)
  const bottom = layout.elevationY(opening.sill)
  const soil = Math.min(gradeAt(facade, x), gradeAt(facade, x + width))
  const inset = Math.min(FRAME_IN, width / 10)
  const [l, w, t] = [x + inset, width - 2 * inset, top + inset]
  const steps = Math.max(1, Math.min(4, Math.round((opening.sill - soil) / 7)))
  const rise = (opening.sill - soil) / steps
  const stoop = Array.from({ length: opening.sill - soil > 1 ? steps : 0 }, (_, i) => {
    const out = 5 + i * 6
    return path(rect(x - out, bottom + i * rise, x + width + out, bottom + (i + 1) * rise), { fill: 'foundation', stroke: 'ink-soft', strokePx: 0.9 })
  })
  return [
    path(rect(x - CASING_IN, top - CASING_IN, x + width + CASING_IN, bottom), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.9 }),
    path(rect(x - CASING_IN - 2, top - CASING_IN - 3, x + width + CASING_IN + 2, top - CASING_IN), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.9 }),
    path(rect(l, t, l + w, bottom), { fill: 'door', stroke: 'ink', strokePx: 0.9 }),
    ...panels(l, w, t, bottom),
    path(circle(l + w * 0.92, t + (bottom - t) * 0.56, Math.min(1.3, w / 20)), { fill: 'foliage-gold', stroke: 'ink', strokePx: 0.5 }),
    ...stoop.reverse(),
  ]
}

/** One opening square-on. */
export function drawOpening(opening: Opening, layout: Layout, facade: Facade): PathShape[] {
  return opening.kind === 'window' ? drawWindow(opening, layout, facade) : drawDoor(opening, layout, facade)
}

/** One opening in the cut wall: the gap, and a double line for glass or a threshold for a door. */
export function cutOpening(opening: Opening, layout: Layout, facade: Facade): PathShape[] {
  const { x, width } = opening
  const face = layout.planY(wallY(facade, x + width / 2))
  const back = face - WALL_IN
  const gap = path(rect(x, back - 0.6, x + width, face + 0.6), { fill: 'sheet' })
  const jambs = path(segment(x, back, x, face) + segment(x + width, back, x + width, face), { stroke: 'ink', strokePx: 1.2 })
  if (opening.kind === 'door') {
    return [gap, jambs, path(rect(x, face - 2, x + width, face + 2), { fill: 'foundation', stroke: 'ink-soft', strokePx: 0.8 })]
  }
  const middle = (face + back) / 2
  return [
    gap,
    jambs,
    path(rect(x, middle - 1.2, x + width, middle + 1.2), { fill: 'glass', stroke: 'ink', strokePx: 0.8 }),
    path(rect(x - 2, face, x + width + 2, face + 2), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.7 }),
  ]
}

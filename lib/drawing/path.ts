/** Path data: scene inches to hundredths, enough for any screen or paper. */
import type { Box, PathData, PathShape } from './types'

export interface Dot {
  x: number
  y: number
}

/** A number as it stands in path data. Anything that is not finite becomes 0: a drawing never carries NaN. */
export function num(value: number): number {
  const rounded = Math.round(value * 100) / 100
  return Number.isFinite(rounded) ? rounded + 0 : 0
}

/** `.01` to `.99` as they stand behind a whole number, without trailing zeros. */
const HUNDREDTHS = Array.from({ length: 100 }, (_, i) => (i === 0 ? '' : `.${String(i).padStart(2, '0').replace(/0$/, '')}`))

/** Two coordinates as path data writes them, to hundredths. Whole numbers print several times faster than fractions. */
export function xy(x: number, y: number): string {
  return `${short(x)} ${short(y)}`
}

function short(value: number): string {
  const hundredths = Math.round(value * 100)
  if (!(Math.abs(hundredths) < 2 ** 31)) return String(num(value))
  const size = hundredths < 0 ? -hundredths : hundredths
  const whole = (size / 100) | 0
  return `${hundredths < 0 ? '-' : ''}${whole}${HUNDREDTHS[size - whole * 100]}`
}

const pair = (point: Dot) => xy(point.x, point.y)

/** An open line through points; '' without points. */
export function line(points: readonly Dot[]): PathData {
  return points.length === 0 ? '' : `M${points.map(pair).join('L')}`
}

/** A closed outline. */
export function polygon(points: readonly Dot[]): PathData {
  return points.length === 0 ? '' : `${line(points)}Z`
}

export function segment(x1: number, y1: number, x2: number, y2: number): PathData {
  return `M${num(x1)} ${num(y1)}L${num(x2)} ${num(y2)}`
}

/** A rectangle from two corners, always turning the same way. */
export function rect(x1: number, y1: number, x2: number, y2: number): PathData {
  const [l, r] = x1 < x2 ? [x1, x2] : [x2, x1]
  const [t, b] = y1 < y2 ? [y1, y2] : [y2, y1]
  return `M${num(l)} ${num(t)}L${num(r)} ${num(t)}L${num(r)} ${num(b)}L${num(l)} ${num(b)}Z`
}

/** A circle, turning the same way as `rect`. */
export function circle(x: number, y: number, radius: number): PathData {
  const r = num(Math.max(radius, 0))
  return `M${num(x - r)} ${num(y)}A${r} ${r} 0 1 1 ${num(x + r)} ${num(y)}A${r} ${r} 0 1 1 ${num(x - r)} ${num(y)}Z`
}

export const boxPath = (box: Box): PathData => rect(box.x, box.y, box.x + box.width, box.y + box.height)

export function boxAround(points: readonly Dot[]): Box {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity]
  for (const { x, y } of points) {
    left = Math.min(left, x)
    right = Math.max(right, x)
    top = Math.min(top, y)
    bottom = Math.max(bottom, y)
  }
  return points.length === 0 ? { x: 0, y: 0, width: 0, height: 0 } : { x: left, y: top, width: right - left, height: bottom - top }
}

export const boxOfCircle = (x: number, y: number, radius: number): Box => ({ x: x - radius, y: y - radius, width: 2 * radius, height: 2 * radius })

/** Points on one side of a line: at `distance` to its left-hand normal (dy, -dx), corners mitred. */
export function offsetLine(points: readonly Dot[], distance: number): Dot[] {
  const normals = points.slice(1).map((point, i) => {
    const from = points[i]!
    const length = Math.hypot(point.x - from.x, point.y - from.y) || 1
    return { x: (point.y - from.y) / length, y: -(point.x - from.x) / length }
  })
  return points.map((point, i) => {
    const a = normals[Math.max(i - 1, 0)] ?? { x: 0, y: -1 }
    const b = normals[Math.min(i, normals.length - 1)] ?? a
    const scale = distance / Math.max(1 + a.x * b.x + a.y * b.y, 0.5)
    return { x: point.x + (a.x + b.x) * scale, y: point.y + (a.y + b.y) * scale }
  })
}

function area(points: readonly Dot[]): number {
  return points.reduce((sum, point, i) => {
    const next = points[(i + 1) % points.length]!
    return sum + point.x * next.y - next.x * point.y
  }, 0) / 2
}

/** The points so ordered that they turn the same way as `rect` and `circle` (positive area, y down). */
export function wound<T extends Dot>(points: readonly T[]): T[] {
  return area(points) < 0 ? [...points].reverse() : [...points]
}

/**
 * Everything within `distance` of a line or outline, as one path whose parts turn alike (nonzero winding fills
 * their union): the exact rounded band, without polygon arithmetic.
 */
export function within(points: readonly Dot[], distance: number, closed: boolean): PathData {
  const parts: PathData[] = closed ? [polygon(wound(points))] : []
  if (distance <= 0) return parts.join('')
  const count = closed ? points.length : points.length - 1
  for (let i = 0; i < count; i += 1) {
    const a = points[i]!
    const b = points[(i + 1) % points.length]!
    const length = Math.hypot(b.x - a.x, b.y - a.y)
    if (length === 0) continue
    const nx = ((b.y - a.y) / length) * distance
    const ny = (-(b.x - a.x) / length) * distance
    parts.push(polygon(wound([{ x: a.x + nx, y: a.y + ny }, { x: b.x + nx, y: b.y + ny }, { x: b.x - nx, y: b.y - ny }, { x: a.x - nx, y: a.y - ny }])))
  }
  for (const point of points) parts.push(circle(point.x, point.y, distance))
  return parts.join('')
}

/** The nearest point of a line to a point, and how far it is. */
export function nearestOnLine(point: Dot, points: readonly Dot[], closed: boolean): Dot & { distance: number } {
  let best = { x: points[0]?.x ?? 0, y: points[0]?.y ?? 0, distance: Infinity }
  const count = closed ? points.length : points.length - 1
  for (let i = 0; i < count; i += 1) {
    const a = points[i]!
    const b = points[(i + 1) % points.length]!
    const [dx, dy] = [b.x - a.x, b.y - a.y]
    const t = Math.min(1, Math.max(0, ((point.x - a.x) * dx + (point.y - a.y) * dy) / (dx * dx + dy * dy || 1)))
    const [x, y] = [a.x + t * dx, a.y + t * dy]
    const distance = Math.hypot(point.x - x, point.y - y)
    if (distance < best.distance) best = { x, y, distance }
  }
  return best
}

/** A path shape, shorter to write. */
export function path(d: PathData, style: Omit<PathShape, 'kind' | 'd'>): PathShape {
  return { kind: 'path', d, ...style }
}

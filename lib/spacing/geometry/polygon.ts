/** Plane polygons as lists of points; the last side closes. Square inches and inches. */
import type { Inches, Point } from '../types'

/** Nearest point of a segment to a point. */
export function nearestOnSegment(p: Point, a: Point, b: Point): Point {
  const dx = b.x - a.x
  const dy = b.y - a.y
  const length = dx * dx + dy * dy
  const t = length === 0 ? 0 : Math.min(1, Math.max(0, ((p.x - a.x) * dx + (p.y - a.y) * dy) / length))
  return { x: a.x + t * dx, y: a.y + t * dy }
}

/** Signed area: positive where the points run anticlockwise with y up. */
export function polygonArea(points: readonly Point[]): number {
  let twice = 0
  for (let i = 0; i < points.length; i++) {
    const a = points[i]!
    const b = points[(i + 1) % points.length]!
    twice += a.x * b.y - b.x * a.y
  }
  return twice / 2
}

/** Nearest point of the outline to a point. */
export function nearestOnOutline(p: Point, points: readonly Point[]): Point {
  let best: Point = points[0]!
  let least = Infinity
  for (let i = 0; i < points.length; i++) {
    const near = nearestOnSegment(p, points[i]!, points[(i + 1) % points.length]!)
    const square = (p.x - near.x) ** 2 + (p.y - near.y) ** 2
    if (square < least) {
      least = square
      best = near
    }
  }
  return best
}

/** Is the point inside? On the edge itself the answer may be either: `pointInPolygon` settles it. */
export function isInside(p: Point, points: readonly Point[]): boolean {
  let inside = false
  for (let i = 0, j = points.length - 1; i < points.length; j = i++) {
    const a = points[i]!
    const b = points[j]!
    if (a.y > p.y !== b.y > p.y && p.x < ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y) + a.x) inside = !inside
  }
  return inside
}

/** Distance from a point to the outline: negative inside, 0 on the edge. */
export function distanceToPolygon(p: Point, points: readonly Point[]): Inches {
  const near = nearestOnOutline(p, points)
  const distance = Math.hypot(p.x - near.x, p.y - near.y)
  return isInside(p, points) ? -distance : distance
}

/** A point this near a slanted edge is on it: closer than any drawing, farther than the noise of a sum. */
const ON_EDGE = 1e-6

/** Is the point inside? The edge counts as inside. */
export function pointInPolygon(p: Point, points: readonly Point[]): boolean {
  return isInside(p, points) || distanceToPolygon(p, points) <= ON_EDGE
}

const turn = (a: Point, b: Point, c: Point) => Math.sign((b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x))

const within = (a: Point, b: Point, p: Point) =>
  Math.min(a.x, b.x) <= p.x && p.x <= Math.max(a.x, b.x) && Math.min(a.y, b.y) <= p.y && p.y <= Math.max(a.y, b.y)

function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  const t1 = turn(a, b, c)
  const t2 = turn(a, b, d)
  const t3 = turn(c, d, a)
  const t4 = turn(c, d, b)
  if (t1 !== t2 && t3 !== t4) return true
  return (t1 === 0 && within(a, b, c)) || (t2 === 0 && within(a, b, d)) || (t3 === 0 && within(c, d, a)) || (t4 === 0 && within(c, d, b))
}

/** Neighbouring sides that fold back over each other lie on one line and point against each other. */
const foldsBack = (a: Point, b: Point, c: Point) =>
  turn(a, b, c) === 0 && (b.x - a.x) * (c.x - b.x) + (b.y - a.y) * (c.y - b.y) < 0

/** Does an outline cross, touch or fold over itself? Repeated points at one spot count as one. */
export function polygonCrossesItself(outline: readonly Point[]): boolean {
  const points = outline.filter((p, i) => {
    const next = outline[(i + 1) % outline.length]!
    return p.x !== next.x || p.y !== next.y
  })
  const n = points.length
  if (n < 3) return true
  for (let i = 0; i < n; i++) {
    if (foldsBack(points[i]!, points[(i + 1) % n]!, points[(i + 2) % n]!)) return true
    for (let j = i + 2; j < n; j++) {
      if (i === 0 && j === n - 1) continue
      if (segmentsMeet(points[i]!, points[i + 1]!, points[j]!, points[(j + 1) % n]!)) return true
    }
  }
  return false
}

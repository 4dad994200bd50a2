/** The house in plan: its wall line and the distance to it. Inches. */
import type { Facade, Inches, Point } from '../types'
import { nearestOnSegment } from './polygon'

/** The wall line's y at x: piecewise linear; at a jog the wall nearer the viewer; flat beyond the corners. */
export function wallY({ wall }: Pick<Facade, 'wall'>, x: Inches): Inches {
  const first = wall[0]!
  const last = wall[wall.length - 1]!
  if (x < first.x) return first.y
  if (x > last.x) return last.y
  let y = -Infinity
  for (let i = 0; i < wall.length - 1; i++) {
    const a = wall[i]!
    const b = wall[i + 1]!
    if (x < a.x || x > b.x) continue
    y = Math.max(y, a.x === b.x ? Math.max(a.y, b.y) : a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x))
  }
  return y
}

/** The point of the wall line nearest to a point in plan, returns included. */
export function nearestOnWall({ wall }: Pick<Facade, 'wall'>, x: Inches, y: Inches): Point {
  const point = { x, y }
  let best: Point = wall[0]!
  let least = Infinity
  for (let i = 0; i < wall.length - 1; i++) {
    const near = nearestOnSegment(point, wall[i]!, wall[i + 1]!)
    const square = (x - near.x) ** 2 + (y - near.y) ** 2
    if (square < least) {
      least = square
      best = near
    }
  }
  return best
}

/**
 * Plan distance to the nearest point of the wall line, returns included. Between the corners it is negative
 * behind the wall; elsewhere never negative.
 */
export function wallDistance(facade: Pick<Facade, 'wall'>, x: Inches, y: Inches): Inches {
  const { wall } = facade
  const near = nearestOnWall(facade, x, y)
  const distance = Math.hypot(x - near.x, y - near.y)
  const isBetween = x >= wall[0]!.x && x <= wall[wall.length - 1]!.x
  return isBetween && y < wallY(facade, x) ? -distance : distance
}

/** The house in plan and its soil: wall line, distance to it, ground heights. Inches. */
import type { Facade, GradePoint, Inches } from '../types'
import { distanceToSegment } from './polygon'

/** A contact of at most this much is none, in any direction. */
export const CONTACT = 0.01

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

/**
 * Plan distance to the nearest point of the wall line, returns included. Between the corners it is negative
 * behind the wall; elsewhere never negative.
 */
export function wallDistance(facade: Pick<Facade, 'wall'>, x: Inches, y: Inches): Inches {
  const { wall } = facade
  let best = Infinity
  for (let i = 0; i < wall.length - 1; i++) best = Math.min(best, distanceToSegment({ x, y }, wall[i]!, wall[i + 1]!))
  const between = x >= wall[0]!.x && x <= wall[wall.length - 1]!.x
  return between && y < wallY(facade, x) ? -best : best
}

/** Soil height at the wall: linear between the measured points, flat beyond them. */
export function gradeAt({ grade }: { grade: readonly GradePoint[] }, x: Inches): Inches {
  const first = grade[0]!
  if (x <= first.x) return first.z
  for (let i = 1; i < grade.length; i++) {
    const a = grade[i - 1]!
    const b = grade[i]!
    if (x <= b.x) return a.z + ((b.z - a.z) * (x - a.x)) / (b.x - a.x)
  }
  return grade[grade.length - 1]!.z
}

/** Soil height at a point: the soil at the wall less the fall over the distance from it. */
export function groundAt(facade: Pick<Facade, 'wall' | 'grade' | 'fall'>, x: Inches, y: Inches): Inches {
  return gradeAt(facade, x) - facade.fall * Math.max(0, wallDistance(facade, x, y))
}

/** Plan distance from a point to the nearest spot of an interval of the x axis; 0 inside. */
export function gapInX(x: Inches, left: Inches, width: Inches): Inches {
  return Math.max(0, left - x, x - left - width)
}

export const clamp = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high)


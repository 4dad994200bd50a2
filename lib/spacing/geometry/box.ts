/** Upright rectangles in plan: what encloses an outline. */
import type { Inches, Point } from '../types'

export interface Box {
  left: Inches
  right: Inches
  back: Inches
  front: Inches
}

/** The smallest rectangle around some points. */
export function boxOf(points: readonly Point[]): Box {
  const box: Box = { left: Infinity, right: -Infinity, back: Infinity, front: -Infinity }
  for (const { x, y } of points) {
    box.left = Math.min(box.left, x)
    box.right = Math.max(box.right, x)
    box.back = Math.min(box.back, y)
    box.front = Math.max(box.front, y)
  }
  return box
}

/** How far a number lies outside an interval; 0 inside. */
export const gapTo = (value: number, from: number, to: number): number => Math.max(0, from - value, value - to)

/** Square of the distance from a point to a box; 0 inside. */
export function squareToBox({ x, y }: Point, { left, right, back, front }: Box): number {
  return gapTo(x, left, right) ** 2 + gapTo(y, back, front) ** 2
}

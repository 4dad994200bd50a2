/** Simple shapes that people measure by a few numbers, and the points they stand for on a sheet. */
import type { Facade, Point } from '../spacing'

/** A strip square to the wall: from x to x, from y to y, inches. */
export interface Rectangle {
  fromX: number
  toX: number
  fromY: number
  toY: number
}

/** The four corners, from the one at left and nearest the wall line. */
export function outlineOf({ fromX, toX, fromY, toY }: Rectangle): Point[] {
  return [{ x: fromX, y: fromY }, { x: toX, y: fromY }, { x: toX, y: toY }, { x: fromX, y: toY }]
}

/** The rectangle an outline is, in whatever order its corners stand; null when it is any other shape. */
export function rectangleOf(outline: readonly Point[]): Rectangle | null {
  const xs = outline.map(({ x }) => x)
  const ys = outline.map(({ y }) => y)
  const box = { fromX: Math.min(...xs), toX: Math.max(...xs), fromY: Math.min(...ys), toY: Math.max(...ys) }
  if (outline.length !== 4 || box.fromX === box.toX || box.fromY === box.toY) return null
  const isCorner = ({ x, y }: Point) => (x === box.fromX || x === box.toX) && (y === box.fromY || y === box.toY)
  const isSquare = outline.every((point, i) => {
    const next = outline[(i + 1) % 4]!
    return isCorner(point) && (point.x === next.x) !== (point.y === next.y)
  })
  return isSquare ? box : null
}

/** From `from` on to the right the wall stands `out` in front of the base line. */
export interface WallStep {
  from: number
  out: number
}

/** A wall of straight stretches with square jogs: its stretches from left to right, and the right corner. */
export interface SteppedWall {
  steps: WallStep[]
  end: number
}

/** The wall line as stretches and jogs; null when a stretch runs askew and only points can tell it. */
export function steppedWallOf(wall: readonly Point[]): SteppedWall | null {
  const first = wall[0]
  const last = wall.at(-1)
  if (!first || !last) return null
  const steps: WallStep[] = [{ from: first.x, out: first.y }]
  for (const [i, point] of wall.slice(1).entries()) {
    const before = wall[i]!
    if (point.x === before.x && point.y !== before.y) {
      if (point.x === steps.at(-1)!.from) return null
      steps.push({ from: point.x, out: point.y })
    } else if (point.y !== before.y) return null
  }
  return steps.at(-1)!.from === last.x ? null : { steps, end: last.x }
}

/** The points of a stepped wall: two at each jog. Keeps the order given, so a step out of order shows as a problem. */
export function wallOf({ steps, end }: SteppedWall): Point[] {
  return steps.flatMap(({ from, out }, i) => [{ x: from, y: out }, { x: steps[i + 1]?.from ?? end, y: out }])
}

/** The facade made so wide: its right corner moves, and a soil height taken at that corner moves with it. */
export function withWidth(facade: Facade, width: number): Facade {
  const left = facade.wall[0]!.x
  const right = facade.wall.at(-1)!.x
  const moved = left + width
  return {
    ...facade,
    wall: facade.wall.map((point, i) => (i > 0 && i === facade.wall.length - 1 ? { ...point, x: moved } : point)),
    grade: facade.grade.map((point, i) => (i > 0 && i === facade.grade.length - 1 && point.x === right ? { ...point, x: moved } : point)),
  }
}

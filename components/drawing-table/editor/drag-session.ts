/**
 * A plant on the move: a snapshot taken at the start, and an offset from it. Nothing on the sheet changes until
 * the drop; putting it back is forgetting the offset, so rounding never adds up.
 */
import { roundLength } from '@/lib/measure'
import { checkPlacement, prepare, type Finding, type Inches, type Placement, type Prepared, type Sheet } from '@/lib/spacing'

/** Where a moved plant may stand: whole inches, or the 1/64 in that every length is kept to. */
export const GRIDS = [1, 1 / 64] as const
export type Grid = (typeof GRIDS)[number]
/** In plan a plant goes both ways; in elevation only along the wall. */
export type Axes = 'both' | 'x'

interface Start {
  sheet: Sheet
  placement: Placement
  axes: Axes
  grid: Grid
}

const snap = (value: Inches, grid: Grid): Inches => roundLength(Math.round(value / grid) * grid)

export class DragSession {
  readonly snapshot: Placement
  private readonly start: Start
  private readonly prepared: Prepared
  private moved: Placement
  private found: Finding[] | null = null

  constructor(start: Start) {
    this.start = start
    this.snapshot = start.placement
    this.moved = start.placement
    this.prepared = prepare(start.sheet)
  }

  /** The plant where it is held now. */
  get candidate(): Placement {
    return this.moved
  }

  get axes(): Axes {
    return this.start.axes
  }

  get hasMoved(): boolean {
    return this.moved.x !== this.snapshot.x || this.moved.y !== this.snapshot.y
  }

  /** What the size and neighbour rules say about the plant where it is held now. Computed once for each place. */
  get findings(): Finding[] {
    this.found ??= checkPlacement(this.prepared, this.moved)
    return this.found
  }

  /** Held at this offset from the snapshot, inches, the place snapped to the grid. Answers whether anything changed. */
  moveBy(dx: Inches, dy: Inches): boolean {
    const { x, y } = this.snapshot
    const { axes, grid } = this.start
    return this.hold(dx === 0 ? x : snap(x + dx, grid), axes === 'x' || dy === 0 ? y : snap(y + dy, grid))
  }

  /** Held at this point, snapped to the grid; in elevation `y` is kept. */
  moveTo(x: Inches, y: Inches): boolean {
    return this.moveBy(x - this.snapshot.x, y - this.snapshot.y)
  }

  /** One more step from where it is held, off the grid: what an arrow key does. */
  step(dx: Inches, dy: Inches): boolean {
    return this.hold(roundLength(this.moved.x + dx), roundLength(this.moved.y + dy))
  }

  private hold(x: Inches, y: Inches): boolean {
    if (!Number.isFinite(x) || !Number.isFinite(y) || (x === this.moved.x && y === this.moved.y)) return false
    this.moved = { ...this.snapshot, x, y }
    this.found = null
    return true
  }
}

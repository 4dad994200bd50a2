/** Where a bed stays empty when all is grown: room for annuals. */
import { boxOf } from './geometry/box'
import { distanceToPolygon } from './geometry/polygon'
import type { Prepared } from './prepared'
import type { Bed, Inches, Pocket, Point } from './types'
import { isOnWall } from './verdict'

/** Smaller gaps are left to mulch. */
const LEAST_ACROSS_IN = 18
const FINENESS_IN = 0.25
/** So many a bed are told: a bed emptier than that is not short of a list. */
const MOST_A_BED = 24
/** Four-inch annuals commonly stand a foot apart. */
export const ANNUAL_SPACING_IN = 12
/** An equilateral grid takes this much more than a square one. */
const STAGGERED = 2 / Math.sqrt(3)

interface Disc extends Point {
  radius: Inches
}

export type SpacingPattern = 'square' | 'staggered'

/**
 * Plants that an area takes, not rounded: 144/s^2 to the square foot on a square grid, 2/sqrt 3 as many staggered.
 * @param area square inches
 * Bloomin Designs, plant calculator, https://www.bloomindesigns.com/plant-calculator/ (read).
 */
export function plantsInArea(area: number, spacing: Inches, pattern: SpacingPattern = 'square'): number {
  return (area / (spacing * spacing)) * (pattern === 'square' ? 1 : STAGGERED)
}

/** Annuals to order for a round pocket, rounded up. */
export const annualsIn = (diameter: Inches, spacing: Inches = ANNUAL_SPACING_IN, pattern: SpacingPattern = 'square'): number =>
  Math.ceil(plantsInArea((Math.PI * diameter * diameter) / 4, spacing, pattern))

interface Cell extends Point {
  half: Inches
  room: Inches
}

/** Room about a point: to the edge of the bed and to every disc; less than nothing outside the bed and under crowns. */
function roomAt(point: Point, { outline }: Bed, discs: readonly Disc[]): Inches {
  let room = -distanceToPolygon(point, outline)
  for (const { x, y, radius } of discs) room = Math.min(room, Math.hypot(point.x - x, point.y - y) - radius)
  return room
}

/** The search for empty circles: cells that could still hold one, halved where they could hold a larger one than the best. */
class Search {
  private cells: Cell[] = []

  constructor(private readonly bed: Bed, private readonly discs: readonly Disc[]) {
    const { left, right, back, front } = boxOf(bed.outline)
    const size = Math.max(Math.min(right - left, front - back), 1)
    for (let x = left; x < right; x += size) for (let y = back; y < front; y += size) this.cells.push(this.cellAt(x + size / 2, y + size / 2, size / 2))
  }

  private cellAt(x: Inches, y: Inches, half: Inches): Cell {
    return { x, y, half, room: roomAt({ x, y }, this.bed, this.discs) }
  }

  private quarters({ x, y, half }: Cell): Cell[] {
    const quarter = half / 2
    return [this.cellAt(x - quarter, y - quarter, quarter), this.cellAt(x + quarter, y - quarter, quarter), this.cellAt(x - quarter, y + quarter, quarter), this.cellAt(x + quarter, y + quarter, quarter)]
  }

  /** The largest empty circle; null where none is 18 in across. */
  largest(): Disc | null {
    let best: Cell | null = null
    for (;;) {
      for (const cell of this.cells) if (cell.room >= LEAST_ACROSS_IN / 2 && cell.room > (best?.room ?? 0)) best = cell
      const beaten = Math.max(LEAST_ACROSS_IN / 2, best?.room ?? 0) + FINENESS_IN
      const [split, kept]: [Cell[], Cell[]] = [[], []]
      for (const cell of this.cells) {
        const most = cell.room + cell.half * Math.SQRT2
        if (most > beaten) split.push(cell)
        else if (most > LEAST_ACROSS_IN / 2) kept.push(cell)
      }
      this.cells = [...kept, ...split.flatMap((cell) => this.quarters(cell))]
      if (split.length === 0) return best ? { x: best.x, y: best.y, radius: best.room } : null
    }
  }

  /** Takes a circle out of what is empty. */
  take({ x, y, radius }: Disc): void {
    for (const cell of this.cells) cell.room = Math.min(cell.room, Math.hypot(cell.x - x, cell.y - y) - radius)
  }
}

/** The pockets of one bed; each is taken out of what is empty for the beds after it, should they overlap. */
function pocketsOf(bed: Bed, taken: Disc[]): Pocket[] {
  const { left, right } = boxOf(bed.outline)
  const discs = taken.filter(({ x, radius }) => x + radius > left && x - radius < right)
  const search = new Search(bed, discs)
  const pockets: Pocket[] = []
  for (let found = search.largest(); found && pockets.length < MOST_A_BED; found = search.largest()) {
    discs.push(found)
    taken.push(found)
    search.take(found)
    pockets.push({ bed: bed.id, x: found.x, y: found.y, diameter: 2 * found.radius, annuals: annualsIn(2 * found.radius) })
  }
  return pockets
}

/** The pockets of every bed at expected maturity: empty circles, disjoint, largest first, to a quarter inch. */
export function pocketsOfSheet({ sheet, grown }: Prepared): Pocket[] {
  const taken: Disc[] = grown.filter((one) => !isOnWall(one)).map(({ mature: { expected } }) => ({ x: expected.x, y: expected.y, radius: expected.spread / 2 }))
  return sheet.beds.flatMap((bed) => pocketsOf(bed, taken))
}

/** How many plants could ever grow into one another: what a check costs beyond its plants. */
import { Strips } from './geometry/strips'
import { matureSize } from './growth'
import type { Inches, Point, Sheet } from './types'

interface Spread extends Point {
  radius: Inches
}

/** Pairs of plants whose largest crowns would meet in plan; plants that go or are not known to the sheet count for nothing. */
export function pairsThatMeet({ plants, placements }: Pick<Sheet, 'plants' | 'placements'>): number {
  const known = new Map(plants.map((plant) => [plant.id, plant]))
  const spreads = placements.flatMap((placement): Spread[] => {
    const plant = known.get(placement.plant)
    return plant && placement.status !== 'goes' ? [{ x: placement.x, y: placement.y, radius: matureSize(plant, placement, 'high').spread / 2 }] : []
  })
  const strips = new Strips(spreads, ({ x, radius }) => ({ from: x - radius, to: x + radius }))
  const meets = (a: Spread) => strips.near(a.x - a.radius, a.x + a.radius).filter((b) => b !== a && Math.hypot(a.x - b.x, a.y - b.y) < a.radius + b.radius).length
  return spreads.reduce((sum, one) => sum + meets(one), 0) / 2
}

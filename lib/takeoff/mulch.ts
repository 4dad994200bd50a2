/** Mulch by the yard. One cubic yard covers 324 sq ft an inch deep. */

const CUBIC_FEET_IN_YARD = 27

export interface Mulch {
  cubicFeet: number
  cubicYards: number
  /** Whole yards, as it is delivered. */
  order: number
}

/** @param area square feet @param depth inches. Nothing for no depth. */
export function mulchFor(area: number, depth: number): Mulch {
  const cubicFeet = (area * Math.max(0, depth)) / 12
  const cubicYards = cubicFeet / CUBIC_FEET_IN_YARD
  // The noise of the division must not order a yard more.
  return { cubicFeet, cubicYards, order: Math.ceil(cubicYards - 1e-9) }
}

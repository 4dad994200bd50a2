/** The beds by area, and the mulch that covers them. */
import { polygonArea, type Sheet } from '../spacing'
import { mulchFor, type Mulch } from './mulch'

const SQUARE_INCHES = 144

export interface BedArea {
  name: string
  squareFeet: number
}

export interface BedsTakeoff {
  beds: BedArea[]
  squareFeet: number
  /** Inches, as measured for the facade. */
  depth: number
  mulch: Mulch
}

/** Areas of a sheet's beds as drawn (overlaps are counted twice) and the mulch for them at the facade's depth. */
export function takeOffBeds({ beds, facade }: Pick<Sheet, 'beds' | 'facade'>): BedsTakeoff {
  const areas = beds.map(({ name, outline }) => ({ name, squareFeet: Math.abs(polygonArea(outline)) / SQUARE_INCHES }))
  const squareFeet = areas.reduce((sum, bed) => sum + bed.squareFeet, 0)
  return { beds: areas, squareFeet, depth: facade.mulch, mulch: mulchFor(squareFeet, facade.mulch) }
}

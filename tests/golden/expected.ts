/** A finding worked out by hand. Figures in inches are compared within 0.001; a year may be up to 0.05 later than worked out. */
import type { FindingKind } from '@/lib/spacing'

export type Three = [low: number, expected: number, high: number]

export interface Expected {
  rule: string
  kind: FindingKind
  placements: string[]
  feature: string | null
  limit?: number
  measured?: Three | null
  excess: number
  /** Earliest, expected, latest, where it was worked out. */
  year?: Three | null
}

/** The rules these beds were worked out for; findings of others are another page's matter. */
export const WORKED_RULES = ['sill', 'walk-edge', 'wall-gap', 'gutter', 'outside-bed', 'crowding', 'layer-order', 'hardiness', 'light']

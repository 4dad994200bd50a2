/** A finding worked out by hand. Figures in inches are compared within 0.001; a year may be up to 0.05 later than worked out. */
import type { FindingKind } from '@/lib/spacing'

export type Three = [low: number, expected: number, high: number]

export interface Expected {
  rule: string
  kind: FindingKind
  placements: string[]
  feature: string | null
  limit?: number
  /** Rules of the expected size alone measure that. */
  measured?: Three | [null, number, null] | null
  excess: number
  /** Earliest, expected, latest, where it was worked out. */
  year?: Three | null
}

/** The rules beds were worked out for unless they name their own; findings of others are another page's matter. */
export const WORKED_RULES = ['sill', 'walk-edge', 'wall-gap', 'gutter', 'outside-bed', 'crowding', 'layer-order', 'hardiness', 'light']

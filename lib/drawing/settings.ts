/** The limits the lines are drawn at: the studio's standards, else the rules' own defaults. */
import { resolveStandards, type Sheet } from '../spacing'

export interface Margins {
  sill: number
  gutter: number
  walk: number
  headroom: number
  gap: number
  layer: number
}

/** Margins of a sheet, inches. A sheet without standards (as the client's) takes the rules' defaults. */
export function marginsOf(sheet: Pick<Sheet, 'standards'>): Margins {
  const standards: Record<string, unknown> = resolveStandards(sheet)
  const number = (name: string, otherwise: number) => {
    const value = standards[name]
    return typeof value === 'number' ? value : otherwise
  }
  return {
    sill: number('sill.margin', 0),
    gutter: number('gutter.clearance', 12),
    walk: number('walk-edge.clearance', 0),
    headroom: number('walk-edge.headroom', 80),
    gap: number('wall-gap.gap', 12),
    layer: number('layer-order.tolerance', 0),
  }
}

import { plantedBeds } from '../by-bed'
import { topOf } from '../crown'
import { judgeExpected } from '../expected-only'
import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import { gradeAt } from '../geometry/ground'
import { distanceToPolygon } from '../geometry/polygon'
import { numberOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Finding, Inches, Point } from '../types'

/** A corner plant at least this share of the wall's height, or the setting if that is less, closes the corner. */
const LEAST_SHARE = 1 / 3

interface Corner {
  id: 'left' | 'right'
  at: Point
  soil: Inches
  /** Gutter above the soil there. */
  wall: Inches
}

function cornersOf({ sheet: { facade } }: Prepared): Corner[] {
  const ends = [['left', facade.wall[0]!], ['right', facade.wall.at(-1)!]] as const
  return ends.map(([id, at]) => {
    const soil = gradeAt(facade, at.x)
    return { id, at, soil, wall: facade.gutter - soil }
  })
}

const isNear = (corner: Corner, { placement: { x, y } }: Grown, near: Inches) => Math.hypot(x - corner.at.x, y - corner.at.y) <= near

/** A corner with a bed about it and nothing tall enough to close it. */
function emptyCorner(prepared: Prepared, corner: Corner, standing: readonly Grown[]): Finding[] {
  const limit = Math.min(LEAST_SHARE * corner.wall, numberOf(prepared, 'corner-height.least'))
  const near = numberOf(prepared, 'corner-height.near')
  if (!plantedBeds(prepared).some(({ bed }) => distanceToPolygon(corner.at, bed.outline) <= near)) return []
  const tallest = Math.max(0, ...standing.map(({ mature }) => topOf(mature.expected) - corner.soil))
  if (limit - tallest <= CONTACT) return []
  const measured = standing.length > 0 ? { low: null, expected: tallest, high: null } : null
  return [findingOf({ rule: 'corner-height', kind: 'note', placements: [], feature: corner.id, limit, measured, excess: limit - tallest })]
}

export const cornerHeight: Rule = {
  scope: 'sheet',
  meta: {
    id: 'corner-height',
    title: 'House corners',
    question: 'Do the corners of the house look right?',
    settings: [
      { name: 'corner-height.near', label: 'At a corner within', default: 48, min: 0, max: 120, unit: 'in' },
      { name: 'corner-height.share', label: 'Height allowed there, of the gutter', default: 2 / 3, min: 0.25, max: 1, unit: 'share' },
      { name: 'corner-height.least', label: 'Height that closes a corner', default: 48, min: 0, max: 120, unit: 'in' },
    ],
    fixedKind: 'risk',
    sources: [{ publisher: 'NDSU Extension', title: 'Foundation Plantings: corner shrubs at 2/3 to 3/4 of the eave', address: 'https://www.ag.ndsu.edu/hort/info/inform/wplts/foundation.htm', known: 'read' }],
    notes: 'Heights are above the soil at the corner, at the expected size. An empty corner is a note where a planted bed comes near it; a third of the wall, or 48 in if that is less, closes it.',
  },
  judge: (prepared) => {
    const near = numberOf(prepared, 'corner-height.near')
    return cornersOf(prepared).flatMap((corner) => {
      const standing = prepared.grown.filter((one) => isNear(corner, one, near))
      const limit = numberOf(prepared, 'corner-height.share') * corner.wall
      const tall = standing.flatMap((one) => judgeExpected({ rule: 'corner-height', one, feature: corner.id, limit, measure: (crown) => topOf(crown) - corner.soil }) ?? [])
      return [...tall, ...emptyCorner(prepared, corner, standing)]
    })
  },
}

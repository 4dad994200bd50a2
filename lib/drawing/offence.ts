/** What exactly breaks a limit: the area to hatch, and the one dimension that says by how much. */
import {
  BOUNDS, crownOf, groundAt, radiusAt, reach, silhouette, span, wallDistance,
  type Bound, type Crown, type Finding, type Placement,
} from '../spacing'
import type { Plant } from '../plants'
import type { Layout } from './layout'
import { boxAround, boxOfCircle, circle, nearestOnLine, polygon, rect, within, wound, type Dot } from './path'
import type { Margins } from './settings'
import type { Box, PathData, SceneOptions } from './types'

export interface Offence {
  view: 'elevation' | 'plan'
  /** Outlines of the crowns concerned, at the size that breaks the limit. */
  outlines: PathData[]
  /** The offending area: the intersection. */
  clip: PathData[]
  box: Box
  /** From the limit to what passes it. */
  dimension: [Dot, Dot]
  upright: boolean
}

export interface Case {
  sheet: SceneOptions['sheet']
  plants: ReadonlyMap<string, Plant>
  layout: Layout
  margins: Margins
  finding: Finding
}

const FAR_IN = 20_000

function crownsAt({ sheet, plants, finding }: Case, bound: Bound): Crown[] {
  return finding.placements.flatMap((id): Crown[] => {
    const placement = sheet.placements.find((one): one is Placement => one.id === id)
    const plant = placement && plants.get(placement.plant)
    if (!placement || !plant) return []
    return [crownOf({ plant, placement, facade: sheet.facade, zone: sheet.site.zone, bound, year: 'mature', natural: finding.kind === 'held' })]
  })
}

const outlineOf = (crown: Crown, layout: Layout): PathData => polygon(silhouette(crown).map(({ x, z }) => ({ x, y: layout.elevationY(z) })))
const planOutline = (crown: Crown, layout: Layout, radius: number): PathData => circle(crown.x, layout.planY(crown.y), radius)
const topOf = (crown: Crown) => crown.z0 + crown.height
const widest = (crown: Crown) => reach(crown, crown.z0, topOf(crown))

/** The part of a crown above a height and between two x, in the elevation. */
function above(crown: Crown, layout: Layout, limit: number, to: { from: number; until: number; top: number }): Offence | null {
  if (to.top <= limit + 0.01 || to.until <= to.from) return null
  const y = layout.elevationY(limit)
  const top = layout.elevationY(topOf(crown))
  const outline = outlineOf(crown, layout)
  const [left, right] = [Math.max(to.from, crown.x - widest(crown)), Math.min(to.until, crown.x + widest(crown))]
  const x = Math.min(Math.max(crown.x, left), right)
  return {
    view: 'elevation', outlines: [outline], clip: [outline, rect(to.from, y, to.until, top - 1)],
    box: { x: left, y: top, width: right - left, height: y - top },
    dimension: [{ x, y }, { x, y: layout.elevationY(to.top) }], upright: true,
  }
}

function sill({ sheet, finding, layout, margins }: Case, [crown]: Crown[]): Offence | null {
  const opening = sheet.openings.find(({ id }) => id === finding.feature)
  if (!opening || !crown) return null
  const dx = Math.max(opening.x - crown.x, crown.x - opening.x - opening.width, 0)
  const part = span(crown, dx)
  if (!part || part.from > opening.head) return null
  return above(crown, layout, opening.sill - margins.sill, { from: opening.x, until: opening.x + opening.width, top: part.to })
}

function gutter({ sheet, layout, margins }: Case, [crown]: Crown[]): Offence | null {
  if (!crown) return null
  const distance = Math.max(0, wallDistance(sheet.facade, crown.x, crown.y) - sheet.facade.overhang)
  const part = span(crown, distance)
  return part && above(crown, layout, sheet.facade.gutter - margins.gutter, { from: -FAR_IN, until: FAR_IN, top: part.to })
}

function layerOrder({ layout, margins }: Case, [front, behind]: Crown[]): Offence | null {
  if (!front || !behind) return null
  const found = above(front, layout, topOf(behind) + margins.layer, { from: -FAR_IN, until: FAR_IN, top: topOf(front) })
  return found && { ...found, outlines: [...found.outlines, outlineOf(behind, layout)] }
}

/** A circle in plan cut to an area; the dimension runs from the limit to the crown's edge. */
function inPlan(crown: Crown, layout: Layout, radius: number, cut: { area: PathData[]; limit: Dot; edge: Dot }): Offence {
  const outline = planOutline(crown, layout, radius)
  const scene = ({ x, y }: Dot): Dot => ({ x, y: layout.planY(y) })
  return {
    view: 'plan', outlines: [outline], clip: [outline, ...cut.area], box: boxOfCircle(crown.x, layout.planY(crown.y), radius),
    dimension: [scene(cut.limit), scene(cut.edge)], upright: false,
  }
}

/** Unit direction from a crown's axis to a point; away from the wall when they coincide. */
function towards(crown: Crown, point: Dot & { distance: number }, inside: boolean): Dot {
  if (point.distance < 0.01) return { x: 0, y: 1 }
  const sign = inside ? -1 : 1
  return { x: (sign * (point.x - crown.x)) / point.distance, y: (sign * (point.y - crown.y)) / point.distance }
}

const step = (from: Dot, way: Dot, length: number): Dot => ({ x: from.x + way.x * length, y: from.y + way.y * length })

function walkEdge({ sheet, finding, layout, margins }: Case, [crown]: Crown[]): Offence | null {
  const walk = sheet.walks.find(({ id }) => id === finding.feature)
  if (!walk || !crown) return null
  const near = nearestOnLine(crown, walk.outline, true)
  const inside = isInside(crown, walk.outline)
  const soil = groundAt(sheet.facade, near.x, near.y)
  const radius = reach(crown, soil, soil + margins.headroom)
  const excess = margins.walk - ((inside ? -near.distance : near.distance) - radius)
  if (excess <= 0.01 || (radius <= 0 && !inside)) return null
  const way = towards(crown, near, inside)
  const area = within(walk.outline.map(({ x, y }) => ({ x, y: layout.planY(y) })), margins.walk, true)
  const edge = step(crown, way, radius)
  return inPlan(crown, layout, radius, { area: [area], limit: step(edge, way, -excess), edge })
}

function isInside(point: Dot, outline: readonly Dot[]): boolean {
  let inside = false
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!
    if (a.y > point.y !== b.y > point.y && point.x < a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x)) inside = !inside
  })
  return inside
}

/** Everything nearer the wall than the gap, and behind it. */
function gapArea(face: readonly Dot[], gap: number): PathData {
  const behind = polygon(wound([...face, { x: face.at(-1)!.x, y: face.at(-1)!.y - FAR_IN }, { x: face[0]!.x, y: face[0]!.y - FAR_IN }]))
  return within(face, gap, false) + behind
}

function wallGap({ sheet, layout, margins }: Case, [crown]: Crown[]): Offence | null {
  if (!crown) return null
  const distance = wallDistance(sheet.facade, crown.x, crown.y)
  const radius = reach(crown, crown.z0, sheet.facade.gutter)
  const excess = margins.gap - (distance - radius)
  if (excess <= 0.01 || radius <= 0) return null
  const way = towards(crown, nearestOnLine(crown, sheet.facade.wall, false), distance < 0)
  const area = gapArea(sheet.facade.wall.map(({ x, y }) => ({ x, y: layout.planY(y) })), margins.gap)
  const edge = step(crown, way, radius)
  return inPlan(crown, layout, radius, { area: [area], limit: step(edge, way, -excess), edge })
}

function outsideBed({ sheet, layout }: Case, [crown]: Crown[]): Offence | null {
  if (!crown || sheet.beds.length === 0) return null
  const radius = Math.max(widest(crown), 2)
  const nearest = sheet.beds.map(({ outline }) => nearestOnLine(crown, outline, true)).reduce((a, b) => (a.distance <= b.distance ? a : b))
  if (nearest.distance <= 0.01 || sheet.beds.some(({ outline }) => isInside(crown, outline))) return null
  // A field with the bed as a hole: the hole turns the other way.
  const field = rect(-FAR_IN, -FAR_IN, FAR_IN, FAR_IN)
  const area = sheet.beds.map(({ outline }) => field + polygon(wound(outline.map(({ x, y }) => ({ x, y: layout.planY(y) }))).toReversed()))
  return inPlan(crown, layout, radius, { area, limit: nearest, edge: crown })
}

const LENS_STEPS = 48

function crowding({ layout }: Case, [one, other]: Crown[]): Offence | null {
  if (!one || !other) return null
  const low = Math.max(one.z0 + one.clearStem, other.z0 + other.clearStem)
  const high = Math.min(topOf(one), topOf(other))
  if (high - low <= 0.01) return null
  const sums = Array.from({ length: LENS_STEPS + 1 }, (_, i) => {
    const z = low + ((high - low) * i) / LENS_STEPS
    return [radiusAt(one, z), radiusAt(other, z)] as const
  })
  const [r1, r2] = sums.reduce((a, b) => (b[0] + b[1] > a[0] + a[1] ? b : a))
  const distance = Math.hypot(one.x - other.x, one.y - other.y)
  if (r1 + r2 - distance <= 0.01) return null
  const way = distance > 0.01 ? { x: (other.x - one.x) / distance, y: (other.y - one.y) / distance } : { x: 1, y: 0 }
  const second = planOutline(other, layout, r2)
  const found = inPlan(one, layout, r1, { area: [second], limit: step(other, way, -r2), edge: step(one, way, r1) })
  return { ...found, outlines: [...found.outlines, second], box: boxAround([...corners(found.box)]) }
}

const corners = ({ x, y, width, height }: Box): Dot[] => [{ x, y }, { x: x + width, y: y + height }]

const MAKERS: Record<string, (of: Case, crowns: Crown[]) => Offence | null> = {
  sill, gutter, 'layer-order': layerOrder, 'walk-edge': walkEdge, 'wall-gap': wallGap, 'outside-bed': outsideBed, crowding,
}

/**
 * The offence of a finding at the first mature size that breaks the limit: expected, else high, else low (held:
 * unclipped). null for rules without a shape (hardiness, light) and where nothing of the crown passes the limit.
 */
export function offenceOf(of: Case): Offence | null {
  const make = MAKERS[of.finding.rule]
  if (!make) return null
  const order: Bound[] = ['expected', ...BOUNDS.filter((bound) => bound !== 'expected').toReversed()]
  for (const bound of order) {
    const found = make(of, crownsAt(of, bound))
    if (found) return found
  }
  return null
}

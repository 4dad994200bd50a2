/** One plant from above: full-grown outline, the largest on record dashed, today's size inside, a cross at the axis. */
import { reach, type Crown, type Placement } from '../spacing'
import { lookOf, type Dress } from './foliage'
import { boxOfCircle, circle, line, path, xy } from './path'
import type { Subject } from './plant-elevation'
import { randomFrom, type Random } from './random'
import type { PathShape, PlantDrawing, Shape } from './types'

/** Crowns of the same placement: today, and full-grown at the expected and the high bound. */
export interface PlanSubject extends Subject {
  expected: Crown
  high: Crown
}

const radiusOf = (crown: Crown) => Math.max(0, reach(crown, crown.z0, crown.z0 + crown.height))

/** A leafy ring in a unit circle, x and y by turns: every bump reaches the circle, every notch lies inside. */
function unitRing(bumps: number, random: Random): number[] {
  const turn = random() * 2 * Math.PI
  const points: number[] = []
  const put = (share: number, radius: number) => {
    const angle = turn + (share / bumps) * 2 * Math.PI
    points.push(Math.cos(angle) * radius, Math.sin(angle) * radius)
  }
  put(0, 0.95)
  let from = 0
  for (let i = 0; i < bumps; i += 1) {
    const last = i === bumps - 1
    const to = last ? bumps : i + 1 + (random() - 0.5) * 0.55
    const step = to - from
    put(from + step * 0.2, 0.995)
    put(from + step * 0.5, 0.998)
    put(from + step * 0.8, 0.995)
    put(to, last ? 0.95 : 0.925 + random() * 0.05)
    from = to
  }
  return points
}

/** Rings are thrown once for each placement and size of growth; every year only scales them. */
const rings = new WeakMap<Placement, { bumps: number; points: number[] }>()

function ringOf(placement: Placement, full: number): number[] {
  const bumps = Math.min(30, Math.max(8, Math.round(full * 0.6)))
  const known = rings.get(placement)
  if (known?.bumps === bumps) return known.points
  const points = unitRing(bumps, randomFrom(`${placement.id} plan`))
  rings.set(placement, { bumps, points })
  return points
}

function scaledRing(points: readonly number[], { x, y }: { x: number; y: number }, radius: number): string {
  const at = (i: number) => xy(x + points[2 * i]! * radius, y + points[2 * i + 1]! * radius)
  const parts = [`M${at(0)}`]
  for (let i = 1; i + 3 < points.length / 2; i += 4) parts.push(`Q${at(i)} ${at(i + 1)}Q${at(i + 2)} ${at(i + 3)}`)
  return `${parts.join('')}Z`
}

function spokes(cx: number, cy: number, radius: number, random: Random): string {
  const count = Math.min(16, Math.max(7, Math.round(radius / 3)))
  return Array.from({ length: count }, (_, i) => {
    const angle = ((i + random() * 0.6) / count) * 2 * Math.PI
    const [from, to] = [radius * 0.12, radius * (0.6 + random() * 0.35)]
    return line([{ x: cx + Math.cos(angle) * from, y: cy + Math.sin(angle) * from }, { x: cx + Math.cos(angle) * to, y: cy + Math.sin(angle) * to }])
  }).join('')
}

const FULL: Record<Dress, number> = { leaves: 0.42, thin: 0.25, bare: 0.1, dormant: 0.16 }
const TODAY: Record<Dress, number> = { leaves: 0.42, thin: 0.3, bare: 0.18, dormant: 0.25 }

function growing(subject: PlanSubject, cx: number, cy: number): Shape[] {
  const { placement, plant, month } = subject
  const look = lookOf(plant, month)
  const [full, most, today] = [radiusOf(subject.expected), radiusOf(subject.high), radiusOf(subject.crown)]
  const stays = placement.status === 'stays'
  const ink = stays ? 'ink-soft' : 'ink'
  const points = ringOf(placement, full)
  const ring = scaledRing(points, { x: cx, y: cy }, full)
  const shapes: Shape[] = [
    path(ring, { fill: look.fill, opacity: FULL[look.dress] }),
    path(scaledRing(points, { x: cx, y: cy }, Math.max(today, 0.5)), { fill: look.fill, stroke: 'foliage-shade', strokePx: 0.6, opacity: TODAY[look.dress] }),
  ]
  if (look.dress === 'bare' || plant.category === 'grass') {
    shapes.push(path(spokes(cx, cy, full, randomFrom(`${placement.id} spokes`)), { stroke: 'bark', strokePx: 0.6, opacity: 0.8 }))
  }
  if (most > full + 0.5) shapes.push(path(circle(cx, cy, most), { stroke: 'ink-soft', strokePx: 0.8, dashPx: [4, 4] }))
  shapes.push(
    path(ring, { stroke: ink, strokePx: stays ? 0.8 : 1.05, ...(look.dress === 'dormant' && { dashPx: [3, 3] }) }),
    { kind: 'mark', mark: 'cross', x: cx, y: cy, ink, radiusPx: 3.5 },
  )
  return shapes
}

function leaving(radius: number, cx: number, cy: number): PathShape[] {
  const r = radius * 0.7
  return [
    path(circle(cx, cy, radius), { stroke: 'ink-soft', strokePx: 1, dashPx: [5, 4] }),
    path(line([{ x: cx - r, y: cy - r }, { x: cx + r, y: cy + r }]) + line([{ x: cx - r, y: cy + r }, { x: cx + r, y: cy - r }]), { stroke: 'ink-soft', strokePx: 1 }),
  ]
}

/**
 * One plant in plan.
 * @param planY scene y of a distance from the base line.
 */
export function drawPlantPlan(subject: PlanSubject, planY: (y: number) => number): PlantDrawing {
  const { placement, plant, crown } = subject
  const [cx, cy] = [crown.x, planY(crown.y)]
  const goes = placement.status === 'goes'
  const radius = goes ? radiusOf(crown) : Math.max(radiusOf(subject.expected), radiusOf(crown))
  return {
    placement: placement.id, plant: plant.id, at: { x: cx, y: cy }, hit: boxOfCircle(cx, cy, radius),
    shapes: goes ? leaving(radius, cx, cy) : growing(subject, cx, cy),
    depth: crown.z0 + crown.height,
  }
}

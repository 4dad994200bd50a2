/** One plant from above: full-grown outline, the largest on record dashed, today's size inside, a cross at the axis. */
import { reach, type Crown } from '../spacing'
import { lookOf, type Dress } from './foliage'
import { boxOfCircle, circle, line, num, path } from './path'
import type { Subject } from './plant-elevation'
import { randomFrom, type Random } from './random'
import type { PathShape, PlantDrawing, Shape } from './types'

/** Crowns of the same placement: today, and full-grown at the expected and the high bound. */
export interface PlanSubject extends Subject {
  expected: Crown
  high: Crown
}

const radiusOf = (crown: Crown) => Math.max(0, reach(crown, crown.z0, crown.z0 + crown.height))

/** A leafy ring within a circle: every bump touches it, every notch lies inside. */
function leafyRing(cx: number, cy: number, radius: number, random: Random): string {
  const bumps = Math.min(30, Math.max(8, Math.round(radius * 0.6)))
  const turn = random() * 2 * Math.PI
  const at = (share: number, r: number) => {
    const angle = turn + (share / bumps) * 2 * Math.PI
    return `${num(cx + Math.cos(angle) * r)} ${num(cy + Math.sin(angle) * r)}`
  }
  const inner = () => radius * (0.925 + random() * 0.05)
  const start = at(0, inner())
  let from = 0
  const parts = Array.from({ length: bumps }, (_, i) => {
    const to = i === bumps - 1 ? bumps : i + 1 + (random() - 0.5) * 0.55
    const step = to - from
    const bump = `Q${at(from + step * 0.2, radius * 0.995)} ${at(from + step * 0.5, radius * 0.998)}Q${at(from + step * 0.8, radius * 0.995)} ${i === bumps - 1 ? start : at(to, inner())}`
    from = to
    return bump
  })
  return `M${start}${parts.join('')}Z`
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
  const ring = leafyRing(cx, cy, full, randomFrom(`${placement.id} plan`))
  const shapes: Shape[] = [
    path(ring, { fill: look.fill, opacity: FULL[look.dress] }),
    path(leafyRing(cx, cy, Math.max(today, 0.5), randomFrom(`${placement.id} today`)), { fill: look.fill, stroke: 'foliage-shade', strokePx: 0.6, opacity: TODAY[look.dress] }),
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

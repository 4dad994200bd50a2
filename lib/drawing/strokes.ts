/** The marks inside a crown: foliage texture, flowers, stems, bare branches, blades. All thrown from one seed. */
import type { Texture } from '../plants'
import type { Envelope, Place, Spot } from './envelope'
import { num, xy } from './path'
import type { Random } from './random'

interface Grain {
  /** One stroke to about this many square inches. */
  area: number
  most: number
  size: number
}

const GRAINS: Record<Texture, Grain> = {
  fine: { area: 30, most: 48, size: 2.2 },
  medium: { area: 46, most: 42, size: 3.2 },
  coarse: { area: 80, most: 40, size: 5 },
}

export type Pen = (spot: Spot) => string

/** A pen that writes spots of a crown as scene path data. */
export function penFor(place: Place): Pen {
  return (spot) => {
    const dot = place(spot)
    return xy(dot.x, dot.y)
  }
}

/** A spot inside the crown, off its edge by `margin` (share). */
function throwSpot(envelope: Envelope, random: Random, margin: number): Spot {
  const { bottom, top, radius } = envelope
  const z = bottom + (top - bottom) * (0.04 + 0.9 * random() ** 0.85)
  return { x: radius(z) * (random() * 2 - 1) * (1 - margin), z }
}

const keepIn = (envelope: Envelope, spot: Spot): Spot => {
  const z = Math.min(Math.max(spot.z, envelope.crown.z0), envelope.top)
  const most = z < envelope.bottom ? Math.max(envelope.at(0).x, 0) : envelope.radius(z) * 0.97
  return { x: Math.max(-most, Math.min(most, spot.x)), z }
}

const sizeOfCrown = (envelope: Envelope) => Math.max(1, envelope.widest * (envelope.top - envelope.bottom) * 1.5)

/** One stroke of a texture, about `size` long, leaning outwards. */
function stroke(texture: Texture, spot: Spot, size: number, random: Random): Spot[] {
  const lean = (spot.x >= 0 ? 1 : -1) * (0.25 + random() * 0.6)
  if (texture === 'fine') return [spot, { x: spot.x + lean * size * 0.7, z: spot.z + size }]
  const wide = texture === 'coarse' ? 0.9 : 0.7
  return [{ x: spot.x - size * wide, z: spot.z }, { x: spot.x + lean * size * 0.3, z: spot.z + size * 0.9 }, { x: spot.x + size * wide, z: spot.z - size * 0.1 }]
}

/** Sparse texture: ticks (fine), small arcs (medium), leaf curves (coarse), denser on the shaded side. */
export function textureStrokes(envelope: Envelope, texture: Texture, random: Random, pen: Pen): string {
  const grain = GRAINS[texture]
  const count = Math.min(grain.most, Math.max(5, Math.round(sizeOfCrown(envelope) / grain.area)))
  const size = Math.min(grain.size * Math.max(1, envelope.widest / 45), envelope.widest * 0.3)
  const parts: string[] = []
  for (let i = 0; i < count; i += 1) {
    const spot = throwSpot(envelope, random, 0.14)
    if (spot.x < 0 && random() < 0.45) continue
    const marks = stroke(texture, spot, size * (0.7 + random() * 0.5), random).map((at) => keepIn(envelope, at))
    parts.push(marks.length === 2 ? `M${pen(marks[0]!)}L${pen(marks[1]!)}` : `M${pen(marks[0]!)}Q${pen(marks[1]!)} ${pen(marks[2]!)}`)
  }
  return parts.join('')
}

/** Masses of leaves: short rows of bumps inside the crown, open below, as one sketches a shrub. */
export function leafMasses(envelope: Envelope, random: Random, pen: Pen): string {
  const { bottom, top, radius, widest } = envelope
  const count = Math.min(9, Math.max(2, Math.round(Math.sqrt(sizeOfCrown(envelope)) / 14)))
  const parts: string[] = []
  for (let i = 0; i < count; i += 1) {
    const z = bottom + (top - bottom) * (0.16 + (0.68 * (i + random())) / count)
    const size = Math.min(widest * 0.16, (top - bottom) * 0.1) * (0.8 + random() * 0.5)
    const x = radius(z) * (random() * 1.5 - 0.85)
    const bumps = [-1.5, -0.5, 0.5].map((at) => {
      const lift = (spot: number) => size * (0.9 - 0.28 * spot * spot)
      const middle = keepIn(envelope, { x: x + (at + 0.5) * size, z: z + lift(at + 0.5) + size * 0.55 })
      return `Q${pen(middle)} ${pen(keepIn(envelope, { x: x + (at + 1) * size, z: z + lift(at + 1) }))}`
    })
    parts.push(`M${pen(keepIn(envelope, { x: x - 1.5 * size, z: z + size * 0.27 }))}${bumps.join('')}`)
  }
  return parts.join('')
}

/** Needle branches in tiers, drooping from the axis: for cones. */
export function tierStrokes(envelope: Envelope, random: Random, pen: Pen): string {
  const { bottom, top, radius } = envelope
  const count = Math.min(16, Math.max(5, Math.round((top - bottom) / 9)))
  const parts: string[] = []
  for (let i = 0; i < count; i += 1) {
    const z = bottom + ((top - bottom) * (i + 0.4 + random() * 0.4)) / count
    for (const way of [-1, 1]) {
      const far = radius(z) * (0.45 + random() * 0.4) * way
      const near = far * (0.25 + random() * 0.2)
      parts.push(`M${pen({ x: near, z: z + Math.abs(far) * 0.1 })}Q${pen({ x: (near + far) / 2, z: z + Math.abs(far) * 0.12 })} ${pen(keepIn(envelope, { x: far, z: z - Math.abs(far) * 0.16 }))}`)
    }
  }
  return parts.join('')
}

/** Blades from the foot to the edge: grasses, and the hanging shoots of arching and weeping plants. */
export function bladeStrokes(envelope: Envelope, random: Random, pen: Pen, arch: number): string {
  const { bottom } = envelope
  const count = Math.min(42, Math.max(12, Math.round(envelope.widest * 0.9)))
  const parts: string[] = []
  for (let i = 0; i < count; i += 1) {
    const way = i % 2 ? 1 : -1
    const tip = envelope.at(0.3 + 0.68 * random())
    const end = { x: tip.x * way * 0.96, z: bottom + (tip.z - bottom) * 0.96 }
    const from = { x: end.x * 0.12 + (random() - 0.5) * envelope.at(0).x * 0.4, z: bottom }
    const bend = keepIn(envelope, { x: from.x + (end.x - from.x) * 0.35, z: bottom + (end.z - bottom) * (0.8 + arch * 0.3) })
    parts.push(`M${pen(from)}Q${pen(bend)} ${pen(keepIn(envelope, end))}`)
  }
  return parts.join('')
}

/** Flowers as small rounds, one path for each ink; more towards the top, where the light is. */
export function flowerDots(envelope: Envelope, inks: number, random: Random, pen: Pen): string[] {
  const count = Math.min(46, Math.max(7, Math.round(sizeOfCrown(envelope) / 75)))
  const radius = Math.min(Math.max(envelope.widest * 0.05, 0.9), 2.6)
  const paths: string[][] = Array.from({ length: inks }, () => [])
  for (let i = 0; i < count; i += 1) {
    const { bottom, top } = envelope
    const z = bottom + (top - bottom) * (0.15 + 0.8 * Math.sqrt(random()))
    const most = Math.max(0, envelope.radius(z) - radius)
    const r = num(Math.min(radius * (0.75 + random() * 0.5), Math.max(top - z, 0.5)))
    const spot = { x: most * (random() * 2 - 1), z: Math.min(z, top - r) }
    paths[i % inks]!.push(`M${pen({ x: spot.x - r, z: spot.z })}a${r} ${r} 0 1 1 ${num(2 * r)} 0a${r} ${r} 0 1 1 ${num(-2 * r)} 0Z`)
  }
  return paths.map((parts) => parts.join(''))
}

/** Stems from the soil into the crown; one trunk, or several for shrubs and multi-stemmed trees. */
export function stems(envelope: Envelope, count: number, random: Random, pen: Pen): string {
  const { crown, bottom, top } = envelope
  const reach = bottom + (top - bottom) * 0.35
  const spread = Math.min(envelope.at(0).x * 0.5, envelope.widest * 0.4)
  return Array.from({ length: count }, (_, i) => {
    const side = count === 1 ? 0 : (i / (count - 1)) * 2 - 1
    const foot = { x: side * Math.min(3, spread * 0.3), z: crown.z0 }
    const end = keepIn(envelope, { x: side * spread * (0.8 + random() * 0.4), z: reach })
    return `M${pen(foot)}Q${pen({ x: foot.x + (end.x - foot.x) * 0.25, z: crown.z0 + (reach - crown.z0) * 0.6 })} ${pen(end)}`
  }).join('')
}

export interface Wood {
  /** The single trunk of a tree; '' otherwise. */
  trunk: string
  limbs: string
  twigs: string
}

/** Twigs off a limb, each with twigs of its own; none reaches beyond the crown or below the fork. */
function twigsOf(envelope: Envelope, limb: [Spot, Spot, Spot], { random, pen, floor }: { random: Random; pen: Pen; floor: number }): string {
  const many = envelope.widest > 18 ? 6 : 3
  const parts: string[] = []
  const shoot = (from: Spot, angle: number, long: number): Spot => {
    const to = keepIn(envelope, { x: from.x + Math.cos(angle) * long, z: Math.max(from.z + Math.sin(angle) * long, floor) })
    parts.push(`M${pen(from)}L${pen(to)}`)
    return to
  }
  for (let i = 0; i < many; i += 1) {
    const t = 0.34 + (0.62 * (i + random() * 0.6)) / many
    const from = along(...limb, t)
    const ahead = along(...limb, Math.min(1, t + 0.1))
    const angle = Math.atan2(ahead.z - from.z, ahead.x - from.x) + (i % 2 ? 1 : -1) * (0.45 + random() * 0.4)
    const long = (1.15 - t) * envelope.widest * 0.5 * (0.7 + random() * 0.5)
    const end = shoot(from, angle, long)
    if (many > 3) {
      const middle = { x: (from.x + end.x) / 2, z: (from.z + end.z) / 2 }
      shoot(middle, angle + 0.5 + random() * 0.3, long * 0.45)
      shoot(middle, angle - 0.5 - random() * 0.3, long * 0.4)
    }
  }
  return parts.join('')
}

/** A bare plant: limbs to the edge of the crown and twigs off them, none reaching beyond it. */
export function bareBranches(envelope: Envelope, single: boolean, random: Random, pen: Pen): Wood {
  const { crown, bottom, top } = envelope
  const limbs: string[] = []
  const twigs: string[] = []
  const count = Math.min(13, Math.max(7, Math.round(envelope.widest / 6)))
  const fork = single ? Math.max(bottom, crown.z0 + (top - crown.z0) * 0.14) : crown.z0
  for (let i = 0; i < count; i += 1) {
    const way = i % 2 ? 1 : -1
    const tip = envelope.at(0.25 + (0.74 * (i + random() * 0.8)) / count)
    const end = { x: tip.x * way * 0.96, z: Math.max(bottom + (tip.z - bottom) * 0.98, fork) }
    const low = single ? fork + (end.z - fork) * 0.3 * random() : fork
    const from = { x: single ? 0 : way * Math.min(2.5, envelope.at(0).x * 0.2) * random(), z: low }
    const bend = { x: from.x + (end.x - from.x) * (0.25 + random() * 0.25), z: low + (end.z - low) * 0.6 }
    limbs.push(`M${pen(from)}Q${pen(bend)} ${pen(end)}`)
    twigs.push(twigsOf(envelope, [from, bend, end], { random, pen, floor: fork }))
  }
  const tall = fork + (top - fork) * 0.1
  const trunk = single ? `M${pen({ x: 0, z: crown.z0 })}L${pen({ x: 0, z: tall })}` : ''
  return { trunk, limbs: limbs.join(''), twigs: twigs.join('') }
}

function along(a: Spot, b: Spot, c: Spot, t: number): Spot {
  const s = 1 - t
  return { x: s * s * a.x + 2 * s * t * b.x + t * t * c.x, z: s * s * a.z + 2 * s * t * b.z + t * t * c.z }
}

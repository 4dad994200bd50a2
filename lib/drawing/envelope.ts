/**
 * The true outline of a crown as a line one can walk along, and a drawn edge inside it. The crown's radius is
 * concave over its height, so the crown is convex: every curve whose points lie on or within it stays within it.
 */
import { radiusAt, type Crown } from '../spacing'
import { xy, type Dot } from './path'
import type { Random } from './random'

const STEPS = 22

/** Points in the crown's own frame: x from the axis, z height on the facade. */
export interface Spot {
  x: number
  z: number
}

export interface Envelope {
  crown: Crown
  bottom: number
  top: number
  /** Largest radius. */
  widest: number
  middle: number
  /** Length of one side from the foot to the tip. */
  length: number
  /** A point of the right-hand side by its share of the length, 0 foot to 1 tip. */
  at: (share: number) => Spot
  radius: (z: number) => number
}

function halfProfile(crown: Crown, bottom: number, top: number): Spot[] {
  const points: Spot[] = []
  for (let i = 0; i <= STEPS; i += 1) {
    // Closer together towards the tip, where the outline turns fastest.
    const share = Math.sin((i / STEPS) * (Math.PI / 2))
    const z = bottom + (top - bottom) * share
    points.push({ x: Math.max(0, radiusAt(crown, z)), z })
  }
  if (points.at(-1)!.x > 0) points.push({ x: 0, z: top })
  return points
}

/** Lays the outline of a crown out as a walkable line. */
export function envelopeOf(crown: Crown): Envelope {
  const bottom = crown.z0 + crown.clearStem
  const top = Math.max(crown.z0 + crown.height, bottom + 0.1)
  const points = halfProfile(crown, bottom, top)
  const sums = [0]
  for (let i = 1; i < points.length; i += 1) {
    sums.push(sums[i - 1]! + Math.hypot(points[i]!.x - points[i - 1]!.x, points[i]!.z - points[i - 1]!.z))
  }
  const length = sums.at(-1)!
  const middle = sums.length >> 1
  const at = (share: number): Spot => {
    const goal = Math.min(Math.max(share, 0), 1) * length
    let i = sums[middle]! < goal ? middle : 1
    while (i < sums.length - 1 && sums[i]! < goal) i += 1
    const [a, b] = [points[i - 1]!, points[i]!]
    const t = (goal - sums[i - 1]!) / (sums[i]! - sums[i - 1]! || 1)
    return { x: a.x + (b.x - a.x) * t, z: a.z + (b.z - a.z) * t }
  }
  const widest = points.reduce((most, { x }) => Math.max(most, x), 0)
  return { crown, bottom, top, widest, length, middle: (bottom + top) / 2, at, radius: (z) => Math.max(0, radiusAt(crown, z)) }
}

/** How an edge is drawn: leafy bumps, needles, or blades of grass. */
export type Edge = 'leafy' | 'spiky' | 'bladed'

export interface EdgeStyle {
  edge: Edge
  /** Bumps on one side, foot to tip. */
  bumps: number
  /** Deepest notch, inches. */
  depth: number
}

const inward = (spot: Spot, middle: number, share: number): Spot => ({ x: spot.x * (1 - share), z: spot.z + (middle - spot.z) * share })

/** Writes spots as scene path data. */
export type Place = (spot: Spot) => Dot

interface Bump {
  /** Where the bump starts and ends on the side, shares of its length. */
  foot: number
  tip: number
  notch: Spot
}

/** The bumps of one side, foot to tip: notches are thrown, peaks stand on the true outline. */
function bumpsOf(envelope: Envelope, { bumps, depth }: EdgeStyle, random: Random): Bump[] {
  let foot = 0
  return Array.from({ length: bumps }, (_, i) => {
    const tip = i === bumps - 1 ? 1 : (i + 1 + (random() - 0.5) * 0.7) / bumps
    const spot = envelope.at(foot + (tip - foot) * (0.35 + random() * 0.3))
    const reach = Math.hypot(spot.x, spot.z - envelope.middle) || 1
    const bump = { foot, tip, notch: inward(spot, envelope.middle, Math.min(0.4, (depth * (0.3 + random() * 0.7)) / reach)) }
    foot = tip
    return bump
  })
}

/** Path data along bumps, after a point at their first end. */
function edgeData(envelope: Envelope, bumps: readonly Bump[], edge: Edge, write: (spot: Spot) => string): string {
  const up = bumps[0]?.foot === 0
  return bumps.map(({ foot, tip, notch }) => {
    const [from, to] = up ? [foot, tip] : [tip, foot]
    if (edge !== 'leafy') return `L${write(notch)}L${write(envelope.at(to))}`
    const lean = (to - from) * 0.28
    return `Q${write(envelope.at(from + lean))} ${write(notch)}Q${write(envelope.at(to - lean))} ${write(envelope.at(to))}`
  }).join('')
}

export interface Drawn {
  /** The whole silhouette, closed. */
  outline: string
  /** The side away from the light, closed: between the right edge and a wavering line inside. */
  shade: string
}

/**
 * The drawn silhouette as scene path data: right side up, left side down, and a foot that is straight on the
 * ground or ragged above a clear stem. Never outside the crown, and touching it at every peak.
 */
export function drawSilhouette(envelope: Envelope, style: EdgeStyle, random: Random, place: Place): Drawn {
  const write = (spot: Spot) => {
    const dot = place(spot)
    return xy(dot.x, dot.y)
  }
  const mirror = (spot: Spot) => write({ x: -spot.x, z: spot.z })
  const right = edgeData(envelope, bumpsOf(envelope, style, random), style.edge, write)
  const left = edgeData(envelope, bumpsOf(envelope, style, random).toReversed(), style.edge, mirror)
  const foot = `M${write(envelope.at(0))}`
  return {
    outline: `${foot}${right}${left}${underside(envelope, style, random, write)}Z`,
    shade: `${foot}${right}${innerLine(envelope, random, write)}Z`,
  }
}

/** From the tip back to the foot, right of the middle, in bumps towards the light: the edge of the shaded side. */
function innerLine(envelope: Envelope, random: Random, write: (spot: Spot) => string): string {
  const { bottom, top, radius } = envelope
  const count = Math.min(11, Math.max(5, Math.round((top - bottom) / 9)))
  const zAt = (step: number) => top + ((bottom - top) * step) / count
  return Array.from({ length: count }, (_, i) => {
    const [middle, end] = [zAt(i + 0.4), zAt(i + 1)]
    const lean = 0.5 - 0.2 * ((i + 1) / count) + 0.12 * random()
    return `Q${write({ x: radius(middle) * (lean - 0.28 - 0.1 * random()), z: middle })} ${write({ x: radius(end) * lean, z: end })}`
  }).join('')
}

/** Above a clear stem the foot of the crown hangs in bumps: low points on the crown's underside. */
function underside(envelope: Envelope, style: EdgeStyle, random: Random, write: (spot: Spot) => string): string {
  const foot = envelope.at(0)
  if (envelope.crown.clearStem < 1 || foot.x < 2) return ''
  const count = Math.max(3, Math.min(14, Math.round((foot.x * 2) / Math.max(style.depth * 3, 5))))
  const lift = Math.min(style.depth * 1.4, (envelope.top - envelope.bottom) * 0.2)
  return Array.from({ length: count }, (_, i) => {
    const from = -foot.x + (foot.x * 2 * i) / count
    const to = -foot.x + (foot.x * 2 * (i + 1)) / count
    const z = foot.z + (i === count - 1 ? 0 : lift * (0.4 + random() * 0.6))
    const most = envelope.radius(z)
    return `Q${write({ x: (from + to) / 2, z: foot.z })} ${write({ x: Math.max(-most, Math.min(most, to)), z })}`
  }).join('')
}

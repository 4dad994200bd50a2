/**
 * The body of a plant in space: a solid of revolution about its axis, by habit, as it is at some age.
 * Heights are on the z axis, radii from the axis; inches.
 */
import type { Habit } from '../plants/types'
import { CONTACT } from './geometry/contact'
import { inverseOf, PROFILES, shareAt, squareTo, whereItFalls, widthTo } from './profile'
import type { Inches, Size } from './types'

export interface Crown {
  x: Inches
  y: Inches
  /** Soil at the axis. */
  z0: Inches
  /** Top above the soil, as kept. */
  height: Inches
  /** Twice the largest radius, as kept. */
  spread: Inches
  /** No foliage below this height above the soil. */
  clearStem: Inches
  habit: Habit
  /** The uncut size whose shape this is; absent where nothing is cut away. */
  natural?: Size
}

export interface Axis {
  x: Inches
  y: Inches
  z0: Inches
  habit: Habit
}

/** What shears leave of a size: the largest share of its height that stays foliage-free. */
export const MOST_CLEAR = 0.6

/**
 * The crown of a natural size, cut to a kept size as shears do where one is given: nothing above the kept height,
 * nothing farther out than half the kept spread. A kept height lowers the clear stem to 0.6 of itself.
 */
export function makeCrown({ x, y, z0, habit }: Axis, natural: Size & { clearStem: Inches }, kept?: Partial<Size>): Crown {
  const { height, spread, clearStem } = natural
  const uncut: Crown = { x, y, z0, height, spread, clearStem, habit }
  if (!kept) return uncut
  const keptHeight = kept.height ?? Infinity
  const keptSpread = kept.spread ?? Infinity
  if (keptHeight >= height && keptSpread >= spread) return uncut
  const top = Math.min(height, keptHeight)
  const bottom = Math.min(clearStem, MOST_CLEAR * keptHeight)
  const low: Crown = { x, y, z0, height: top, spread, clearStem: bottom, habit, natural: { height, spread } }
  return { ...low, spread: Math.min(2 * radiusAt(low, peakOf(low).from), keptSpread) }
}

/** Height of the lowest foliage on the z axis. */
export const footOf = (crown: Crown): Inches => crown.z0 + crown.clearStem
/** Height of the top on the z axis. */
export const topOf = (crown: Crown): Inches => crown.z0 + crown.height
/** Width of the plant had it never been clipped. */
export const naturalSpread = (crown: Crown): Inches => (crown.natural ?? crown).spread
const lengthOf = (crown: Crown): Inches => (crown.natural ?? crown).height - crown.clearStem

/** Heights are compared within this, for the same height comes by different sums. */
const NOISE = 1e-9

/** Radius of the crown at a height on the z axis; 0 above and below it. */
export function radiusAt(crown: Crown, z: Inches): Inches {
  const above = z - footOf(crown)
  const length = lengthOf(crown)
  if (above < -NOISE || z - topOf(crown) > NOISE || length <= 0) return 0
  const radius = (naturalSpread(crown) / 2) * shareAt(PROFILES[crown.habit], Math.min(1, Math.max(0, above / length)))
  return Math.min(radius, crown.spread / 2)
}

/** The heights between which the crown is widest: one height, or a range where shears cut it straight. */
function peakOf(crown: Crown): { from: Inches; to: Inches } {
  const foot = footOf(crown)
  const length = lengthOf(crown)
  const top = topOf(crown)
  const profile = PROFILES[crown.habit]
  const share = Math.min(1, crown.spread / naturalSpread(crown))
  if (share >= 1) {
    const z = Math.min(top, foot + profile.shoulder * length)
    return { from: z, to: z }
  }
  const { from, to } = inverseOf(profile, share)
  return { from: Math.min(top, foot + from * length), to: Math.min(top, foot + to * length) }
}

/** The largest radius between two heights; 0 where the crown and the range share no more than a contact. */
export function reach(crown: Crown, z1: Inches, z2: Inches): Inches {
  const low = Math.max(z1, footOf(crown))
  const high = Math.min(z2, topOf(crown))
  if (high - low <= CONTACT) return 0
  const widest = footOf(crown) + PROFILES[crown.habit].shoulder * lengthOf(crown)
  return radiusAt(crown, Math.min(high, Math.max(low, widest)))
}

/**
 * The interval of heights at which the crown extends at least `d` from its axis; null where it extends no more
 * than a contact past `d`. Closed form: the profile rises straight to its shoulder and falls beyond it.
 */
export function span(crown: Crown, d: Inches): { from: Inches; to: Inches } | null {
  const length = lengthOf(crown)
  if (length <= 0 || crown.spread / 2 - d <= CONTACT) return null
  const u = inverseOf(PROFILES[crown.habit], Math.max(0, d) / (naturalSpread(crown) / 2))
  const from = footOf(crown) + u.from * length
  const to = Math.min(footOf(crown) + u.to * length, topOf(crown))
  return to - from > CONTACT ? { from, to } : null
}

/** Largest sum of the two radii between two heights that both crowns have foliage at. */
function widestSum(a: Crown, b: Crown, low: Inches, high: Inches): Inches {
  const clamp = (z: Inches) => Math.min(high, Math.max(low, z))
  const [one, other] = [peakOf(a), peakOf(b)]
  const [lower, upper, first, second] = one.from <= other.from ? [a, b, one, other] : [b, a, other, one]
  const from = clamp(first.to)
  const to = clamp(second.from)
  const sum = (z: Inches) => radiusAt(lower, z) + radiusAt(upper, z)
  // Between the peaks the lower crown draws in, ever faster, while the upper one widens in a straight line.
  const ends = Math.max(sum(from), sum(to))
  if (to - from <= NOISE) return ends
  const profile = PROFILES[upper.habit]
  const rise = profile.shoulder === 0 ? 0 : ((1 - profile.base) / profile.shoulder) * (naturalSpread(upper) / 2 / lengthOf(upper))
  const length = lengthOf(lower)
  const share = (z: Inches) => Math.min(1, Math.max(PROFILES[lower.habit].shoulder, (z - footOf(lower)) / length))
  const u = whereItFalls(PROFILES[lower.habit], (rise * length) / (naturalSpread(lower) / 2), { from: share(from), to: share(to) })
  return Math.max(ends, sum(clamp(footOf(lower) + u * length)))
}

/**
 * How far two crowns reach into each other at the height where they do so most; negative where they stand apart by
 * that much, null where they share no height. `distance` is that of their axes in plan.
 */
export function overlapOf(a: Crown, b: Crown, distance: Inches): Inches | null {
  const low = Math.max(footOf(a), footOf(b))
  const high = Math.min(topOf(a), topOf(b))
  return high - low <= CONTACT ? null : widestSum(a, b, low, high) - distance
}

/** Sums over the crown from the foot up, where `to(u)` is the sum over the natural profile up to u and `straight` that of a cut side. */
function sumOver(crown: Crown, to: (u: number) => number, straight: number): number {
  const length = lengthOf(crown)
  if (length <= 0) return 0
  const end = Math.min(1, (crown.height - crown.clearStem) / length)
  const share = crown.spread / naturalSpread(crown)
  if (share >= 1) return length * to(end)
  const cut = inverseOf(PROFILES[crown.habit], share)
  const [from, until] = [Math.min(cut.from, end), Math.min(cut.to, end)]
  return length * (to(from) + straight * (until - from) + to(end) - to(until))
}

/** Volume of the crown, cubic inches; closed form, cut or not. */
export function crownVolume(crown: Crown): number {
  const radius = naturalSpread(crown) / 2
  return Math.PI * radius * radius * sumOver(crown, (u) => squareTo(PROFILES[crown.habit], u), (crown.spread / 2 / radius) ** 2)
}

/** Area of the crown seen square-on, square inches; closed form but for cut crowns of two habits (quadrature). */
export function silhouetteArea(crown: Crown): number {
  const radius = naturalSpread(crown) / 2
  return 2 * radius * sumOver(crown, (u) => widthTo(PROFILES[crown.habit], u), crown.spread / 2 / radius)
}

/**
 * The crown seen square-on as a closed polygon of { x, z }: from the foot of the foliage at left over the top and
 * down at right, the clear stem left out. Every corner of the shape is a point; `steps` more crowd where it curves.
 */
export function silhouette(crown: Crown, steps = 24): { x: Inches; z: Inches }[] {
  const foot = footOf(crown)
  const top = topOf(crown)
  const length = lengthOf(crown)
  const { shoulder } = PROFILES[crown.habit]
  const curve = Array.from({ length: steps + 1 }, (_, i) => foot + length * (shoulder + (1 - shoulder) * Math.sin((Math.PI / 2) * (i / steps))))
  const peak = peakOf(crown)
  const heights = [foot, peak.from, peak.to, ...curve, top].filter((z) => z >= foot && z <= top).sort((a, b) => a - b)
  const levels = heights.filter((z, i) => i === 0 || z > heights[i - 1]!)
  const left = levels.map((z) => ({ x: crown.x - radiusAt(crown, z), z }))
  const right = levels.map((z) => ({ x: crown.x + radiusAt(crown, z), z })).reverse()
  return [...left, ...right]
}

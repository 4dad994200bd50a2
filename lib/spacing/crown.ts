/**
 * The body of a plant in space: a solid of revolution about its axis, by habit, as it is at some age.
 * Heights are on the z axis, radii from the axis; inches.
 */
import type { Habit } from '../plants/types'
import { CONTACT } from './geometry/wall'
import type { Inches } from './types'

interface Profile {
  base: number
  shoulder: number
  m: number
  n: number
}

/** Half-width by height, as shares: straight from `base` up to the shoulder, then a superellipse to the tip. */
const PROFILES: Record<Habit, Profile> = {
  columnar: { base: 0.9, shoulder: 0.8, m: 2, n: 2 },
  upright: { base: 0.6, shoulder: 0.5, m: 2, n: 2 },
  pyramidal: { base: 1, shoulder: 0, m: 1, n: 1 },
  rounded: { base: 0.7, shoulder: 0.45, m: 2, n: 2 },
  mounded: { base: 1, shoulder: 0, m: 2, n: 2 },
  spreading: { base: 0.8, shoulder: 0.4, m: 3, n: 2 },
  vase: { base: 0.3, shoulder: 0.75, m: 2, n: 2 },
  arching: { base: 0.5, shoulder: 0.6, m: 2, n: 2 },
  weeping: { base: 0.9, shoulder: 0.5, m: 2, n: 2 },
  clump: { base: 0.4, shoulder: 0.65, m: 2, n: 2 },
  'multi-stem': { base: 0.6, shoulder: 0.5, m: 2, n: 2 },
  prostrate: { base: 1, shoulder: 0, m: 4, n: 2 },
}

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
  /** The uncut body whose shape this is; absent where nothing is cut. */
  natural?: { height: Inches; spread: Inches }
}

/** The crown of a natural size, cut to a kept size as shears do where one is given. */
export function makeCrown(
  axis: { x: Inches; y: Inches; z0: Inches; habit: Habit },
  natural: { height: Inches; spread: Inches; clearStem: Inches },
  kept: { height?: Inches; spread?: Inches } = {},
): Crown {
  const height = Math.min(natural.height, kept.height ?? Infinity)
  const clearStem = height < natural.height ? Math.min(natural.clearStem, 0.6 * height) : natural.clearStem
  if (height === natural.height && kept.spread === undefined) return { ...axis, ...natural }
  const uncut: Crown = { ...axis, height, spread: natural.spread, clearStem, natural: { height: natural.height, spread: natural.spread } }
  const widest = 2 * reach(uncut, -Infinity, Infinity)
  return { ...uncut, spread: Math.min(widest, kept.spread ?? Infinity) }
}

const bottomOf = (crown: Crown) => crown.z0 + crown.clearStem
/** Height of the top on the z axis. */
export const topOf = (crown: Crown): Inches => crown.z0 + crown.height
/** Length of the foliage along the axis, uncut. */
const lengthOf = (crown: Crown) => (crown.natural ?? crown).height - crown.clearStem
/** Largest radius of the uncut body. */
const halfOf = (crown: Crown) => (crown.natural ?? crown).spread / 2

function profileAt({ base, shoulder, m, n }: Profile, u: number): number {
  if (u < shoulder) return base + ((1 - base) * u) / shoulder
  const v = (u - shoulder) / (1 - shoulder)
  return v >= 1 ? 0 : (1 - v ** m) ** (1 / n)
}

/** Radius of the crown at a height on the z axis; 0 above and below it. */
export function radiusAt(crown: Crown, z: Inches): Inches {
  const length = lengthOf(crown)
  if (length <= 0 || z < bottomOf(crown) || z > topOf(crown)) return 0
  const u = Math.min(1, (z - bottomOf(crown)) / length)
  return Math.min(halfOf(crown) * profileAt(PROFILES[crown.habit], u), crown.spread / 2)
}

/** Height at which the uncut crown is widest. */
const shoulderOf = (crown: Crown) => bottomOf(crown) + PROFILES[crown.habit].shoulder * lengthOf(crown)

/** The largest radius between two heights; 0 where the crown and the range share no more than a contact. */
export function reach(crown: Crown, z1: Inches, z2: Inches): Inches {
  const low = Math.max(z1, bottomOf(crown))
  const high = Math.min(z2, topOf(crown))
  if (high - low <= CONTACT) return 0
  return radiusAt(crown, Math.min(Math.max(shoulderOf(crown), low), high))
}

/**
 * The interval of heights at which the crown extends at least `d` from its axis; null where that is no more
 * than a contact. Closed form: the profile rises straight to its shoulder and falls beyond it.
 */
export function span(crown: Crown, d: Inches): { from: Inches; to: Inches } | null {
  const length = lengthOf(crown)
  const half = halfOf(crown)
  if (length <= 0 || half <= 0 || crown.spread / 2 - d <= CONTACT) return null
  const { base, shoulder, m, n } = PROFILES[crown.habit]
  const q = Math.max(0, d) / half
  const u1 = q <= base || shoulder === 0 ? 0 : (shoulder * (q - base)) / (1 - base)
  const u2 = shoulder + (1 - shoulder) * (1 - q ** n) ** (1 / m)
  const from = bottomOf(crown) + u1 * length
  const to = Math.min(bottomOf(crown) + u2 * length, topOf(crown))
  return to - from > CONTACT ? { from, to } : null
}

/** Sum of f over the crown's heights by Simpson's rule, with the steep tip spread out so that it converges fast. */
function integrate(crown: Crown, f: (radius: Inches) => number): number {
  const shoulder = Math.min(shoulderOf(crown), topOf(crown))
  const tip = bottomOf(crown) + lengthOf(crown)
  const depth = tip - shoulder
  const below = simpson((z) => f(radiusAt(crown, z)), bottomOf(crown), shoulder)
  if (depth <= 0) return below
  // z = tip - depth w^2 takes the square-root edge out of the integrand.
  const start = Math.sqrt(Math.max(0, tip - topOf(crown)) / depth)
  return below + simpson((w) => f(radiusAt(crown, Math.min(topOf(crown), tip - depth * w * w))) * 2 * depth * w, start, 1)
}

function simpson(f: (t: number) => number, from: number, to: number, steps = 400): number {
  if (!(to > from)) return 0
  const h = (to - from) / steps
  let sum = f(from) + f(to)
  for (let i = 1; i < steps; i++) sum += f(from + i * h) * (i % 2 === 1 ? 4 : 2)
  return (sum * h) / 3
}

/** Volume of the crown, cubic inches. */
export const crownVolume = (crown: Crown): number => integrate(crown, (radius) => Math.PI * radius * radius)

/** Area of the crown seen square-on, square inches. */
export const silhouetteArea = (crown: Crown): number => integrate(crown, (radius) => 2 * radius)

/**
 * The crown seen square-on as a closed polygon of { x, z }, from the foot of the foliage on the left over the top
 * and down on the right. Points crowd where it curves.
 */
export function silhouette(crown: Crown, steps = 24): { x: Inches; z: Inches }[] {
  const low = bottomOf(crown)
  const top = topOf(crown)
  const heights = Array.from({ length: steps + 1 }, (_, i) => low + (top - low) * Math.sin((Math.PI / 2) * (i / steps)))
  const left = heights.map((z) => ({ x: crown.x - radiusAt(crown, z), z }))
  const right = heights.map((z) => ({ x: crown.x + radiusAt(crown, z), z }))
  return [...left, ...right.reverse()]
}

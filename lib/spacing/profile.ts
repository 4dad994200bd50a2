/**
 * Half-width of a crown by height, as shares of its largest: straight from `base` up to the shoulder, then a
 * superellipse to the tip. u runs from 0 at the lowest foliage to 1 at the tip; the share is concave in u, so every
 * question asked of it has one answer.
 */
import type { Habit } from '../plants/types'

export interface Profile {
  base: number
  shoulder: number
  m: number
  n: number
}

export const PROFILES: Record<Habit, Profile> = {
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

/** v to the power m, for the few m there are. */
function power(v: number, m: number): number {
  if (m === 2) return v * v
  return m === 1 ? v : m === 3 ? v * v * v : m === 4 ? v * v * v * v : v ** m
}

const root = (value: number, m: number) => (m === 2 ? Math.sqrt(value) : m === 1 ? value : value ** (1 / m))

/** Share of the largest radius at u in [0, 1]. */
export function shareAt({ base, shoulder, m, n }: Profile, u: number): number {
  if (u < shoulder) return base + ((1 - base) * u) / shoulder
  const v = (u - shoulder) / (1 - shoulder)
  return v >= 1 ? 0 : root(1 - power(v, m), n)
}

/** The u from which and up to which the share is at least q, for q in [0, 1]: the closed inverse of `shareAt`. */
export function inverseOf({ base, shoulder, m, n }: Profile, q: number): { from: number; to: number } {
  const from = q <= base || shoulder === 0 ? 0 : (shoulder * (q - base)) / (1 - base)
  return { from: Math.min(from, shoulder), to: shoulder + (1 - shoulder) * root(Math.max(0, 1 - power(q, n)), m) }
}

/**
 * The u above the shoulder where the share falls as fast as `slope` per u (positive), between two u of that part:
 * the end where it falls faster or slower throughout. Above the shoulder the fall only steepens.
 */
export function whereItFalls({ shoulder, m, n }: Profile, slope: number, { from, to }: { from: number; to: number }): number {
  const steepness = slope * (1 - shoulder)
  if (n === 1) return steepness > 1 ? to : from
  const fallAt = (v: number) => (v >= 1 ? Infinity : (m * power(v, m) / v) / (2 * Math.sqrt(1 - power(v, m))))
  let low = (from - shoulder) / (1 - shoulder)
  let high = (to - shoulder) / (1 - shoulder)
  if (m === 2) return shoulder + (1 - shoulder) * Math.min(high, Math.max(low, steepness / Math.sqrt(1 + steepness * steepness)))
  for (let i = 0; i < 50; i++) {
    const middle = (low + high) / 2
    if (fallAt(middle) < steepness) low = middle
    else high = middle
  }
  return shoulder + (1 - shoulder) * low
}

/** Whole integrals over v of the part above the shoulder: of the share, by closed forms and beta functions. */
const UPPER: Record<number, number> = { 1: 1 / 2, 2: Math.PI / 4, 3: 0.8413092631952724, 4: 0.87401918476404 }

/** Nodes and weights of 16-point Gauss-Legendre quadrature on [-1, 1], the positive half. */
const GAUSS: readonly [number, number][] = [
  [0.0950125098376374, 0.1894506104550685], [0.2816035507792589, 0.1826034150449236], [0.4580167776572274, 0.1691565193950025],
  [0.6178762444026438, 0.1495959888165767], [0.755404408355003, 0.1246289712555339], [0.8656312023878318, 0.0951585116824928],
  [0.9445750230732326, 0.0622535239386479], [0.9894009349916499, 0.0271524594117541],
]

/** Integral of the share over v in [0, v], 0 <= v <= 1, of the part above the shoulder. */
function upperWidth({ m, n }: Profile, v: number): number {
  if (v >= 1) return UPPER[m]!
  if (n === 1) return v - (v * v) / 2
  if (m === 2) return (v * Math.sqrt(1 - v * v) + Math.asin(v)) / 2
  // t = 1 - w^2 takes the square-root edge at the tip out of the integrand.
  const low = Math.sqrt(1 - v)
  const half = (1 - low) / 2
  const middle = (1 + low) / 2
  const at = (w: number) => root(1 - power(1 - w * w, m), n) * 2 * w
  return GAUSS.reduce((sum, [node, weight]) => sum + weight * (at(middle - half * node) + at(middle + half * node)), 0) * half
}

/** Integral of the squared share over v in [0, v], of the part above the shoulder: closed for every habit. */
const upperSquare = ({ m, n }: Profile, v: number): number => (n === 1 ? (1 - (1 - v) ** 3) / 3 : v - power(v, m) * v / (m + 1))

function integral(profile: Profile, u: number, lower: (share: number) => number, upper: (v: number) => number): number {
  const { base, shoulder } = profile
  if (u >= shoulder) return lower(1) + (1 - shoulder) * upper((u - shoulder) / (1 - shoulder))
  return lower(base + ((1 - base) * u) / shoulder)
}

/** Integral of the share over u in [0, u]. */
export function widthTo(profile: Profile, u: number): number {
  const { base, shoulder } = profile
  const lower = (share: number) => (base === 1 ? 0 : (shoulder * (share * share - base * base)) / (2 * (1 - base)))
  return integral(profile, u, lower, (v) => upperWidth(profile, v))
}

/** Integral of the squared share over u in [0, u]. */
export function squareTo(profile: Profile, u: number): number {
  const { base, shoulder } = profile
  const lower = (share: number) => (base === 1 ? 0 : (shoulder * (share ** 3 - base ** 3)) / (3 * (1 - base)))
  return integral(profile, u, lower, (v) => upperSquare(profile, v))
}

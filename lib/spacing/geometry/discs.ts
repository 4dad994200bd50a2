/** How much of an outline lies under a number of discs: exact, by the rim of what is covered. Inches, square inches. */
import type { Inches, Point } from '../types'
import { isInside, polygonArea } from './polygon'
import { Stretches } from './stretches'

export interface Disc {
  x: Inches
  y: Inches
  r: Inches
}

/** Centres nearer than this are one, and arcs shorter than this are none. */
const NOISE = 1e-9

/** A disc and its rim, by angles from -pi to pi. */
interface Rim {
  disc: Disc
  /** The stretches that lie under other discs. */
  under: Stretches
  /** Where the outline meets it, in order. */
  cuts: number[]
  /** Lies whole under another. */
  isHidden: boolean
}

/** Angles run from -pi to pi: a stretch that passes the end goes on at the start. */
function addAngles(under: Stretches, middle: number, half: number): void {
  const from = middle - half
  const to = middle + half
  if (from < -Math.PI) under.add(from + 2 * Math.PI, Math.PI)
  if (to > Math.PI) under.add(-Math.PI, to - 2 * Math.PI)
  under.add(Math.max(from, -Math.PI), Math.min(to, Math.PI))
}

/** Marks what each of two hides of the other. A disc that is hidden whole hides nothing its own cover does not. */
function hideBoth(a: Rim, b: Rim): void {
  if (a.isHidden || b.isHidden) return
  const [dx, dy] = [b.disc.x - a.disc.x, b.disc.y - a.disc.y]
  const square = dx * dx + dy * dy
  const sum = a.disc.r + b.disc.r
  if (square >= sum * sum) return
  const distance = Math.sqrt(square)
  const more = a.disc.r - b.disc.r
  if (distance <= Math.abs(more) + NOISE) {
    // Of two alike the second is the hidden one.
    if (more >= 0) b.isHidden = true
    else a.isHidden = true
    return
  }
  const towards = Math.atan2(dy, dx)
  const lead = more * sum
  addAngles(a.under, towards, Math.acos(Math.min(1, Math.max(-1, (square + lead) / (2 * distance * a.disc.r)))))
  addAngles(b.under, towards > 0 ? towards - Math.PI : towards + Math.PI, Math.acos(Math.min(1, Math.max(-1, (square - lead) / (2 * distance * b.disc.r)))))
}

function rimsOf(discs: readonly Disc[]): Rim[] {
  const rims = discs.map((disc): Rim => ({ disc, under: new Stretches(), cuts: [], isHidden: false })).sort((a, b) => a.disc.x - a.disc.r - (b.disc.x - b.disc.r))
  for (let i = 0; i < rims.length; i++) {
    const right = rims[i]!.disc.x + rims[i]!.disc.r
    for (let j = i + 1; j < rims.length && rims[j]!.disc.x - rims[j]!.disc.r < right; j++) hideBoth(rims[i]!, rims[j]!)
  }
  return rims.filter(({ isHidden }) => !isHidden)
}

/** Where a line from `a` towards `b` enters and leaves a disc, as shares of the way, a touch included; null where it passes by. */
function chordOf({ x, y, r }: Disc, a: Point, b: Point): { from: number; to: number } | null {
  const [dx, dy, ax, ay] = [b.x - a.x, b.y - a.y, a.x - x, a.y - y]
  const square = dx * dx + dy * dy
  if (square === 0) return null
  const cross = ax * dy - ay * dx
  const inside = r * r * square - cross * cross
  if (inside < -NOISE * cross * cross) return null
  const middle = -(ax * dx + ay * dy) / square
  const half = Math.sqrt(Math.max(0, inside)) / square
  return { from: middle - half, to: middle + half }
}

/** The angles at which the outline crosses or touches a rim, in order. */
function crossings(disc: Disc, outline: readonly Point[]): number[] {
  const found: number[] = []
  for (let i = 0; i < outline.length; i++) {
    const [a, b] = [outline[i]!, outline[(i + 1) % outline.length]!]
    const chord = chordOf(disc, a, b)
    if (!chord) continue
    for (const t of [chord.from, chord.to]) {
      if (t >= -NOISE && t <= 1 + NOISE) found.push(Math.atan2(a.y + t * (b.y - a.y) - disc.y, a.x + t * (b.x - a.x) - disc.x))
    }
  }
  return found.sort((a, b) => a - b)
}

function atAngle({ x, y, r }: Disc, angle: number): Point {
  return { x: x + r * Math.cos(angle), y: y + r * Math.sin(angle) }
}

/** Sum of `x dy` along an arc: its chord, and the segment beyond it. */
function alongArc(disc: Disc, from: number, to: number): number {
  const [a, b] = [atAngle(disc, from), atAngle(disc, to)]
  return ((a.x + b.x) / 2) * (b.y - a.y) + (disc.r * disc.r * (to - from - Math.sin(to - from))) / 2
}

/** Sum of `x dy` along a stretch that the outline does not meet on the way; 0 where it runs outside. */
function alongPiece({ disc, cuts }: Rim, from: number, to: number, outline: readonly Point[]): number {
  if (to - from <= NOISE) return 0
  // A rim that the outline never meets is whole inside or whole outside: it has been asked.
  const isKnown = cuts.length === 0
  return isKnown || isInside(atAngle(disc, (from + to) / 2), outline) ? alongArc(disc, from, to) : 0
}

function alongStretch(rim: Rim, from: number, to: number, outline: readonly Point[]): number {
  let start = from
  let sum = 0
  for (const cut of rim.cuts) {
    if (cut <= start || cut >= to) continue
    sum += alongPiece(rim, start, cut, outline)
    start = cut
  }
  return sum + alongPiece(rim, start, to, outline)
}

/** Sum of `x dy` over the parts of a rim that lie under no other disc and inside the outline. */
function alongRim(rim: Rim, outline: readonly Point[]): number {
  rim.cuts = crossings(rim.disc, outline)
  if (rim.cuts.length === 0 && !isInside(atAngle(rim.disc, 0), outline)) return 0
  const { from, to } = rim.under.unite()
  let start = -Math.PI
  let sum = 0
  for (let i = 0; i < from.length; i++) {
    sum += alongStretch(rim, start, from[i]!, outline)
    start = to[i]!
  }
  return sum + alongStretch(rim, start, Math.PI, outline)
}

/** Sum of `x dy` over the parts of the outline that lie under discs. */
function alongOutline(discs: readonly Rim[], outline: readonly Point[]): number {
  const under = new Stretches()
  let sum = 0
  for (let i = 0; i < outline.length; i++) {
    const [a, b] = [outline[i]!, outline[(i + 1) % outline.length]!]
    under.clear()
    for (const { disc } of discs) {
      const chord = chordOf(disc, a, b)
      if (chord) under.add(Math.max(0, chord.from), Math.min(1, chord.to))
    }
    under.unite()
    for (let k = 0; k < under.from.length; k++) {
      const [from, to] = [under.from[k]!, under.to[k]!]
      sum += (a.x + ((from + to) / 2) * (b.x - a.x)) * (to - from) * (b.y - a.y)
    }
  }
  return sum
}

/** Area of the outline that lies under the discs, each spot counted once. The outline must not cross itself. */
export function areaUnder(discs: readonly Disc[], outline: readonly Point[]): number {
  const origin = outline[0]!
  const turned = polygonArea(outline) < 0 ? outline.toReversed() : outline
  // Sums of products are exact near zero: the outline is measured from one of its own points.
  const near = turned.map(({ x, y }) => ({ x: x - origin.x, y: y - origin.y }))
  const rims = rimsOf(discs.filter(({ r }) => r > 0).map(({ x, y, r }) => ({ x: x - origin.x, y: y - origin.y, r })))
  let sum = alongOutline(rims, near)
  for (const rim of rims) sum += alongRim(rim, near)
  return Math.max(0, sum)
}

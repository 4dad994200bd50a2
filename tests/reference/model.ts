/**
 * A second, plain model of crowns, sizes, growth, wall and soil, written from the specification and sharing no code with
 * the engine: crowns are polygons here. The oracle and the bench's polygon version stand on it.
 */
import polygonClipping, { type MultiPolygon, type Polygon } from 'polygon-clipping'
import type { Bound, Facade, Placement, Point, Size } from '@/lib/spacing'
import type { Habit, Plant } from '@/lib/plants/types'

interface Form { base: number; shoulder: number; m: number; n: number }

const form = (base: number, shoulder: number, m = 2, n = 2): Form => ({ base, shoulder, m, n })

const FORMS: Record<Habit, Form> = {
  columnar: form(0.9, 0.8), upright: form(0.6, 0.5), pyramidal: form(1, 0, 1, 1), rounded: form(0.7, 0.45),
  mounded: form(1, 0), spreading: form(0.8, 0.4, 3), vase: form(0.3, 0.75), arching: form(0.5, 0.6),
  weeping: form(0.9, 0.5), clump: form(0.4, 0.65), 'multi-stem': form(0.6, 0.5), prostrate: form(1, 0, 4),
}

export interface Solid {
  x: number
  y: number
  z0: number
  habit: Habit
  height: number
  spread: number
  clearStem: number
  kept: Partial<Size>
}

const HERBACEOUS = new Set(['perennial', 'grass', 'groundcover', 'fern', 'bulb', 'annual'])

/** Listed size at a bound: middle of the figures; a single figure spreads by 15 %; trees' high is 1.2 times the largest. */
export function listedSize(plant: Plant, bound: Bound): Size {
  const of = (least: number, most: number) => {
    if (bound === 'expected') return (least + most) / 2
    if (bound === 'low') return least === most ? 0.85 * least : least
    if (plant.category === 'tree') return 1.2 * most
    return least === most ? 1.15 * most : most
  }
  return { height: of(plant.heightMin, plant.heightMax), spread: of(plant.spreadMin, plant.spreadMax) }
}

export function matureSize(plant: Plant, placement: Placement, bound: Bound): Size {
  const { height, spread } = listedSize(plant, bound)
  return { height: Math.max(height, placement.planted.height), spread: Math.max(spread, placement.planted.spread) }
}

const INDEX = { low: 0, expected: 1, high: 2 } as const
const RATES = {
  tree: { slow: [6, 12, 20], moderate: [9, 18, 32], fast: [16, 30, 48] },
  shrub: { slow: [3, 5, 8], moderate: [7, 10, 14], fast: [13, 18, 24] },
  conifer: { slow: [1, 3, 6], moderate: [6, 8, 12], fast: [12, 15, 20] },
} as const

function isConiferShrub({ category, leaf }: Plant): boolean {
  return (category === 'shrub' || category === 'groundcover') && (leaf === 'needle-evergreen' || leaf === 'scale-evergreen')
}

function constantOf(plant: Plant, bound: Bound, zone: string, gain: number): number {
  if (HERBACEOUS.has(plant.category) && !isConiferShrub(plant)) {
    const years = { perennial: 3, grass: 3, fern: 4, bulb: 1, annual: 1 }[plant.category as 'perennial'] ?? { slow: 5, moderate: 3, fast: 2 }[plant.growth]
    return Math.log(20) / years
  }
  const kind = isConiferShrub(plant) ? 'conifer' : plant.category === 'tree' ? 'tree' : 'shrub'
  const number = Number.parseInt(zone, 10) + (zone.endsWith('b') ? 0.5 : 0)
  const season = Math.min(1.4, Math.max(0.76, 1 + 0.08 * (number - 6)))
  return (RATES[kind][plant.growth][INDEX[bound]]! * season) / gain
}

export interface When {
  bound: Bound
  year: number | 'mature'
  zone: string
}

export function sizeAt(plant: Plant, placement: Placement, { bound, year, zone }: When): Size {
  const { planted } = placement
  const mature = matureSize(plant, placement, bound)
  const gain = Math.max(mature.height - planted.height, mature.spread - planted.spread)
  if (year === 'mature' || gain <= 0) return mature
  const waits = placement.status !== 'stays' && (!HERBACEOUS.has(plant.category) || isConiferShrub(plant))
  const lag = waits ? 2 - INDEX[bound] : 0
  const share = 1 - Math.exp(-constantOf(plant, bound, zone, gain) * Math.max(0, year - lag))
  return {
    height: planted.height + (mature.height - planted.height) * share,
    spread: planted.spread + (mature.spread - planted.spread) * share,
  }
}

function interpolate(points: readonly { at: number; value: number }[], at: number): number {
  const first = points[0]!
  if (at <= first.at) return first.value
  for (let i = 1; i < points.length; i += 1) {
    const [a, b] = [points[i - 1]!, points[i]!]
    if (at <= b.at) return a.value + ((b.value - a.value) * (at - a.at)) / (b.at - a.at)
  }
  return points.at(-1)!.value
}

function nearestOnSegment(p: Point, a: Point, b: Point): Point {
  const [dx, dy] = [b.x - a.x, b.y - a.y]
  const length = dx * dx + dy * dy
  const t = length === 0 ? 0 : Math.min(1, Math.max(0, ((p.x - a.x) * dx + (p.y - a.y) * dy) / length))
  return { x: a.x + t * dx, y: a.y + t * dy }
}

function nearestOf(p: Point, candidates: readonly Point[]): Point {
  return candidates.reduce((best, next) => (Math.hypot(next.x - p.x, next.y - p.y) < Math.hypot(best.x - p.x, best.y - p.y) ? next : best))
}

/** The wall line's y at x; at a jog the point nearer the viewer; flat beyond the ends. */
export function wallYAt({ wall }: Facade, x: number): number {
  const at = wall.filter((point) => point.x === x)
  if (at.length > 0) return Math.max(...at.map((point) => point.y))
  if (x < wall[0]!.x) return wall[0]!.y
  for (let i = 1; i < wall.length; i += 1) {
    const [a, b] = [wall[i - 1]!, wall[i]!]
    if (a.x < x && x < b.x) return a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x)
  }
  return wall.at(-1)!.y
}

/** Plan distance to the wall line, returns included; negative behind the wall between its corners. */
export function wallDistanceOf(facade: Facade, p: Point): number {
  const { wall } = facade
  const nearest = nearestOf(p, wall.slice(1).map((b, i) => nearestOnSegment(p, wall[i]!, b)))
  const distance = Math.hypot(nearest.x - p.x, nearest.y - p.y)
  const between = p.x >= wall[0]!.x && p.x <= wall.at(-1)!.x
  return between && p.y < wallYAt(facade, p.x) ? -distance : distance
}

export function soilAt(facade: Facade, p: Point): number {
  return interpolate(facade.grade.map(({ x, z }) => ({ at: x, value: z })), p.x) - facade.fall * Math.max(0, wallDistanceOf(facade, p))
}

/** The point of a closed outline nearest to p. */
export function nearestOnOutline(p: Point, outline: readonly Point[]): Point {
  return nearestOf(p, outline.map((a, i) => nearestOnSegment(p, a, outline[(i + 1) % outline.length]!)))
}

/** Even-odd test by a ray to the right. */
export function isInside(p: Point, outline: readonly Point[]): boolean {
  return outline.reduce((inside, a, i) => {
    const b = outline[(i + 1) % outline.length]!
    const crosses = a.y > p.y !== b.y > p.y && p.x < a.x + ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y)
    return crosses ? !inside : inside
  }, false)
}

/** The crown of a placement; `natural` leaves its kept size aside. */
export function solidOf(plant: Plant, placement: Placement, at: When & { facade: Facade; natural?: boolean }): Solid {
  const { height, spread } = sizeAt(plant, placement, at)
  const expected = matureSize(plant, placement, 'expected').height
  const limbed = plant.category === 'tree' && expected >= 180 && !['pyramidal', 'columnar', 'weeping', 'multi-stem'].includes(plant.habit)
  const natural = Math.min(0.6 * height, placement.clearStem ?? (limbed ? 0.15 * height : 0))
  const kept = at.natural ? {} : (placement.kept ?? {})
  const clearStem = kept.height === undefined ? natural : Math.min(natural, 0.6 * kept.height)
  return { x: placement.x, y: placement.y, z0: soilAt(at.facade, placement), habit: plant.habit, height, spread, clearStem, kept }
}

const ring = (points: readonly [number, number][]): Polygon => [[...points]]
export const rectangle = (x0: number, z0: number, x1: number, z1: number): Polygon => ring([[x0, z0], [x1, z0], [x1, z1], [x0, z1]])
export const disc = (p: Point, radius: number, corners = 360): Polygon =>
  ring(Array.from({ length: corners }, (_, i) => {
    const angle = (2 * Math.PI * i) / corners
    return [p.x + radius * Math.cos(angle), p.y + radius * Math.sin(angle)]
  }))

/** Right half of the profile from the lowest foliage up: [height share, radius share], dense where it turns. */
function profileOf(habit: Habit, steps: number): [number, number][] {
  const { base, shoulder, m, n } = FORMS[habit]
  const points: [number, number][] = shoulder > 0 ? [[0, base]] : []
  for (let i = 0; i <= steps; i += 1) {
    // v^m = sin^2 and p^n = cos^2 of one angle satisfy p = (1 - v^m)^(1/n) exactly.
    const angle = (Math.PI / 2) * (i / steps)
    const v = Math.sin(angle) ** (2 / m)
    points.push([shoulder + v * (1 - shoulder), i === steps ? 0 : Math.cos(angle) ** (2 / n)])
  }
  return points
}

const profiles = new Map<string, [number, number][]>()

/** The silhouette in the plane through the axis, axis at `axis`: kept sizes cut it as shears do, by the polygon library. */
export function silhouetteOf(solid: Solid, { axis = solid.x, steps = 128 } = {}): MultiPolygon {
  const key = `${solid.habit}/${steps}`
  const profile = profiles.get(key) ?? profileOf(solid.habit, steps)
  profiles.set(key, profile)
  const foot = solid.z0 + solid.clearStem
  const length = solid.height - solid.clearStem
  const right = profile.map(([u, p]): [number, number] => [axis + (p * solid.spread) / 2, foot + u * length])
  const left = profile.slice(0, -1).map(([u, p]): [number, number] => [axis - (p * solid.spread) / 2, foot + u * length]).reverse()
  const natural: MultiPolygon = [ring([...right, ...left])]
  const { height = Infinity, spread = Infinity } = solid.kept
  if (height >= solid.height && spread >= solid.spread) return natural
  const half = Math.min(spread, solid.spread) / 2
  return polygonClipping.intersection(natural, rectangle(axis - half, solid.z0 - 1, axis + half, solid.z0 + Math.min(height, solid.height)))
}

export function areaOf(shapes: MultiPolygon): number {
  return shapes.reduce((total, shape) => total + shape.reduce((sum, points, hole) => {
    const twice = points.reduce((part, [x, y], i) => {
      const [u, v] = points[(i + 1) % points.length]!
      return part + x * v - u * y
    }, 0)
    return sum + (hole === 0 ? 1 : -1) * Math.abs(twice / 2)
  }, 0), 0)
}

/** Do the two share ground? Slivers that rounding leaves are none. */
export function overlaps(a: MultiPolygon | Polygon, b: MultiPolygon | Polygon): boolean {
  return areaOf(polygonClipping.intersection(a as MultiPolygon, b as MultiPolygon)) > 1e-6
}

/** Extent of the shapes in x and z; null for none. */
export function extentOf(shapes: MultiPolygon): { x0: number; x1: number; z0: number; z1: number } | null {
  const points = shapes.flat(2)
  if (points.length === 0) return null
  const xs = points.map(([x]) => x)
  const zs = points.map(([, z]) => z)
  return { x0: Math.min(...xs), x1: Math.max(...xs), z0: Math.min(...zs), z1: Math.max(...zs) }
}

/** Largest radius between two heights; 0 where there is no foliage. */
export function reachOf(solid: Solid, z1: number, z2: number, steps = 128): number {
  const whole = silhouetteOf(solid, { axis: 0, steps })
  const part = extentOf(polygonClipping.intersection(whole, rectangle(-1e5, z1, 1e5, z2)))
  return part && part.z1 - part.z0 > 0.01 ? part.x1 : 0
}

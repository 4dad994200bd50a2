/** The ground from above: cut wall, beds with mulch, walks, drip line of the eaves. */
import { pointInPolygon, type Bed, type Facade, type Walk } from '../spacing'
import { WALL_IN, type Layout } from './layout'
import { boxAround, line, num, offsetLine, path, polygon, segment, type Dot } from './path'
import { randomFrom } from './random'
import type { PathShape } from './types'

const STIPPLE_IN = 10
const MOST_STIPPLES = 420
const JOINT_IN = 48
const MOST_JOINTS = 60

const inPlan = (points: readonly Dot[], layout: Layout): Dot[] => points.map(({ x, y }) => ({ x, y: layout.planY(y) }))

/** The wall as cut: its face follows every jog, hatched between face and back. */
export function cutWall(facade: Facade, layout: Layout): PathShape[] {
  const face = inPlan(facade.wall, layout)
  const back = offsetLine(face, WALL_IN)
  const outline = polygon([...face, ...back.toReversed()])
  const area = boxAround([...face, ...back])
  const step = Math.max(5, area.width / 240)
  const hatch: string[] = []
  for (let x = area.x - area.height; x < area.x + area.width; x += step) {
    hatch.push(segment(x, area.y + area.height, x + area.height, area.y))
  }
  return [
    path(outline, { fill: 'roof' }),
    path(hatch.join(''), { stroke: 'wall', strokePx: 0.7, clip: [outline] }),
    path(outline, { stroke: 'ink', strokePx: 1.5 }),
  ]
}

/** The edge of the eaves above, as a drafter shows what hangs overhead: dashed. */
export function dripLine(facade: Facade, layout: Layout): PathShape[] {
  if (facade.overhang <= 0) return []
  return [path(line(offsetLine(inPlan(facade.wall, layout), -facade.overhang)), { stroke: 'drip-line', strokePx: 0.9, dashPx: [9, 5] })]
}

/** Sparse strokes of mulch, thrown from the bed's id: they never move. */
function stipple(bed: Bed): { d: string } {
  const area = boxAround(bed.outline)
  const step = Math.max(STIPPLE_IN, Math.sqrt((area.width * area.height) / MOST_STIPPLES))
  const random = randomFrom(`mulch ${bed.id}`)
  const parts: string[] = []
  for (let y = area.y + step / 2; y < area.y + area.height; y += step) {
    for (let x = area.x + step / 2; x < area.x + area.width; x += step) {
      const at = { x: x + (random() - 0.5) * step, y: y + (random() - 0.5) * step }
      const [dx, dy, keep] = [(random() - 0.5) * 4, (random() - 0.5) * 2.4, random() < 0.62]
      if (keep && pointInPolygon(at, bed.outline)) parts.push(`M${num(at.x)} Y${num(at.y)}l${num(dx)} ${num(dy)}`)
    }
  }
  return { d: parts.join('') }
}

const stipples = new WeakMap<Bed, string>()

function mulch(bed: Bed, layout: Layout): string {
  let raw = stipples.get(bed)
  if (raw === undefined) {
    raw = stipple(bed).d
    stipples.set(bed, raw)
  }
  return raw.replaceAll(/Y(-?[\d.]+)/g, (_, y: string) => String(num(layout.planY(Number(y)))))
}

/** A bed: mulch within a drawn edge. */
export function drawBed(bed: Bed, layout: Layout): PathShape[] {
  const outline = polygon(inPlan(bed.outline, layout))
  return [
    path(outline, { fill: 'mulch' }),
    path(mulch(bed, layout), { stroke: 'mulch-dot', strokePx: 0.9, cap: 'round' }),
    path(outline, { stroke: 'soil', strokePx: 1.3 }),
  ]
}

/** A walk: paving tone with joints across its long way. */
export function drawWalk(walk: Walk, layout: Layout): PathShape[] {
  const points = inPlan(walk.outline, layout)
  const outline = polygon(points)
  const area = boxAround(points)
  const along = area.width >= area.height
  const length = along ? area.width : area.height
  const step = Math.max(JOINT_IN, length / MOST_JOINTS)
  const joints = Array.from({ length: Math.max(0, Math.ceil(length / step) - 1) }, (_, i) => {
    const at = (i + 1) * step
    return along
      ? segment(area.x + at, area.y, area.x + at, area.y + area.height)
      : segment(area.x, area.y + at, area.x + area.width, area.y + at)
  })
  return [
    path(outline, { fill: 'paving' }),
    path(joints.join(''), { stroke: 'paving-line', strokePx: 0.8, clip: [outline] }),
    path(outline, { stroke: 'ink-soft', strokePx: 1 }),
  ]
}

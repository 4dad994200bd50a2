/** The wall seen square-on: face, siding, foundation, eaves and roof, and the soil in front of it. */
import { gradeAt, groundAt, wallY, type Facade } from '../spacing'
import { line, num, path, polygon, rect, segment, type Dot } from './path'
import { randomFrom } from './random'
import type { Layout } from './layout'
import type { PathShape } from './types'

const LAP_IN = 6
const COURSE_IN = 8
const BRICK_IN = 24
const SHINGLE_IN = 9
const MOST_LINES = 80

/** x of every point where soil or wall bends, with the corners: enough to follow both exactly. */
function stations(facade: Facade, { left, right }: Layout): number[] {
  const inner = [...facade.grade, ...facade.wall].map(({ x }) => x).filter((x) => x > left && x < right)
  return [...new Set([left, ...inner, right])].sort((a, b) => a - b)
}

/** The soil against the wall, scene points left to right; `above` lifts the line. */
export function soilAtWall(facade: Facade, layout: Layout, above = 0): Dot[] {
  return stations(facade, layout).map((x) => ({ x, y: layout.elevationY(gradeAt(facade, x) + above) }))
}

function lapLines(layout: Layout, facade: Facade, bottom: number): string {
  const step = Math.max(LAP_IN, (facade.gutter - bottom) / MOST_LINES)
  const parts: string[] = []
  for (let z = facade.gutter - step; z > bottom; z -= step) {
    parts.push(segment(layout.left, layout.elevationY(z), layout.right, layout.elevationY(z)))
  }
  return parts.join('')
}

/** Bed joints all along, upright joints here and there, as one draws masonry without counting bricks. */
function courseLines(layout: Layout, facade: Facade, bottom: number): string {
  const step = Math.max(COURSE_IN, (facade.gutter - bottom) / MOST_LINES)
  const brick = Math.max(BRICK_IN, (layout.right - layout.left) / MOST_LINES)
  const random = randomFrom('masonry')
  const parts: string[] = []
  let course = 0
  for (let z = facade.gutter - step; z > bottom; z -= step, course += 1) {
    parts.push(segment(layout.left, layout.elevationY(z), layout.right, layout.elevationY(z)))
    for (let x = layout.left + (course % 2 ? brick / 2 : brick); x < layout.right; x += brick) {
      if (random() < 0.45) parts.push(segment(x, layout.elevationY(z), x, layout.elevationY(z + step)))
    }
  }
  return parts.join('')
}

/** Uprights where the wall jogs, with a soft shadow on the wall that stands back. */
function jogs(facade: Facade, layout: Layout): PathShape[] {
  const top = layout.elevationY(facade.gutter)
  return facade.wall.slice(1).flatMap((point, i): PathShape[] => {
    const from = facade.wall[i]!
    if (Math.abs(point.y - from.y) < 1 || Math.abs(point.x - from.x) > 0.5) return []
    const foot = layout.elevationY(gradeAt(facade, point.x))
    const shade = Math.min(Math.abs(point.y - from.y) * 0.35, 14) * (point.y > from.y ? -1 : 1)
    return [
      path(rect(point.x, top, point.x + shade, foot), { fill: 'foliage-shade', opacity: 0.1 }),
      path(segment(point.x, top, point.x, foot), { stroke: 'wall', strokePx: 1 }),
    ]
  })
}

function roof(facade: Facade, layout: Layout): PathShape[] {
  const { left, right, hip, eaves, ridge, elevationY } = layout
  const [l, r] = [left - facade.overhang, right + facade.overhang]
  const slope = (z: number) => ((z - eaves) / (ridge - eaves)) * hip
  const random = randomFrom('roof')
  const courses: string[] = []
  for (let z = eaves + SHINGLE_IN; z < ridge - 2; z += SHINGLE_IN) {
    courses.push(segment(l + slope(z), elevationY(z), r - slope(z), elevationY(z)))
    const step = Math.max(34, (r - l) / 40)
    for (let x = l + slope(z) + random() * step; x < r - slope(z); x += step * (0.6 + random())) {
      courses.push(segment(x, elevationY(z), x, elevationY(z - SHINGLE_IN + 1)))
    }
  }
  const outline = polygon([
    { x: l, y: elevationY(eaves) }, { x: l + hip, y: elevationY(ridge) }, { x: r - hip, y: elevationY(ridge) }, { x: r, y: elevationY(eaves) },
  ])
  const gutter = rect(l, elevationY(facade.gutter), r, elevationY(eaves))
  return [
    path(outline, { fill: 'roof', stroke: 'ink-soft', strokePx: 1 }),
    path(courses.join(''), { stroke: 'roof-line', strokePx: 0.75 }),
    path(segment(l + hip, elevationY(ridge), r - hip, elevationY(ridge)), { stroke: 'ink', strokePx: 1.5 }),
    path(gutter, { fill: 'trim', stroke: 'ink-soft', strokePx: 1 }),
    path(segment(l, elevationY(facade.gutter + 3.6), r, elevationY(facade.gutter + 3.6)), { stroke: 'roof-line', strokePx: 0.75 }),
  ]
}

/** Roof, wall face and foundation. */
export function drawHouse(facade: Facade, layout: Layout): PathShape[] {
  const { left, right, elevationY } = layout
  const footing = soilAtWall(facade, layout, facade.exposed)
  const soil = soilAtWall(facade, layout)
  const top = elevationY(facade.gutter)
  const face = polygon([{ x: left, y: top }, { x: right, y: top }, ...footing.toReversed()])
  const lowest = Math.min(...footing.map(({ y }) => layout.heightAt(y)))
  const masonry = facade.siding === 'masonry'
  const joints = masonry ? courseLines(layout, facade, lowest) : lapLines(layout, facade, lowest)
  const shadow = Math.min(Math.max(facade.overhang * 0.4, 2), 12)
  return [
    path(face, { fill: masonry ? 'masonry' : 'siding' }),
    path(joints, { stroke: masonry ? 'masonry-line' : 'siding-line', strokePx: 0.75, clip: [face] }),
    path(rect(left, top, right, top + shadow), { fill: 'foliage-shade', opacity: 0.12, clip: [face] }),
    path(polygon([...footing, ...soil.toReversed()]), { fill: 'foundation', stroke: 'ink-soft', strokePx: 0.6 }),
    ...jogs(facade, layout),
    path(polygon([{ x: left, y: top }, { x: right, y: top }, ...soil.toReversed()]), { stroke: 'ink-soft', strokePx: 1.1 }),
    ...roof(facade, layout),
  ]
}

/** Where the drawn ground ends towards the viewer: the soil as it falls away (or rises), scene points. */
function frontLine(facade: Facade, layout: Layout): Dot[] {
  const { box } = layout
  const inner = [...facade.grade, ...facade.wall].map(({ x }) => x).filter((x) => x > box.x && x < box.x + box.width)
  const ends = [box.x + 4, box.x + box.width - 4]
  return [...new Set([ends[0]!, ...inner, ends[1]!])].sort((a, b) => a - b).map((x) => {
    const out = Math.max(layout.front, wallY(facade, x))
    return { x, y: layout.elevationY(groundAt(facade, x, out)) }
  })
}

/** The bed surface between the wall and the front edge, the heavy ground line, and earth beneath it. */
export function drawSoil(facade: Facade, layout: Layout): PathShape[] {
  const front = frontLine(facade, layout)
  const back = front.map(({ x }) => ({ x, y: layout.elevationY(gradeAt(facade, x)) }))
  const ticks: string[] = []
  const step = Math.max(9, layout.box.width / 70)
  const random = randomFrom('soil')
  for (let i = 1; i < front.length; i += 1) {
    const [a, b] = [front[i - 1]!, front[i]!]
    for (let x = a.x + step * random(); x < b.x; x += step * (0.5 + random())) {
      const y = a.y + ((x - a.x) / (b.x - a.x || 1)) * (b.y - a.y)
      ticks.push(`M${num(x)} ${num(y)}l${num(-3 - random() * 2)} ${num(4 + random() * 2)}`)
    }
  }
  return [
    path(polygon([...front, ...back.toReversed()]), { fill: 'mulch' }),
    path(line(soilAtWall(facade, layout)), { stroke: 'soil', strokePx: 0.9 }),
    path(ticks.join(''), { stroke: 'soil', strokePx: 0.8 }),
    path(line(front), { stroke: 'ink', strokePx: 1.8 }),
  ]
}

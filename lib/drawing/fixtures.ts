/** What must stay reachable or visible on the wall, each drawn as what it is. */
import type { Fixture } from '../spacing'
import type { Layout } from './layout'
import { circle, line, path, polygon, rect, segment } from './path'
import type { PathShape } from './types'

/** Left, top, right, bottom and middle of a fixture in the elevation, scene. */
function frame({ x, width, z, height }: Fixture, layout: Layout) {
  const top = layout.elevationY(z + height)
  const bottom = layout.elevationY(z)
  return { l: x, t: top, r: x + width, b: bottom, cx: x + width / 2, cy: (top + bottom) / 2, w: width, h: height }
}
type Frame = ReturnType<typeof frame>

const METAL = { fill: 'metal', stroke: 'ink-soft', strokePx: 0.9 } as const
const FINE = { stroke: 'ink-soft', strokePx: 0.7 } as const

function louvres({ l, r, t, h }: Frame, count: number): string {
  return Array.from({ length: count }, (_, i) => {
    const y = t + (h * (i + 1)) / (count + 1)
    return segment(l + 1, y, r - 1, y)
  }).join('')
}

function meter(f: Frame): PathShape[] {
  const dial = Math.min(f.w, f.h) * 0.34
  return [
    path(rect(f.l, f.t, f.r, f.b), METAL),
    path(circle(f.cx, f.t + f.h * 0.4, dial), { fill: 'glass', stroke: 'ink-soft', strokePx: 0.9 }),
    path(segment(f.cx - dial * 0.5, f.t + f.h * 0.4, f.cx + dial * 0.5, f.t + f.h * 0.4), FINE),
  ]
}

function downspout(f: Frame): PathShape[] {
  const straps = [0.12, 0.5, 0.88].map((at) => rect(f.l - 1, f.t + f.h * at, f.r + 1, f.t + f.h * at + 2)).join('')
  return [
    path(rect(f.l, f.t, f.r, f.b - Math.min(4, f.h / 4)), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.9 }),
    path(rect(f.l - 0.8, f.b - Math.min(5, f.h / 4), f.r + 0.8, f.b), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.9 }),
    path(straps, { fill: 'metal', stroke: 'ink-soft', strokePx: 0.5 }),
  ]
}

function condenser(f: Frame): PathShape[] {
  return [
    path(rect(f.l - 2, f.b - 2, f.r + 2, f.b), { fill: 'foundation', ...FINE }),
    path(rect(f.l, f.t, f.r, f.b - 2), METAL),
    path(louvres(f, 8), { stroke: 'ink-soft', strokePx: 0.5 }),
    path(rect(f.l - 0.8, f.t - 1.5, f.r + 0.8, f.t), METAL),
  ]
}

function lantern(f: Frame): PathShape[] {
  return [
    path(segment(f.cx, f.t, f.cx, f.t + f.h * 0.15), { stroke: 'ink', strokePx: 1.2 }),
    path(polygon([{ x: f.l, y: f.t + f.h * 0.3 }, { x: f.cx, y: f.t }, { x: f.r, y: f.t + f.h * 0.3 }]), { fill: 'ink-soft', stroke: 'ink', strokePx: 0.8 }),
    path(polygon([
      { x: f.l + f.w * 0.1, y: f.t + f.h * 0.3 }, { x: f.r - f.w * 0.1, y: f.t + f.h * 0.3 }, { x: f.r - f.w * 0.25, y: f.b }, { x: f.l + f.w * 0.25, y: f.b },
    ]), { fill: 'foliage-lit', stroke: 'ink', strokePx: 0.8 }),
  ]
}

function hoseBib(f: Frame): PathShape[] {
  return [
    path(circle(f.cx, f.t + f.h * 0.3, Math.max(f.w * 0.45, 1.2)), METAL),
    path(line([{ x: f.cx, y: f.t + f.h * 0.3 }, { x: f.cx, y: f.b }, { x: f.r, y: f.b + 1 }]), { stroke: 'ink-soft', strokePx: 1.6 }),
  ]
}

function numberPlate(f: Frame): PathShape[] {
  const digits = [0.25, 0.5, 0.75].map((at) => segment(f.l + f.w * at, f.t + f.h * 0.22, f.l + f.w * at, f.b - f.h * 0.22)).join('')
  return [path(rect(f.l, f.t, f.r, f.b), { fill: 'trim', stroke: 'ink-soft', strokePx: 0.8 }), path(digits, { stroke: 'ink', strokePx: 1.3 })]
}

function drawKind(fixture: Fixture, f: Frame): PathShape[] {
  switch (fixture.kind) {
    case 'electric-meter': return meter(f)
    case 'gas-meter': return [...meter(f), path(segment(f.l - 3, f.b, f.l - 3, f.cy) + segment(f.l - 3, f.cy, f.l, f.cy), { stroke: 'ink-soft', strokePx: 1.6 })]
    case 'condenser': return condenser(f)
    case 'hose-bib': return hoseBib(f)
    case 'vent': return [path(rect(f.l, f.t, f.r, f.b), METAL), path(louvres(f, 4), FINE)]
    case 'downspout': return downspout(f)
    case 'house-number': return numberPlate(f)
    case 'entry-light': return lantern(f)
    case 'escape-well': return [path(rect(f.l, f.t, f.r, f.b), METAL), path(Array.from({ length: 5 }, (_, i) => segment(f.l + (f.w * (i + 1)) / 6, f.t, f.l + (f.w * (i + 1)) / 6, f.b)).join(''), FINE)]
  }
}

/** One fixture square-on. */
export function drawFixture(fixture: Fixture, layout: Layout): PathShape[] {
  return drawKind(fixture, frame(fixture, layout))
}

/** One fixture from above; a downspout shows where its water leaves. */
export function planFixture(fixture: Fixture, layout: Layout): PathShape[] {
  const { x, y, width, depth, outlet } = fixture
  const [top, bottom] = [layout.planY(y), layout.planY(y + Math.max(depth, 1))]
  const body = path(rect(x, top, x + width, bottom), METAL)
  if (fixture.kind === 'condenser') {
    return [body, path(circle(x + width / 2, (top + bottom) / 2, Math.min(width, depth) * 0.38), FINE)]
  }
  if (fixture.kind !== 'downspout' || !outlet) return [body]
  const [cx, end] = [x + width / 2, layout.planY(y + outlet)]
  return [
    body,
    path(segment(cx, bottom, cx, end), { stroke: 'ink-soft', strokePx: 1, dashPx: [5, 3] }),
    path(line([{ x: cx - 2.5, y: end - 5 }, { x: cx, y: end }, { x: cx + 2.5, y: end - 5 }]), { stroke: 'ink-soft', strokePx: 1 }),
  ]
}

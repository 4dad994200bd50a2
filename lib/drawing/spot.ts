/** A spot one asks about: a mark in plan, and the largest crown it holds as an outline in both views. */
import { groundAt, silhouette, type Crown, type Facade, type Pocket, type Point, type Size } from '../spacing'
import { circle, path, polygon, segment } from './path'
import type { Scene, Shape } from './types'

const MARK_PX = 7

/** The frontier is worked out for mounded crowns. */
function crownAt(facade: Facade, { x, y }: Point, { height, spread }: Size): Crown {
  return { x, y, z0: groundAt(facade, x, y), height, spread, clearStem: 0, habit: 'mounded' }
}

export function drawSpot(spot: Point & { room: Size | null }, facade: Facade, scene: Pick<Scene, 'elevationY' | 'planY' | 'projection' | 'pxPerInch'>): { elevation: Shape[]; plan: Shape[] } {
  const { x, y, room } = spot
  const at = { x, y: scene.planY(y) }
  const arm = MARK_PX / scene.pxPerInch
  const mark: Shape[] = [
    path(segment(at.x - arm, at.y, at.x + arm, at.y), { stroke: 'leaf', strokePx: 2 }),
    path(segment(at.x, at.y - arm, at.x, at.y + arm), { stroke: 'leaf', strokePx: 2 }),
    path(scene.projection(x, y), { stroke: 'leaf', strokePx: 1.2, dashPx: [2, 3] }),
  ]
  if (!room) return { elevation: [], plan: mark }
  const crown = crownAt(facade, spot, room)
  const outline = { stroke: 'leaf' as const, strokePx: 2.4, dashPx: [7, 4] }
  return {
    elevation: [path(polygon(silhouette(crown).map((point) => ({ x: point.x, y: scene.elevationY(point.z) }))), outline)],
    plan: [path(circle(at.x, at.y, room.spread / 2), outline), ...mark],
  }
}

/** Pockets in plan: dashed rings, each with the number of annuals it takes. */
export function drawPockets(pockets: readonly Pocket[], { planY }: Pick<Scene, 'planY'>): Shape[] {
  return pockets.flatMap(({ x, y, diameter, annuals }): Shape[] => [
    path(circle(x, planY(y), diameter / 2), { stroke: 'ink-soft', strokePx: 1.6, dashPx: [3, 4] }),
    { kind: 'text', text: String(annuals), x, y: planY(y), sizePx: 13, font: 'mono', ink: 'ink', anchor: 'middle', bold: true, halo: true },
  ])
}

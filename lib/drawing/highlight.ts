/** What is picked out: a ring and a projection line for the selected plant, hatch and one dimension for a finding. */
import { formatLength } from '../measure'
import { boxOfWords, type Labeler, type Words } from './labels'
import { offenceOf, type Case, type Offence } from './offence'
import type { Ink } from './palette'
import { boxPath, circle, path, segment, type Dot } from './path'
import type { PlantDrawing, Scene, Shape, View } from './types'

const RING_PX = 2.4

/** The selected plant in both views, and the line that ties them. */
export function drawSelected(placement: string, scene: Pick<Scene, 'elevation' | 'plan' | 'projection'>, out: number): { elevation: Shape[]; plan: Shape[] } {
  const is = (drawing: PlantDrawing) => drawing.placement === placement
  const up = scene.elevation.plants.find(is)
  const down = scene.plan.plants.find(is)
  if (!up || !down) return { elevation: [], plan: [] }
  const radius = down.hit.width / 2
  const outline = up.shapes.findLast((shape) => shape.kind === 'path' && shape.stroke !== undefined && !shape.fill)
  const ring: Shape = outline?.kind === 'path'
    ? path(outline.d, { stroke: 'leaf', strokePx: RING_PX })
    : path(boxPath(up.hit), { stroke: 'leaf', strokePx: RING_PX })
  return {
    elevation: [ring],
    plan: [
      path(circle(down.at.x, down.at.y, radius + 1), { stroke: 'leaf', strokePx: RING_PX }),
      path(scene.projection(down.at.x, out), { stroke: 'leaf', strokePx: 1.2, dashPx: [2, 3] }),
    ],
  }
}

/** A length as a foreman says it: whole inches, small ones to the quarter. */
export function excessText(excess: number): string {
  const unit = excess >= 4 ? 1 : 0.25
  return formatLength(Math.max(unit, Math.round(excess / unit) * unit))
}

function tick(at: Dot, size: number): string {
  return segment(at.x - size, at.y + size, at.x + size, at.y - size)
}

function dimension({ dimension: [from, to], upright }: Offence, text: string, ink: Ink, labeler: Labeler): Shape[] {
  const { px } = labeler
  const size = px(4)
  const words: Words = { text, sizePx: 13, ink: ink === 'risk' ? 'ink' : ink, font: 'mono' }
  const [cx, cy] = [(from.x + to.x) / 2, (from.y + to.y) / 2]
  const spots = upright
    ? [{ x: cx + px(7), y: cy + px(4), anchor: 'start' as const }, { x: cx - px(7), y: cy + px(4), anchor: 'end' as const }]
    : [{ x: cx + px(8), y: cy - px(7), anchor: 'start' as const }, { x: cx + px(8), y: cy + px(16), anchor: 'start' as const }, { x: cx - px(8), y: cy - px(7), anchor: 'end' as const }, { x: cx, y: cy - px(14), anchor: 'middle' as const }]
  const label = labeler.setWords(words, [...spots, ...spots.map((spot) => ({ ...spot, y: spot.y - px(20) }))], true)!
  const back = boxOfWords(words, label, labeler.pxPerInch)
  return [
    path(segment(from.x, from.y, to.x, to.y), { stroke: 'sheet', strokePx: 4 }),
    path(segment(from.x, from.y, to.x, to.y) + tick(from, size) + tick(to, size), { stroke: ink, strokePx: 1.6 }),
    path(boxPath(back), { fill: 'sheet', opacity: 0.85 }),
    label,
  ]
}

const toEach = (view: View['title'] | Offence['view'], shapes: Shape[]) => ({ elevation: view === 'elevation' ? shapes : [], plan: view === 'plan' ? shapes : [] })

/** A finding on the drawing: the crown that breaks the limit dashed, only its offending part hatched, one dimension. */
export function drawFinding(of: Case, labelers: Record<Offence['view'], Labeler>): { elevation: Shape[]; plan: Shape[] } {
  const offence = offenceOf(of)
  if (!offence) return { elevation: [], plan: [] }
  const ink: Ink = of.finding.kind
  return toEach(offence.view, [
    ...offence.outlines.map((d) => path(d, { stroke: ink, strokePx: 1.2, dashPx: [6, 3] })),
    { kind: 'hatch', clip: offence.clip, box: offence.box, ink, spacingPx: 6 },
    ...dimension(offence, excessText(of.finding.excess), ink, labelers[offence.view]),
  ])
}

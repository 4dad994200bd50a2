/** What is seen of a plant on the move: its drawings carried along, the line that ties the two views, and what the check says. */
import { groundAt, type Finding, type FindingKind } from '@/lib/spacing'
import { FINDING_KINDS } from '@/lib/spacing'
import type { PlantDrawing, Scene, Shape, Ink } from '@/lib/drawing'
import type { DragSession } from '../editor'
import type { Sheet } from '@/lib/spacing'

export interface Carried {
  elevation: PlantDrawing
  plan: PlantDrawing
}

export interface Offset {
  x: number
  y: number
}

/** How far the drawings have gone from where the scene has them, scene inches. In elevation the soil carries the plant up and down. */
export function offsetsOf(drag: DragSession, sheet: Pick<Sheet, 'facade'>): { elevation: Offset; plan: Offset } {
  const { snapshot, candidate } = drag
  const rise = groundAt(sheet.facade, candidate.x, candidate.y) - groundAt(sheet.facade, snapshot.x, snapshot.y)
  const x = candidate.x - snapshot.x
  return { elevation: { x, y: -rise }, plan: { x, y: candidate.y - snapshot.y } }
}

/** The worst of several findings; null when there is none. */
export function worstOf(findings: readonly Finding[]): FindingKind | null {
  return FINDING_KINDS.find((kind) => findings.some((finding) => finding.kind === kind)) ?? null
}

const RING_PX = 2.4
const circle = (x: number, y: number, r: number) => `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`

/** A mark of the kind of finding, by form as well as by colour: diamond, half diamond, notched square, open ring. */
export function markShapes(kind: FindingKind, x: number, y: number, unit: number): Shape[] {
  const diamond = `M${x} ${y - 8 * unit}L${x + 8 * unit} ${y}L${x} ${y + 8 * unit}L${x - 8 * unit} ${y}Z`
  switch (kind) {
    case 'conflict':
      return [{ kind: 'path', d: diamond, fill: 'conflict', stroke: 'sheet', strokePx: 1.5 }]
    case 'risk':
      return [
        { kind: 'path', d: diamond, fill: 'sheet', stroke: 'ink', strokePx: 1.5 },
        { kind: 'path', d: `M${x} ${y - 8 * unit}L${x} ${y + 8 * unit}L${x - 8 * unit} ${y}Z`, fill: 'risk', stroke: 'ink', strokePx: 1 },
      ]
    case 'held':
      return [{ kind: 'path', d: `M${x - 7 * unit} ${y - 7 * unit}H${x + 7 * unit}V${y + 7 * unit}H${x + 2 * unit}V${y + 2 * unit}H${x - 2 * unit}V${y + 7 * unit}H${x - 7 * unit}Z`, fill: 'held', stroke: 'sheet', strokePx: 1.5 }]
    case 'note':
      return [{ kind: 'path', d: circle(x, y, 6 * unit), fill: 'sheet', stroke: 'note', strokePx: 2 }]
  }
}

/** Rings, ghost and projection line of a move; the plant's own drawings are moved by their offsets. */
export function movingShapes(drag: DragSession, { elevation, plan }: Carried, scene: Scene, { sheet, scale }: { sheet: Pick<Sheet, 'facade'>; scale: number }): Shape[] {
  const offsets = offsetsOf(drag, sheet)
  const kind = worstOf(drag.findings)
  const ink: Ink = kind ?? 'leaf'
  const unit = 1 / scale
  const radius = Math.max(plan.hit.width / 2, 12 * unit)
  const at = { x: plan.at.x + offsets.plan.x, y: plan.at.y + offsets.plan.y }
  const top = { x: elevation.hit.x + elevation.hit.width / 2 + offsets.elevation.x, y: elevation.hit.y + offsets.elevation.y }
  return [
    { kind: 'path', d: circle(plan.at.x, plan.at.y, radius), stroke: 'ink-soft', strokePx: 1, dashPx: [4, 4] },
    { kind: 'path', d: scene.projection(drag.candidate.x, drag.candidate.y), stroke: ink, strokePx: 1.2, dashPx: [2, 3] },
    { kind: 'path', d: circle(at.x, at.y, radius + unit), stroke: ink, strokePx: kind === null || kind === 'note' ? RING_PX : RING_PX + 0.8, ...(kind === 'risk' && { dashPx: [8, 3] }) },
    ...(kind ? [...markShapes(kind, at.x + radius * 0.72, at.y - radius * 0.72, unit), ...markShapes(kind, top.x, top.y - 14 * unit, unit)] : []),
  ]
}

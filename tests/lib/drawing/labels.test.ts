import { describe, expect, it } from 'vitest'
import { buildScene, contrast, INKS, MARK_INKS, OUTDOORS, PAPER, TEXT_INKS, type Shape, type View } from '@/lib/drawing'
import { boxOfWords } from '@/lib/drawing/labels'
import { plantKeys } from '@/lib/sheet'
import { ordinaryBed } from './scenes'

const PX_PER_INCH = 2

function boxOf(shape: Shape) {
  if (shape.kind === 'text' && shape.halo) return [boxOfWords(shape, shape, PX_PER_INCH)]
  if (shape.kind !== 'mark' || shape.mark !== 'key') return []
  const r = shape.radiusPx / PX_PER_INCH
  return [{ x: shape.x - r, y: shape.y - r, width: 2 * r, height: 2 * r }]
}

function overlapsIn(view: View): number {
  const boxes = view.labels.flatMap(boxOf)
  return boxes.flatMap((a, i) => boxes.slice(i + 1).filter((b) =>
    a.x < b.x + b.width - 1e-6 && b.x < a.x + a.width - 1e-6 && a.y < b.y + b.height - 1e-6 && b.y < a.y + a.height - 1e-6)).length
}

describe('labels', () => {
  it('never cover each other on an ordinary bed', () => {
    const { elevation, plan } = buildScene({ sheet: ordinaryBed(), year: 10, bound: 'expected', pxPerInch: PX_PER_INCH })
    expect([overlapsIn(elevation), overlapsIn(plan)]).toEqual([0, 0])
    expect(elevation.labels.flatMap(boxOf).length).toBeGreaterThan(6)
  })

  it('name every plant by the key of the lists, in both views', () => {
    const sheet = ordinaryBed()
    const scene = buildScene({ sheet, year: 10, bound: 'expected', pxPerInch: PX_PER_INCH })
    const keys = plantKeys(sheet)
    for (const view of [scene.elevation, scene.plan]) {
      const named = new Map(view.labels.flatMap((shape) => (shape.kind === 'mark' && shape.placements ? shape.placements.map((id) => [id, shape.text] as const) : [])))
      for (const { id, plant } of sheet.placements) expect(named.get(id)).toBe(keys.get(plant))
    }
  })

  it('give each window the height of its sill', () => {
    const { elevation } = buildScene({ sheet: ordinaryBed(), year: 1, bound: 'expected', pxPerInch: PX_PER_INCH })
    expect(elevation.labels.flatMap((shape) => (shape.kind === 'text' ? [shape.text] : []))).toContain(`Kitchen sill 3'-2"`)
  })
})

describe('inks', () => {
  it('stand in both themes, all of them', () => {
    for (const theme of [PAPER, OUTDOORS]) expect(Object.keys(theme).sort()).toEqual([...INKS].sort())
  })

  it('read against the sheet: text 4.5 (outdoors 7), marks 3', () => {
    for (const ground of ['sheet', 'paper'] as const) {
      for (const ink of TEXT_INKS) expect(contrast(PAPER[ink], PAPER[ground]), `${ink} on ${ground}`).toBeGreaterThanOrEqual(4.5)
      for (const ink of TEXT_INKS) expect(contrast(OUTDOORS[ink], OUTDOORS[ground]), `${ink} outdoors`).toBeGreaterThanOrEqual(7)
      for (const ink of MARK_INKS) expect(contrast(PAPER[ink], PAPER[ground]), `${ink} on ${ground}`).toBeGreaterThanOrEqual(3)
    }
  })
})

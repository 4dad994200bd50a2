/** What makes a drawing a sheet: titles, names of walks, scale bar, north. */
import { polygonArea, pointInPolygon, type Site } from '../spacing'
import { boxOfWords, type Labeler, type Words } from './labels'
import type { Layout } from './layout'
import { boxAround, path, rect, segment } from './path'
import type { SceneOptions, Shape, TextShape } from './types'

const WINDS = ['north', 'north-east', 'east', 'south-east', 'south', 'south-west', 'west', 'north-west'] as const

/** The wind a wall looks towards, in words; '' when the facing is not known. */
export function facingWords({ facing }: Pick<Site, 'facing'>): string {
  return facing === undefined ? '' : `facing ${WINDS[Math.round(facing / 45) % 8]}`
}

/** A view's title in its upper left corner. */
export function titleOf(text: string, at: { x: number; y: number }, labeler: Labeler): TextShape {
  const words: Words = { text, sizePx: 15, ink: 'ink', font: 'heading' }
  const spot = { x: at.x + labeler.px(6), y: at.y + labeler.px(17), anchor: 'start' as const }
  labeler.block(boxOfWords(words, spot, labeler.pxPerInch))
  return { kind: 'text', ...words, ...spot }
}

/** Names of walks, where they fit inside their walk; upright walks carry theirs at the foot. */
export function walkNames(sheet: SceneOptions['sheet'], layout: Layout, labeler: Labeler): Shape[] {
  return sheet.walks.flatMap(({ name, outline }): Shape[] => {
    if (Math.abs(polygonArea(outline)) < 1) return []
    const box = boxAround(outline)
    const words: Words = { text: name, sizePx: 13, ink: 'ink-soft', font: 'text' }
    const middle = box.x + box.width / 2
    const rows = [0.5, 0.72, 0.88, 0.3].map((share) => box.y + box.height * share)
    const spots = [middle, box.x + box.width * 0.2, box.x + box.width * 0.8].flatMap((x) => rows.map((y) => ({ x, y })))
      .filter((spot) => pointInPolygon(spot, outline))
      .map(({ x, y }) => ({ x, y: layout.planY(y) + labeler.px(4), anchor: 'middle' as const }))
    const text = labeler.setWords(words, spots)
    return text ? [text] : []
  })
}

/** Lengths a scale bar may have, feet. */
const BAR_FEET = [2, 4, 8, 12, 16, 24, 40, 80, 160, 320]

/** A bar of four parts, about 150 px long, with its figures in feet. */
export function scaleBar(layout: Layout, labeler: Labeler): Shape[] {
  const feet = BAR_FEET.findLast((length) => length * 12 * layout.pxPerInch <= 200) ?? BAR_FEET[0]!
  const x = layout.left
  const y = layout.plan.y + layout.plan.height - labeler.px(22)
  const part = (feet * 12) / 4
  const thick = labeler.px(4)
  const bars = [0, 1, 2, 3].map((i) => path(rect(x + i * part, y - thick / 2, x + (i + 1) * part, y + thick / 2), { fill: i % 2 ? 'sheet' : 'ink', stroke: 'ink', strokePx: 0.8 }))
  const figures = [0, 1, 2, 3, 4].filter((i) => i % 2 === 0 || part * layout.pxPerInch > 22).map((i): TextShape => ({
    kind: 'text', x: x + i * part, y: y + labeler.px(17), text: `${(feet * i) / 4}${i === 4 ? ' ft' : ''}`, sizePx: 12, ink: 'ink', font: 'mono', anchor: i === 4 ? 'start' : 'middle',
  })).map((figure) => (figure.anchor === 'start' ? { ...figure, x: figure.x - labeler.px(4) } : figure))
  labeler.block({ x: x - labeler.px(8), y: y - labeler.px(6), width: feet * 12 + labeler.px(44), height: labeler.px(28) })
  const ticks = [0, 1, 2, 3, 4].map((i) => segment(x + i * part, y - labeler.px(5), x + i * part, y + labeler.px(5))).join('')
  return [...bars, path(ticks, { stroke: 'ink', strokePx: 0.8 }), ...figures]
}

/** The north arrow, turned from the way the wall looks; nothing when that is not known. */
export function northArrow({ facing }: Pick<Site, 'facing'>, layout: Layout, labeler: Labeler): Shape[] {
  if (facing === undefined) return []
  const x = layout.right - labeler.px(16)
  const y = layout.plan.y + layout.plan.height - labeler.px(24)
  labeler.block({ x: x - labeler.px(24), y: y - labeler.px(24), width: labeler.px(48), height: labeler.px(48) })
  return [{ kind: 'mark', mark: 'north', x, y, text: 'N', ink: 'ink', radiusPx: 14, turn: (((180 - facing) % 360) + 360) % 360 }]
}

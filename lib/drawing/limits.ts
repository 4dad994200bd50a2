/** The limits drawn on top: each with its own ink, its own dash and its length. */
import { formatLength } from '../measure'
import { gradeAt, wallY } from '../spacing'
import type { Labeler, Spot, Words } from './labels'
import type { Layout } from './layout'
import type { Ink } from './palette'
import { boxAround, line, offsetLine, path, polygon, segment, wound } from './path'
import type { Margins } from './settings'
import type { SceneOptions, Shape } from './types'

export const DASH = {
  sill: [9, 3],
  gutter: [14, 3, 2, 3],
  walk: [10, 3, 3, 3, 3, 3],
  gap: [3, 3],
} as const satisfies Record<string, number[]>

export interface Drawn {
  lines: Shape[]
  words: Shape[]
}

type Measured = SceneOptions['sheet']
const TEXT_PX = 12

const wordsIn = (ink: Ink, text: string): Words => ({ text, ink, sizePx: TEXT_PX, font: 'mono' })

/** Places above and below a level line, from its left end to its right. */
function alongLine([x1, x2]: [number, number], y: number, { px }: Labeler, belowFirst = false): Spot[] {
  const above = y - px(4)
  const below = y + px(TEXT_PX + (belowFirst ? 6 : 2))
  const middle = (x1 + x2) / 2
  const row = (at: number): Spot[] => [
    { x: x1, y: at, anchor: 'start' }, { x: x2, y: at, anchor: 'end' }, { x: middle, y: at, anchor: 'middle' },
    { x: x1 - px(3), y: at, anchor: 'end' }, { x: x2 + px(3), y: at, anchor: 'start' },
  ]
  return [...(belowFirst ? [below, above] : [above, below]), above - px(15), below + px(15), above - px(30)].flatMap(row)
}

function sillLines(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  const windows = sheet.openings.filter(({ kind }) => kind === 'window')
  const lines: Shape[] = []
  const words: Shape[] = []
  for (const { x, width, sill, name } of windows) {
    const limit = sill - margins.sill
    const y = layout.elevationY(limit)
    const over = labeler.px(8)
    // Below the sill where the wall is tall enough there, else on the glass.
    const room = (limit - gradeAt(sheet.facade, x + width / 2)) * layout.pxPerInch
    lines.push(path(segment(x - over, y, x + width + over, y), { stroke: 'sill-line', strokePx: 1.4, dashPx: [...DASH.sill] }))
    const long = `${name} sill ${formatLength(limit)}`
    const short = `sill ${formatLength(limit)}`
    const fits = long.length * TEXT_PX * 0.61 < (width + 24) * layout.pxPerInch
    const text = labeler.setWords(wordsIn('sill-line', fits ? long : short), alongLine([x, x + width], y, labeler, room > 60))
    if (text) words.push(text)
  }
  return { lines, words }
}

function gutterLine(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  const { gutter, overhang } = sheet.facade
  const limit = gutter - margins.gutter
  const y = layout.elevationY(limit)
  const [l, r] = [layout.left - overhang, layout.right + overhang]
  const label = `${margins.gutter > 0 ? 'below gutter' : 'gutter'} ${formatLength(limit)}`
  const text = labeler.setWords(wordsIn('gutter-line', label), alongLine([layout.left + labeler.px(4), layout.right - labeler.px(4)], margins.gutter > 0 ? y : layout.elevationY(layout.eaves), labeler))
  return {
    lines: [path(segment(l, y, r, y), { stroke: 'gutter-line', strokePx: 1.3, dashPx: [...DASH.gutter] })],
    words: text ? [text] : [],
  }
}

/** Sill and gutter lines of the elevation. */
export function elevationLimits(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  const gutter = gutterLine(sheet, layout, margins, labeler)
  const sills = sillLines(sheet, layout, margins, labeler)
  return { lines: [...gutter.lines, ...sills.lines], words: [...gutter.words, ...sills.words] }
}

function walkEdges(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  const lines: Shape[] = []
  const words: Shape[] = []
  for (const { outline, name } of sheet.walks) {
    const points = wound(outline.map(({ x, y }) => ({ x, y: layout.planY(y) })))
    const ring = offsetLine([points.at(-1)!, ...points, points[0]!], margins.walk).slice(1, -1)
    lines.push(path(polygon(ring), { stroke: 'walk-edge', strokePx: 1.3, dashPx: [...DASH.walk] }))
    const box = boxAround(ring)
    const label = `${name} edge${margins.walk > 0 ? ` + ${formatLength(margins.walk)}` : ''}, ${formatLength(Math.max(box.width < box.height ? box.width : box.height, 0))} wide`
    const short = margins.walk > 0 ? `edge + ${formatLength(margins.walk)}` : 'walk edge'
    const spots = [...alongLine([box.x + labeler.px(4), box.x + box.width - labeler.px(4)], box.y + box.height, labeler), ...alongLine([box.x, box.x + box.width], box.y, labeler)]
    const fits = label.length * TEXT_PX * 0.61 < Math.max(box.width, 60) * layout.pxPerInch
    const text = labeler.setWords(wordsIn('walk-edge', fits ? label : short), spots)
    if (text) words.push(text)
  }
  return { lines, words }
}

function gapLine(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  if (margins.gap <= 0) return { lines: [], words: [] }
  const face = sheet.facade.wall.map(({ x, y }) => ({ x, y: layout.planY(y) }))
  const ring = offsetLine(face, -margins.gap)
  const label = `wall gap ${formatLength(margins.gap)}`
  const spots = [0.02, 0.85, 0.3, 0.6].flatMap((share): Spot[] => {
    const x = layout.left + (layout.right - layout.left) * share
    const y = layout.planY(wallY(sheet.facade, x) + margins.gap)
    return [{ x, y: y - labeler.px(3), anchor: 'start' }, { x, y: y + labeler.px(13), anchor: 'start' }]
  })
  const text = labeler.setWords(wordsIn('wall-gap', label), spots)
  return { lines: [path(line(ring), { stroke: 'wall-gap', strokePx: 1.2, dashPx: [...DASH.gap] })], words: text ? [text] : [] }
}

/** Walk edges and the wall gap of the plan. */
export function planLimits(sheet: Measured, layout: Layout, margins: Margins, labeler: Labeler): Drawn {
  const gap = gapLine(sheet, layout, margins, labeler)
  const walks = walkEdges(sheet, layout, margins, labeler)
  return { lines: [...gap.lines, ...walks.lines], words: [...gap.words, ...walks.words] }
}

/** Puts the shapes of a scene on a canvas context that is already scaled to the scene: inches in, screen pixels out. */
import type { Face, HatchShape, Ink, MarkShape, PathShape, Shape, TextShape } from '@/lib/drawing'

export interface Pen {
  /** Screen pixels per inch. */
  scale: number
  colours: Readonly<Record<Ink, string>>
  /** Font families by face, as CSS. */
  faces: Readonly<Record<Face, string>>
}

type Context = CanvasRenderingContext2D

const MOST_PATHS = 4_000
const paths = new Map<string, Path2D>()

/** Parsed once: the same path data is drawn again and again. */
function pathOf(d: string): Path2D {
  const known = paths.get(d)
  if (known) return known
  if (paths.size >= MOST_PATHS) paths.clear()
  const path = new Path2D(d)
  paths.set(d, path)
  return path
}

function clipTo(context: Context, clip: readonly string[]): void {
  for (const d of clip) context.clip(pathOf(d))
}

function paintPath(context: Context, shape: PathShape, { scale, colours }: Pen): void {
  const path = pathOf(shape.d)
  context.save()
  if (shape.clip) clipTo(context, shape.clip)
  if (shape.opacity !== undefined) context.globalAlpha *= shape.opacity
  if (shape.fill) {
    context.fillStyle = colours[shape.fill]
    context.fill(path)
  }
  if (shape.stroke) {
    context.strokeStyle = colours[shape.stroke]
    context.lineWidth = (shape.strokePx ?? 1) / scale
    context.lineJoin = 'round'
    context.lineCap = shape.cap ?? 'butt'
    context.setLineDash((shape.dashPx ?? []).map((px) => px / scale))
    context.stroke(path)
  }
  context.restore()
}

/** Runs in screen pixels with the origin at a point of the scene. */
function atScreenSize(context: Context, { x, y }: { x: number; y: number }, { scale }: Pen, paint: () => void): void {
  context.save()
  context.translate(x, y)
  context.scale(1 / scale, 1 / scale)
  paint()
  context.restore()
}

const ALIGN = { start: 'left', middle: 'center', end: 'right' } as const
const HALO_PX = 3.5

function paintText(context: Context, shape: TextShape, pen: Pen): void {
  atScreenSize(context, shape, pen, () => {
    context.font = `${shape.italic ? 'italic ' : ''}${shape.bold ? '700 ' : ''}${shape.sizePx}px ${pen.faces[shape.font]}`
    context.textAlign = ALIGN[shape.anchor]
    context.textBaseline = 'alphabetic'
    if (shape.halo) {
      context.strokeStyle = pen.colours.sheet
      context.lineWidth = HALO_PX
      context.lineJoin = 'round'
      context.strokeText(shape.text, 0, 0)
    }
    context.fillStyle = pen.colours[shape.ink]
    context.fillText(shape.text, 0, 0)
  })
}

function paintNorth(context: Context, { radiusPx: r, turn = 0, text = '', ink }: MarkShape, { colours, faces }: Pen): void {
  context.save()
  context.rotate((turn * Math.PI) / 180)
  for (const side of [1, -1]) {
    context.beginPath()
    context.moveTo(0, -r)
    context.lineTo(side * r * 0.42, r * 0.7)
    context.lineTo(0, r * 0.38)
    context.closePath()
    context.fillStyle = side > 0 ? colours[ink] : colours.sheet
    context.fill()
    context.stroke()
  }
  context.restore()
  const angle = ((turn - 90) * Math.PI) / 180
  context.font = `700 12px ${faces.mono}`
  context.fillText(text, Math.cos(angle) * (r + 8), Math.sin(angle) * (r + 8) + 4)
}

function paintMark(context: Context, shape: MarkShape, pen: Pen): void {
  const { radiusPx: r, ink, text = '' } = shape
  const { colours, faces } = pen
  atScreenSize(context, shape, pen, () => {
    context.strokeStyle = colours[ink]
    context.fillStyle = colours[ink]
    context.textAlign = 'center'
    context.lineWidth = 1.2
    switch (shape.mark) {
      case 'dot':
        context.beginPath()
        context.arc(0, 0, r, 0, 2 * Math.PI)
        return context.fill()
      case 'cross':
        context.beginPath()
        context.moveTo(-r, 0)
        context.lineTo(r, 0)
        context.moveTo(0, -r)
        context.lineTo(0, r)
        return context.stroke()
      case 'north':
        context.lineWidth = 1
        return paintNorth(context, shape, pen)
      case 'key':
        context.beginPath()
        context.arc(0, 0, r, 0, 2 * Math.PI)
        context.fillStyle = colours.sheet
        context.fill()
        context.stroke()
        context.fillStyle = colours[ink]
        context.font = `700 12.5px ${faces.text}`
        return context.fillText(text, 0, 4.3)
    }
  })
}

const HATCH_PX = 2.6

function paintHatch(context: Context, { clip, box, ink, spacingPx }: HatchShape, { scale, colours }: Pen): void {
  context.save()
  clipTo(context, clip)
  context.fillStyle = colours[ink]
  context.globalAlpha *= 0.14
  context.fillRect(box.x, box.y, box.width, box.height)
  context.globalAlpha /= 0.14
  context.strokeStyle = colours[ink]
  context.lineWidth = HATCH_PX / scale
  context.beginPath()
  // Lines at 45 degrees, told apart by where they meet the lower edge.
  const step = (spacingPx / scale) * Math.SQRT2
  for (let x = Math.floor(box.x / step) * step; x < box.x + box.width + box.height; x += step) {
    context.moveTo(x, box.y)
    context.lineTo(x - box.height, box.y + box.height)
  }
  context.stroke()
  context.restore()
}

/** Paints shapes in order. Stroke widths, dashes, texts and marks keep their size on screen. */
export function paintShapes(context: Context, shapes: readonly Shape[], pen: Pen): void {
  for (const shape of shapes) {
    switch (shape.kind) {
      case 'path':
        paintPath(context, shape, pen)
        break
      case 'text':
        paintText(context, shape, pen)
        break
      case 'mark':
        paintMark(context, shape, pen)
        break
      case 'hatch':
        paintHatch(context, shape, pen)
        break
    }
  }
}

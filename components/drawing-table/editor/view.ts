/** Pan and zoom: which part of the scene the window shows. Pure arithmetic, and a store of its own so that React stays out of it. */
import type { Box } from '@/lib/drawing'
import { Observable } from './observable'

export interface Spot {
  x: number
  y: number
}

export interface Size {
  width: number
  height: number
}

/** Screen = scene * scale + (x, y); scale is screen pixels per inch. */
export interface View {
  scale: number
  x: number
  y: number
}

/** Twenty-four pixels to the inch shows a quarter inch; a twentieth of a pixel a house front of 1,000 ft. */
const MOST_SCALE = 24
const LEAST_SCALE = 0.05
const PAD_PX = 10
/** Of the drawing, this much stays in the window. */
const KEPT_PX = 80

const clamp = (value: number, least: number, most: number) => Math.min(Math.max(value, least), most)

export const toScene = (view: View, { x, y }: Spot): Spot => ({ x: (x - view.x) / view.scale, y: (y - view.y) / view.scale })
export const toScreen = (view: View, { x, y }: Spot): Spot => ({ x: x * view.scale + view.x, y: y * view.scale + view.y })

/** The whole box in the middle of the window. A window without size gets scale 1. */
export function fitView(box: Box, size: Size): View {
  const scale = clamp(Math.min((size.width - 2 * PAD_PX) / box.width, (size.height - 2 * PAD_PX) / box.height), LEAST_SCALE, MOST_SCALE)
  if (!Number.isFinite(scale)) return { scale: 1, x: 0, y: 0 }
  return {
    scale,
    x: (size.width - box.width * scale) / 2 - box.x * scale,
    y: (size.height - box.height * scale) / 2 - box.y * scale,
  }
}

/** Nearer or farther by a factor; the point of the scene under `at` stays under it. */
export function zoomView(view: View, at: Spot, factor: number): View {
  const scale = clamp(view.scale * factor, LEAST_SCALE, MOST_SCALE)
  const under = toScene(view, at)
  return { scale, x: at.x - under.x * scale, y: at.y - under.y * scale }
}

/** The view moved back so far that some of the drawing stays in the window. */
export function keepInSight(view: View, box: Box, size: Size): View {
  const kept = Math.min(KEPT_PX, size.width / 2, size.height / 2)
  const [left, top] = [box.x * view.scale, box.y * view.scale]
  return {
    scale: view.scale,
    x: clamp(view.x, kept - left - box.width * view.scale, size.width - kept - left),
    y: clamp(view.y, kept - top - box.height * view.scale, size.height - kept - top),
  }
}

/** Two fingers: the scene points they started on stay under them. */
export function pinchView(start: View, from: readonly [Spot, Spot], to: readonly [Spot, Spot]): View {
  const apart = ([a, b]: readonly [Spot, Spot]) => Math.max(Math.hypot(a.x - b.x, a.y - b.y), 1)
  const middle = ([a, b]: readonly [Spot, Spot]) => ({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 })
  const [was, is] = [middle(from), middle(to)]
  const zoomed = zoomView(start, was, apart(to) / apart(from))
  return { scale: zoomed.scale, x: zoomed.x + is.x - was.x, y: zoomed.y + is.y - was.y }
}

interface State {
  view: View
  size: Size
}

/** The window on the drawing. Fits the drawing until the person has panned or zoomed. */
export class Viewport extends Observable<State> {
  private box: Box = { x: 0, y: 0, width: 1, height: 1 }
  private isFitted = true

  constructor() {
    super({ view: { scale: 1, x: 0, y: 0 }, size: { width: 0, height: 0 } })
  }

  get view(): View {
    return this.getSnapshot().view
  }

  private show(view: View) {
    this.set({ view: keepInSight(view, this.box, this.getSnapshot().size) })
  }

  readonly resize = (size: Size) => {
    this.set({ size })
    if (this.isFitted) this.fit()
    else this.show(this.view)
  }

  /** The drawing has this frame now. */
  readonly frame = (box: Box) => {
    const { x, y, width, height } = this.box
    if (box.x === x && box.y === y && box.width === width && box.height === height) return
    this.box = box
    if (this.isFitted) this.fit()
  }

  readonly fit = () => {
    this.isFitted = true
    this.set({ view: fitView(this.box, this.getSnapshot().size) })
  }

  readonly zoom = (factor: number, at?: Spot) => {
    const { size } = this.getSnapshot()
    this.isFitted = false
    this.show(zoomView(this.view, at ?? { x: size.width / 2, y: size.height / 2 }, factor))
  }

  readonly pan = (dx: number, dy: number) => {
    this.isFitted = false
    this.show({ ...this.view, x: this.view.x + dx, y: this.view.y + dy })
  }

  readonly pinch = (start: View, from: readonly [Spot, Spot], to: readonly [Spot, Spot]) => {
    this.isFitted = false
    this.show(pinchView(start, from, to))
  }
}

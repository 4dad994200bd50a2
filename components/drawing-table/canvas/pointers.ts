/**
 * Mouse, pen and fingers on the drawing. One pointer drags a plant or pans the empty ground, a short touch is a tap,
 * two fingers pan and zoom. A second finger during a drag puts the plant back.
 */
import type { Scene } from '@/lib/drawing'
import { axesAt, placementAt, toScene, type Desk, type Spot, type View } from '../editor'

/** Farther than this and a press is a drag, screen pixels. */
const SLOP_PX = { mouse: 3, pen: 5, touch: 8 } as const
const WHEEL_ZOOM = 0.0016
/** Wheels that count lines instead of pixels. */
const LINE_PX = 16

type Gesture =
  | { kind: 'none' }
  | { kind: 'press'; from: Spot; slop: number; plant: string | null }
  | { kind: 'drag'; from: Spot }
  | { kind: 'pan'; last: Spot }
  | { kind: 'pinch'; start: View; ids: [number, number]; from: [Spot, Spot] }

export class Pointers {
  private readonly down = new Map<number, Spot>()
  private gesture: Gesture = { kind: 'none' }
  private readonly stop = new AbortController()

  constructor(
    private readonly element: HTMLElement,
    private readonly desk: Desk,
    private readonly scene: () => Scene,
  ) {
    const { signal } = this.stop
    const on = <K extends keyof HTMLElementEventMap>(name: K, hear: (event: HTMLElementEventMap[K]) => void) =>
      element.addEventListener(name, hear, { signal, passive: false })
    on('pointerdown', this.press)
    on('pointermove', this.moved)
    on('pointerup', this.release)
    on('pointercancel', this.cancel)
    on('lostpointercapture', this.cancel)
    on('wheel', this.wheel)
    on('contextmenu', (event) => event.preventDefault())
    // Scrolling and the browser's own zoom must not take the fingers away.
    on('touchmove', (event) => event.preventDefault())
  }

  destroy(): void {
    this.stop.abort()
  }

  private spotOf(event: MouseEvent): Spot {
    const { left, top } = this.element.getBoundingClientRect()
    return { x: event.clientX - left, y: event.clientY - top }
  }

  private plantAt(spot: Spot): string | null {
    const { editor, viewport } = this.desk
    return placementAt(this.scene(), toScene(viewport.view, spot), { scale: viewport.view.scale, selected: editor.getSnapshot().selected })
  }

  private readonly press = (event: PointerEvent): void => {
    if (event.pointerType === 'mouse' && event.button > 1) return
    const spot = this.spotOf(event)
    this.down.set(event.pointerId, spot)
    this.element.setPointerCapture(event.pointerId)
    if (this.down.size === 2) return this.startPinch()
    if (this.down.size > 2) return
    const slop = SLOP_PX[event.pointerType as keyof typeof SLOP_PX] ?? SLOP_PX.touch
    this.gesture = event.button === 1 ? { kind: 'pan', last: spot } : { kind: 'press', from: spot, slop, plant: this.plantAt(spot) }
  }

  private startPinch(): void {
    const [[a, from], [b, to]] = [...this.down] as [[number, Spot], [number, Spot]]
    if (!this.desk.editor.getSnapshot().isCarried) this.desk.editor.cancelMove()
    this.gesture = { kind: 'pinch', start: this.desk.viewport.view, ids: [a, b], from: [from, to] }
  }

  private readonly moved = (event: PointerEvent): void => {
    const spot = this.spotOf(event)
    if (!this.down.has(event.pointerId)) return this.hover(event, spot)
    this.down.set(event.pointerId, spot)
    const { editor, viewport } = this.desk
    const { gesture } = this
    switch (gesture.kind) {
      case 'press':
        if (Math.hypot(spot.x - gesture.from.x, spot.y - gesture.from.y) > gesture.slop) this.startDrag(gesture, spot)
        break
      case 'drag': {
        const { scale } = viewport.view
        editor.moveBy((spot.x - gesture.from.x) / scale, (spot.y - gesture.from.y) / scale)
        break
      }
      case 'pan':
        viewport.pan(spot.x - gesture.last.x, spot.y - gesture.last.y)
        this.gesture = { kind: 'pan', last: spot }
        break
      case 'pinch': {
        const [a, b] = gesture.ids.map((id) => this.down.get(id))
        if (a && b) viewport.pinch(gesture.start, gesture.from, [a, b])
        break
      }
      case 'none':
        break
    }
  }

  /** A plant picked up follows the mouse before it is set down; fingers do not hover. */
  private hover(event: PointerEvent, spot: Spot): void {
    if (event.pointerType === 'touch' || !this.desk.editor.getSnapshot().isCarried) return
    this.carryTo(spot)
  }

  private carryTo(spot: Spot): void {
    const { editor, viewport } = this.desk
    const drag = editor.moving
    if (!drag) return
    const at = toScene(viewport.view, spot)
    const isPlan = axesAt(this.scene(), at) === 'both'
    editor.moveTo(at.x, isPlan ? this.scene().outAt(at.y) : drag.candidate.y)
  }

  private startDrag({ from, plant }: Extract<Gesture, { kind: 'press' }>, spot: Spot): void {
    const { editor, viewport } = this.desk
    const { tool, isCarried } = editor.getSnapshot()
    const canDrag = plant !== null && tool.kind === 'move' && !isCarried
    if (canDrag && editor.beginMove(plant, axesAt(this.scene(), toScene(viewport.view, from)))) {
      this.gesture = { kind: 'drag', from }
      editor.moveBy((spot.x - from.x) / viewport.view.scale, (spot.y - from.y) / viewport.view.scale)
      return
    }
    this.gesture = { kind: 'pan', last: spot }
    viewport.pan(spot.x - from.x, spot.y - from.y)
  }

  private readonly release = (event: PointerEvent): void => {
    if (!this.down.delete(event.pointerId)) return
    const { gesture } = this
    if (gesture.kind === 'press') this.tap(gesture)
    if (gesture.kind === 'drag') this.desk.editor.commitMove()
    const [left] = this.down.values()
    // One finger left after a pinch goes on panning.
    this.gesture = gesture.kind === 'pinch' && left ? { kind: 'pan', last: left } : { kind: 'none' }
  }

  private readonly cancel = (event: PointerEvent): void => {
    if (!this.down.delete(event.pointerId)) return
    if (this.gesture.kind === 'drag') this.desk.editor.cancelMove()
    this.gesture = { kind: 'none' }
  }

  /** Sets down what is held, sets a new plant, picks up the selected plant, or selects. */
  private tap({ from, plant }: Extract<Gesture, { kind: 'press' }>): void {
    const { editor, viewport } = this.desk
    const { tool, isCarried, selected } = editor.getSnapshot()
    if (isCarried) {
      this.carryTo(from)
      return editor.commitMove()
    }
    if (tool.kind === 'room') {
      const at = toScene(viewport.view, from)
      if (axesAt(this.scene(), at) === 'both') editor.setSpot(Math.round(at.x), Math.round(this.scene().outAt(at.y)))
      return
    }
    if (tool.kind === 'plant' && tool.plant) {
      const at = toScene(viewport.view, from)
      if (axesAt(this.scene(), at) === 'both') editor.add(tool.plant, Math.round(at.x), Math.round(this.scene().outAt(at.y)))
      return
    }
    if (plant !== null && plant === selected && editor.canEdit) return editor.pickUp()
    editor.select(plant)
  }

  private readonly wheel = (event: WheelEvent): void => {
    event.preventDefault()
    const px = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? event.deltaY * LINE_PX : event.deltaY
    this.desk.viewport.zoom(Math.exp(-px * WHEEL_ZOOM), this.spotOf(event))
  }
}

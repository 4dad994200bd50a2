/**
 * The drawing on Konva, driven by hand: React is asked for nothing while a plant moves. Layers from the ground up:
 * ground, plants (one group each and view), limits and labels, and a small overlay for what is selected or moves.
 */
import Konva from 'konva'
import { buildScene, type PlantDrawing, type Scene, type Shape } from '@/lib/drawing'
import type { Desk } from '../editor'
import { movingShapes, offsetsOf, type Carried } from './moving'
import { paintShapes, type Pen } from './paint'
import { onThemeChange, readTheme } from './theme'

/** Labels are placed for the scale they are seen at, once it has been still for so long. */
const SETTLE_MS = 140

const FAINT = 0.35

type Shapes = () => readonly Shape[]
type Views = 'elevation' | 'plan'

export class Board {
  private readonly stage: Konva.Stage
  private readonly layers = {
    ground: new Konva.Layer({ listening: false }),
    plants: new Konva.Layer({ listening: false }),
    labels: new Konva.Layer({ listening: false }),
    overlay: new Konva.Layer({ listening: false }),
  }
  private readonly groups = new Map<string, Konva.Group>()
  private pen: Pen
  private scene: Scene
  private labelScale: number
  private held: Carried | null = null
  private keys: Konva.Shape | null = null
  private frame = 0
  private settling: ReturnType<typeof setTimeout> | undefined
  private readonly stops: (() => void)[] = []

  constructor(
    private readonly container: HTMLDivElement,
    private readonly desk: Desk,
  ) {
    this.stage = new Konva.Stage({ container, width: container.clientWidth, height: container.clientHeight })
    for (const layer of Object.values(this.layers)) this.stage.add(layer)
    this.pen = { scale: 1, ...readTheme(container) }
    this.scene = this.build(undefined)
    desk.viewport.frame(this.scene.box)
    this.labelScale = desk.viewport.view.scale
    this.listen()
    this.redrawAll()
  }

  /** The scene as it is drawn now. */
  get current(): Scene {
    return this.scene
  }

  destroy(): void {
    this.stops.forEach((stop) => stop())
    cancelAnimationFrame(this.frame)
    clearTimeout(this.settling)
    this.stage.destroy()
  }

  private listen(): void {
    const { editor, viewport } = this.desk
    const sized = new ResizeObserver(() => viewport.resize({ width: this.container.clientWidth, height: this.container.clientHeight }))
    sized.observe(this.container)
    this.stops.push(
      () => sized.disconnect(),
      editor.subscribe(() => this.schedule()),
      editor.onMoving(this.move),
      viewport.subscribe(this.show),
      onThemeChange(() => {
        this.pen = { ...this.pen, ...readTheme(this.container) }
        this.redrawAll()
      }),
    )
  }

  private build(pxPerInch: number | undefined): Scene {
    const { editor } = this.desk
    const { sheet, year, bound, month, selected, finding, spot, room, pockets } = editor.getSnapshot()
    return buildScene({ sheet, year, bound, month, selected, finding: editor.finding(finding), spot: spot && { ...spot, room }, pockets, ...(pxPerInch && { pxPerInch }) })
  }

  /** Many changes in one frame are drawn once. */
  private schedule(): void {
    cancelAnimationFrame(this.frame)
    this.frame = requestAnimationFrame(() => this.redrawAll())
  }

  private readonly show = (): void => {
    const { view, size } = this.desk.viewport.getSnapshot()
    if (this.stage.width() !== size.width || this.stage.height() !== size.height) this.stage.size(size)
    this.stage.scale({ x: view.scale, y: view.scale })
    this.stage.position({ x: view.x, y: view.y })
    this.pen = { ...this.pen, scale: view.scale }
    this.stage.batchDraw()
    if (view.scale === this.labelScale) return
    clearTimeout(this.settling)
    this.settling = setTimeout(() => this.redrawAll(), SETTLE_MS)
  }

  private painted(shapes: Shapes): Konva.Shape {
    return new Konva.Shape({
      listening: false,
      perfectDrawEnabled: false,
      sceneFunc: (context) => paintShapes(context._context, shapes(), this.pen),
    })
  }

  private redrawAll(): void {
    cancelAnimationFrame(this.frame)
    this.labelScale = this.desk.viewport.view.scale
    this.scene = this.build(this.labelScale)
    const { elevation, plan } = this.scene
    this.desk.viewport.frame(this.scene.box)
    const { ground, plants, labels } = this.layers
    const fill = (layer: Konva.Layer, ...nodes: (Konva.Shape | Konva.Group)[]) => {
      layer.destroyChildren()
      layer.add(...nodes)
    }
    fill(ground, this.painted(() => [...elevation.ground, ...plan.ground]))
    this.groups.clear()
    fill(plants, ...this.plantGroups('elevation', elevation.plants), ...this.plantGroups('plan', plan.plants))
    const all = [...elevation.labels, ...plan.labels]
    this.keys = this.painted(() => all.filter(({ kind }) => kind !== 'text'))
    fill(labels, this.painted(() => [...elevation.limits, ...plan.limits]), this.keys, this.painted(() => all.filter(({ kind }) => kind === 'text')))
    this.held = null
    this.show()
    this.move()
  }

  private plantGroups(view: Views, drawings: readonly PlantDrawing[]): Konva.Group[] {
    return drawings.map((drawing) => {
      const group = new Konva.Group({ name: drawing.placement, listening: false })
      group.add(this.painted(() => drawing.shapes))
      this.groups.set(`${view} ${drawing.placement}`, group)
      return group
    })
  }

  /** One frame of a move: only the overlay is painted; the plant leaves its layer at the first frame and returns at the last. */
  private readonly move = (): void => {
    const drag = this.desk.editor.moving
    if (!drag) return this.rest()
    if (!this.held) this.lift(drag.snapshot.id)
    const held = this.held
    if (!held) return
    const { sheet } = this.desk.editor.getSnapshot()
    const offsets = offsetsOf(drag, sheet)
    for (const view of ['elevation', 'plan'] as const) this.groups.get(`${view} ${drag.snapshot.id}`)?.position(offsets[view])
    this.layers.overlay.batchDraw()
  }

  private lift(id: string): void {
    const { overlay, plants, labels } = this.layers
    const find = (drawings: readonly PlantDrawing[]) => drawings.find(({ placement }) => placement === id)
    const [elevation, plan] = [find(this.scene.elevation.plants), find(this.scene.plan.plants)]
    if (!elevation || !plan) return
    const held = { elevation, plan }
    this.held = held
    overlay.destroyChildren()
    for (const view of ['elevation', 'plan'] as const) this.groups.get(`${view} ${id}`)?.moveTo(overlay)
    overlay.add(this.painted(() => {
      const drag = this.desk.editor.moving
      const { sheet } = this.desk.editor.getSnapshot()
      return drag ? movingShapes(drag, held, this.scene, { sheet, scale: this.pen.scale }) : []
    }))
    plants.batchDraw()
    // Keys stay where they are till the drop: they step back so that none seems to belong to the empty place.
    this.keys?.opacity(FAINT)
    labels.batchDraw()
  }

  /** Nothing moves: the overlay shows what is selected. A plant put back returns to its place. */
  private rest(): void {
    const { overlay } = this.layers
    if (this.held) {
      this.held = null
      return this.redrawAll()
    }
    const { elevation, plan } = this.scene
    overlay.destroyChildren()
    overlay.add(this.painted(() => [...elevation.highlight, ...plan.highlight]))
    overlay.batchDraw()
  }
}

/**
 * The drawing table without a drawing: the sheet, what is said of it, what is selected, and every way of changing it.
 * No React, no Konva, no DOM. Two ways to listen: `subscribe` for what panels show, `onMoving` for what moves under
 * the finger (React sleeps through a drag).
 */
import type { Plant } from '@/lib/plants'
import { applyEdits, placementSchema, targetOf, type Edit } from '@/lib/sheet'
import { changedPlacements, check, type Bound, type Finding, type Placement, type Pocket, type Point, type Remedy, type Sheet, type Size } from '@/lib/spacing'
import { DragSession, type Axes, type Grid } from './drag-session'
import { History, inversesOf } from './history'
import { Observable } from './observable'
import { newPlacement } from './placing'
import type { WaitingEdit } from './queue-store'
import type { Served, SheetReport } from './save-calls'
import { keyOfEdit, thingOn } from './things'

export const LAST_YEAR = 20
export const TENTH_SUMMER = 10

/** move: pointers select and drag. plant: a tap in plan sets this plant there. room: a tap in plan asks what fits there. */
export type Tool = { kind: 'move' } | { kind: 'plant'; plant: Plant | null } | { kind: 'room' }

export interface EditorState {
  sheet: Sheet
  report: SheetReport
  /** Placement. */
  selected: string | null
  /** Key of a finding. */
  finding: string | null
  tool: Tool
  /** Where one asks what fits, and the largest crown it holds once that is known. */
  spot: Point | null
  room: Size | null
  /** Empty circles to draw on the plan. */
  pockets: readonly Pocket[]
  /** Picked up by a tap: the next tap says where it goes. */
  isCarried: boolean
  /** Years since planting, 0 to 20. */
  year: number
  bound: Bound
  /** 1-12. */
  month: number
  grid: Grid
  undoLabel: string | null
  redoLabel: string | null
  /** The last deed in words, for those who listen. */
  said: string
}

interface Options {
  sheet: Sheet
  report: SheetReport
  canEdit: boolean
  newId: () => string
  /** Takes the edits that are to be saved. */
  send: (edits: WaitingEdit[]) => void
}

const JULY = 7

/** A plant's common name, or its botanical one where it has none. */
export function nameOf(sheet: Pick<Sheet, 'plants'>, placement: Pick<Placement, 'plant'>): string {
  const plant = sheet.plants.find(({ id }) => id === placement.plant)
  return plant ? plant.common || plant.botanical : 'Unknown plant'
}

export class Editor extends Observable<EditorState> {
  readonly canEdit: boolean
  private readonly history: History
  private readonly plants: Map<string, Plant>
  /** The sheet as far as the server has acknowledged it. */
  private confirmed: Sheet
  private drag: DragSession | null = null
  private readonly movingListeners = new Set<() => void>()

  constructor(private readonly options: Options) {
    super({
      sheet: options.sheet, report: options.report, selected: null, finding: null, tool: { kind: 'move' }, spot: null, room: null, pockets: [], isCarried: false,
      year: TENTH_SUMMER, bound: 'expected', month: JULY, grid: 1, undoLabel: null, redoLabel: null, said: '',
    })
    this.canEdit = options.canEdit
    this.confirmed = options.sheet
    this.history = new History(options.newId)
    this.plants = new Map(options.sheet.plants.map((plant) => [plant.id, plant]))
  }

  // -- looking ------------------------------------------------------------------------------------------------

  placement(id: string | null): Placement | null {
    return this.getSnapshot().sheet.placements.find((placement) => placement.id === id) ?? null
  }

  finding(key: string | null): Finding | null {
    return this.getSnapshot().report.findings.find((finding) => finding.key === key) ?? null
  }

  /** Selects a plant, or nothing. What was held goes back. */
  readonly select = (id: string | null): void => {
    this.cancelMove()
    const finding = this.finding(this.getSnapshot().finding)
    const keepsFinding = finding !== null && id !== null && finding.placements.includes(id)
    this.set({ selected: this.placement(id)?.id ?? null, ...(!keepsFinding && { finding: null }) })
  }

  /** Selects a finding and the first plant it names. */
  readonly selectFinding = (key: string | null): void => {
    this.cancelMove()
    const finding = this.finding(key)
    this.set({ finding: finding?.key ?? null, selected: finding ? (finding.placements[0] ?? null) : null })
  }

  readonly setYear = (year: number): void => this.set({ year: Math.min(Math.max(Math.round(year), 0), LAST_YEAR) })
  readonly setBound = (bound: Bound): void => this.set({ bound })
  readonly setMonth = (month: number): void => this.set({ month })
  readonly setGrid = (grid: Grid): void => this.set({ grid })

  readonly setTool = (tool: Tool): void => {
    this.cancelMove()
    this.set({ tool: this.canEdit || tool.kind === 'room' ? tool : { kind: 'move' }, spot: null, room: null, ...(tool.kind === 'room' && { selected: null, finding: null }) })
  }

  /** Asks what fits at a point of the plan. */
  readonly setSpot = (x: number, y: number): void => this.set({ spot: { x, y }, room: null })
  readonly showPockets = (pockets: readonly Pocket[]): void => this.set({ pockets })
  /** Shows the largest crown the spot holds. */
  readonly showRoom = (room: Size | null): void => this.set({ room: this.getSnapshot().spot ? room : null })

  // -- changing -----------------------------------------------------------------------------------------------

  /** Makes one gesture: its edits, one undo entry, one full check. Does nothing in a read-only table. */
  private make(edits: readonly Edit[], label: string): void {
    if (!this.canEdit || edits.length === 0) return
    const { sheet } = this.getSnapshot()
    this.history.record({ label, forward: edits, back: inversesOf(sheet, edits, this.options.newId) })
    this.apply(edits, label)
  }

  private apply(edits: readonly Edit[], said: string): void {
    let sheet = this.getSnapshot().sheet
    const waiting = edits.map((edit): WaitingEdit => {
      const before = thingOn(sheet, targetOf(edit))
      sheet = applyEdits(sheet, [edit])
      const plant = edit.op === 'put' && edit.kind === 'placement' ? this.plants.get(edit.value.plant) : undefined
      return { edit, before, ...(plant && { plant }) }
    })
    this.show(sheet, said)
    this.options.send(waiting)
  }

  private withPlants(sheet: Sheet): Sheet {
    const known = new Set(sheet.plants.map(({ id }) => id))
    const missing = [...new Set(sheet.placements.map(({ plant }) => plant))].filter((id) => !known.has(id))
    const found = missing.flatMap((id) => this.plants.get(id) ?? [])
    return found.length > 0 ? { ...sheet, plants: [...sheet.plants, ...found] } : sheet
  }

  private show(next: Sheet, said: string, report?: SheetReport): void {
    const sheet = this.withPlants(next)
    const { selected, finding } = this.getSnapshot()
    const checked = report ?? check(sheet)
    this.set({
      sheet, said,
      report: { engine: checked.engine, findings: checked.findings },
      selected: sheet.placements.some(({ id }) => id === selected) ? selected : null,
      finding: checked.findings.some(({ key }) => key === finding) ? finding : null,
      undoLabel: this.history.undoLabel, redoLabel: this.history.redoLabel,
    })
  }

  /** Puts a placement as it should be. Answers what is wrong with it, one sentence; null when it was put. */
  readonly put = (placement: Placement, label: string): string | null => {
    const parsed = placementSchema.safeParse(placement)
    if (!parsed.success) return parsed.error.issues[0]?.message ?? 'This does not fit.'
    if (!this.plants.has(placement.plant)) return 'This plant is not in the library.'
    this.cancelMove()
    this.make([{ id: this.options.newId(), op: 'put', kind: 'placement', value: parsed.data }], label)
    return null
  }

  /** Sets a new plant at a point of the plan and selects it. Answers its id; null in a read-only table. */
  readonly add = (plant: Plant, x: number, y: number): string | null => {
    if (!this.canEdit) return null
    this.plants.set(plant.id, plant)
    const placement = newPlacement({ id: this.options.newId(), plant, x, y })
    if (this.put(placement, `${plant.common || plant.botanical} planted`) !== null) return null
    this.select(placement.id)
    return placement.id
  }

  /** Applies a way out: one gesture, whatever it changes. `plant` is the one swapped in. */
  readonly applyRemedy = (remedy: Remedy, label: string, plant?: Plant): void => {
    if (plant) this.plants.set(plant.id, plant)
    this.cancelMove()
    const changed = changedPlacements(this.getSnapshot().sheet, remedy, plant)
    this.make(changed.map((value) => ({ id: this.options.newId(), op: 'put', kind: 'placement', value })), label)
  }

  readonly remove = (id: string): void => {
    const placement = this.placement(id)
    if (!placement) return
    this.cancelMove()
    this.make([{ id: this.options.newId(), op: 'remove', kind: 'placement', target: id }], `${nameOf(this.getSnapshot().sheet, placement)} removed`)
  }

  readonly undo = (): void => {
    if (this.drag) return this.cancelMove()
    const step = this.canEdit ? this.history.undo() : null
    if (step) this.apply(step.back, `Taken back: ${step.label}`)
  }

  readonly redo = (): void => {
    this.cancelMove()
    const step = this.canEdit ? this.history.redo() : null
    if (step) this.apply(step.forward, `Done again: ${step.label}`)
  }

  // -- moving -------------------------------------------------------------------------------------------------

  get moving(): DragSession | null {
    return this.drag
  }

  /** Hears every frame of a move; nothing else does. */
  readonly onMoving = (listener: () => void): (() => void) => {
    this.movingListeners.add(listener)
    return () => this.movingListeners.delete(listener)
  }

  private tellMoving(): void {
    for (const listener of [...this.movingListeners]) listener()
  }

  /** Takes hold of a plant. Answers null where nothing may be moved. */
  readonly beginMove = (id: string, axes: Axes): DragSession | null => {
    const placement = this.placement(id)
    if (!this.canEdit || !placement) return null
    this.cancelMove()
    if (this.getSnapshot().selected !== id) this.select(id)
    const { sheet, grid } = this.getSnapshot()
    this.drag = new DragSession({ sheet, placement, axes, grid })
    this.tellMoving()
    return this.drag
  }

  readonly moveBy = (dx: number, dy: number): void => {
    if (this.drag?.moveBy(dx, dy)) this.tellMoving()
  }

  readonly moveTo = (x: number, y: number): void => {
    if (this.drag?.moveTo(x, y)) this.tellMoving()
  }

  /** An arrow key held or struck: takes hold of the selected plant if need be, and goes one step. */
  readonly nudge = (dx: number, dy: number): void => {
    const { selected, isCarried } = this.getSnapshot()
    if (!this.drag && selected) this.beginMove(selected, 'both')
    if (this.drag?.step(dx, dy)) this.tellMoving()
    if (isCarried) this.set({ isCarried: false })
  }

  /** Drops what is held where it is held: one edit, one undo entry; none when it did not move. */
  readonly commitMove = (): void => {
    const drag = this.drag
    if (!drag) return
    this.drag = null
    if (this.getSnapshot().isCarried) this.set({ isCarried: false })
    if (drag.hasMoved) {
      const label = `${nameOf(this.getSnapshot().sheet, drag.candidate)} moved`
      this.make([{ id: this.options.newId(), op: 'put', kind: 'placement', value: drag.candidate }], label)
    }
    this.tellMoving()
  }

  /** What is held goes back to where it was. */
  readonly cancelMove = (): void => {
    if (this.drag) {
      this.drag = null
      this.tellMoving()
    }
    if (this.getSnapshot().isCarried) this.set({ isCarried: false })
  }

  /** Picks the selected plant up, to be set down by a tap. */
  readonly pickUp = (): void => {
    const { selected, sheet } = this.getSnapshot()
    const placement = this.placement(selected)
    if (!placement || !this.beginMove(placement.id, 'both')) return
    this.set({ isCarried: true, tool: { kind: 'move' }, said: `${nameOf(sheet, placement)} picked up. Tap where it goes; Escape puts it back.` })
  }

  // -- the server ---------------------------------------------------------------------------------------------

  /** All that is unsent, with what an earlier page left: on the sheet again. What that page did is not to be undone here. */
  readonly restored = (waiting: readonly WaitingEdit[]): void => {
    this.learn(waiting)
    this.show(applyEdits(this.confirmed, waiting.map(({ edit }) => edit)), 'Edits that were not sent are back on the sheet.')
  }

  private learn(waiting: readonly WaitingEdit[]): void {
    for (const { plant } of waiting) if (plant) this.plants.set(plant.id, plant)
  }

  /** The server has these edits; its report stands when nothing newer waits. */
  readonly saved = (waiting: readonly WaitingEdit[], report: SheetReport, isLatest: boolean): void => {
    this.confirmed = this.withPlants(applyEdits(this.confirmed, waiting.map(({ edit }) => edit)))
    if (isLatest) this.set({ report })
  }

  /** A refused edit comes off the sheet; what still waits stays on. */
  readonly refused = (refused: WaitingEdit, rest: readonly WaitingEdit[]): void => {
    this.cancelMove()
    this.history.forget(new Set([keyOfEdit(refused.edit)]))
    this.show(applyEdits(this.confirmed, rest.map(({ edit }) => edit)), 'An edit was refused and taken out.')
  }

  /** The server's sheet, with what still waits on top. What was given up for theirs cannot be undone. */
  readonly served = (served: Served, rest: readonly WaitingEdit[], dropped: readonly WaitingEdit[]): void => {
    this.cancelMove()
    for (const plant of served.sheet.plants) this.plants.set(plant.id, plant)
    this.confirmed = served.sheet
    this.history.forget(new Set(dropped.map(({ edit }) => keyOfEdit(edit))))
    const sheet = applyEdits(served.sheet, rest.map(({ edit }) => edit))
    this.show(sheet, 'The sheet now holds what others changed.', rest.length === 0 ? served.report : undefined)
  }
}

/**
 * What is measured on one facade while somebody types: the sheet as it is kept, and beside it what is typed but not
 * yet kept. A thing (the house front, one opening, one bed) is kept when a field is left and the whole thing is sound;
 * until then it waits, with the reason at its field. No React, no DOM.
 */
import {
  applyEdit, applyEdits, aspectSchema, bedSchema, facadeSchema, findProblems, fixtureSchema, inverseOf, listOf, openingSchema,
  problemsOf, targetOf, walkSchema, type Edit, type EditKind, type ListedKind, type Problem, type ValueOf,
} from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { isSameThing, keyOfEdit, thingOn } from '../drawing-table/editor/things'
import type { WaitingEdit } from '../drawing-table/editor/queue-store'

export type MeasuredKind = Exclude<EditKind, 'placement'>
/** One whole thing with the values typed into it. */
export type Thing = { [K in MeasuredKind]: { kind: K; value: ValueOf[K] } }[MeasuredKind]
export type MeasuredList = Exclude<ListedKind, 'placement'>

export interface Draft {
  thing: Thing
  /** [] when it could be kept as it is. */
  problems: Problem[]
}

interface Step {
  label: string
  forward: Edit[]
  back: Edit[]
}

export interface MeasuringState {
  /** Kept, and on its way to the server. */
  sheet: Sheet
  /** Kept, and what is typed and sound: what the drawing shows. */
  shown: Sheet
  drafts: ReadonlyMap<string, Draft>
  past: readonly Step[]
  future: readonly Step[]
  /** The last deed in words, for the status line: "Kitchen removed". */
  said: string | null
}

const SCHEMAS = { facade: facadeSchema, aspect: aspectSchema, opening: openingSchema, fixture: fixtureSchema, walk: walkSchema, bed: bedSchema }
export const LIST_NAMES = { opening: 'openings', fixture: 'fixtures', walk: 'walks', bed: 'beds' } as const
const PAST_KEPT = 200

const editOf = (thing: Thing, id: string): Edit => ({ id, op: 'put', ...thing }) as Edit
const keyOf = (thing: Thing): string => keyOfEdit(editOf(thing, ''))

/** What a thing is called in a sentence. */
export function nameOf(thing: Thing): string {
  switch (thing.kind) {
    case 'facade':
      return 'House front'
    case 'aspect':
      return 'Facing and light'
    case 'fixture':
      return thing.value.kind.replaceAll('-', ' ').replace(/^./, (letter) => letter.toUpperCase())
    case 'opening':
    case 'walk':
    case 'bed':
      return thing.value.name || 'Without a name'
  }
}

/** Where a thing stands in the sheet: the start of the path of its problems. */
export function pathOf(sheet: Sheet, thing: Thing): (string | number)[] {
  if (thing.kind === 'facade') return ['facade']
  if (thing.kind === 'aspect') return ['site']
  const list = listOf(sheet, thing.kind)
  const at = list.findIndex(({ id }) => id === thing.value.id)
  return [LIST_NAMES[thing.kind], at < 0 ? list.length : at]
}

/** What putting this thing on the sheet would break that is not broken already; [] when it may be kept. */
export function problemsWith(sheet: Sheet, thing: Thing): Problem[] {
  const shape = SCHEMAS[thing.kind].safeParse(thing.value)
  if (!shape.success) {
    const start = pathOf(sheet, thing)
    return problemsOf(shape.error).map(({ path, message }) => ({ path: [...start, ...path], message }))
  }
  const known = new Set(findProblems(sheet).map((problem) => JSON.stringify(problem)))
  return findProblems(applyEdit(sheet, editOf(thing, ''))).filter((problem) => !known.has(JSON.stringify(problem)))
}

const isKept = (sheet: Sheet, thing: Thing) => isSameThing(thingOn(sheet, targetOf(editOf(thing, ''))), thing.value)

/** What is measured on a sheet; in which order its things stand does not count. */
function measuresOf({ facade, site: { light, facing }, ...lists }: Sheet) {
  return { facade, light, facing, things: Object.values(LIST_NAMES).map((name) => [...lists[name]].sort((a, b) => (a.id < b.id ? -1 : 1))) }
}

/** Edits with the things they touch as they stood before each: what the save queue takes. */
function withBefore(sheet: Sheet, edits: readonly Edit[]): WaitingEdit[] {
  let now = sheet
  return edits.map((edit) => {
    const before = thingOn(now, targetOf(edit))
    now = applyEdit(now, edit)
    return { edit, before }
  })
}

interface Options {
  /** Takes the edits that are to be saved. */
  send: (edits: WaitingEdit[]) => void
  newId: () => string
}

/** The store behind the form. `subscribe` and `getState` suit React's external stores. */
export class Measuring {
  private state: MeasuringState
  private readonly listeners = new Set<() => void>()

  constructor(sheet: Sheet, private readonly options: Options) {
    this.state = { sheet, shown: sheet, drafts: new Map(), past: [], future: [], said: null }
  }

  readonly getState = (): MeasuringState => this.state
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  private set(next: Partial<MeasuringState>) {
    const merged = { ...this.state, ...next }
    const drafts = new Map([...merged.drafts].map(([key, { thing }]) => [key, { thing, problems: problemsWith(merged.sheet, thing) }]))
    const sound = [...drafts.values()].filter(({ problems }) => problems.length === 0)
    const shown = applyEdits(merged.sheet, sound.map(({ thing }) => editOf(thing, '')))
    this.state = { ...merged, drafts, shown: sound.length > 0 ? shown : merged.sheet }
    this.listeners.forEach((listener) => listener())
  }

  /** A field holds a readable value: the drawing follows where the thing is sound. */
  readonly type = (thing: Thing) => {
    const drafts = new Map(this.state.drafts)
    if (isKept(this.state.sheet, thing)) drafts.delete(keyOf(thing))
    else drafts.set(keyOf(thing), { thing, problems: [] })
    this.set({ drafts })
  }

  /** Forgets what is typed into a thing. */
  readonly drop = (thing: Thing) => {
    const drafts = new Map(this.state.drafts)
    drafts.delete(keyOf(thing))
    this.set({ drafts })
  }

  /** A field is left: whatever is typed and sound is kept and sent; keeping one thing may make another sound. */
  readonly leave = () => {
    for (let sound = this.firstSound(); sound; sound = this.firstSound()) {
      const { thing } = sound
      const drafts = new Map(this.state.drafts)
      drafts.delete(keyOf(thing))
      this.commit([editOf(thing, this.options.newId())], `${nameOf(thing)} changed`, drafts)
    }
  }

  private firstSound(): Draft | undefined {
    return [...this.state.drafts.values()].find(({ problems }) => problems.length === 0)
  }

  /** Puts a thing at once: a new one, a copy, a choice from a list. Refused, with the reasons, when it is not sound. */
  readonly put = (thing: Thing, label = `${nameOf(thing)} added`): Problem[] => {
    const problems = problemsWith(this.state.sheet, thing)
    if (problems.length === 0) this.commit([editOf(thing, this.options.newId())], label, this.state.drafts)
    return problems
  }

  readonly remove = (thing: Extract<Thing, { kind: MeasuredList }>) => {
    const drafts = new Map(this.state.drafts)
    drafts.delete(keyOf(thing))
    this.commit([{ id: this.options.newId(), op: 'remove', kind: thing.kind, target: thing.value.id }], `${nameOf(thing)} removed`, drafts)
  }

  private commit(forward: Edit[], label: string, drafts: MeasuringState['drafts']) {
    const waiting = withBefore(this.state.sheet, forward)
    const back: Edit[] = []
    let sheet = this.state.sheet
    for (const edit of forward) {
      const inverse = inverseOf(sheet, edit, this.options.newId())
      if (inverse) back.unshift(inverse)
      sheet = applyEdit(sheet, edit)
    }
    const past = [...this.state.past, { label, forward, back }].slice(-PAST_KEPT)
    this.set({ sheet, drafts, past, future: [], said: label })
    this.options.send(waiting)
  }

  /** Takes the last step back, as edits of its own. What is typed and waits in other things stays. */
  readonly undo = () => {
    const step = this.state.past.at(-1)
    if (step) this.replay(step.back, { past: this.state.past.slice(0, -1), future: [...this.state.future, step], said: `Taken back: ${step.label}` })
  }

  readonly redo = () => {
    const step = this.state.future.at(-1)
    if (step) this.replay(step.forward, { past: [...this.state.past, step], future: this.state.future.slice(0, -1), said: `Done again: ${step.label}` })
  }

  private replay(edits: readonly Edit[], next: Partial<MeasuringState>) {
    const fresh = edits.map((edit) => ({ ...edit, id: this.options.newId() }))
    const waiting = withBefore(this.state.sheet, fresh)
    const touched = new Set(fresh.map(keyOfEdit))
    const drafts = new Map([...this.state.drafts].filter(([key]) => !touched.has(key)))
    this.set({ ...next, sheet: applyEdits(this.state.sheet, fresh), drafts })
    this.options.send(waiting)
  }

  /**
   * Takes over a sheet that came from the server. What is typed stays where the thing under it did not change; steps made
   * here could undo what others did, so they are forgotten when anything changed.
   */
  readonly adopt = (sheet: Sheet, said: string | null) => {
    const before = this.state.sheet
    const isChanged = ({ thing }: Draft) => {
      const target = targetOf(editOf(thing, ''))
      return !isSameThing(thingOn(before, target), thingOn(sheet, target))
    }
    const drafts = new Map([...this.state.drafts].filter(([, draft]) => !isChanged(draft)))
    const steps = isSameThing(measuresOf(before), measuresOf(sheet)) ? {} : { past: [], future: [] }
    this.set({ sheet, drafts, ...steps, said: said ?? this.state.said })
  }

  /** Takes back what the server refused, quietly: it was never on the sheet. */
  readonly withdraw = ({ edit, before }: WaitingEdit, message: string) => {
    const { kind, target } = targetOf(edit)
    const back = before === null ? { id: '', op: 'remove', kind, target } : { id: '', op: 'put', kind, value: before }
    this.adopt(applyEdit(this.state.sheet, back as Edit), `Refused and taken back: ${message}`)
  }
}

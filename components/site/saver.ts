/**
 * Sends the edits of one page to the server, in order, one request in flight, and says how that stands.
 * Edits that could not be sent wait; sending one twice changes nothing twice. No React, no DOM.
 */
import { applyEdits, listOf, targetOf, type Edit, type EditKind } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'

/** One thing changed here and, meanwhile, elsewhere; null where it was removed. */
export interface Clash {
  kind: EditKind
  target: string
  mine: unknown
  theirs: unknown
}

export type SaveState =
  | { kind: 'saved'; at: number | null }
  | { kind: 'saving' }
  | { kind: 'not-saved'; message: string; waiting: number }
  | { kind: 'clash'; clashes: Clash[]; theirs: Sheet }

export type Answer<T> = { ok: true; value: T } | { ok: false; status: number; message: string }

/** The two calls of the server that saving needs. Both answer, also when the network does not. */
export interface SheetCalls {
  saveEdits: (body: { base: number; editor: string; edits: Edit[] }) => Promise<Answer<{ seq: number }>>
  readSheet: () => Promise<Answer<{ seq: number; sheet: Sheet }>>
}

interface Options {
  seq: number
  editor: string
  calls: SheetCalls
  now: () => number
}

const MOST_AT_ONCE = 200

function thingOf(sheet: Sheet, kind: EditKind, target: string): unknown {
  if (kind === 'facade') return sheet.facade
  if (kind === 'aspect') return { light: sheet.site.light, facing: sheet.site.facing }
  return listOf(sheet, kind).find(({ id }) => id === target) ?? null
}

/** What a set of edits would change of a sheet, thing by thing; things that would stay the same are left out. */
export function clashesOf(theirs: Sheet, edits: readonly Edit[]): Clash[] {
  const mine = applyEdits(theirs, edits)
  const targets = new Map(edits.map((edit) => [JSON.stringify(targetOf(edit)), targetOf(edit)]))
  return [...targets.values()]
    .map(({ kind, target }) => ({ kind, target, mine: thingOf(mine, kind, target), theirs: thingOf(theirs, kind, target) }))
    .filter((clash) => JSON.stringify(clash.mine) !== JSON.stringify(clash.theirs))
}

export class Saver {
  private seq: number
  private waiting: Edit[] = []
  private isSending = false
  private state: SaveState = { kind: 'saved', at: null }
  private readonly listeners = new Set<() => void>()

  constructor(private readonly options: Options) {
    this.seq = options.seq
  }

  readonly getState = (): SaveState => this.state
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }
  /** Is anything made here not yet known to be saved? */
  readonly hasWaiting = (): boolean => this.waiting.length > 0

  private set(state: SaveState) {
    this.state = state
    this.listeners.forEach((listener) => listener())
  }

  readonly send = (edits: readonly Edit[]) => {
    this.waiting.push(...edits)
    if (this.state.kind !== 'clash') void this.flush()
  }

  /** Tries again what could not be sent. */
  readonly retry = () => {
    if (this.state.kind === 'not-saved') void this.flush()
  }

  private async flush(): Promise<void> {
    if (this.isSending) return
    this.isSending = true
    while (this.waiting.length > 0) {
      const edits = this.waiting.slice(0, MOST_AT_ONCE)
      this.set({ kind: 'saving' })
      const answer = await this.options.calls.saveEdits({ base: this.seq, editor: this.options.editor, edits })
      if (!answer.ok) {
        this.isSending = false
        return answer.status === 409 ? this.openClash() : this.fail(answer.message)
      }
      this.seq = answer.value.seq
      this.waiting = this.waiting.slice(edits.length)
    }
    this.isSending = false
    this.set({ kind: 'saved', at: this.options.now() })
  }

  private fail(message: string) {
    this.set({ kind: 'not-saved', message, waiting: this.waiting.length })
  }

  private async openClash() {
    const answer = await this.options.calls.readSheet()
    if (!answer.ok) return this.fail(answer.message)
    this.seq = answer.value.seq
    const theirs = answer.value.sheet
    this.set({ kind: 'clash', clashes: clashesOf(theirs, this.waiting), theirs })
  }

  /** Ends a clash: what waits here is dropped. Answers the sheet that stands now; null when there is no clash. */
  readonly takeTheirs = (): Sheet | null => {
    if (this.state.kind !== 'clash') return null
    const { theirs } = this.state
    this.waiting = []
    this.set({ kind: 'saved', at: this.options.now() })
    return theirs
  }

  /** Ends a clash: what waits here is put over what the others made. Answers the sheet that stands now. */
  readonly keepMine = (): Sheet | null => {
    if (this.state.kind !== 'clash') return null
    const mine = applyEdits(this.state.theirs, this.waiting)
    this.set({ kind: 'saving' })
    void this.flush()
    return mine
  }
}

/**
 * Edits on their way to the server: kept in a store before they are sent, in order, one request in flight. Sending an
 * edit twice changes nothing twice, so whatever was not answered is sent again. The state never calls saved what the
 * server has not acknowledged. No React, no DOM.
 */
import type { Edit } from '@/lib/sheet'
import { clashesOf, type Clash } from './clashes'
import { Observable } from './observable'
import type { QueueStore, Waiting, WaitingEdit } from './queue-store'
import type { Clock, Refusal, SaveCalls, Saved, Served } from './save-calls'
import { keyOfEdit, targetKey } from './things'

export type SavePhase =
  /** The server has everything; `at` null: nothing was changed here yet. */
  | { kind: 'saved'; at: number | null }
  | { kind: 'saving' }
  /** Nothing can be sent just now; it is tried again by itself. */
  | { kind: 'waiting'; message: string }
  | { kind: 'signed-out' }
  | { kind: 'conflict'; clashes: Clash[] }
  /** The server has all but what it refused. */
  | { kind: 'refused' }
  /** The server will not take anything: the person must see why. */
  | { kind: 'stopped'; message: string }

export interface SaveState {
  phase: SavePhase
  /** How many edits the server has not acknowledged. */
  waiting: number
  /** Whether what waits outlives the page. */
  isLasting: boolean
  /** Why edits were taken out, until dismissed. */
  refusals: readonly string[]
}

/** What the queue tells the editor. */
export interface SaveEvents {
  /** The server has these; `isLatest` when nothing newer waits. `othersSaved`: it holds more than this page knows. */
  saved: (edits: readonly WaitingEdit[], answer: Saved, isLatest: boolean, othersSaved: boolean) => void
  /** This one was refused and taken out; `rest` still waits. */
  refused: (edit: WaitingEdit, message: string, rest: readonly WaitingEdit[]) => void
  /** The server's sheet stands, with `rest` still to go on top; `dropped` were given up for theirs. */
  served: (served: Served, rest: readonly WaitingEdit[], dropped: readonly WaitingEdit[]) => void
}

interface Options {
  facade: string
  editor: string
  /** Seq of the sheet the page was given. */
  base: number
  store: QueueStore
  calls: SaveCalls
  clock: Clock
  events: SaveEvents
}

const MOST_AT_ONCE = 100
const FIRST_RETRY_MS = 1_000
const LAST_RETRY_MS = 30_000
/** Conflicts that turn out to be none are settled by taking the newer base; more in a row than this are shown. */
const MOST_REBASES = 5

export class SaveQueue extends Observable<SaveState> {
  private edits: WaitingEdit[] = []
  private base: number
  private editor: string
  private inFlight = false
  private failures = 0
  private rebases = 0
  private oneByOne = false
  private theirs: Served | null = null
  private kept: Promise<void> = Promise.resolve()
  private calledOff: (() => void) | null = null
  private savedAt: number | null = null
  private isReady = false

  constructor(private readonly options: Options) {
    super({ phase: { kind: 'saved', at: null }, waiting: 0, isLasting: options.store.isLasting, refusals: [] })
    this.base = options.base
    this.editor = options.editor
  }

  /** Edits the server has not acknowledged, in order. */
  get unsaved(): readonly WaitingEdit[] {
    return this.edits
  }

  /**
   * Takes over what earlier pages of this browser left unsent. Answers it, to be put on the sheet, and sends it.
   * Call once: nothing is sent before it is done.
   */
  async restore(): Promise<readonly WaitingEdit[]> {
    const left = await this.options.store.claim(this.options.facade).catch((): Waiting[] => [])
    this.isReady = true
    const first = left[0]
    if (!first) {
      if (this.edits.length > 0) void this.send()
      return []
    }
    const made = this.edits
    // Under the name they were made by, or the server would take our own edits for somebody else's.
    this.editor = first.editor
    this.base = Math.min(this.base, ...left.map(({ base }) => base))
    this.edits = [...left.flatMap(({ edits }) => edits), ...made]
    this.keep()
    for (const { facade, editor } of left.slice(1)) void this.kept.then(() => this.options.store.write({ facade, editor, base: 0, edits: [] })).catch(() => {})
    const restored = this.edits.slice(0, this.edits.length - made.length)
    void this.send()
    return restored
  }

  /** Adds edits just made. */
  push(edits: readonly WaitingEdit[]): void {
    if (edits.length === 0) return
    this.edits = [...this.edits, ...edits]
    this.keep()
    void this.send()
  }

  /** Tries at once what failed: the network is back, or the person signed in again. */
  readonly wake = (): void => {
    const { kind } = this.getSnapshot().phase
    if (kind === 'waiting' || kind === 'signed-out' || kind === 'stopped') void this.send(true)
  }

  readonly dismissRefusals = (): void => {
    const { phase } = this.getSnapshot()
    this.set({ refusals: [], ...(phase.kind === 'refused' && { phase: { kind: 'saved', at: this.savedAt } }) })
  }

  /** Settles a conflict: on the things that clash the one version or the other stands; all other edits go on. */
  readonly settle = (choice: 'mine' | 'theirs'): void => {
    const { phase } = this.getSnapshot()
    const theirs = this.theirs
    if (phase.kind !== 'conflict' || !theirs) return
    const clashing = new Set(phase.clashes.map(targetKey))
    const isGivenUp = ({ edit }: WaitingEdit) => choice === 'theirs' && clashing.has(keyOfEdit(edit))
    const dropped = this.edits.filter(isGivenUp)
    this.edits = this.edits.filter((waiting) => !isGivenUp(waiting))
    this.take(theirs, dropped)
    this.show({ kind: 'saving' })
    void this.send(true)
  }

  /** Takes the server's sheet where nothing waits here. */
  readonly adopt = (served: Served): void => {
    if (this.edits.length === 0) this.take(served, [])
  }

  private take(served: Served, dropped: readonly WaitingEdit[]): void {
    this.base = served.seq
    this.theirs = null
    this.keep()
    this.options.events.served(served, this.edits, dropped)
  }

  private show(phase: SavePhase): void {
    this.set({ phase, waiting: this.edits.length })
  }

  /** Writes what waits; a store that fails is said to be none. */
  private keep(): void {
    const { facade, store } = this.options
    const waiting: Waiting = { facade, editor: this.editor, base: this.base, edits: this.edits }
    this.kept = this.kept
      .then(() => store.write(waiting))
      .then(() => this.isLasting(store.isLasting), () => this.isLasting(false))
  }

  private isLasting(isLasting: boolean): void {
    if (this.getSnapshot().isLasting !== isLasting) this.set({ isLasting })
  }

  private isHeld(): boolean {
    const { kind } = this.getSnapshot().phase
    return kind === 'conflict' || kind === 'signed-out' || kind === 'stopped' || (kind === 'waiting' && this.calledOff !== null)
  }

  private async send(isForced = false): Promise<void> {
    if (this.inFlight || !this.isReady) return this.set({ waiting: this.edits.length })
    if (!isForced && this.isHeld()) return this.set({ waiting: this.edits.length })
    this.calledOff?.()
    this.calledOff = null
    this.inFlight = true
    try {
      while (this.edits.length > 0 && (await this.sendBatch())) {
        // Each round takes the next batch.
      }
    } finally {
      this.inFlight = false
    }
    if (this.edits.length === 0 && !this.isHeld()) this.finish()
  }

  /** One request. Answers whether to go on. */
  private async sendBatch(): Promise<boolean> {
    this.show({ kind: 'saving' })
    await this.kept
    const batch = this.edits.slice(0, this.oneByOne ? 1 : MOST_AT_ONCE)
    const answer = await this.options.calls.saveEdits({ base: this.base, editor: this.editor, edits: batch.map(({ edit }): Edit => edit) })
    if (!answer.ok) return this.failed(batch, answer)
    this.failures = 0
    this.rebases = 0
    this.savedAt = this.options.clock.now()
    // A batch of ours raises the seq by one.
    const othersSaved = answer.value.seq > this.base + 1
    this.base = answer.value.seq
    this.edits = this.edits.filter((waiting) => !batch.includes(waiting))
    this.keep()
    this.options.events.saved(batch, answer.value, this.edits.length === 0, othersSaved)
    return true
  }

  private finish(): void {
    this.oneByOne = false
    const { refusals } = this.getSnapshot()
    this.show(refusals.length > 0 ? { kind: 'refused' } : { kind: 'saved', at: this.savedAt })
  }

  private async failed(batch: readonly WaitingEdit[], refusal: Refusal): Promise<boolean> {
    switch (refusal.status) {
      case 401:
        this.show({ kind: 'signed-out' })
        return false
      case 409:
        return this.compare()
      case 422:
        return this.takeOut(batch, refusal)
      case 0:
      case 408:
      case 429:
        return this.waitFor(refusal.message)
      default:
        if (refusal.status >= 500) return this.waitFor(refusal.message)
        this.show({ kind: 'stopped', message: refusal.message })
        return false
    }
  }

  private waitFor(message: string): false {
    const ms = Math.min(FIRST_RETRY_MS * 2 ** this.failures, LAST_RETRY_MS)
    this.failures += 1
    this.calledOff = this.options.clock.after(ms, () => {
      this.calledOff = null
      void this.send(true)
    })
    this.show({ kind: 'waiting', message })
    return false
  }

  /** One refused edit is taken out; where the server does not say which of many, they go one by one. */
  private takeOut(batch: readonly WaitingEdit[], { at, message }: Refusal): boolean {
    const index = batch.length === 1 ? 0 : at
    const refused = index === undefined ? undefined : batch[index]
    if (!refused) {
      this.oneByOne = true
      return true
    }
    this.edits = this.edits.filter((waiting) => waiting !== refused)
    this.keep()
    this.set({ refusals: [...this.getSnapshot().refusals, message] })
    this.options.events.refused(refused, message, this.edits)
    return true
  }

  private async compare(): Promise<boolean> {
    const answer = await this.options.calls.readSheet()
    if (!answer.ok) {
      if (answer.status === 401) this.show({ kind: 'signed-out' })
      else this.waitFor(answer.message)
      return false
    }
    const clashes = clashesOf(answer.value.sheet, this.edits)
    if (clashes.length > 0) {
      this.theirs = answer.value
      this.show({ kind: 'conflict', clashes })
      return false
    }
    this.rebases += 1
    this.take(answer.value, [])
    return this.rebases <= MOST_REBASES || this.waitFor('Others are changing this sheet just now.')
  }
}

export type { Clash } from './clashes'

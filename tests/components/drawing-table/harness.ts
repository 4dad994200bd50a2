/** A server and a clock in the test's hand, for the save queue and the desk. */
import type { Answer, Clock, SaveCalls, Saved, Served, SheetReport } from '@/components/drawing-table/editor/save-calls'
import { applyEdits, targetOf, type Edit } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { sampleSheet } from '../../lib/sheet/sample'

export const NO_FINDINGS: SheetReport = { engine: 'test', findings: [] }

let count = 0
export const newId = () => `0b0e6d2e-0000-4000-8000-${String((count += 1)).padStart(12, '0')}`

/** Lets promises run on, as many turns as a chain of stores and calls may need. */
export async function settle(): Promise<void> {
  for (let turn = 0; turn < 40; turn += 1) await Promise.resolve()
}

/** Time stands still until it is told to go on. */
export class HandClock implements Clock {
  private time = 1_000_000
  private timers: { at: number; callback: () => void }[] = []
  now = () => this.time
  after = (ms: number, callback: () => void) => {
    const timer = { at: this.time + ms, callback }
    this.timers.push(timer)
    return () => {
      this.timers = this.timers.filter((one) => one !== timer)
    }
  }
  async pass(ms: number): Promise<void> {
    this.time += ms
    const due = this.timers.filter(({ at }) => at <= this.time)
    this.timers = this.timers.filter(({ at }) => at > this.time)
    due.forEach(({ callback }) => callback())
    await settle()
  }
}

interface Logged {
  seq: number
  editor: string
  edit: Edit
}

/** Keeps a sheet as the real one does: known ids are skipped, things touched since `base` by others are a conflict. */
export class HandServer implements SaveCalls {
  sheet: Sheet = sampleSheet()
  seq = 7
  /** Requests that reached it. */
  readonly asked: { base: number; editor: string; edits: Edit[] }[] = []
  /** What happens to the next requests: answered, lost on the way there, or lost on the way back. */
  fate: ('answer' | 'no-request' | 'no-answer' | number)[] = []
  /** Sentence for an edit that is refused; undefined lets it pass. */
  refuse: (edit: Edit) => string | undefined = () => undefined
  namesPlace = true
  private readonly log: Logged[] = []
  private gate: Promise<void> | null = null
  private open = () => {}
  inFlight = 0
  mostInFlight = 0

  /** Requests wait at the door until `letGo`. */
  hold(): void {
    this.gate ??= new Promise((resolve) => (this.open = resolve))
  }

  async letGo(): Promise<void> {
    this.open()
    this.gate = null
    await settle()
  }

  has(id: string): boolean {
    return this.log.some(({ edit }) => edit.id === id)
  }

  /** Somebody else changes the sheet. */
  other(edit: Edit): void {
    this.write('other', [edit])
  }

  private write(editor: string, edits: Edit[]): void {
    this.seq += 1
    this.sheet = applyEdits(this.sheet, edits)
    this.log.push(...edits.map((edit) => ({ seq: this.seq, editor, edit })))
  }

  saveEdits = async (body: { base: number; editor: string; edits: Edit[] }): Promise<Answer<Saved>> => {
    this.inFlight += 1
    this.mostInFlight = Math.max(this.mostInFlight, this.inFlight)
    try {
      const fate = this.fate.shift() ?? 'answer'
      await this.gate
      await Promise.resolve()
      if (fate === 'no-request') return { ok: false, status: 0, message: 'no network.' }
      if (typeof fate === 'number') return { ok: false, status: fate, message: `status ${fate}` }
      const answer = this.judge(structuredClone(body))
      return fate === 'no-answer' ? { ok: false, status: 0, message: 'no network.' } : answer
    } finally {
      this.inFlight -= 1
    }
  }

  private judge(body: { base: number; editor: string; edits: Edit[] }): Answer<Saved> {
    this.asked.push(body)
    const fresh = body.edits.filter(({ id }) => !this.has(id))
    const same = (a: Edit, b: Edit) => JSON.stringify(targetOf(a)) === JSON.stringify(targetOf(b))
    const clash = this.log.some(({ seq, editor, edit }) => seq > body.base && editor !== body.editor && fresh.some((one) => same(one, edit)))
    if (clash) return { ok: false, status: 409, message: 'Someone else changed the same thing meanwhile.' }
    const at = body.edits.findIndex((edit) => this.refuse(edit) !== undefined)
    if (at >= 0) return { ok: false, status: 422, message: this.refuse(body.edits[at]!)!, ...(this.namesPlace && { at }) }
    if (fresh.length > 0) this.write(body.editor, fresh)
    return { ok: true, value: { seq: this.seq, report: NO_FINDINGS } }
  }

  readSheet = async (): Promise<Answer<Served>> => ({ ok: true, value: { seq: this.seq, sheet: structuredClone(this.sheet), report: NO_FINDINGS } })
}

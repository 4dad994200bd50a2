/** What the save queue asks of the server. Every call answers, also when the network does not. */
import type { Edit } from '@/lib/sheet'
import type { Report, Sheet } from '@/lib/spacing'

/** The part of a report that is kept and shown. */
export type SheetReport = Pick<Report, 'engine' | 'findings'>

export interface Saved {
  seq: number
  report: SheetReport
}

export interface Served extends Saved {
  sheet: Sheet
}

export interface Refusal {
  ok: false
  /** HTTP status; 0 when no answer came. */
  status: number
  message: string
  /** Place in the batch of the edit that was refused, where the server names one. */
  at?: number
}

export type Answer<T> = { ok: true; value: T } | Refusal

export interface SaveCalls {
  saveEdits: (body: { base: number; editor: string; edits: Edit[] }) => Promise<Answer<Saved>>
  readSheet: () => Promise<Answer<Served>>
}

/** Time, given from outside so that tests hold the clock. */
export interface Clock {
  /** Milliseconds UTC. */
  now: () => number
  /** Calls back after so many milliseconds; the answer calls it off. */
  after: (ms: number, callback: () => void) => () => void
}

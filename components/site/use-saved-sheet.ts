'use client'
/** Ties the store of the form to the save queue, for the life of one page. */
import { useEffect, useState } from 'react'
import { v7 as newId } from 'uuid'
import { applyEdits } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { saveCalls } from '../drawing-table/calls'
import { MemoryQueueStore, type WaitingEdit } from '../drawing-table/editor/queue-store'
import type { Clock } from '../drawing-table/editor/save-calls'
import { SaveQueue } from '../drawing-table/editor/save-queue'
import { IdbQueueStore, lockWatch } from '../drawing-table/editor/save-queue-idb'
import { Measuring } from './measuring'

export interface Opened {
  facade: { id: string; name: string }
  sheet: Sheet
  seq: number
  readOnly: boolean
}

const clock: Clock = {
  now: () => Date.now(),
  after: (ms, callback) => {
    const timer = setTimeout(callback, ms)
    return () => clearTimeout(timer)
  },
}

const over = (sheet: Sheet, waiting: readonly WaitingEdit[]) => applyEdits(sheet, waiting.map(({ edit }) => edit))

/** Joins the two. Nothing is sent or stored before the first edit. */
function openSheet({ facade, sheet, seq }: Opened) {
  const hasStore = typeof indexedDB !== 'undefined'
  let latest = seq
  let areOthersHere = false
  const calls = saveCalls(facade.id)
  const measuring: Measuring = new Measuring(sheet, { send: (edits) => queue.push(edits), newId })
  const queue: SaveQueue = new SaveQueue({
    facade: facade.id,
    editor: newId(),
    base: seq,
    store: hasStore ? new IdbQueueStore(lockWatch(), clock.now) : new MemoryQueueStore(),
    calls,
    clock,
    events: {
      saved: (_edits, answer, isLatest) => {
        // Every saved batch raises the seq by one: a wider step is somebody else's.
        areOthersHere ||= answer.seq > latest + 1
        latest = Math.max(latest, answer.seq)
        if (isLatest && areOthersHere) void refresh()
      },
      refused: (edit, message) => measuring.withdraw(edit, message),
      served: (served, rest, dropped) => {
        latest = served.seq
        areOthersHere = false
        measuring.adopt(over(served.sheet, rest), dropped.length > 0 ? 'Theirs taken' : null)
      },
    },
  })

  /** Others may have changed things this page has not seen: their sheet is shown, if nothing newer waits. */
  async function refresh() {
    const answer = await calls.readSheet()
    // An answer asked for before a later save must not bring the older sheet back.
    if (answer.ok && answer.value.seq >= latest && queue.unsaved.length === 0) queue.adopt(answer.value)
  }

  let isRestored = false
  /** What an earlier page of this browser left unsent goes on the sheet and to the server; once, however often called. */
  async function restore() {
    if (isRestored) return
    isRestored = true
    const left = await queue.restore()
    if (left.length > 0) measuring.adopt(over(measuring.getState().sheet, left), 'Brought back what waited on this device')
  }

  return { measuring, queue, restore }
}

/** The store and the queue of a facade; in the browser also what an earlier page left unsent. */
export function useSavedSheet(opened: Opened): { measuring: Measuring; queue: SaveQueue } {
  const [{ measuring, queue, restore }] = useState(() => openSheet(opened))
  const { readOnly } = opened
  useEffect(() => {
    if (readOnly) return
    void restore()
    window.addEventListener('online', queue.wake)
    return () => window.removeEventListener('online', queue.wake)
  }, [readOnly, queue, restore])
  return { measuring, queue }
}

/** The editor and its line to the server, joined: what is made here is sent, what is answered is shown. */
import { SaveQueue, type SaveEvents } from './save-queue'
import type { QueueStore } from './queue-store'
import type { Clock, SaveCalls, SheetReport } from './save-calls'
import { Editor } from './store'
import { Viewport } from './view'
import type { Sheet } from '@/lib/spacing'

export interface Desk {
  editor: Editor
  queue: SaveQueue
  viewport: Viewport
  /** Shows the server's sheet as it is now, unless something waits here. */
  refresh: () => Promise<void>
}

interface Options {
  facade: string
  sheet: Sheet
  seq: number
  report: SheetReport
  canEdit: boolean
  newId: () => string
  store: QueueStore
  calls: SaveCalls
  clock: Clock
}

/** Makes a desk. Call `openDesk` once it is in use. */
export function createDesk(options: Options): Desk {
  const { facade, sheet, seq, report, canEdit, newId, store, calls, clock } = options
  const editor: Editor = new Editor({ sheet, report, canEdit, newId, send: (edits) => queue.push(edits) })

  // Others have changed things this page has not seen: their sheet is fetched and shown once nothing newer waits.
  let isBehind = false
  const refresh = async () => {
    const answer = await calls.readSheet()
    if (answer.ok && queue.unsaved.length === 0) queue.adopt(answer.value)
  }

  const saved: SaveEvents['saved'] = (edits, answer, isLatest, othersSaved) => {
    editor.saved(edits, answer.report, isLatest)
    isBehind ||= othersSaved
    if (!isLatest || !isBehind) return
    isBehind = false
    void refresh()
  }

  const queue: SaveQueue = new SaveQueue({
    facade, editor: newId(), base: seq, store, calls, clock,
    events: { saved, refused: (edit, _message, rest) => editor.refused(edit, rest), served: editor.served },
  })
  return { editor, queue, viewport: new Viewport(), refresh }
}

/** Brings back what an earlier page could not send, and begins to send. A read-only desk sends nothing. */
export async function openDesk({ editor, queue }: Desk): Promise<void> {
  if (!editor.canEdit) return
  const left = await queue.restore()
  if (left.length > 0) editor.restored(queue.unsaved)
}

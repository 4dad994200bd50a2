/** Where edits wait until the server has them. */
import type { Edit } from '@/lib/sheet'
import type { Plant } from '@/lib/plants'

/** An edit and the thing it touched as it stood before: what a conflict is judged by. */
export interface WaitingEdit {
  edit: Edit
  before: unknown
  /** The plant of a placement, kept here so that the drawing can show it before the server knows it. */
  plant?: Plant
}

/** What one open drawing table has not saved yet. `base` is the seq its edits were made on. */
export interface Waiting {
  facade: string
  editor: string
  base: number
  edits: WaitingEdit[]
}

export interface QueueStore {
  /** Whether what is written here is still there after the page is closed. */
  readonly isLasting: boolean
  /** Writes what waits, whole; nothing waiting forgets it. */
  write: (waiting: Waiting) => Promise<void>
  /** What earlier pages left for a facade and no open page looks after, oldest first; from now on it is the caller's. */
  claim: (facade: string) => Promise<Waiting[]>
}

/** A store that lasts as long as the object: for tests, and where the browser allows nothing better. */
export class MemoryQueueStore implements QueueStore {
  readonly isLasting: boolean = false
  private readonly kept = new Map<string, string>()

  async write(waiting: Waiting): Promise<void> {
    const key = `${waiting.facade} ${waiting.editor}`
    if (waiting.edits.length === 0) this.kept.delete(key)
    else this.kept.set(key, JSON.stringify(waiting))
  }

  async claim(facade: string): Promise<Waiting[]> {
    return [...this.kept.values()].map((text) => JSON.parse(text) as Waiting).filter((waiting) => waiting.facade === facade)
  }
}

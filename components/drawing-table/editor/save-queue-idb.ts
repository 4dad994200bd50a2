/** Waiting edits in IndexedDB: they outlive the page, the browser and an empty battery. */
import { openDB, type DBSchema, type IDBPDatabase } from 'idb'
import type { QueueStore, Waiting } from './queue-store'

interface Schema extends DBSchema {
  waiting: { key: [string, string]; value: Waiting & { at: number }; indexes: { facade: string } }
}

const NAME = 'tenth-summer-waiting'

/** Tells whether an open page looks after the edits made under an editor's name. */
export interface Watch {
  /** Takes the name for the life of this page; false when another open page has it. */
  take: (editor: string) => Promise<boolean>
}

/** Web Locks end with the page that holds them. Without them every name counts as free. */
export function lockWatch(): Watch {
  return {
    take: (editor) =>
      new Promise((resolve) => {
        if (!('locks' in navigator)) return resolve(true)
        const held = navigator.locks.request(`${NAME}:${editor}`, { ifAvailable: true }, (lock) => {
          resolve(lock !== null)
          return lock ? new Promise<void>(() => {}) : undefined
        })
        held.catch(() => resolve(true))
      }),
  }
}

export class IdbQueueStore implements QueueStore {
  readonly isLasting = true
  private opened: Promise<IDBPDatabase<Schema>> | null = null
  private readonly held = new Set<string>()

  constructor(
    private readonly watch: Watch,
    private readonly now: () => number,
  ) {}

  private open(): Promise<IDBPDatabase<Schema>> {
    this.opened ??= openDB<Schema>(NAME, 1, {
      upgrade: (database) => {
        database.createObjectStore('waiting', { keyPath: ['facade', 'editor'] }).createIndex('facade', 'facade')
      },
    })
    return this.opened
  }

  /** The name for this page, for good: no other open page may send what is written under it. */
  private async hold(editor: string): Promise<boolean> {
    if (this.held.has(editor)) return true
    const isOurs = await this.watch.take(editor)
    if (isOurs) this.held.add(editor)
    return isOurs
  }

  async write(waiting: Waiting): Promise<void> {
    await this.hold(waiting.editor)
    const database = await this.open()
    if (waiting.edits.length === 0) await database.delete('waiting', [waiting.facade, waiting.editor])
    else await database.put('waiting', { ...waiting, at: this.now() })
  }

  async claim(facade: string): Promise<Waiting[]> {
    const database = await this.open()
    const all = await database.getAllFromIndex('waiting', 'facade', facade)
    const mine: Waiting[] = []
    for (const { editor, base, edits } of all.sort((a, b) => a.at - b.at)) {
      if (await this.hold(editor)) mine.push({ facade, editor, base, edits })
    }
    return mine
  }
}

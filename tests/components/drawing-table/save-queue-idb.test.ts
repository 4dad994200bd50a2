/** Waiting edits outlive the page; an open page keeps its own. IndexedDB by fake-indexeddb. */
import 'fake-indexeddb/auto'
import { expect, test } from 'vitest'
import { IdbQueueStore, type Watch } from '@/components/drawing-table/editor/save-queue-idb'
import type { Waiting } from '@/components/drawing-table/editor/queue-store'

const waiting = (editor: string, facade = 'front', count = 1): Waiting => ({
  facade, editor, base: 3,
  edits: Array.from({ length: count }, (_, i) => ({ edit: { id: `${editor}-${i}`, op: 'remove', kind: 'placement', target: 'a1' }, before: null })),
})

function stores() {
  const taken = new Set<string>()
  let time = 0
  const watch: Watch = { take: async (editor) => !taken.has(editor) && Boolean(taken.add(editor)) }
  return {
    store: () => new IdbQueueStore(watch, () => (time += 1)),
    /** All pages are closed: their names are free. */
    closeAll: () => taken.clear(),
  }
}

test('what waits is there for the next page, oldest first, and gone once nothing waits', async () => {
  const { store, closeAll } = stores()
  await store().write(waiting('late'))
  await store().write(waiting('early', 'other-side'))
  await store().write({ ...waiting('late'), base: 4 })
  await store().write(waiting('second', 'front', 2))
  closeAll()
  const next = store()
  expect(await next.claim('front')).toEqual([{ ...waiting('late'), base: 4 }, waiting('second', 'front', 2)])
  await next.write(waiting('late', 'front', 0))
  await next.write(waiting('second', 'front', 0))
  expect(await stores().store().claim('front')).toEqual([])
  expect(await stores().store().claim('other-side')).toHaveLength(1)
})

test('what an open page looks after is left to it', async () => {
  const { store, closeAll } = stores()
  await store().write(waiting('left', 'back'))
  closeAll()
  await store().write(waiting('open-elsewhere', 'back'))
  expect((await store().claim('back')).map(({ editor }) => editor)).toEqual(['left'])
})

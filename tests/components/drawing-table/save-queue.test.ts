/** Nothing made here is lost, nothing is saved twice, and the label never calls saved what the server has not acknowledged. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { MemoryQueueStore, type WaitingEdit } from '@/components/drawing-table/editor/queue-store'
import { saveLabel } from '@/components/drawing-table/editor/save-label'
import { SaveQueue } from '@/components/drawing-table/editor/save-queue'
import { thingOn } from '@/components/drawing-table/editor/things'
import { targetOf, type Edit } from '@/lib/sheet'
import { sampleSheet } from '../../lib/sheet/sample'
import { HandClock, HandServer, newId, settle } from './harness'

const START = sampleSheet().placements[0]!
const move = (x: number, id = 'a1'): WaitingEdit => {
  const edit: Edit = { id: newId(), op: 'put', kind: 'placement', value: { ...START, id, x } }
  return { edit, before: thingOn(sampleSheet(), targetOf(edit)) }
}
const idsOf = (waiting: readonly WaitingEdit[]) => waiting.map(({ edit }) => edit.id)

interface Parts {
  server?: HandServer
  store?: MemoryQueueStore
  clock?: HandClock
  base?: number
}

function table({ server = new HandServer(), store = new MemoryQueueStore(), clock = new HandClock(), base = server.seq }: Parts = {}) {
  const heard = { saved: [] as string[], refused: [] as string[], served: [] as { rest: string[]; dropped: string[] }[], latest: [] as boolean[] }
  const queue = new SaveQueue({
    facade: 'front', editor: newId(), base, store, calls: server, clock,
    events: {
      saved: (edits, _answer, isLatest) => {
        heard.saved.push(...idsOf(edits))
        heard.latest.push(isLatest)
      },
      refused: (one, message) => heard.refused.push(`${one.edit.id} ${message}`),
      served: (_served, rest, dropped) => heard.served.push({ rest: idsOf(rest), dropped: idsOf(dropped) }),
    },
  })
  const label = () => saveLabel(queue.getSnapshot())
  return { server, store, clock, queue, heard, label }
}

async function opened(parts: Parts = {}) {
  const made = table(parts)
  await made.queue.restore()
  return made
}

describe('sending', () => {
  test('says saving, then saved and when', async () => {
    const { queue, server, label, clock } = await opened()
    expect(label()).toBe('Nothing changed yet')
    server.hold()
    queue.push([move(100)])
    expect(label()).toBe('Saving')
    await server.letGo()
    expect(queue.getSnapshot()).toMatchObject({ phase: { kind: 'saved', at: clock.now() }, waiting: 0 })
    expect(label()).toMatch(/^Saved \d\d:\d\d$/)
  })

  test('keeps one request in flight; what is made meanwhile follows in one, and only the last answer is the latest', async () => {
    const { queue, server, heard } = await opened()
    server.hold()
    const edits = [move(100), move(101), move(102)]
    queue.push([edits[0]!])
    await settle()
    queue.push([edits[1]!])
    queue.push([edits[2]!])
    await server.letGo()
    expect(server.mostInFlight).toBe(1)
    expect(server.asked.map(({ edits: sent }) => sent.length)).toEqual([1, 2])
    expect(heard.latest).toEqual([false, true])
    expect(heard.saved).toEqual(idsOf(edits))
  })

  test('edits are in the store before they are sent', async () => {
    const store = new MemoryQueueStore()
    const { queue, server } = await opened({ store })
    server.hold()
    const edit = move(100)
    queue.push([edit])
    await settle()
    expect((await store.claim('front'))[0]?.edits.map((one) => one.edit.id)).toEqual([edit.edit.id])
    await server.letGo()
    expect(await store.claim('front')).toEqual([])
  })
})

describe('a network that fails', () => {
  test('a lost answer: the same edit is sent again and changes nothing twice', async () => {
    const { queue, server, clock, label } = await opened()
    server.fate = ['no-answer']
    queue.push([move(100)])
    await settle()
    expect(label()).toBe('On this page only: 1 edit waiting')
    expect(server.seq).toBe(8)
    await clock.pass(1_000)
    expect(server.asked).toHaveLength(2)
    expect(server.seq).toBe(8)
    expect(label()).toMatch(/^Saved/)
  })

  test('waits longer after each failure, and goes at once when the network is back', async () => {
    const { queue, server, clock } = await opened()
    server.fate = ['no-request', 503, 'no-request']
    queue.push([move(100)])
    await settle()
    await clock.pass(1_000)
    await clock.pass(1_999)
    expect(server.fate).toHaveLength(1)
    await clock.pass(1)
    expect(server.fate).toHaveLength(0)
    expect(server.asked).toHaveLength(0)
    queue.push([move(120)])
    await settle()
    expect(queue.getSnapshot()).toMatchObject({ phase: { kind: 'waiting' }, waiting: 2 })
    queue.wake()
    await settle()
    expect(server.asked[0]!.edits).toHaveLength(2)
    expect(queue.getSnapshot()).toMatchObject({ phase: { kind: 'saved' }, waiting: 0 })
  })

  test('signed out: the edits stay until the person is back', async () => {
    const { queue, server, label } = await opened()
    server.fate = [401]
    queue.push([move(100)])
    await settle()
    queue.push([move(110)])
    await settle()
    expect(label()).toBe('Signed out. On this page only: 2 edits waiting')
    expect(server.asked).toHaveLength(0)
    queue.wake()
    await settle()
    expect(server.sheet.placements[0]!.x).toBe(110)
  })

  test('a refusal for good stops and says why', async () => {
    const { queue, server, label } = await opened()
    server.fate = [403]
    queue.push([move(100)])
    await settle()
    expect(queue.getSnapshot().phase).toEqual({ kind: 'stopped', message: 'status 403' })
    expect(label()).toBe('Not saved, 1 edit waiting')
  })
})

describe('a page that is closed', () => {
  test('what waited is sent by the next page, under the name it was made by', async () => {
    const store = new MemoryQueueStore()
    const server = new HandServer()
    const first = await opened({ store, server })
    server.fate = ['no-answer']
    const [one, two] = [move(100), move(110)]
    first.queue.push([one])
    await settle()
    first.queue.push([two])
    await settle()
    // The second page got the sheet of a later seq, with the first edit on it.
    const second = table({ store, server, clock: new HandClock(), base: server.seq })
    const restored = await second.queue.restore()
    expect(idsOf(restored)).toEqual([one.edit.id, two.edit.id])
    await settle()
    expect(server.sheet.placements[0]!.x).toBe(110)
    expect(second.label()).toMatch(/^Saved/)
    expect(new Set(server.asked.map(({ editor }) => editor)).size).toBe(1)
    expect(await store.claim('front')).toEqual([])
  })

  test('edits made before the store has answered go after what it held', async () => {
    const store = new MemoryQueueStore()
    const server = new HandServer()
    const first = await opened({ store, server })
    server.fate = ['no-request']
    first.queue.push([move(100)])
    await settle()
    const second = table({ store, server })
    const restoring = second.queue.restore()
    second.queue.push([move(130)])
    await restoring
    await settle()
    expect(server.asked[0]!.edits).toHaveLength(2)
    expect(server.sheet.placements[0]!.x).toBe(130)
  })
})

describe('somebody else', () => {
  const theirMove = (x: number) => ({ id: newId(), op: 'put', kind: 'placement', value: { ...START, x } }) as const

  test('changed the same plant: both versions are shown, theirs can stand', async () => {
    const { queue, server, heard, label } = await opened()
    server.other(theirMove(200))
    const [mine, fresh] = [move(100), move(300, 'new1')]
    queue.push([mine, fresh])
    await settle()
    expect(queue.getSnapshot().phase).toMatchObject({ kind: 'conflict', clashes: [{ kind: 'placement', target: 'a1', mine: { x: 100 }, theirs: { x: 200 } }] })
    expect(label()).toBe('Not saved: someone else changed the same thing')
    queue.settle('theirs')
    await settle()
    expect(heard.served).toEqual([{ rest: [fresh.edit.id], dropped: [mine.edit.id] }])
    expect(server.sheet.placements.map(({ x }) => x)).toEqual([200, 300])
    expect(label()).toMatch(/^Saved/)
  })

  test('changed the same plant: mine can stand', async () => {
    const { queue, server, label } = await opened()
    server.other(theirMove(200))
    queue.push([move(100)])
    await settle()
    queue.settle('mine')
    await settle()
    expect(server.sheet.placements[0]!.x).toBe(100)
    expect(label()).toMatch(/^Saved/)
  })

  test('theirs taken with nothing of mine left ends as saved', async () => {
    const { queue, server } = await opened()
    server.other(theirMove(200))
    queue.push([move(100)])
    await settle()
    queue.settle('theirs')
    await settle()
    expect(queue.getSnapshot()).toMatchObject({ phase: { kind: 'saved' }, waiting: 0 })
    expect(server.sheet.placements[0]!.x).toBe(200)
  })

  test('changed another plant: no question is asked', async () => {
    const { queue, server } = await opened()
    server.other({ ...theirMove(200), value: { ...START, id: 'new2', x: 200 } })
    queue.push([move(100)])
    await settle()
    expect(queue.getSnapshot().phase.kind).toBe('saved')
    expect(server.sheet.placements.map(({ x }) => x)).toEqual([100, 200])
  })
})

describe('an edit that is refused', () => {
  test.each([true, false])('is taken out with its sentence, the others are saved (place named: %s)', async (namesPlace) => {
    const { queue, server, heard, label } = await opened()
    server.namesPlace = namesPlace
    server.refuse = (edit) => (edit.op === 'put' && edit.kind === 'placement' && edit.value.x === 666 ? 'That is too far.' : undefined)
    server.fate = ['no-request']
    const [good, bad, after] = [move(100), move(666, 'new1'), move(120)]
    queue.push([good, bad, after])
    await settle()
    queue.wake()
    await settle()
    expect(heard.refused).toEqual([`${bad.edit.id} That is too far.`])
    expect(heard.saved).toEqual([good.edit.id, after.edit.id])
    expect(label()).toBe('Something was refused; the rest is saved')
    queue.dismissRefusals()
    expect(label()).toMatch(/^Saved/)
  })
})

test('whatever the network does, in whatever order: one request in flight, saved only when the server has all, all in the end', async () => {
  const deed = fc.oneof(
    fc.record({ kind: fc.constant('push' as const), x: fc.integer({ min: 1, max: 400 }) }),
    fc.record({ kind: fc.constant('pass' as const), ms: fc.integer({ min: 1, max: 40_000 }) }),
    fc.record({ kind: fc.constant('wake' as const) }),
    fc.record({ kind: fc.constant('hold' as const) }),
    fc.record({ kind: fc.constant('let-go' as const) }),
    fc.record({ kind: fc.constant('reload' as const) }),
    fc.record({ kind: fc.constant('fate' as const), fate: fc.constantFrom('no-request' as const, 'no-answer' as const, 500, 401, 429) }),
  )
  await fc.assert(fc.asyncProperty(fc.array(deed, { maxLength: 40 }), async (deeds) => {
    const [server, store] = [new HandServer(), new MemoryQueueStore()]
    let clock = new HandClock()
    const pushed: string[] = []
    let page = await opened({ server, store, clock })
    const honest = () => {
      if (page.label().startsWith('Saved')) expect(pushed.filter((id) => !server.has(id))).toEqual([])
      if (page.queue.unsaved.length > 0) expect(page.label()).not.toMatch(/^Saved/)
    }
    page.queue.subscribe(honest)
    let last = START.x
    for (const one of deeds) {
      if (one.kind === 'push') {
        last = one.x
        const edit = move(one.x)
        pushed.push(edit.edit.id)
        page.queue.push([edit])
      } else if (one.kind === 'pass') await clock.pass(one.ms)
      else if (one.kind === 'wake') page.queue.wake()
      else if (one.kind === 'hold') server.hold()
      else if (one.kind === 'let-go') await server.letGo()
      else if (one.kind === 'fate') server.fate.push(one.fate)
      else {
        await server.letGo()
        // The closed page's timers end with it.
        clock = new HandClock()
        page = await opened({ server, store, clock })
        page.queue.subscribe(honest)
      }
      honest()
      await settle()
      honest()
    }
    server.fate = []
    await server.letGo()
    for (let turn = 0; turn < 3; turn += 1) {
      page.queue.wake()
      await settle()
    }
    expect(page.queue.unsaved).toEqual([])
    expect(pushed.filter((id) => !server.has(id))).toEqual([])
    expect(server.sheet.placements[0]!.x).toBe(last)
  }), { numRuns: 150 })
})

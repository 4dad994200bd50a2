/** The editor and its line to the server together: what the sheet shows and what the server holds end the same. */
import { describe, expect, test } from 'vitest'
import { createDesk, openDesk } from '@/components/drawing-table/editor/desk'
import { placementAt } from '@/components/drawing-table/editor/hit'
import { MemoryQueueStore } from '@/components/drawing-table/editor/queue-store'
import { saveLabel } from '@/components/drawing-table/editor/save-label'
import { buildScene } from '@/lib/drawing'
import { sampleSheet } from '../../lib/sheet/sample'
import { HandClock, HandServer, newId, NO_FINDINGS, settle } from './harness'

async function desk({ server = new HandServer(), store = new MemoryQueueStore(), canEdit = true } = {}) {
  const clock = new HandClock()
  const made = createDesk({ facade: 'front', sheet: structuredClone(server.sheet), seq: server.seq, report: NO_FINDINGS, canEdit, newId, store, calls: server, clock })
  await openDesk(made)
  await settle()
  const place = (id = 'a1') => made.editor.placement(id)
  const label = () => saveLabel(made.queue.getSnapshot())
  return { ...made, server, store, clock, place, label }
}

const theirMove = (x: number, id = 'a1') => ({ id: newId(), op: 'put', kind: 'placement', value: { ...sampleSheet().placements[0]!, id, x } }) as const

describe('a desk', () => {
  test('a move reaches the server; undo reaches it too', async () => {
    const { editor, server, label } = await desk()
    editor.beginMove('a1', 'both')
    editor.moveBy(14, 0)
    editor.commitMove()
    await settle()
    expect(server.sheet.placements[0]!.x).toBe(110)
    editor.undo()
    await settle()
    expect(server.sheet).toEqual(sampleSheet())
    expect(label()).toMatch(/^Saved/)
  })

  test('offline, reloaded, online again: nothing is lost, also not what was planted', async () => {
    const [server, store] = [new HandServer(), new MemoryQueueStore()]
    const first = await desk({ server, store })
    server.fate = ['no-request', 'no-request']
    const id = first.editor.add({ ...sampleSheet().plants[0]!, id: 'p5' }, 200, 60)!
    first.editor.remove('a1')
    await settle()
    expect(first.label()).toBe('On this page only: 2 edits waiting')
    const second = await desk({ server, store })
    expect(second.place(id)).toMatchObject({ plant: 'p5', x: 200 })
    expect(second.place()).toBeNull()
    expect(second.editor.getSnapshot().sheet.plants.map((plant) => plant.id)).toContain('p5')
    second.queue.wake()
    await settle()
    expect(server.sheet.placements.map((placement) => placement.id)).toEqual([id])
    expect(second.label()).toMatch(/^Saved/)
  })

  test('theirs taken: the sheet shows theirs, and undo does not bring mine back', async () => {
    const { editor, queue, server, place } = await desk()
    server.other(theirMove(200))
    editor.put({ ...place()!, x: 10 }, 'mine')
    await settle()
    expect(place()!.x).toBe(10)
    queue.settle('theirs')
    await settle()
    expect(place()!.x).toBe(200)
    expect(editor.getSnapshot().undoLabel).toBeNull()
    expect(server.sheet.placements[0]!.x).toBe(200)
  })

  test('mine kept: the sheet and the server hold mine', async () => {
    const { editor, queue, server, place } = await desk()
    server.other(theirMove(200))
    editor.put({ ...place()!, x: 10 }, 'mine')
    await settle()
    queue.settle('mine')
    await settle()
    expect([place()!.x, server.sheet.placements[0]!.x]).toEqual([10, 10])
  })

  test('what others changed elsewhere is shown once mine is saved', async () => {
    const { editor, server, place } = await desk()
    server.other(theirMove(333, 'b7'))
    editor.put({ ...place()!, x: 10 }, 'mine')
    await settle()
    expect(place('b7')).toMatchObject({ x: 333 })
    expect(place()).toMatchObject({ x: 10 })
    expect(server.sheet.placements).toHaveLength(2)
  })

  test('a refused edit is taken off the sheet', async () => {
    const { editor, queue, server, place } = await desk()
    server.refuse = (edit) => (edit.op === 'put' && edit.kind === 'placement' && edit.value.x > 1000 ? 'That is off the lot.' : undefined)
    editor.put({ ...place()!, x: 5000 }, 'too far')
    await settle()
    expect(place()!.x).toBe(96)
    expect(queue.getSnapshot()).toMatchObject({ phase: { kind: 'refused' }, refusals: ['That is off the lot.'] })
    expect(editor.getSnapshot().undoLabel).toBeNull()
  })

  test('a desk for looking sends nothing, not even what an earlier page left', async () => {
    const [server, store] = [new HandServer(), new MemoryQueueStore()]
    const first = await desk({ server, store })
    server.fate = ['no-request']
    first.editor.remove('a1')
    await settle()
    const looking = await desk({ server, store, canEdit: false })
    expect(server.asked).toHaveLength(0)
    expect(looking.place()).not.toBeNull()
  })
})

describe('which plant a pointer means', () => {
  const sheet = sampleSheet()
  const first = sheet.placements[0]!
  sheet.placements = [first, { ...first, id: 'a2', x: 110 }, { ...first, id: 'small', x: 400, planted: { height: 4, spread: 4 } }]
  const scene = buildScene({ sheet, year: 0, bound: 'expected', pxPerInch: 1, show: { keys: false } })
  const plan = (x: number, y: number, selected: string | null = null) => placementAt(scene, { x, y: scene.planY(y) }, { scale: 1, selected })

  test('the nearest axis wins; the selected plant wins where it is hit well', () => {
    expect(plan(98, 48)).toBe('a1')
    expect(plan(108, 48)).toBe('a2')
    expect(plan(104, 48, 'a1')).toBe('a1')
    expect(plan(250, 48)).toBeNull()
  })

  test('a small plant answers to 44 px of screen', () => {
    const at = scene.elevationY(2)
    expect(plan(421, 48)).toBe('small')
    expect(placementAt(scene, { x: 421, y: at }, { scale: 1, selected: null })).toBe('small')
    expect(placementAt(scene, { x: 440, y: at }, { scale: 4, selected: null })).toBeNull()
  })
})

/** The editor by script, without a page: pick up, move, put back, undo; one edit and one undo entry for each gesture. */
import { beforeEach, describe, expect, test } from 'vitest'
import { Editor, nameOf } from '@/components/drawing-table/editor/store'
import type { WaitingEdit } from '@/components/drawing-table/editor/queue-store'
import { neighbourOf, outFromWall, usualPlantedSize } from '@/components/drawing-table/editor/placing'
import { applyEdits } from '@/lib/sheet'
import { check, wallDistance, type Sheet } from '@/lib/spacing'
import { sampleSheet } from '../../lib/sheet/sample'
import { newId, NO_FINDINGS } from './harness'

let sent: WaitingEdit[][]
const editorOn = (sheet: Sheet = sampleSheet(), canEdit = true) => new Editor({ sheet, report: NO_FINDINGS, canEdit, newId, send: (edits) => sent.push(edits) })
const at = (editor: Editor, id = 'a1') => {
  const { x, y } = editor.placement(id)!
  return { x, y }
}

beforeEach(() => {
  sent = []
})

describe('moving a plant', () => {
  test('a drag of many frames is one edit and one undo entry', () => {
    const editor = editorOn()
    editor.beginMove('a1', 'both')
    for (let frame = 1; frame <= 30; frame += 1) editor.moveBy(frame / 3, frame / 5)
    expect(at(editor)).toEqual({ x: 96, y: 48 })
    expect(sent).toEqual([])
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 106, y: 54 })
    expect(sent).toHaveLength(1)
    expect(sent[0]).toHaveLength(1)
    expect(sent[0]![0]!.before).toEqual(sampleSheet().placements[0])
    editor.undo()
    expect(at(editor)).toEqual({ x: 96, y: 48 })
    expect(editor.getSnapshot().undoLabel).toBeNull()
    editor.redo()
    expect(at(editor)).toEqual({ x: 106, y: 54 })
    expect(sent).toHaveLength(3)
    expect(new Set(sent.flat().map(({ edit }) => edit.id)).size).toBe(3)
  })

  test('panels hear nothing while it moves, the overlay hears each new place', () => {
    const editor = editorOn()
    editor.select('a1')
    let panels = 0
    let frames = 0
    editor.subscribe(() => (panels += 1))
    editor.onMoving(() => (frames += 1))
    editor.beginMove('a1', 'both')
    editor.moveBy(0.2, 0)
    editor.moveBy(3.2, 0)
    editor.moveBy(3.4, 0)
    editor.moveBy(4, 2)
    expect(panels).toBe(0)
    expect(frames).toBe(3)
  })

  test('Escape puts it back and leaves nothing behind', () => {
    const editor = editorOn()
    editor.beginMove('a1', 'both')
    editor.moveBy(40, 10)
    editor.cancelMove()
    expect(editor.moving).toBeNull()
    expect(at(editor)).toEqual({ x: 96, y: 48 })
    expect(sent).toEqual([])
    expect(editor.getSnapshot().undoLabel).toBeNull()
  })

  test('in elevation it goes along the wall only', () => {
    const editor = editorOn()
    editor.beginMove('a1', 'x')
    editor.moveBy(12, 30)
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 108, y: 48 })
  })

  test('snaps to whole inches, or to the 1/64 in', () => {
    const editor = editorOn()
    editor.beginMove('a1', 'both')
    editor.moveBy(3.49, 3.51)
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 99, y: 52 })
    editor.setGrid(1 / 64)
    editor.beginMove('a1', 'both')
    editor.moveBy(0.02, 0)
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 99 + 1 / 64, y: 52 })
  })

  test('dropped where it stood, nothing was done', () => {
    const editor = editorOn()
    editor.beginMove('a1', 'both')
    editor.moveBy(20, 0)
    editor.moveBy(0, 0)
    editor.commitMove()
    expect(sent).toEqual([])
  })

  test('picked up by a tap, set down by a tap', () => {
    const editor = editorOn()
    editor.select('a1')
    editor.pickUp()
    expect(editor.getSnapshot().isCarried).toBe(true)
    editor.moveTo(200.4, 60.2)
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 200, y: 60 })
    expect(editor.getSnapshot().isCarried).toBe(false)
    expect(sent).toHaveLength(1)
  })

  test('an arrow held is one gesture', () => {
    const editor = editorOn()
    editor.select('a1')
    for (let i = 0; i < 5; i += 1) editor.nudge(1, 0)
    editor.nudge(0, -6)
    editor.commitMove()
    expect(at(editor)).toEqual({ x: 101, y: 42 })
    expect(sent).toHaveLength(1)
  })

  test('what is said while it moves is what the full check says of that place', () => {
    const sheet = sampleSheet()
    const editor = editorOn(sheet)
    const drag = editor.beginMove('a1', 'both')!
    for (const [dx, dy] of [[0, 0], [10, -20], [60, 40], [-90, 0]] as const) {
      editor.moveBy(dx, dy)
      const all = check({ ...sheet, placements: [drag.candidate] }).findings
      const keys = new Set(drag.findings.map(({ key }) => key))
      expect(drag.findings).toEqual(all.filter(({ key }) => keys.has(key)))
      expect(all.filter(({ rule }) => ['sill', 'walk-edge', 'wall-gap', 'gutter', 'outside-bed'].includes(rule)).every(({ key }) => keys.has(key))).toBe(true)
    }
  })
})

describe('adding, changing, removing', () => {
  const plant = { ...sampleSheet().plants[0]!, id: 'p9', common: 'sweetspire' }

  test('a plant of the library comes onto the sheet with its placement and is selected', () => {
    const editor = editorOn()
    const id = editor.add(plant, 120, 60)!
    const { sheet, selected } = editor.getSnapshot()
    expect(selected).toBe(id)
    expect(sheet.plants.map((one) => one.id)).toContain('p9')
    expect(editor.placement(id)).toMatchObject({ x: 120, y: 60, planted: usualPlantedSize(plant) })
    expect(sent[0]![0]).toMatchObject({ before: null, plant: { id: 'p9' } })
    editor.undo()
    expect(editor.placement(id)).toBeNull()
    expect(editor.getSnapshot().selected).toBeNull()
  })

  test('removed and taken back', () => {
    const editor = editorOn()
    editor.select('a1')
    editor.remove('a1')
    expect(editor.getSnapshot()).toMatchObject({ selected: null, said: 'inkberry removed' })
    editor.undo()
    expect(editor.placement('a1')).toEqual(sampleSheet().placements[0])
  })

  test('a size that cannot be is refused with a sentence and changes nothing', () => {
    const editor = editorOn()
    expect(editor.put({ ...editor.placement('a1')!, planted: { height: 0, spread: 15 } }, 'x')).toBe('Planted height must be more than 0.')
    expect(sent).toEqual([])
  })

  test('a new deed forgets what was taken back', () => {
    const editor = editorOn()
    editor.remove('a1')
    editor.undo()
    editor.put({ ...editor.placement('a1')!, x: 50 }, 'moved')
    expect(editor.getSnapshot().redoLabel).toBeNull()
  })

  test('those who may only look change nothing', () => {
    const editor = editorOn(sampleSheet(), false)
    expect(editor.add(plant, 1, 1)).toBeNull()
    expect(editor.beginMove('a1', 'both')).toBeNull()
    editor.remove('a1')
    editor.put({ ...sampleSheet().placements[0]!, x: 1 }, 'x')
    editor.select('a1')
    editor.nudge(1, 0)
    editor.pickUp()
    expect(editor.getSnapshot()).toMatchObject({ selected: 'a1', isCarried: false })
    expect(editor.getSnapshot().sheet).toEqual(sampleSheet())
    expect(sent).toEqual([])
  })
})

describe('what the server says', () => {
  test('a refused edit comes off, what was made after it stays on', () => {
    const editor = editorOn()
    editor.put({ ...editor.placement('a1')!, x: 50 }, 'one')
    editor.put({ ...editor.placement('a1')!, id: 'a2', x: 300 }, 'two')
    const [[refused], [after]] = sent as [[WaitingEdit], [WaitingEdit]]
    editor.refused(refused, [after])
    expect(at(editor).x).toBe(96)
    expect(at(editor, 'a2').x).toBe(300)
    expect(editor.getSnapshot().undoLabel).toBe('two')
  })

  test('its report stands only when nothing newer waits', () => {
    const editor = editorOn()
    editor.put({ ...editor.placement('a1')!, x: 50 }, 'one')
    const report = { engine: 'the server', findings: [] }
    editor.saved(sent[0]!, report, false)
    expect(editor.getSnapshot().report.engine).not.toBe('the server')
    editor.saved([], report, true)
    expect(editor.getSnapshot().report).toBe(report)
  })

  test('others changed things: theirs are shown, what waits here stays on top', () => {
    const editor = editorOn()
    editor.put({ ...editor.placement('a1')!, id: 'a2', x: 300 }, 'two')
    const theirs = applyEdits(sampleSheet(), [{ id: newId(), op: 'put', kind: 'placement', value: { ...sampleSheet().placements[0]!, x: 222 } }])
    editor.served({ seq: 9, sheet: theirs, report: NO_FINDINGS }, sent[0]!, [])
    expect(at(editor).x).toBe(222)
    expect(at(editor, 'a2').x).toBe(300)
  })

  test('edits of an earlier page come back, also of plants this sheet has not met', () => {
    const editor = editorOn()
    const plant = { ...sampleSheet().plants[0]!, id: 'p7' }
    const value = { ...sampleSheet().placements[0]!, id: 'a7', plant: 'p7' }
    editor.restored([{ edit: { id: newId(), op: 'put', kind: 'placement', value }, before: null, plant }])
    expect(editor.placement('a7')).toEqual(value)
    expect(nameOf(editor.getSnapshot().sheet, value)).toBe('inkberry')
    expect(sent).toEqual([])
  })
})

describe('finding one\'s way', () => {
  test('plants follow each other along the wall and end at its ends', () => {
    const first = sampleSheet().placements[0]!
    const sheet = { placements: [{ ...first, id: 'c', x: 30 }, { ...first, id: 'b', x: 20 }, { ...first, id: 'a', x: 30, y: 10 }] }
    expect([neighbourOf(sheet, null, 1), neighbourOf(sheet, 'b', 1), neighbourOf(sheet, 'a', 1), neighbourOf(sheet, 'c', 1)]).toEqual(['b', 'a', 'c', null])
    expect([neighbourOf(sheet, null, -1), neighbourOf(sheet, 'b', -1)]).toEqual(['c', null])
  })

  test('a typed distance from the wall is the distance measured there, returns of jogs included', () => {
    const { facade } = sampleSheet()
    for (const x of [0, 120, 230, 239, 250, 400]) {
      for (const out of [0.5, 12, 23, 24, 36, 90]) {
        const y = outFromWall(facade, x, out)
        const isBesideReturn = x < 240 && 240 - x < out && wallDistance(facade, x, y) > out
        if (!isBesideReturn) expect(wallDistance(facade, x, y)).toBeCloseTo(out, 1)
      }
    }
  })
})

/** The form's store: what is impossible waits with its reason and changes nothing; what is sound is kept and can be undone. */
import { beforeEach, describe, expect, test } from 'vitest'
import { Measuring, type Thing } from '@/components/site/measuring'
import { applyEdit, type Edit } from '@/lib/sheet'
import type { WaitingEdit } from '@/components/drawing-table/editor/queue-store'
import { sampleSheet } from '../../lib/sheet/sample'

let sent: Edit[]
let waiting: WaitingEdit[]
let measuring: Measuring
beforeEach(() => {
  let count = 0
  sent = []
  measuring = new Measuring(sampleSheet(), {
    send: (edits) => {
      waiting = edits
      sent.push(...edits.map(({ edit }) => edit))
    },
    newId: () => `0b0e6d2e-0000-4000-8000-${String((count += 1)).padStart(12, '0')}`,
  })
})

const kitchen = (change: object): Extract<Thing, { kind: 'opening' }> => ({ kind: 'opening', value: { ...sampleSheet().openings[0]!, ...change } })
const front = (change: object): Thing => ({ kind: 'facade', value: { ...sampleSheet().facade, ...change } })
const reasons = () => [...measuring.getState().drafts.values()].flatMap(({ problems }) => problems.map(({ path, message }) => `${path.join('.')}: ${message}`))

describe('while somebody types', () => {
  test('the drawing follows and nothing is kept or sent', () => {
    measuring.type(kitchen({ sill: 44 }))
    expect(measuring.getState().shown.openings[0]!.sill).toBe(44)
    expect(measuring.getState().sheet.openings[0]!.sill).toBe(38)
    expect(sent).toEqual([])
  })

  test('a sill above its head changes neither drawing nor data, and says why at the sill', () => {
    measuring.type(kitchen({ sill: 95 }))
    measuring.leave()
    expect(measuring.getState().shown).toEqual(sampleSheet())
    expect(sent).toEqual([])
    expect(reasons()).toEqual(['openings.0.sill: The sill must be below the head.'])
  })

  test('a width of 0 is refused at the width', () => {
    measuring.type(kitchen({ width: 0 }))
    expect(reasons()).toEqual(['openings.0.width: Width must be more than 0.'])
  })

  test('a wall made shorter than its windows reach is refused, naming the window', () => {
    measuring.type(front({ wall: [{ x: 0, y: 0 }, { x: 100, y: 0 }], grade: [{ x: 0, z: 0 }] }))
    expect(reasons()).toContain('openings.0.width: Kitchen runs beyond the right corner of the wall.')
  })
})

describe('when a field is left', () => {
  test('what is sound is kept and sent as one edit', () => {
    measuring.type(kitchen({ sill: 40 }))
    measuring.type(kitchen({ sill: 44 }))
    measuring.leave()
    expect(sent).toMatchObject([{ op: 'put', kind: 'opening', value: { id: 'w1', sill: 44 } }])
    expect(measuring.getState().sheet.openings[0]!.sill).toBe(44)
  })

  test('nothing is sent when the value is what it was', () => {
    measuring.type(kitchen({ sill: 44 }))
    measuring.type(kitchen({}))
    measuring.leave()
    expect(sent).toEqual([])
    expect(measuring.getState().past).toEqual([])
  })

  test('a sill that waited is kept once its head makes room', () => {
    measuring.type(kitchen({ sill: 95 }))
    measuring.leave()
    measuring.type(kitchen({ sill: 95, head: 120 }))
    measuring.leave()
    expect(sent).toHaveLength(1)
    expect(measuring.getState().sheet.openings[0]).toMatchObject({ sill: 95, head: 120 })
  })

  test('a window that waited for a longer wall is kept when the wall is', () => {
    measuring.type(kitchen({ x: 550 }))
    measuring.leave()
    expect(sent).toEqual([])
    measuring.type(front({ wall: [{ x: 0, y: 0 }, { x: 700, y: 0 }] }))
    measuring.leave()
    expect(sent.map(({ kind }) => kind)).toEqual(['facade', 'opening'])
  })
})

describe('undo', () => {
  test('brings back what was removed, and redo removes it again, each sent under an id of its own', () => {
    measuring.remove(kitchen({}))
    expect(measuring.getState().sheet.openings.map(({ id }) => id)).toEqual(['d1'])
    measuring.undo()
    expect(measuring.getState().sheet.openings.find(({ id }) => id === 'w1')).toEqual(sampleSheet().openings[0])
    measuring.redo()
    expect(measuring.getState().sheet.openings.map(({ id }) => id)).toEqual(['d1'])
    expect(new Set(sent.map(({ id }) => id)).size).toBe(3)
  })

  test('takes an added thing away', () => {
    expect(measuring.put({ kind: 'walk', value: { id: 'k2', name: 'Side walk', outline: sampleSheet().walks[0]!.outline } })).toEqual([])
    expect(measuring.getState().said).toBe('Side walk added')
    measuring.undo()
    expect(measuring.getState().sheet).toEqual(sampleSheet())
  })

  test('leaves what is typed and waits in another thing', () => {
    measuring.remove({ kind: 'bed', value: sampleSheet().beds[0]! })
    measuring.type(kitchen({ sill: 95 }))
    measuring.undo()
    expect(reasons()).toHaveLength(1)
  })

  test('with nothing to take back does nothing', () => {
    measuring.undo()
    measuring.redo()
    expect(sent).toEqual([])
  })
})

test('a thing that is not sound cannot be put', () => {
  expect(measuring.put(kitchen({ head: 10 })).map(({ message }) => message)).toEqual(['The sill must be below the head.'])
  expect(sent).toEqual([])
})

test('each edit goes out with the thing as it stood before', () => {
  measuring.type(kitchen({ sill: 44 }))
  measuring.leave()
  expect(waiting.map(({ before }) => before)).toEqual([sampleSheet().openings[0]])
  measuring.put({ kind: 'bed', value: { ...sampleSheet().beds[0]!, id: 'b2' } })
  expect(waiting.map(({ before }) => before)).toEqual([null])
})

describe('a sheet from the server', () => {
  const theirs = applyEdit(sampleSheet(), { id: '', op: 'put', kind: 'opening', value: { ...sampleSheet().openings[0]!, name: 'Bay' } })

  test('is taken over, and what others did cannot be undone from here', () => {
    measuring.remove(kitchen({}))
    measuring.adopt(theirs, 'Theirs taken')
    expect(measuring.getState().shown).toEqual(theirs)
    expect(measuring.getState().past).toEqual([])
  })

  test('that is the same leaves the steps as they are', () => {
    measuring.type(kitchen({ sill: 44 }))
    measuring.leave()
    measuring.adopt(structuredClone(measuring.getState().sheet), null)
    expect(measuring.getState().past).toHaveLength(1)
  })

  test('with the same measures in another order leaves the steps as they are', () => {
    measuring.remove(kitchen({}))
    measuring.undo()
    const { past, sheet } = measuring.getState()
    measuring.adopt({ ...sheet, openings: sheet.openings.toReversed() }, null)
    expect(measuring.getState().past).toBe(past)
    expect(measuring.getState().future).toHaveLength(1)
  })

  test('leaves what is typed into things the others did not touch', () => {
    measuring.type(front({ gutter: -50 }))
    measuring.type(kitchen({ sill: 95 }))
    measuring.adopt(theirs, null)
    expect([...measuring.getState().drafts.keys()]).toEqual(['facade:single'])
  })
})

test('what the server refuses is taken back, with its reason', () => {
  measuring.type(kitchen({ sill: 44 }))
  measuring.leave()
  measuring.withdraw(waiting[0]!, 'The sill is not right.')
  expect(measuring.getState().sheet).toEqual(sampleSheet())
  expect(measuring.getState().said).toContain('The sill is not right.')
})

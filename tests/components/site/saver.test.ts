/** Edits go out in order, one request at a time; what fails waits; a clash is settled by the person. */
import { describe, expect, test } from 'vitest'
import { Saver, type Answer, type SheetCalls } from '@/components/site/saver'
import { applyEdits, type Edit } from '@/lib/sheet'
import { sampleSheet } from '../../lib/sheet/sample'

const edit = (n: number, sill = 40 + n): Edit => ({
  id: `0b0e6d2e-0000-4000-8000-${String(n).padStart(12, '0')}`, op: 'put', kind: 'opening', value: { ...sampleSheet().openings[0]!, sill },
})

type Save = Parameters<SheetCalls['saveEdits']>[0]

/** A server in the test's hand: it answers when told to. */
function server() {
  const asked: Save[] = []
  const pending: ((answer: Answer<{ seq: number }>) => void)[] = []
  const theirs = applyEdits(sampleSheet(), [edit(90, 50)])
  const calls: SheetCalls = {
    saveEdits: (body) => {
      asked.push(body)
      return new Promise((resolve) => pending.push(resolve))
    },
    readSheet: async () => ({ ok: true, value: { seq: 20, sheet: theirs } }),
  }
  const answer = async (with_: Answer<{ seq: number }>) => {
    pending.shift()!(with_)
    await new Promise((resolve) => setTimeout(resolve))
  }
  const saver = new Saver({ seq: 7, editor: 'me', calls, now: () => 1000 })
  return { asked, answer, saver, theirs }
}

describe('saving', () => {
  test('says saving, then saved and when; the next base is the seq answered', async () => {
    const { asked, answer, saver } = server()
    saver.send([edit(1)])
    expect(saver.getState()).toEqual({ kind: 'saving' })
    expect(asked[0]).toMatchObject({ base: 7, editor: 'me', edits: [{ id: edit(1).id }] })
    await answer({ ok: true, value: { seq: 8 } })
    expect(saver.getState()).toEqual({ kind: 'saved', at: 1000 })
    saver.send([edit(2)])
    expect(asked[1]!.base).toBe(8)
  })

  test('keeps one request in flight; what is made meanwhile follows in order', async () => {
    const { asked, answer, saver } = server()
    saver.send([edit(1)])
    saver.send([edit(2)])
    saver.send([edit(3)])
    expect(asked).toHaveLength(1)
    await answer({ ok: true, value: { seq: 8 } })
    expect(asked[1]!.edits.map(({ id }) => id)).toEqual([edit(2).id, edit(3).id])
  })

  test('what fails waits, says why, and is sent again under the same ids', async () => {
    const { asked, answer, saver } = server()
    saver.send([edit(1)])
    await answer({ ok: false, status: 0, message: 'no network.' })
    expect(saver.getState()).toEqual({ kind: 'not-saved', message: 'no network.', waiting: 1 })
    expect(saver.hasWaiting()).toBe(true)
    saver.retry()
    expect(asked[1]).toEqual(asked[0])
    await answer({ ok: true, value: { seq: 8 } })
    expect(saver.hasWaiting()).toBe(false)
  })
})

describe('a clash', () => {
  async function clashed() {
    const table = server()
    table.saver.send([edit(1, 44)])
    await table.answer({ ok: false, status: 409, message: 'Someone else changed it.' })
    return table
  }

  test('shows both versions of each thing', async () => {
    const { saver } = await clashed()
    expect(saver.getState()).toMatchObject({ kind: 'clash', clashes: [{ kind: 'opening', target: 'w1', mine: { sill: 44 }, theirs: { sill: 50 } }] })
  })

  test('ends with theirs: nothing more is sent', async () => {
    const { saver, asked, theirs } = await clashed()
    expect(saver.takeTheirs()).toEqual(theirs)
    expect(saver.hasWaiting()).toBe(false)
    expect(saver.getState()).toEqual({ kind: 'saved', at: 1000 })
    expect(asked).toHaveLength(1)
  })

  test('ends with mine: the same edits go out over theirs', async () => {
    const { saver, asked, answer } = await clashed()
    expect(saver.keepMine()?.openings[0]!.sill).toBe(44)
    expect(asked[1]).toMatchObject({ base: 20, edits: [{ id: edit(1).id }] })
    await answer({ ok: true, value: { seq: 21 } })
    expect(saver.getState()).toEqual({ kind: 'saved', at: 1000 })
  })

  test('while it is open further edits wait for the decision', async () => {
    const { saver, asked } = await clashed()
    saver.send([edit(2)])
    expect(asked).toHaveLength(1)
    saver.keepMine()
    expect(asked[1]!.edits).toHaveLength(2)
  })
})

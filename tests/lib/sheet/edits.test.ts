/** Edits are the only way a sheet changes: pure, one thing at a time, and each can be taken back. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { applyEdit, applyEdits, editSchema, inverseOf, listOf, problemsOf, targetOf, type Edit, type ListedKind } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { anyEdit, sampleSheet } from './sample'

const ID = '0b0e6d2e-0000-4000-8000-000000000001'
const BACK = '0b0e6d2e-0000-4000-8000-000000000002'

/** A sheet with every list in the order of its ids: taking back a removal puts the thing at the end of its list. */
function inOrder(sheet: Sheet): Sheet {
  const sorted = <T extends { id: string }>(list: T[]) => [...list].sort((a, b) => (a.id < b.id ? -1 : 1))
  return { ...sheet, openings: sorted(sheet.openings), fixtures: sorted(sheet.fixtures), walks: sorted(sheet.walks), beds: sorted(sheet.beds), placements: sorted(sheet.placements) }
}

function takeBack(before: Sheet, edit: Edit): Sheet {
  const back = inverseOf(before, edit, BACK)
  const after = applyEdit(before, edit)
  return back ? applyEdit(after, back) : after
}

describe('one edit', () => {
  test('puts a new thing at the end of its list', () => {
    const value = { id: 'w2', kind: 'window', name: 'Bay', x: 200, width: 30, sill: 30, head: 80 } as const
    const after = applyEdit(sampleSheet(), { id: ID, op: 'put', kind: 'opening', value })
    expect(after.openings.map(({ id }) => id)).toEqual(['w1', 'd1', 'w2'])
    expect(after.openings[2]).toEqual(value)
  })

  test('puts a thing that stands already in its own place', () => {
    const before = sampleSheet()
    const value = { ...before.openings[0]!, sill: 40 }
    const after = applyEdit(before, { id: ID, op: 'put', kind: 'opening', value })
    expect(after.openings.map(({ id, sill }) => [id, sill])).toEqual([['w1', 40], ['d1', 8]])
  })

  test('removes one thing, and nothing when it is not there', () => {
    const before = sampleSheet()
    expect(applyEdit(before, { id: ID, op: 'remove', kind: 'opening', target: 'w1' }).openings.map(({ id }) => id)).toEqual(['d1'])
    expect(applyEdit(before, { id: ID, op: 'remove', kind: 'opening', target: 'k1' })).toEqual(before)
  })

  test('of the aspect changes light and facing and leaves the rest of the site', () => {
    const before = sampleSheet()
    const after = applyEdit(before, { id: ID, op: 'put', kind: 'aspect', value: { light: 'full-sun' } })
    const expected: Partial<Sheet['site']> = { ...before.site, light: 'full-sun' }
    delete expected.facing
    expect(after.site).toEqual(expected)
  })

  test('names its target; facade and aspect have one each', () => {
    const { facade, openings } = sampleSheet()
    expect(targetOf({ id: ID, op: 'put', kind: 'facade', value: facade })).toEqual({ kind: 'facade', target: 'single' })
    expect(targetOf({ id: ID, op: 'put', kind: 'opening', value: openings[0]! })).toEqual({ kind: 'opening', target: 'w1' })
    expect(targetOf({ id: ID, op: 'remove', kind: 'bed', target: 'b1' })).toEqual({ kind: 'bed', target: 'b1' })
  })
})

describe('any edit', () => {
  test('leaves the sheet before it as it was', () => {
    fc.assert(
      fc.property(anyEdit, (edit) => {
        const before = sampleSheet()
        applyEdit(before, edit)
        expect(before).toEqual(sampleSheet())
      }),
    )
  })

  test('is taken back by its inverse', () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { maxLength: 6 }), anyEdit, (earlier, edit) => {
        const before = applyEdits(sampleSheet(), earlier)
        expect(inOrder(takeBack(before, edit))).toEqual(inOrder(before))
      }),
    )
  })

  test('is done again by the inverse of its inverse', () => {
    fc.assert(
      fc.property(anyEdit, (edit) => {
        const before = sampleSheet()
        const after = applyEdit(before, edit)
        const back = inverseOf(before, edit, BACK)
        const again = back && inverseOf(after, back, ID)
        if (back && again) expect(inOrder(applyEdits(after, [back, again]))).toEqual(inOrder(after))
        else expect(after).toEqual(before)
      }),
    )
  })

  test('put twice is put once', () => {
    fc.assert(fc.property(anyEdit, (edit) => void expect(applyEdits(sampleSheet(), [edit, edit])).toEqual(applyEdit(sampleSheet(), edit))))
  })

  test('touches the list of its kind alone', () => {
    fc.assert(
      fc.property(anyEdit, (edit) => {
        const before = sampleSheet()
        const after = applyEdit(before, edit)
        const others = (['opening', 'fixture', 'walk', 'bed', 'placement'] as ListedKind[]).filter((kind) => kind !== edit.kind)
        for (const kind of others) expect(listOf(after, kind)).toEqual(listOf(before, kind))
        expect(after.plants).toEqual(before.plants)
      }),
    )
  })

  test('passes its own schema unchanged', () => {
    fc.assert(fc.property(anyEdit, (edit) => void expect(editSchema.parse(JSON.parse(JSON.stringify(edit)))).toEqual(edit)))
  })
})

describe('an edit from outside is refused', () => {
  const bed = sampleSheet().beds[0]!
  const good = { id: ID, op: 'put', kind: 'bed', value: bed }
  const problems = (edit: unknown) => {
    const read = editSchema.safeParse(edit)
    if (read.success) throw new Error('The edit was accepted.')
    return problemsOf(read.error)
  }

  test('the good one is not', () => expect(editSchema.safeParse(good).success).toBe(true))

  test.each([
    ['an unknown key beside the value', { ...good, extra: 1 }, ['extra']],
    ['an unknown key deep inside', { ...good, value: { ...bed, outline: [{ ...bed.outline[0]!, z: 1 }, ...bed.outline.slice(1)] } }, ['value', 'outline', 0, 'z']],
    ['an id that is no UUID', { ...good, id: 'x' }, ['id']],
    ['two points for an outline', { ...good, value: { ...bed, outline: bed.outline.slice(2) } }, ['value', 'outline']],
    ['a name of spaces', { ...good, value: { ...bed, name: '   ' } }, ['value', 'name']],
    ['another value than its kind', { ...good, kind: 'opening' }, ['value', 'kind']],
  ])('%s', (_, edit, path) => expect(problems(edit).map((problem) => problem.path)).toContainEqual(path))

  test.each([
    ['an unknown deed', { ...good, op: 'burn' }],
    ['an unknown kind', { ...good, kind: 'roof' }],
    ['the facade removed', { id: ID, op: 'remove', kind: 'facade', target: 'single' }],
    ['nothing', null],
  ])('%s', (_, edit) => expect(problems(edit).length).toBeGreaterThan(0))
})

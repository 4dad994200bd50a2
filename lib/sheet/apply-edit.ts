/** Pure changes of a sheet: each answer is a new sheet, the old one stays as it was. */
import type { Sheet } from '../spacing'
import { targetOf, type Edit, type ListedKind, type PutEdit } from './edits'

const LIST_OF = {
  opening: 'openings',
  fixture: 'fixtures',
  walk: 'walks',
  bed: 'beds',
  placement: 'placements',
} as const satisfies Record<ListedKind, keyof Sheet>

/** The list a kind of thing stands in. */
export function listOf(sheet: Sheet, kind: ListedKind): readonly { id: string }[] {
  return sheet[LIST_OF[kind]]
}

function withList(sheet: Sheet, kind: ListedKind, list: readonly { id: string }[]): Sheet {
  return { ...sheet, [LIST_OF[kind]]: list }
}

/**
 * The sheet after one edit. Putting a thing whose id stands already replaces it in its place; a new one goes
 * to the end. Removing what is not there changes nothing.
 */
export function applyEdit(sheet: Sheet, edit: Edit): Sheet {
  if (edit.op === 'remove') {
    return withList(sheet, edit.kind, listOf(sheet, edit.kind).filter((thing) => thing.id !== edit.target))
  }
  if (edit.kind === 'facade') return { ...sheet, facade: edit.value }
  if (edit.kind === 'aspect') return { ...sheet, site: withAspect(sheet, edit.value) }
  const list = listOf(sheet, edit.kind)
  const at = list.findIndex((thing) => thing.id === edit.value.id)
  return withList(sheet, edit.kind, at < 0 ? [...list, edit.value] : list.with(at, edit.value))
}

function withAspect(sheet: Sheet, aspect: { light: Sheet['site']['light']; facing?: number }): Sheet['site'] {
  const site = { ...sheet.site, light: aspect.light }
  delete site.facing
  return aspect.facing === undefined ? site : { ...site, facing: aspect.facing }
}

/** The sheet after several edits, in order. */
export function applyEdits(sheet: Sheet, edits: readonly Edit[]): Sheet {
  return edits.reduce(applyEdit, sheet)
}

/**
 * The edit that takes `edit` back, given the sheet before it; null where there is nothing to take back
 * (removing what was not there).
 * @param newId id for the inverse: it is an edit of its own.
 */
export function inverseOf(before: Sheet, edit: Edit, newId: string): Edit | null {
  const { kind, target } = targetOf(edit)
  if (kind === 'facade') return { id: newId, op: 'put', kind, value: before.facade }
  if (kind === 'aspect') {
    const { light, facing } = before.site
    return { id: newId, op: 'put', kind, value: facing === undefined ? { light } : { light, facing } }
  }
  const old = listOf(before, kind).find((thing) => thing.id === target)
  if (old) return { id: newId, op: 'put', kind, value: old } as PutEdit
  return edit.op === 'remove' ? null : { id: newId, op: 'remove', kind, target }
}

/** Things of a sheet by kind and id, and whether two versions of one thing say the same. */
import { listOf, targetOf, type Edit, type EditKind } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'

export interface Target {
  kind: EditKind
  target: string
}

/** The thing as it stands on the sheet; null where there is none. */
export function thingOn(sheet: Sheet, { kind, target }: Target): unknown {
  if (kind === 'facade') return sheet.facade
  if (kind === 'aspect') return { light: sheet.site.light, facing: sheet.site.facing }
  return listOf(sheet, kind).find(({ id }) => id === target) ?? null
}

/** The thing as an edit leaves it; null after a removal. */
export const thingAfter = (edit: Edit): unknown => (edit.op === 'remove' ? null : edit.value)

export const targetKey = ({ kind, target }: Target): string => `${kind}:${target}`
export const keyOfEdit = (edit: Edit): string => targetKey(targetOf(edit))

/** Text of a value with its fields in order and absent fields left out: equal texts mean equal things. */
function plainText(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) => {
    if (part === null || typeof part !== 'object' || Array.isArray(part)) return part
    return Object.fromEntries(Object.entries(part).filter(([, field]) => field !== undefined).sort(([a], [b]) => (a < b ? -1 : 1)))
  })
}

export const isSameThing = (a: unknown, b: unknown): boolean => plainText(a) === plainText(b)

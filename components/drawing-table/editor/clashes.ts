/** What was changed here and, meanwhile, elsewhere. */
import { applyEdits, targetOf } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import type { WaitingEdit } from './queue-store'
import { isSameThing, keyOfEdit, thingAfter, thingOn, type Target } from './things'

/** One thing in both versions; null where it was removed. */
export interface Clash extends Target {
  mine: unknown
  theirs: unknown
}

/**
 * The things on which the waiting edits and the server's sheet disagree because somebody else changed them. What the
 * server shows as it was before, or as one of the waiting edits left it (saved, but the answer was lost), is no clash.
 */
export function clashesOf(theirs: Sheet, waiting: readonly WaitingEdit[]): Clash[] {
  const mine = applyEdits(theirs, waiting.map(({ edit }) => edit))
  const byTarget = new Map<string, WaitingEdit[]>()
  for (const one of waiting) byTarget.set(keyOfEdit(one.edit), [...(byTarget.get(keyOfEdit(one.edit)) ?? []), one])
  return [...byTarget.values()].flatMap((edits): Clash[] => {
    const target = targetOf(edits[0]!.edit)
    const now = thingOn(theirs, target)
    const known = [edits[0]!.before, ...edits.map(({ edit }) => thingAfter(edit))]
    const last = thingOn(mine, target)
    return known.some((version) => isSameThing(version, now)) || isSameThing(last, now) ? [] : [{ ...target, mine: last, theirs: now }]
  })
}

import { authorize } from '../authorize'
import type { Context } from '../context'
import { standardsOf } from '../sheets/read-sheet'

/** What the studio has set otherwise than the rules do, by name: numbers, and kinds for "<rule>.kind". */
export function getStandards(context: Context, _: Record<string, never> = {}): { values: Record<string, number | string> } {
  authorize(context, 'standards:read')
  return { values: standardsOf(context.db, context.actor.studioId) }
}

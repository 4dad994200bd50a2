import type { Plant } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { libraryPlants } from '../sheets/sheet-plants'

/** Every plant the studio may use, with the facts that the check reads: what swaps are drawn from. By botanical name. */
export function listLibrary(context: Context, _: Record<string, never> = {}): { plants: Plant[] } {
  authorize(context, 'plant:read')
  return { plants: libraryPlants(context.db, context.actor.studioId) }
}

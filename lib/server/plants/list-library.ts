import type { Plant } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { libraryFruits, libraryPlants } from '../sheets/sheet-plants'

export interface Library {
  plants: Plant[]
  /** Fruit by plant id, of those that have any of note. */
  fruits: Record<string, { color: string; months: number[] }>
}

/** Every plant the studio may use, with the facts that the check reads: what swaps are drawn from. By botanical name. */
export function listLibrary(context: Context, _: Record<string, never> = {}): Library {
  authorize(context, 'plant:read')
  const { db, actor } = context
  return { plants: libraryPlants(db, actor.studioId), fruits: libraryFruits(db, actor.studioId) }
}

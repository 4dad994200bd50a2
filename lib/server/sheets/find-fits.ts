import { snapshot } from '@/db/open'
import type { Plant } from '@/lib/plants'
import { fitsHere, prepare, type Fit, type NearMiss, type Size } from '@/lib/spacing'
import { MAX_LENGTH_IN } from '@/lib/measure'
import { z } from '@/lib/zod'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findFacade } from './find-facade'
import { readSheet } from './read-sheet'
import { libraryPlants } from './sheet-plants'

const coordinate = z.number({ error: 'A place is two numbers, in inches.' }).min(-MAX_LENGTH_IN).max(MAX_LENGTH_IN)

/** A point of the plan, inches; `instead` names a placement that is to be replaced. */
export const spotSchema = z.strictObject({ x: coordinate, y: coordinate, instead: z.string().min(1).max(64).optional() })

/** So many are told, the best first. */
const MOST_FITS = 60

export interface FitsAnswer {
  frontier: Size[]
  largest: Size | null
  fits: Fit[]
  /** How many fit in all. */
  total: number
  misses: NearMiss[]
  /** The plants named, with their facts. */
  plants: Plant[]
}

interface Asked {
  facadeId: string
  x: number
  y: number
  instead?: string | undefined
}

/** What a spot of a saved sheet can hold, and which plants of the studio's library fit it. Throws AppError('not-found'). */
export function findFits(context: Context, { facadeId, x, y, instead }: Asked): FitsAnswer {
  authorize(context, 'sheet:read')
  const { db, actor } = context
  const { sheet, library } = snapshot(db, () => ({ sheet: readSheet(db, findFacade(context, facadeId)), library: libraryPlants(db, actor.studioId) }))
  const { frontier, largest, fits, misses } = fitsHere(prepare(sheet), { x, y, ...(instead !== undefined && { instead }) }, library)
  const shown = fits.slice(0, MOST_FITS)
  const named = new Set([...shown, ...misses].map(({ plant }) => plant))
  return { frontier, largest, fits: shown, total: fits.length, misses, plants: library.filter(({ id }) => named.has(id)) }
}

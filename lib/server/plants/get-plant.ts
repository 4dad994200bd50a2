import type { LibraryPlant } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findPlant } from './find-plant'

/** One plant with its sources. Throws AppError('not-found') when it is absent or another studio's. */
export function getPlant(context: Context, { plantId }: { plantId: string }): LibraryPlant {
  authorize(context, 'plant:read')
  return findPlant(context, plantId)
}

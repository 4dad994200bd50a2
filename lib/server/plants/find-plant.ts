import { eq } from 'drizzle-orm'
import { plants } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { LibraryPlant } from '@/lib/plants'
import type { Context } from '../context'
import { isPlantVisible, withSources } from './library-rows'

/** A plant that the studio may see; AppError('not-found') when it is absent or another studio's. */
export function findPlant({ db, actor }: Context, plantId: string): LibraryPlant {
  const row = db.select().from(plants).where(isPlantVisible(plantId, actor.studioId)).get()
  const [plant] = row ? withSources(db, [row]) : []
  if (!plant) throw new AppError('not-found')
  return plant
}

/** A plant that the studio may change: its own. AppError('forbidden') for one of the shared library. */
export function findOwnPlant(context: Context, plantId: string): LibraryPlant {
  const plant = findPlant(context, plantId)
  if (plant.studioId === null) throw new AppError('forbidden', 'This plant belongs to the shared library. Add one of your own to use other figures.')
  return plant
}

/** Where one plant is. */
export const isPlant = (plantId: string) => eq(plants.id, plantId)

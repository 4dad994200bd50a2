import { transact } from '@/db/open'
import { plants } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findOwnPlant, isPlant } from './find-plant'
import { placesOfPlant } from './places-of-plant'

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`

/**
 * Takes one of the studio's own plants out of the library. Throws AppError('not-found' | 'forbidden'), and 'conflict'
 * with a sentence naming the facades when the plant still stands on one.
 */
export function removePlant(context: Context, { plantId }: { plantId: string }): void {
  authorize(context, 'plant:edit')
  const { db } = context
  transact(db, () => {
    findOwnPlant(context, plantId)
    const places = placesOfPlant(db, plantId)
    if (places.length > 0) {
      const total = places.reduce((sum, { count }) => sum + count, 0)
      const named = places.slice(0, 3).map(({ facade, project }) => `${facade.name} of ${project.name}`)
      const rest = places.length > 3 ? ` and ${counted(places.length - 3, 'more facade', 'more facades')}` : ''
      throw new AppError('conflict', `It is placed ${counted(total, 'time', 'times')}: on ${named.join(', ')}${rest}. Take it off the drawing first.`)
    }
    db.delete(plants).where(isPlant(plantId)).run()
  })
}

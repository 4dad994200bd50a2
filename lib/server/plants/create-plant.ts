import { transact } from '@/db/open'
import { plants } from '@/db/schema'
import { plantInputSchema, type PlantInput } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { newId } from '../new-id'
import { factsOf } from './library-rows'
import { refuseTakenName } from './studio-names'
import { writeSources } from './write-sources'

/**
 * Adds a plant to the studio's own. Throws AppError('invalid') naming each bad field, the name when the studio has
 * it already.
 */
export function createPlant(context: Context, { plant }: { plant: PlantInput }): { id: string } {
  authorize(context, 'plant:edit')
  const judged = parseInput(plantInputSchema, plant)
  const { db, actor, now } = context
  return transact(db, () => {
    refuseTakenName(context, judged.botanical)
    const id = newId()
    db.insert(plants).values({ ...factsOf(judged), id, studioId: actor.studioId, createdAt: now }).run()
    writeSources(db, id, judged)
    return { id }
  })
}

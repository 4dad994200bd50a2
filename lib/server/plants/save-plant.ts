import { transact } from '@/db/open'
import { plants } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { enteredSourcesOf, plantInputSchema, type LibraryPlant, type PlantInput } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { recheck } from '../sheets/freshen-findings'
import { findOwnPlant, isPlant } from './find-plant'
import { factsOf } from './library-rows'
import { placesOfPlant } from './places-of-plant'
import { refuseTakenName } from './studio-names'
import { writeSources } from './write-sources'

interface Args {
  plantId: string
  plant: PlantInput
  /** The plant as it was when it was opened to be changed. */
  base: PlantInput
}

/** A kept plant as it would be entered. */
export function enteredPlantOf({ id: _id, studioId: _studioId, sources, ...facts }: LibraryPlant): PlantInput {
  return { ...facts, ...enteredSourcesOf(sources) }
}

/** Fields in one order, so that equal plants are equal text. */
const textOf = (plant: PlantInput) => JSON.stringify(Object.entries(plant).sort(([a], [b]) => (a < b ? -1 : 1)))

/**
 * Changes one of the studio's own plants. Every facade it stands on is checked again in the same transaction, so no
 * finding rests on the figures of before. Throws AppError('not-found' | 'forbidden' | 'invalid'), and 'conflict' with
 * `current` when someone changed the plant after `base` was read.
 */
export function savePlant(context: Context, { plantId, plant, base }: Args): void {
  authorize(context, 'plant:edit')
  const judged = parseInput(plantInputSchema, plant)
  const { db } = context
  transact(db, () => {
    const current = enteredPlantOf(findOwnPlant(context, plantId))
    if (textOf(current) !== textOf(parseInput(plantInputSchema, base))) {
      throw new AppError('conflict', 'Someone changed this plant while you had it open. Your entries are still here: save again to put them in place of theirs.', { detail: { current } })
    }
    refuseTakenName(context, judged.botanical, plantId)
    db.update(plants).set(factsOf(judged)).where(isPlant(plantId)).run()
    writeSources(db, plantId, judged)
    for (const place of placesOfPlant(db, plantId)) recheck(db, place)
  })
}

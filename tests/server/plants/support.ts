import type { Db } from '@/db/open'
import type { Context } from '@/lib/server/context'
import { EVERY_PLANT, type PlantQuery } from '@/lib/plants'
import { searchPlants } from '@/lib/server/plants/search-plants'
import { AppError } from '@/lib/errors'
import { loadPlants } from '@/seed/load-plants'
import { openTestDatabase } from '../../support/database'
import { addStudios, contextOf, NOW, type Who } from '../../support/actors'

/** Both studios beside the whole shared library. */
export function openLibrary(): { db: Db; as: (who: Who) => Context } {
  const db = openTestDatabase()
  addStudios(db)
  loadPlants(db, { now: NOW })
  return { db, as: (who) => contextOf(db, who) }
}

/** Botanical names found, in order. */
export const namesFor = (context: Context, query: Partial<PlantQuery>) =>
  searchPlants(context, { ...EVERY_PLANT, pageSize: 200, ...query }).plants.map(({ botanical }) => botanical)

/** The AppError that the work throws. */
export function errorOf(work: () => unknown): AppError {
  try {
    work()
  } catch (error) {
    if (error instanceof AppError) return error
    throw error
  }
  throw new Error('nothing was thrown')
}

export const countOf = (db: Db, table: string) => (db.$client.prepare(`select count(*) as n from ${table}`).get() as { n: number }).n

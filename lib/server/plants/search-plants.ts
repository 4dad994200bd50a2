import { and, asc, count, desc, eq, getTableColumns, inArray, isNotNull, isNull, lte, or, sql, type SQL } from 'drizzle-orm'
import type { SQLiteSelect } from 'drizzle-orm/sqlite-core'
import { plants } from '@/db/schema'
import { DEER_CLASSES, EVERY_PLANT, searchExpression, type LibraryPlant, type PlantQuery } from '@/lib/plants'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { isVisibleTo, withSources } from './library-rows'

export interface FoundPlants {
  plants: LibraryPlant[]
  /** Plants that fit the query, on all pages. */
  total: number
  /** The page shown: the last one when the query asked beyond it. */
  page: number
  pages: number
}

const FTS = sql.raw('plants_fts')
const EVERGREENS = ['broadleaf-evergreen', 'needle-evergreen', 'scale-evergreen'] as const
/** From the least browsed on; what nothing is known of stands apart. */
const BROWSED = DEER_CLASSES.filter((deer) => deer !== 'unknown')

function isBrowsedAtMost(deer: (typeof DEER_CLASSES)[number]): SQL {
  return deer === 'unknown' ? eq(plants.deer, deer) : inArray(plants.deer, BROWSED.slice(0, BROWSED.indexOf(deer) + 1))
}

function isHardyIn(zone: number): SQL | undefined {
  const isColdEnough = or(isNull(plants.zoneMin), lte(plants.zoneMin, zone))
  const isWarmEnough = or(isNull(plants.zoneMax), sql`${plants.zoneMax} >= ${zone}`)
  return and(isColdEnough, isWarmEnough)
}

function conditionOf(query: PlantQuery, studioId: string): SQL | undefined {
  const { category, leaf, heightMax, spreadMax, zone, light, deer, foliageColor, bloomColor, owner } = query
  const expression = searchExpression(query.q)
  return and(
    isVisibleTo(studioId),
    owner === '' ? undefined : owner === 'own' ? isNotNull(plants.studioId) : isNull(plants.studioId),
    expression === null ? undefined : sql`${FTS} match ${expression}`,
    category === '' ? undefined : eq(plants.category, category),
    leaf === '' ? undefined : leaf === 'evergreen' ? inArray(plants.leaf, [...EVERGREENS]) : eq(plants.leaf, leaf),
    heightMax === null ? undefined : lte(plants.heightMax, heightMax),
    spreadMax === null ? undefined : lte(plants.spreadMax, spreadMax),
    zone === null ? undefined : isHardyIn(zone),
    light === '' ? undefined : sql`exists (select 1 from json_each(${plants.light}) where value = ${light})`,
    deer === '' ? undefined : isBrowsedAtMost(deer),
    foliageColor === '' ? undefined : eq(plants.foliageColor, foliageColor),
    bloomColor === '' ? undefined : eq(plants.bloomColor, bloomColor),
  )
}

/** The name's closeness to the words asked; a botanical name counts above a common one. */
const closeness = sql`bm25(${FTS}, 0, 2, 1)`

const byName = sql`${plants.botanical} collate nocase`

function sortKeys({ sort, q }: PlantQuery): SQL[] {
  switch (sort) {
    case 'match':
      return searchExpression(q) === null ? [byName] : [closeness]
    case 'botanical':
      return [byName]
    case 'common':
      return [sql`${plants.common} = ''`, sql`${plants.common} collate nocase`]
    case 'category':
      return [sql`${plants.category}`]
    case 'height':
      return [sql`${plants.heightMax}`, sql`${plants.heightMin}`]
    case 'spread':
      return [sql`${plants.spreadMax}`, sql`${plants.spreadMin}`]
    case 'zone':
      return [sql`${plants.zoneMin} is null`, sql`${plants.zoneMin}`, sql`${plants.zoneMax}`]
  }
}

function orderOf(query: PlantQuery): SQL[] {
  const turn = query.direction === 'desc' ? desc : asc
  return [...sortKeys(query).map(turn), asc(byName), asc(plants.id)]
}

/** Narrows a selection of plants, in place: joined with the index of names where words are asked. */
function narrow<T extends SQLiteSelect>(selection: T, query: PlantQuery, studioId: string): T {
  if (searchExpression(query.q) !== null) selection.innerJoin(FTS, sql`${FTS}.plant_id = ${plants.id}`)
  selection.where(conditionOf(query, studioId))
  return selection
}

/**
 * Plants of the shared library and of the actor's studio that fit: words by their beginnings in either name, filters,
 * order, one page. Whatever is typed for words, the search is sound; see PlantQuery for what each filter means.
 */
export function searchPlants(context: Context, asked: Partial<PlantQuery>): FoundPlants {
  authorize(context, 'plant:read')
  const query = { ...EVERY_PLANT, ...asked }
  const { db, actor } = context
  const total = narrow(db.select({ total: count() }).from(plants).$dynamic(), query, actor.studioId).get()?.total ?? 0
  const pages = Math.max(1, Math.ceil(total / query.pageSize))
  const page = Math.min(query.page, pages)
  const rows = narrow(db.select(getTableColumns(plants)).from(plants).$dynamic(), query, actor.studioId)
    .orderBy(...orderOf(query))
    .limit(query.pageSize)
    .offset((page - 1) * query.pageSize)
    .all()
  return { plants: withSources(db, rows), total, page, pages }
}

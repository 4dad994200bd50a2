import { and, inArray, sql } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { plants } from '@/db/schema'
import type { Plant } from '@/lib/plants'
import { isVisibleTo } from '../plants/library-rows'

/** The columns that stand in a sheet: a plant's facts without whose it is or where they were read. */
const SHEET_COLUMNS = {
  id: plants.id, botanical: plants.botanical, common: plants.common, category: plants.category, leaf: plants.leaf,
  heightMin: plants.heightMin, heightMax: plants.heightMax, spreadMin: plants.spreadMin, spreadMax: plants.spreadMax,
  habit: plants.habit, growth: plants.growth, zoneMin: plants.zoneMin, zoneMax: plants.zoneMax, light: plants.light,
  water: plants.water, foliageColor: plants.foliageColor, texture: plants.texture, bloomMonths: plants.bloomMonths,
  bloomColor: plants.bloomColor, deer: plants.deer, toxicity: plants.toxicity, juglone: plants.juglone,
  thorns: plants.thorns, invasive: plants.invasive, native: plants.native, prune: plants.prune,
}

/** Every plant the studio may use (shared ones and its own), by botanical name. */
export function libraryPlants(db: Db, studioId: string): Plant[] {
  return db.select(SHEET_COLUMNS).from(plants).where(isVisibleTo(studioId)).orderBy(sql`${plants.botanical} collate nocase`, plants.id).all()
}

/** Colour and months of fruit by plant id; plants without fruit of note are left out. */
export function libraryFruits(db: Db, studioId: string): Record<string, { color: string; months: number[] }> {
  const rows = db.select({ id: plants.id, color: plants.fruitColor, months: plants.fruitMonths }).from(plants).where(isVisibleTo(studioId)).all()
  return Object.fromEntries(rows.filter(({ months }) => months.length > 0).map(({ id, color, months }) => [id, { color, months }]))
}

/** Plants by id that the studio may use (shared ones and its own), in the order asked for; unknown ids are left out. */
export function sheetPlants(db: Db, studioId: string, ids: Iterable<string>): Plant[] {
  const wanted = [...new Set(ids)]
  if (wanted.length === 0) return []
  const rows = db.select(SHEET_COLUMNS).from(plants).where(and(inArray(plants.id, wanted), isVisibleTo(studioId))).all()
  const byId = new Map<string, Plant>(rows.map((row) => [row.id, row]))
  return wanted.flatMap((id) => byId.get(id) ?? [])
}

import { sql } from 'drizzle-orm'
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import type {
  BirdValue, BloomColor, Category, DeerClass, Evidence, FallColor, FoliageColor, Growth, Habit, Juglone, Leaf, Light,
  NativeRegion, Prune, Texture, Toxicity, Water,
} from '../../lib/plants'
import { createdAt, id, inches, json, yesNo } from './columns'
import { studios } from './people'

/** The library: shared plants (studio_id null) and each studio's own. Names are searched through `plants_fts`. */
export const plants = sqliteTable(
  'plants',
  {
    id: id(),
    studioId: text('studio_id').references(() => studios.id, { onDelete: 'cascade' }),
    botanical: text('botanical').notNull(),
    common: text('common').notNull(),
    category: text('category').$type<Category>().notNull(),
    leaf: text('leaf').$type<Leaf>().notNull(),
    heightMin: inches('height_min_in'),
    heightMax: inches('height_max_in'),
    spreadMin: inches('spread_min_in'),
    spreadMax: inches('spread_max_in'),
    habit: text('habit').$type<Habit>().notNull(),
    growth: text('growth').$type<Growth>().notNull(),
    zoneMin: integer('zone_min'),
    zoneMax: integer('zone_max'),
    light: json<Light[]>('light'),
    water: json<Water[]>('water'),
    foliageColor: text('foliage_color').$type<FoliageColor>().notNull(),
    texture: text('texture').$type<Texture>().notNull(),
    bloomMonths: json<number[]>('bloom_months'),
    bloomColor: text('bloom_color').$type<BloomColor>().notNull(),
    fallColor: text('fall_color').$type<FallColor>().notNull(),
    fruitColor: text('fruit_color').notNull(),
    fruitMonths: json<number[]>('fruit_months'),
    deer: text('deer').$type<DeerClass>().notNull(),
    birds: json<BirdValue[]>('birds'),
    native: json<NativeRegion[]>('native'),
    thorns: yesNo('thorns'),
    toxicity: text('toxicity').$type<Toxicity>().notNull(),
    juglone: text('juglone').$type<Juglone>().notNull(),
    invasive: yesNo('invasive'),
    prune: text('prune').$type<Prune>().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex('plants_shared_name').on(t.botanical).where(sql`${t.studioId} is null`),
    uniqueIndex('plants_studio_name').on(t.studioId, t.botanical),
    check('plants_height', sql`0 < ${t.heightMin} and ${t.heightMin} <= ${t.heightMax}`),
    check('plants_spread', sql`0 < ${t.spreadMin} and ${t.spreadMin} <= ${t.spreadMax}`),
  ],
)

/** Which source carries which facts of a plant, and how they are known. */
export const plantSources = sqliteTable(
  'plant_sources',
  {
    id: id(),
    plantId: text('plant_id').notNull().references(() => plants.id, { onDelete: 'cascade' }),
    title: text('title').notNull(),
    url: text('url').notNull(),
    evidence: text('evidence').$type<Evidence>().notNull(),
    facts: json<string[]>('facts'),
    position: integer('position').notNull(),
  },
  (t) => [index('plant_sources_plant').on(t.plantId), check('plant_sources_evidence', sql`${t.evidence} in ('read', 'practice', 'memory')`)],
)

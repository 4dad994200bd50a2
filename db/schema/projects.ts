import { sql } from 'drizzle-orm'
import { check, index, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { Aim, Finding, FindingKind, GradePoint, Point, Site } from '../../lib/spacing'
import type { Light, Water } from '../../lib/plants'
import type { Stage } from '../../lib/project'
import { createdAt, id, inches, json, optionalInches, yesNo } from './columns'
import { people, studios } from './people'
import { plants } from './plants'

const studioId = () => text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' })

/** One commission at one property, with the facts of its site. */
export const projects = sqliteTable(
  'projects',
  {
    id: id(),
    studioId: studioId(),
    name: text('name').notNull(),
    address: text('address').notNull().default(''),
    clientName: text('client_name').notNull().default(''),
    stage: text('stage').$type<Stage>().notNull().default('draft'),
    zone: text('zone').notNull(),
    latitude: real('latitude'),
    longitude: real('longitude'),
    moisture: text('moisture').$type<Water>().notNull(),
    deer: text('deer').$type<Site['deer']>().notNull(),
    walnut: text('walnut').$type<Site['walnut']>().notNull(),
    fireZone: yesNo('fire_zone'),
    brief: json<Aim[]>('brief'),
    /** Internal words: never shown to the client. */
    notes: text('notes').notNull().default(''),
    /** Rises with every save of the form: two people saving at once are told. */
    version: integer('version').notNull().default(0),
    createdAt: createdAt(),
    /** The last change of the form or of any of its drawings. */
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('projects_studio').on(t.studioId, t.updatedAt),
    check('projects_stage', sql`${t.stage} in ('draft', 'in-review', 'returned', 'approved', 'proposed', 'accepted', 'planted')`),
  ],
)

/** One measured side of the house. `seq` rises by one with every saved batch of edits. */
export const facades = sqliteTable(
  'facades',
  {
    id: id(),
    studioId: studioId(),
    projectId: text('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    light: text('light').$type<Light>().notNull(),
    facing: real('facing'),
    wall: json<Point[]>('wall'),
    grade: json<GradePoint[]>('grade'),
    fall: real('fall').notNull(),
    gutter: inches('gutter_in'),
    overhang: inches('overhang_in'),
    siding: text('siding').$type<'lap' | 'masonry'>().notNull(),
    exposed: inches('exposed_in'),
    mulch: inches('mulch_in'),
    seq: integer('seq').notNull().default(0),
    /** Engine version that made the findings kept beside it; '' before the first check. */
    engine: text('engine').notNull().default(''),
    /** What the studio had set when they were made. */
    standards: json<Record<string, number | string>>('standards').default({}),
    createdAt: createdAt(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [index('facades_project').on(t.projectId), index('facades_studio').on(t.studioId)],
)

/** What every thing on a facade has: the id its maker gave it (unique on its facade) and its place in the list. */
const onFacade = () => ({
  id: text('id').notNull(),
  facadeId: text('facade_id').notNull().references(() => facades.id, { onDelete: 'cascade' }),
  studioId: studioId(),
  position: integer('position').notNull(),
})

export const openings = sqliteTable(
  'openings',
  {
    ...onFacade(),
    kind: text('kind').$type<'window' | 'door'>().notNull(),
    name: text('name').notNull(),
    x: inches('x_in'),
    width: inches('width_in'),
    sill: inches('sill_in'),
    head: inches('head_in'),
  },
  (t) => [primaryKey({ columns: [t.facadeId, t.id] }), check('openings_sill', sql`${t.sill} < ${t.head}`), check('openings_width', sql`${t.width} > 0`)],
)

export const fixtures = sqliteTable(
  'fixtures',
  {
    ...onFacade(),
    kind: text('kind').notNull(),
    x: inches('x_in'),
    y: inches('y_in'),
    width: inches('width_in'),
    depth: inches('depth_in'),
    z: inches('z_in'),
    height: inches('height_in'),
    outlet: optionalInches('outlet_in'),
  },
  (t) => [primaryKey({ columns: [t.facadeId, t.id] })],
)

export const walks = sqliteTable(
  'walks',
  { ...onFacade(), name: text('name').notNull(), outline: json<Point[]>('outline') },
  (t) => [primaryKey({ columns: [t.facadeId, t.id] })],
)

export const beds = sqliteTable(
  'beds',
  { ...onFacade(), name: text('name').notNull(), outline: json<Point[]>('outline') },
  (t) => [primaryKey({ columns: [t.facadeId, t.id] })],
)

export const placements = sqliteTable(
  'placements',
  {
    ...onFacade(),
    plantId: text('plant_id').notNull().references(() => plants.id),
    x: inches('x_in'),
    y: inches('y_in'),
    plantedHeight: inches('planted_height_in'),
    plantedSpread: inches('planted_spread_in'),
    role: text('role'),
    drift: text('drift'),
    keptHeight: optionalInches('kept_height_in'),
    keptSpread: optionalInches('kept_spread_in'),
    clearStem: optionalInches('clear_stem_in'),
    status: text('status'),
  },
  (t) => [
    primaryKey({ columns: [t.facadeId, t.id] }),
    index('placements_plant').on(t.plantId),
    check('placements_planted', sql`${t.plantedHeight} > 0 and ${t.plantedSpread} > 0`),
  ],
)

/** Every saved edit, by the id its maker gave it: sending one twice changes nothing twice. */
export const edits = sqliteTable(
  'edits',
  {
    id: text('id').notNull(),
    facadeId: text('facade_id').notNull().references(() => facades.id, { onDelete: 'cascade' }),
    studioId: studioId(),
    personId: text('person_id').notNull().references(() => people.id),
    /** The open drawing table the edit came from: one tab, one editor. */
    editor: text('editor').notNull(),
    /** The facade's seq once this edit was in. */
    seq: integer('seq').notNull(),
    kind: text('kind').notNull(),
    target: text('target').notNull(),
    body: json<unknown>('body'),
    at: integer('at').notNull(),
  },
  (t) => [primaryKey({ columns: [t.facadeId, t.id] }), index('edits_target').on(t.facadeId, t.kind, t.target, t.seq), index('edits_seq').on(t.facadeId, t.seq)],
)

/** Findings of the last check of a facade, in the engine's order. */
export const findings = sqliteTable(
  'findings',
  {
    facadeId: text('facade_id').notNull().references(() => facades.id, { onDelete: 'cascade' }),
    key: text('key').notNull(),
    studioId: studioId(),
    position: integer('position').notNull(),
    rule: text('rule').notNull(),
    kind: text('kind').$type<FindingKind>().notNull(),
    body: json<Finding>('body'),
  },
  (t) => [primaryKey({ columns: [t.facadeId, t.key] }), index('findings_studio').on(t.studioId, t.kind)],
)

/** A studio's own number or kind for a rule. One of the two values is set. */
export const standards = sqliteTable(
  'standards',
  {
    studioId: studioId(),
    name: text('name').notNull(),
    number: real('number'),
    kind: text('kind'),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [primaryKey({ columns: [t.studioId, t.name] }), check('standards_one', sql`(${t.number} is null) <> (${t.kind} is null)`)],
)

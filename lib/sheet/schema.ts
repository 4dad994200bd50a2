/**
 * The sheet as JSON: strict at the edge, trusted inside. Numbers are accepted as they are and never rounded.
 * Shape and ranges of single fields stand here; what fields owe each other stands in `problems.ts`.
 */
import {
  AIMS, DEER_PRESSURES, FIXTURE_KINDS, OPENING_KINDS, ROLES_IN_BED, SIDINGS, STATUSES, WALNUTS,
  type Sheet,
} from '../spacing'
import { MAX_LENGTH_IN } from '../measure'
import { plantSchema } from '../plants/schema'
import { LIGHTS, WATERS } from '../plants/types'
import { z } from '../zod'

export const MAX_PLACEMENTS = 2_000
export const MAX_THINGS = 500
export const MAX_POINTS = 400

const finite = (what: string) =>
  z.number({ error: `${what} must be a number.` }).finite({ error: `${what} must be a finite number.` })

const coordinate = (what: string) =>
  finite(what)
    .min(-MAX_LENGTH_IN, { error: `${what} is out of reach: at most 1,000 ft from zero.` })
    .max(MAX_LENGTH_IN, { error: `${what} is out of reach: at most 1,000 ft from zero.` })

const size = (what: string) =>
  finite(what)
    .gt(0, { error: `${what} must be more than 0.` })
    .max(MAX_LENGTH_IN, { error: `${what} is too large: at most 1,000 ft.` })

const sizeOrNone = (what: string) =>
  finite(what)
    .min(0, { error: `${what} must be 0 or more.` })
    .max(MAX_LENGTH_IN, { error: `${what} is too large: at most 1,000 ft.` })

const id = z
  .string({ error: 'An id must be text.' })
  .min(1, { error: 'An id must not be empty.' })
  .max(64, { error: 'An id has at most 64 characters.' })

const name = z
  .string({ error: 'A name must be text.' })
  .trim()
  .min(1, { error: 'Give it a name.' })
  .max(80, { error: 'A name has at most 80 characters.' })

const point = z.strictObject({ x: coordinate('x'), y: coordinate('y') })
const outline = z
  .array(point, { error: 'An outline is a list of points.' })
  .min(3, { error: 'An outline needs at least three points.' })
  .max(MAX_POINTS, { error: `An outline has at most ${MAX_POINTS} points.` })

export const zoneSchema = z
  .string({ error: 'Give the hardiness zone, such as 6b.' })
  .regex(/^([1-9]|1[0-3])[ab]$/, { error: 'A hardiness zone is 1a to 13b, such as 6b.' })

export const siteSchema = z.strictObject({
  zone: zoneSchema,
  light: z.enum(LIGHTS),
  facing: finite('Facing').min(0, { error: 'Facing is 0 to 360 degrees.' }).max(360, { error: 'Facing is 0 to 360 degrees.' }).optional(),
  latitude: finite('Latitude').min(-90, { error: 'Latitude is -90 to 90.' }).max(90, { error: 'Latitude is -90 to 90.' }).optional(),
  longitude: finite('Longitude').min(-180, { error: 'Longitude is -180 to 180.' }).max(180, { error: 'Longitude is -180 to 180.' }).optional(),
  moisture: z.enum(WATERS),
  deer: z.enum(DEER_PRESSURES),
  walnut: z.enum(WALNUTS),
  fireZone: z.boolean({ error: 'Fire zone is yes or no.' }),
  brief: z.array(z.enum(AIMS)).max(AIMS.length).optional(),
})

export const facadeSchema = z.strictObject({
  wall: z
    .array(point, { error: 'The wall line is a list of points.' })
    .min(2, { error: 'The wall line needs its two corners.' })
    .max(MAX_POINTS, { error: `The wall line has at most ${MAX_POINTS} points.` }),
  grade: z
    .array(z.strictObject({ x: coordinate('x'), z: coordinate('z') }), { error: 'The soil line is a list of points.' })
    .min(1, { error: 'Give the soil height at one point at least.' })
    .max(MAX_POINTS, { error: `The soil line has at most ${MAX_POINTS} points.` }),
  fall: finite('Fall')
    .min(-0.5, { error: 'A fall steeper than 6 in per foot is a slip: give inches per inch, 0.05 is usual.' })
    .max(0.5, { error: 'A fall steeper than 6 in per foot is a slip: give inches per inch, 0.05 is usual.' }),
  gutter: coordinate('Gutter'),
  overhang: sizeOrNone('Overhang'),
  siding: z.enum(SIDINGS),
  exposed: sizeOrNone('Exposed foundation'),
  mulch: sizeOrNone('Mulch'),
})

export const openingSchema = z.strictObject({
  id, kind: z.enum(OPENING_KINDS), name,
  x: coordinate('Left edge'), width: size('Width'), sill: coordinate('Sill'), head: coordinate('Head'),
})

export const fixtureSchema = z.strictObject({
  id, kind: z.enum(FIXTURE_KINDS),
  x: coordinate('Left edge'), y: coordinate('Distance from the base line'),
  width: size('Width'), depth: sizeOrNone('Depth'), z: coordinate('Height above zero'), height: size('Height'),
  outlet: sizeOrNone('Outlet').optional(),
})

export const walkSchema = z.strictObject({ id, name, outline })
export const bedSchema = z.strictObject({ id, name, outline })

const plantedSize = z.strictObject({ height: size('Planted height'), spread: size('Planted spread') })

export const placementSchema = z.strictObject({
  id,
  plant: id,
  x: coordinate('Along the wall'),
  y: coordinate('Out from the base line'),
  planted: plantedSize,
  role: z.enum(ROLES_IN_BED).optional(),
  drift: z.string({ error: 'A drift is named by text.' }).trim().min(1, { error: 'Name the drift, or leave it out.' }).max(64).optional(),
  kept: z
    .strictObject({ height: size('Kept height').optional(), spread: size('Kept spread').optional() })
    .optional(),
  clearStem: sizeOrNone('Clear stem').optional(),
  status: z.enum(STATUSES).optional(),
})

/** One entry a line: "<rule>.<setting>" to a number, "<rule>.kind" to off, note or risk. Names and ranges: `problems.ts`. */
export const standardsSchema = z.record(z.string().max(80), z.union([z.number().finite(), z.string().max(16)]))

const list = <T extends z.ZodType>(of: T, what: string, most: number) =>
  z.array(of, { error: `${what} must be a list.` }).max(most, { error: `${what}: at most ${most}.` })

/** Shape of a sheet. Use `parseSheet`, which also checks what fields owe each other. */
export const sheetSchema = z.strictObject({
  version: z.literal(1, { error: 'This reads version 1 of the sheet.' }),
  units: z.literal('in', { error: 'Sheets are in inches: units must be "in".' }),
  site: siteSchema,
  facade: facadeSchema,
  openings: list(openingSchema, 'Openings', MAX_THINGS),
  fixtures: list(fixtureSchema, 'Fixtures', MAX_THINGS),
  walks: list(walkSchema, 'Walks', MAX_THINGS),
  beds: list(bedSchema, 'Beds', MAX_THINGS),
  plants: list(plantSchema, 'Plants', MAX_PLACEMENTS),
  placements: list(placementSchema, 'Placements', MAX_PLACEMENTS),
  standards: standardsSchema.optional(),
})

// The schema and the engine's type must not drift apart.
type Parsed = z.infer<typeof sheetSchema>
type Same = Parsed extends Sheet ? true : never
export const schemaMatchesSheet: Same = true

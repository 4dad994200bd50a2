/** Plant facts, strict: the sheet's plants, the library's, and rows of an import are all judged by this. */
import { z } from '../zod'
import { FACTS } from './facts'
import {
  BIRD_VALUES, BLOOM_COLORS, CATEGORIES, DEER_CLASSES, FALL_COLORS, FOLIAGE_COLORS, GROWTHS, HABITS, JUGLONES, LEAVES,
  LIGHTS, NATIVE_REGIONS, PRUNES, TEXTURES, TOXICITIES, WATERS,
} from './types'

/** Larger than any garden tree (300 ft): a bigger figure is a slip. */
export const MAX_PLANT_IN = 3_600

const figure = (what: string) =>
  z
    .number({ error: `${what} must be a number of inches.` })
    .finite({ error: `${what} must be a finite number.` })
    .gt(0, { error: `${what} must be more than 0.` })
    .max(MAX_PLANT_IN, { error: `${what} is too large: at most 300 ft.` })

const zoneNumber = z
  .number({ error: 'A zone is a whole number from 1 to 13, or none.' })
  .int({ error: 'A zone is a whole number from 1 to 13.' })
  .min(1, { error: 'A zone is a whole number from 1 to 13.' })
  .max(13, { error: 'A zone is a whole number from 1 to 13.' })
  .nullable()

/** Months 1-12. */
export const monthsSchema = z.array(z.number().int().min(1, { error: 'Months are 1 to 12.' }).max(12, { error: 'Months are 1 to 12.' })).max(12)

const plantShape = z.strictObject({
  id: z.string().min(1).max(64),
  botanical: z.string().trim().min(2, { error: 'Give the botanical name.' }).max(120, { error: 'A botanical name has at most 120 characters.' }),
  common: z.string().trim().max(120, { error: 'A common name has at most 120 characters.' }),
  category: z.enum(CATEGORIES),
  leaf: z.enum(LEAVES),
  heightMin: figure('Smallest height'),
  heightMax: figure('Largest height'),
  spreadMin: figure('Smallest spread'),
  spreadMax: figure('Largest spread'),
  habit: z.enum(HABITS),
  growth: z.enum(GROWTHS),
  zoneMin: zoneNumber,
  zoneMax: zoneNumber,
  light: z.array(z.enum(LIGHTS)).max(LIGHTS.length),
  water: z.array(z.enum(WATERS)).max(WATERS.length),
  foliageColor: z.enum(FOLIAGE_COLORS),
  texture: z.enum(TEXTURES),
  bloomMonths: monthsSchema,
  bloomColor: z.enum(BLOOM_COLORS),
  deer: z.enum(DEER_CLASSES),
  toxicity: z.enum(TOXICITIES),
  juglone: z.enum(JUGLONES),
  thorns: z.boolean(),
  invasive: z.boolean(),
  native: z.array(z.enum(NATIVE_REGIONS)).max(NATIVE_REGIONS.length),
  prune: z.enum(PRUNES),
})

type Ranges = { heightMin: number; heightMax: number; spreadMin: number; spreadMax: number; zoneMin: number | null; zoneMax: number | null }

/** The pairs of a plant that must stand in order: smaller first. */
function checkRanges(plant: Ranges, context: z.RefinementCtx) {
  const pairs = [['heightMin', 'heightMax', 'height'], ['spreadMin', 'spreadMax', 'spread'], ['zoneMin', 'zoneMax', 'zone']] as const
  for (const [low, high, what] of pairs) {
    const a = plant[low]
    const b = plant[high]
    if (a !== null && b !== null && a > b) {
      context.addIssue({ code: 'custom', path: [low], message: `The smallest ${what} is more than the largest.` })
    }
  }
}

/** A plant as it stands in a sheet. */
export const plantSchema = plantShape.superRefine(checkRanges)

/** A place where facts were read. Only web addresses: they are shown as links. */
export const sourceSchema = z.strictObject({
  title: z.string().trim().min(1, { error: 'Give the source a title.' }).max(240, { error: 'A title has at most 240 characters.' }),
  url: z
    .string()
    .trim()
    .max(600, { error: 'An address has at most 600 characters.' })
    .refine((url) => url === '' || (/^https?:\/\//i.test(url) && URL.canParse(url)), { error: 'An address starts with https:// or http://, or is left empty.' }),
})

/** A plant as a studio enters it or imports it: the id is ours to give. */
export const plantInputSchema = plantShape
  .omit({ id: true })
  .extend({
    fallColor: z.enum(FALL_COLORS),
    fruitColor: z.string().trim().max(24),
    fruitMonths: monthsSchema,
    birds: z.array(z.enum(BIRD_VALUES)).max(BIRD_VALUES.length),
    /** Where the facts were read. */
    sources: z.array(sourceSchema).max(12, { error: 'At most twelve sources.' }),
    /** Facts that are from memory; without any source, all of them are. */
    memoryFacts: z.array(z.enum(FACTS)).max(FACTS.length),
  })
  .superRefine(checkRanges)

export type PlantInput = z.infer<typeof plantInputSchema>

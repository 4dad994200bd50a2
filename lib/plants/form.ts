/** A plant as it is typed into the form: lengths and zones as text, months as numbers picked. */
import { formatLength, parseLength } from '../measure'
import { z } from '../zod'
import { FACTS } from './facts'
import { formatMonths, parseMonths } from './months'
import { plantInputSchema, sourceSchema, type PlantInput } from './schema'

const lengthText = (what: string) =>
  z.string().transform((text, context) => {
    const read = text.trim() === '' ? { ok: false as const, message: `Give the ${what}.` } : parseLength(text)
    if (read.ok) return read.inches
    context.addIssue({ code: 'custom', message: read.message })
    return z.NEVER
  })

const zoneText = z.string().transform((text, context) => {
  const zone = text.trim()
  if (zone === '') return null
  if (/^\d{1,2}$/.test(zone)) return Number(zone)
  context.addIssue({ code: 'custom', message: 'A zone is a whole number from 1 to 13, or empty for a plant grown for one season.' })
  return z.NEVER
})

/** Checkboxes give their months in the order of the year; flowering may run over its turn. */
const pickedMonths = z.array(z.string()).transform((months) => parseMonths(formatMonths(months.map(Number))) ?? [])

const fields = plantInputSchema.shape

/** What the form holds, made into what the server takes; each bad field gets its sentence. */
export const plantFormSchema = z
  .strictObject({
    ...fields,
    heightMin: lengthText('smallest height'),
    heightMax: lengthText('largest height'),
    spreadMin: lengthText('smallest spread'),
    spreadMax: lengthText('largest spread'),
    zoneMin: zoneText,
    zoneMax: zoneText,
    bloomMonths: pickedMonths,
    fruitMonths: pickedMonths,
    thorns: z.boolean(),
    sources: z.array(sourceSchema).max(12),
    memoryFacts: z.array(z.enum(FACTS)),
  })
  .pipe(plantInputSchema)

export type PlantFormValues = z.input<typeof plantFormSchema>

/** A plant as the form shows it. */
export function formValuesOf(plant: PlantInput): PlantFormValues {
  const { heightMin, heightMax, spreadMin, spreadMax, zoneMin, zoneMax } = plant
  return {
    ...plant,
    heightMin: formatLength(heightMin), heightMax: formatLength(heightMax),
    spreadMin: formatLength(spreadMin), spreadMax: formatLength(spreadMax),
    zoneMin: zoneMin === null ? '' : String(zoneMin), zoneMax: zoneMax === null ? '' : String(zoneMax),
    bloomMonths: plant.bloomMonths.map(String), fruitMonths: plant.fruitMonths.map(String),
  }
}

/** An empty form: what is not known says so, and sizes are for the person to give. */
export const EMPTY_FORM: PlantFormValues = {
  botanical: '', common: '', category: 'shrub', leaf: 'deciduous', heightMin: '', heightMax: '', spreadMin: '', spreadMax: '',
  habit: 'rounded', growth: 'moderate', zoneMin: '', zoneMax: '', light: [], water: [], foliageColor: 'green', texture: 'medium',
  bloomMonths: [], bloomColor: '', fallColor: 'none', fruitColor: '', fruitMonths: [], deer: 'unknown', birds: [], native: [],
  thorns: false, toxicity: 'unlisted', juglone: 'unknown', invasive: false, prune: 'minimal', sources: [], memoryFacts: [],
}

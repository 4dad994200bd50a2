/** A project and a facade as they are typed into their forms: numbers as text, empty where not known. */
import { parseLength } from '../measure'
import { AIMS } from '../spacing'
import { z } from '../zod'
import { facadeNameSchema, projectInputSchema, type ProjectInput } from './schema'

/** Degrees as a decimal number; a letter of the compass may stand behind it. Empty is not known. */
const degrees = (what: string, [plus, minus]: [string, string]) =>
  z.string().transform((text, context): number | undefined => {
    const typed = text.trim()
    if (typed === '') return undefined
    const parts = /^([+\-\u2212]?)(\d+(?:[.,]\d+)?)\s*\u00b0?\s*([a-z]?)$/i.exec(typed)
    const side = parts?.[3]?.toUpperCase()
    if (!parts || (side && side !== plus && side !== minus)) {
      context.addIssue({ code: 'custom', message: `${what} is a number of degrees, such as 41.52.` })
      return z.NEVER
    }
    const size = Number(parts[2]!.replace(',', '.'))
    return parts[1] === '-' || parts[1] === '\u2212' || side === minus ? -size : size
  })

/** What the project form holds, made into what the server takes; each bad field gets its sentence. */
export const projectFormSchema = z
  .strictObject({
    ...projectInputSchema.shape,
    address: z.string(),
    clientName: z.string(),
    notes: z.string(),
    zone: z.string().min(1, { error: 'Choose the hardiness zone.' }),
    brief: z.array(z.enum(AIMS)),
    latitude: degrees('Latitude', ['N', 'S']),
    longitude: degrees('Longitude', ['E', 'W']),
  })
  .transform(({ latitude, longitude, ...rest }, context): ProjectInput => {
    const judged = projectInputSchema.safeParse({ ...rest, ...(latitude !== undefined && { latitude }), ...(longitude !== undefined && { longitude }) })
    if (judged.success) return judged.data
    for (const { path, message } of judged.error.issues) context.addIssue({ code: 'custom', path, message })
    return z.NEVER
  })

export type ProjectFormValues = z.input<typeof projectFormSchema>

/** A project as the form shows it. */
export function projectFormValuesOf(input: ProjectInput): ProjectFormValues {
  const text = (value: number | undefined) => (value === undefined ? '' : String(value))
  return { ...input, brief: [...input.brief], latitude: text(input.latitude), longitude: text(input.longitude) }
}

/** An empty form; the zone is for the person to give, since every plant is judged by it. */
export const EMPTY_PROJECT: ProjectFormValues = {
  name: '', address: '', clientName: '', zone: '', moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false,
  brief: [], notes: '', latitude: '', longitude: '',
}

const lengthText = z.string().transform((text, context) => {
  const read = parseLength(text)
  if (read.ok && read.inches > 0) return read.inches
  context.addIssue({ code: 'custom', message: read.ok ? 'This must be more than 0.' : read.message })
  return z.NEVER
})

/** A new facade: its name, the width of its wall and the height of its gutter. */
export const facadeFormSchema = z.strictObject({ name: facadeNameSchema, width: lengthText, gutter: lengthText })

export type FacadeFormValues = z.input<typeof facadeFormSchema>
export type FacadeInput = z.output<typeof facadeFormSchema>

/** One storey of common height, 30 ft wide (practice): put right when the front is measured. */
export const EMPTY_FACADE: FacadeFormValues = { name: '', width: "30'", gutter: "9'" }

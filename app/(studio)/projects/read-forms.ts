/** Reads the forms of projects and facades: every field they have, and no other. */
import { MAX_LENGTH_IN, parseLength } from '@/lib/measure'
import { facadeNameSchema } from '@/lib/project'
import { z } from '@/lib/zod'

export type Typed = Record<string, string | string[]>

const ownFields = (form: FormData) => [...new Set(form.keys())].filter((name) => !name.startsWith('$ACTION'))
const asText = (value: FormDataEntryValue | null) => (typeof value === 'string' ? value : '')

/** What was typed, by field; Next's own fields are left out, fields nobody asked for kept: the schemas refuse them. */
export const typedIn = (form: FormData): Record<string, string> =>
  Object.fromEntries(ownFields(form).map((name) => [name, asText(form.get(name))]))

/** A project's form as typed: `brief` is a list, every other field one text. */
export const projectTyped = (form: FormData): Typed => ({ ...typedIn(form), brief: form.getAll('brief').map(asText) })

/** The project form as `createProject` and `saveProject` judge it. Empty degrees are degrees not given. */
export function projectInput({ latitude = '', longitude = '', fireZone, ...rest }: Typed) {
  const degrees = (name: string, text: string | string[]) => (String(text).trim() === '' ? {} : { [name]: Number(text) })
  const isFire = fireZone === undefined ? false : fireZone === 'on' || fireZone
  return { ...rest, fireZone: isFire, ...degrees('latitude', latitude), ...degrees('longitude', longitude) }
}

const length = (what: string) =>
  z.string({ error: `Give the ${what}.` }).transform((text, context) => {
    const parsed = parseLength(text, 'ft')
    const fault = !parsed.ok ? parsed.message : parsed.inches <= 0 ? `The ${what} must be more than 0.` : parsed.inches > MAX_LENGTH_IN ? `The ${what} is at most 1,000 ft.` : null
    if (parsed.ok && !fault) return parsed.inches
    context.addIssue({ code: 'custom', message: fault ?? `Give the ${what}.` })
    return z.NEVER
  })

/** A new facade: lengths come as people write them and leave in inches; a bare number is feet. */
export const newFacadeSchema = z.strictObject({ name: facadeNameSchema, width: length('width of the wall'), gutter: length('height of the gutter') })

/** A facade's new name. */
export const renameSchema = z.strictObject({ name: facadeNameSchema })

import { route } from '@/lib/server/http/route'
import { IMPORT_MODES, importPlants } from '@/lib/server/plants/import-plants'
import { z } from '@/lib/zod'

const schema = z.strictObject({
  text: z.string({ error: 'Give the text of the file.' }),
  mode: z.enum(IMPORT_MODES, { error: 'Choose good-rows or all-or-none.' }),
})

/** A megabyte of CSV, and what JSON adds to its quotation marks and line ends. */
const MAX_BYTES = 3 * 1_048_576

/** Brings plants of a CSV text into the studio's own. */
export const POST = route(({ context, body }) => importPlants(context, body), { schema, maxBytes: MAX_BYTES })

import { route } from '@/lib/server/http/route'
import { previewImport } from '@/lib/server/plants/preview-import'
import { z } from '@/lib/zod'

const schema = z.strictObject({ text: z.string({ error: 'Give the text of the file.' }) })

/** A megabyte of CSV, and what JSON adds to its quotation marks and line ends. */
const MAX_BYTES = 3 * 1_048_576

/** What an import of this CSV text would do; writes nothing. */
export const POST = route(({ context, body }) => previewImport(context, body), { schema, maxBytes: MAX_BYTES })

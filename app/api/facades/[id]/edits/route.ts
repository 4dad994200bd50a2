import { route } from '@/lib/server/http/route'
import { batchSchema, saveEdits } from '@/lib/server/sheets/save-edits'

/** A batch of edits `{ base, editor, edits }`; answers `{ seq, report }`. */
export const POST = route<{ id: string }, typeof batchSchema>(({ context, params, body }) => saveEdits(context, { ...body, facadeId: params.id }), {
  schema: batchSchema,
  maxBytes: 4 * 1024 * 1024,
})

import { route } from '@/lib/server/http/route'
import { findFits, spotSchema } from '@/lib/server/sheets/find-fits'

/** A spot `{ x, y, instead? }` in inches; answers what it can hold and the plants that fit it. */
export const POST = route<{ id: string }, typeof spotSchema>(({ context, params, body }) => findFits(context, { ...body, facadeId: params.id }), { schema: spotSchema })

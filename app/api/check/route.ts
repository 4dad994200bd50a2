import { route } from '@/lib/server/http/route'
import { checkSheet } from '@/lib/server/sheets/check-sheet'

/** Checks a sheet sent as JSON and answers the report; keeps nothing. */
export const POST = route(({ context, body }) => checkSheet(context, { input: body }), { maxBytes: 2 * 1024 * 1024 })

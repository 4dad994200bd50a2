import { route } from '@/lib/server/http/route'
import { getSheet } from '@/lib/server/sheets/get-sheet'

export const GET = route<{ id: string }>(({ context, params }) => getSheet(context, { facadeId: params.id }))

import { route } from '@/lib/server/http/route'
import { getSheet } from '@/lib/server/sheets/get-sheet'

/** What the last check said, without the sheet. */
export const GET = route<{ id: string }>(({ context, params }) => {
  const { seq, report } = getSheet(context, { facadeId: params.id })
  return { seq, ...report }
})

import { csvTemplate } from '@/lib/plants/csv-columns'
import { authorize } from '@/lib/server/authorize'
import { route } from '@/lib/server/http/route'

/** The empty import, with one example line. */
export const GET = route(({ context }) => {
  authorize(context, 'plant:edit')
  return new Response(csvTemplate(), {
    headers: { 'content-type': 'text/csv; charset=utf-8', 'content-disposition': 'attachment; filename="plants-template.csv"' },
  })
})

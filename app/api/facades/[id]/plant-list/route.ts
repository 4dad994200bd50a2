import { AppError } from '@/lib/errors'
import { route } from '@/lib/server/http/route'
import { getPlantList } from '@/lib/server/takeoffs/get-plant-list'
import { plantListCsv } from '@/lib/takeoff'

/** A file name every system takes, and beside it the true one. */
function disposition(name: string): string {
  const plain = name.normalize('NFKD').replace(/[^\w .-]/g, '').trim() || 'plant list'
  return `attachment; filename="${plain}.csv"; filename*=UTF-8''${encodeURIComponent(name).replace(/['()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16)}`)}.csv`
}

/** The plant list as a CSV file; `bom=1` begins it with a byte order mark. */
export const GET = route<{ id: string }>(({ context, params, query }) => {
  if ((query.get('format') ?? 'csv') !== 'csv') throw new AppError('invalid', 'The plant list can be had as csv.')
  const { facade, rows } = getPlantList(context, { facadeId: params.id })
  return new Response(plantListCsv(rows, { bom: query.get('bom') === '1' }), {
    headers: {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': disposition(`${facade.projectName}, ${facade.name}, plant list`),
    },
  })
})

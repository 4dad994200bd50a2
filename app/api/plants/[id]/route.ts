import { route } from '@/lib/server/http/route'
import { getPlant } from '@/lib/server/plants/get-plant'

/** One plant with every fact and its sources. */
export const GET = route<{ id: string }>(({ context, params }) => getPlant(context, { plantId: params.id }))

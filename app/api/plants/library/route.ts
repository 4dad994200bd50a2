import { route } from '@/lib/server/http/route'
import { listLibrary } from '@/lib/server/plants/list-library'

/** Every plant the studio may use, with the facts the check reads. Answers { plants, fruits }. */
export const GET = route(({ context }) => listLibrary(context))

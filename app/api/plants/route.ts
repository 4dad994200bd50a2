import { AppError } from '@/lib/errors'
import { readPlantQuery } from '@/lib/plants'
import { route } from '@/lib/server/http/route'
import { searchPlants } from '@/lib/server/plants/search-plants'

/** Plants by name and filters: `?q=ilex gla&zone=6&heightMax=4 ft`. Answers { plants, total, page, pages }. */
export const GET = route(({ context, query }) => {
  const { query: asked, problems } = readPlantQuery(Object.fromEntries(query))
  if (problems[0]) {
    throw new AppError('invalid', problems[0].message, { problems: problems.map(({ field, message }) => ({ path: [field], message })) })
  }
  return searchPlants(context, asked)
})

/** Shares at the years people ask for, at each bound. */
import type { When } from './growth'
import { byBound, type Grown } from './prepared'
import type { Crown } from './crown'
import type { Bound, ShareByYear, ShareOf } from './types'

const YEARS: readonly (keyof ShareByYear)[] = ['0', '1', '3', '5', '10', '20', 'mature']
const whenOf = (year: keyof ShareByYear): When => (year === 'mature' ? 'mature' : Number(year))

/** The share of something, by bound and year, where `share` works it out from the crowns at that age. */
export function sharesOf(id: string, plants: readonly Grown[], share: (crowns: Crown[]) => number): ShareOf {
  const at = (bound: Bound, year: keyof ShareByYear) => (plants.length === 0 ? 0 : share(plants.map((one) => one.crown(bound, whenOf(year), false))))
  return { id, ...byBound((bound) => Object.fromEntries(YEARS.map((year) => [year, at(bound, year)])) as unknown as ShareByYear) }
}

import { BOUNDS, type Bound, type ByBound, type Year, type YearRange } from './types'

const LAST_YEAR = 30
const FINENESS = 0.05

/** First year at which something is broken, to 0.05 of a year, the later end taken; `after-30` where it is later. */
export function firstYear(isBroken: (year: number) => boolean): Year {
  let year = 0
  while (year <= LAST_YEAR && !isBroken(year)) year++
  if (year > LAST_YEAR) return 'after-30'
  if (year === 0) return 0
  let sound = year - 1
  let broken = year
  while (broken - sound > FINENESS) {
    const middle = (sound + broken) / 2
    if (isBroken(middle)) broken = middle
    else sound = middle
  }
  return broken
}

const asNumber = (year: Year) => (year === 'after-30' ? Infinity : year)
const asYear = (year: number): Year => (year === Infinity ? 'after-30' : year)

/** The years of the bounds that break: earliest, expected, latest. */
export function yearRange(breaks: ByBound<boolean>, isBroken: (bound: Bound, year: number) => boolean): YearRange {
  const years = BOUNDS.filter((bound) => breaks[bound]).map((bound) => ({ bound, year: asNumber(firstYear((year) => isBroken(bound, year))) }))
  const earliest = Math.min(...years.map(({ year }) => year))
  const latest = Math.max(...years.map(({ year }) => year))
  const expected = years.find(({ bound }) => bound === 'expected')?.year ?? (earliest + latest) / 2
  return { earliest: asYear(earliest), expected: asYear(expected), latest: asYear(latest) }
}

/** What of the garden is shown: year, season, and one part of a house front enlarged. Stands in the address. */

export const SEASONS = ['spring', 'summer', 'fall', 'winter'] as const
export type Season = (typeof SEASONS)[number]
export const SEASON_MONTHS: Record<Season, number> = { spring: 4, summer: 7, fall: 10, winter: 1 }
export const SEASON_WORDS: Record<Season, string> = { spring: 'Spring', summer: 'Summer', fall: 'Fall', winter: 'Winter' }

/** Years offered as plain links. */
export const LINKED_YEARS = [0, 1, 5, 10, 20] as const
export const LAST_YEAR = 20
export const TENTH = 10

export interface Shown {
  year: number
  season: Season
  /** `<facade index>.<part index>`, or none: all fronts whole. */
  part: string | null
}

type Query = Record<string, string | string[] | undefined>

const one = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value)

/** Reads the address; whatever it does not understand is the tenth summer, whole. */
export function readShown(query: Query): Shown {
  const year = Number(one(query.year) ?? TENTH)
  const season = SEASONS.find((name) => name === one(query.season)) ?? 'summer'
  const part = one(query.part)
  return {
    year: Number.isInteger(year) && year >= 0 && year <= LAST_YEAR ? year : TENTH,
    season,
    part: part !== undefined && /^\d{1,2}\.\d$/.test(part) ? part : null,
  }
}

/** The address of what is shown. */
export function hrefOf({ year, season, part }: Shown): `?${string}` {
  return `?year=${year}&season=${season}${part === null ? '' : `&part=${part}`}`
}

/** The year as people say it. */
export function yearWords(year: number): string {
  return year === 0 ? 'Planting day' : `Year ${year}`
}

/** What season it is then: `its tenth summer`, `summer`. */
export function seasonWords({ year, season }: Pick<Shown, 'year' | 'season'>): string {
  return year === TENTH ? `its tenth ${season}` : season
}

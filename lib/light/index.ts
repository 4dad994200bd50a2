/**
 * Direct sun on a wall from where it looks and how far north it stands. An open site with a level horizon: trees,
 * neighbours and eaves take their share, so it is a suggestion and never more.
 */
import { getPosition } from 'suncalc'
import type { Light } from '../plants'

/** Sun lower than this is taken by hedges, fences and houses: common practice. */
const LEAST_ALTITUDE = 10
const SUMMER_MONTHS = [4, 5, 6, 7, 8, 9] as const
const STEP_MINUTES = 4
/** The year makes no difference to the tenth of an hour; longitude shifts the day and not its length. */
const YEAR = 2026

/**
 * Full sun from 6 hours of direct sun, part shade from 4. K-State Research and Extension, Johnson County, sun and shade,
 * https://www.johnson.k-state.edu/programs/lawn-garden/agent-articles-fact-sheets-and-more/agent-articles/environment/sun-shade-conditions.html (read).
 */
export function lightOf(hours: number): Light {
  if (hours >= 6) return 'full-sun'
  return hours >= 4 ? 'part-shade' : 'full-shade'
}

interface Asked {
  /** Degrees clockwise from true north that the wall looks towards. */
  facing: number
  /** Degrees, north positive. */
  latitude: number
  month: number
  day: number
  /** Sun at or below this altitude in degrees is not counted. */
  above?: number
}

/** Angle between two bearings, 0 to 180 degrees. */
const between = (a: number, b: number) => Math.abs(((a - b + 540) % 360) - 180)

/** Hours of a day in which the sun stands before a wall, to about a tenth of an hour. */
export function directSun({ facing, latitude, month, day, above = 0 }: Asked): number {
  const start = Date.UTC(YEAR, month - 1, day)
  let steps = 0
  for (let minute = STEP_MINUTES / 2; minute < 24 * 60; minute += STEP_MINUTES) {
    const { altitude, azimuth } = getPosition(new Date(start + minute * 60_000), latitude, 0)
    if (altitude > above && between(azimuth, facing) < 90) steps++
  }
  return (steps * STEP_MINUTES) / 60
}

export interface SuggestedLight {
  /** Mean hours of direct sun a day, April to September, from sun higher than 10 degrees. */
  hours: number
  light: Light
}

/** The light an open site would give a wall in the growing season. */
export function suggestLight({ facing, latitude }: Pick<Asked, 'facing' | 'latitude'>): SuggestedLight {
  const days = SUMMER_MONTHS.map((month) => directSun({ facing, latitude, month, day: 15, above: LEAST_ALTITUDE }))
  const hours = days.reduce((sum, day) => sum + day, 0) / days.length
  return { hours, light: lightOf(hours) }
}

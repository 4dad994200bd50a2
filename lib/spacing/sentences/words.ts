/** The words that sentences share: lengths, years, and what each kind of finding begins with. */
import { formatLength } from '../../measure'
import { CONTACT } from '../geometry/contact'
import { BOUNDS, type Finding, type Inches, type Sheet, type Year, type YearRange } from '../types'
import type { Names } from './names'

export type Say = (finding: Finding, names: Names, sheet: Sheet) => string

/** How one rule speaks: what it says, and who it is about where that is not the plants it names. */
export interface RuleWords {
  say: Say
  title?: Say
}

/** A length as it is said: halves under 3 in, whole inches to 3 ft, feet and inches beyond. */
export function lengthText(length: Inches): string {
  const size = Math.abs(length)
  if (size < 0.5) return 'under 1/2 in'
  if (size < 3) return `${formatLength(Math.round(size * 2) / 2, 'inches')}`
  const whole = Math.round(size)
  return whole < 36 ? `${whole} in` : formatLength(whole)
}

/** A share as it is said: whole percents. */
export const shareText = (share: number): string => `${Math.round(share * 100)} percent`

const yearNumber = (year: Year) => (year === 'after-30' ? 'after 30' : String(Math.ceil(year)))

/** When a breach begins: "by about year 6 (5-9)". Years are rounded up. */
export function yearsText({ earliest, expected, latest }: YearRange): string {
  if (latest === 0) return 'from the day it is planted'
  if (earliest === 'after-30') return 'after year 30'
  const [first, middle, last] = [earliest, expected, latest].map(yearNumber) as [string, string, string]
  if (expected === 'after-30') return `after year 30 (from year ${first} at the earliest)`
  if (first === last) return `by about year ${middle}`
  return last === 'after 30' ? `by about year ${middle} (${first} or later)` : `by about year ${middle} (${first}-${last})`
}

export const when = ({ year }: Finding) => (year ? ` ${yearsText(year)}` : '')
export const by = ({ excess }: Finding) => lengthText(excess)

/** Does every size on record break the limit? A rule may still call it a risk at most. */
function isEverySize({ limit, measured }: Finding): boolean {
  if (limit === null || measured === null) return false
  const sizes = BOUNDS.map((bound) => measured[bound])
  return sizes.every((size) => size !== null && size - limit > CONTACT) || sizes.every((size) => size !== null && limit - size > CONTACT)
}

/** "At its largest" where only some of its sizes break the limit. */
export const atLargest = (finding: Finding) => (finding.kind === 'risk' && !isEverySize(finding) ? 'At its largest it ' : 'It ')

/** How the expected size stands to a limit it keeps, for a risk. */
export function expectedKeeps({ kind, limit, measured }: Finding, below: string): string {
  const expected = measured?.expected
  if (kind !== 'risk' || limit === null || expected === null || expected === undefined || expected >= limit) return ''
  return ` Its expected size stays ${lengthText(limit - expected)} ${below}.`
}

/** Held findings say what holds them, and what happens once nobody clips. */
export const held = (fits: string, unclipped: string, finding: Finding) => `${fits} only while kept clipped. Left alone it ${unclipped}${when(finding)}.`

/** Where it would stop, for a limit measured as a distance. */
export function sayByDistance(finding: Finding, clear: string, reaches: string): string {
  if (finding.kind === 'held') return held(clear, reaches, finding)
  return `${atLargest(finding)}${reaches}${when(finding)}.`
}

/** From a measure at the three bounds to a finding: conflict, risk or held, with its numbers and years. */
import type { When } from './growth'
import { CONTACT } from './geometry/wall'
import { BOUNDS, type Bound, type ByBound, type Finding, type FindingKind, type YearRange } from './types'
import { yearRange } from './year-range'

/** What a rule measures of a size at one bound and age. */
export interface Measure {
  measured: number | null
  /** By how much the limit is passed, inches; negative where it is kept. */
  excess: number
  /** Broken whatever the excess says: an axis that stands where nothing may. */
  always?: boolean
}

export interface Judgement {
  rule: string
  placements: string[]
  feature: string | null
  /** The limit; where it differs by bound, the high one's. */
  limit: number
  measure(bound: Bound, year: When, natural: boolean): Measure
  /** Is a kept size concerned, so that the finding may be held? */
  canHold: boolean
  /** Held asks the expected bound alone (neighbour rules), not any. */
  heldAsksExpected?: boolean
  /** The worst this may be called. */
  most?: 'risk'
  /** A kind that replaces conflict and risk alike. */
  fixed?: FindingKind
}

export const isBroken = ({ excess, always }: Measure): boolean => always === true || excess > CONTACT

/** Identity of a finding: rule, placements and feature, safely joined. */
export function keyOf(rule: string, placements: readonly string[], feature: string | null): string {
  return [rule, placements.map(encodeURIComponent).join('+'), feature === null ? '' : encodeURIComponent(feature)].join(':')
}

type Parts = Pick<Finding, 'rule' | 'kind' | 'placements' | 'feature'> & Partial<Pick<Finding, 'limit' | 'measured' | 'excess' | 'year'>>

export function finding({ limit = null, measured = null, excess = 0, year = null, ...parts }: Parts): Finding {
  const { rule, placements, feature } = parts
  return { key: keyOf(rule, placements, feature), ...parts, limit, measured, excess, year, remedies: [] }
}

const byBound = <T>(of: (bound: Bound) => T): ByBound<T> => ({ low: of('low'), expected: of('expected'), high: of('high') })

function kindOf(judgement: Judgement, breaks: ByBound<boolean>): FindingKind | null {
  const count = BOUNDS.filter((bound) => breaks[bound]).length
  if (count === 0) return null
  if (judgement.fixed) return judgement.fixed
  return count === 3 && judgement.most !== 'risk' ? 'conflict' : 'risk'
}

function build(judgement: Judgement, kind: FindingKind, natural: boolean, measures: ByBound<Measure>): Finding {
  const { rule, placements, feature, limit, measure } = judgement
  const breaks = byBound((bound) => isBroken(measures[bound]))
  const year: YearRange = yearRange(breaks, (bound, at) => isBroken(measure(bound, at, natural)))
  const measured = byBound((bound) => measures[bound].measured)
  const excess = Math.max(...BOUNDS.map((bound) => measures[bound].excess))
  return finding({ rule, kind, placements, feature, limit, measured, excess, year })
}

/**
 * Conflict if all three bounds break the limit at maturity, risk if one does, held if only the unclipped plant
 * would; null where it is kept. A held finding carries the unclipped numbers and years: when clipping must begin.
 */
export function judgeSizes(judgement: Judgement): Finding | null {
  const measures = byBound((bound) => judgement.measure(bound, 'mature', false))
  const kind = kindOf(judgement, byBound((bound) => isBroken(measures[bound])))
  if (kind) return build(judgement, kind, false, measures)
  if (!judgement.canHold) return null
  const unclipped = byBound((bound) => judgement.measure(bound, 'mature', true))
  const asked: readonly Bound[] = judgement.heldAsksExpected ? ['expected'] : BOUNDS
  return asked.some((bound) => isBroken(unclipped[bound])) ? build(judgement, 'held', true, unclipped) : null
}

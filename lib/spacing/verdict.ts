/** From a measure at the three bounds to a finding: conflict, risk or held, with its numbers and years. */
import { findingOf } from './finding'
import { CONTACT } from './geometry/contact'
import type { When } from './growth'
import { byBound, type Grown } from './prepared'
import { BOUNDS, type Bound, type ByBound, type Finding, type FindingKind } from './types'
import { yearRange } from './year-range'

/** What a rule measures of a size at one bound and age. */
export interface Measure {
  measured: number | null
  /** By how much the limit is passed, inches; negative where it is kept, -Infinity where there is nothing to judge. */
  excess: number
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
  /** What a kind is called here, where the rule says otherwise than the bounds do. */
  as?(kind: FindingKind): FindingKind
}

const isBroken = ({ excess }: Measure): boolean => excess > CONTACT

function build(judgement: Judgement, kind: FindingKind, natural: boolean, measures: ByBound<Measure>): Finding {
  const { rule, placements, feature, limit, measure, as } = judgement
  const breaks = byBound((bound) => isBroken(measures[bound]))
  return findingOf({
    rule, placements, feature, limit,
    kind: as ? as(kind) : kind,
    measured: byBound((bound) => measures[bound].measured),
    excess: Math.max(...BOUNDS.map((bound) => measures[bound].excess)),
    year: yearRange(breaks, (bound, at) => isBroken(measure(bound, at, natural))),
  })
}

/**
 * Conflict if all three bounds break the limit at maturity, risk if one does, held if only the unclipped plant
 * would; null where it is kept. A held finding carries the unclipped numbers and years: when clipping must begin.
 */
export function judgeSizes(judgement: Judgement): Finding | null {
  const measures = byBound((bound) => judgement.measure(bound, 'mature', false))
  const count = BOUNDS.filter((bound) => isBroken(measures[bound])).length
  if (count > 0) return build(judgement, count === BOUNDS.length ? 'conflict' : 'risk', false, measures)
  if (!judgement.canHold) return null
  const unclipped = byBound((bound) => judgement.measure(bound, 'mature', true))
  const asked: readonly Bound[] = judgement.heldAsksExpected ? ['expected'] : BOUNDS
  return asked.some((bound) => isBroken(unclipped[bound])) ? build(judgement, 'held', true, unclipped) : null
}

/** Plants of one season, which neighbours outlast. */
export const isSeasonal = ({ plant: { category } }: Grown): boolean => category === 'annual' || category === 'bulb'
/** Trained on the wall: its role decides, not its category. */
export const isOnWall = ({ placement: { role } }: Grown): boolean => role === 'on-wall'

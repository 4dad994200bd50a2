/** Rules that ask the expected size alone: broken there, or held where only the unclipped plant would break it. */
import { findingOf } from './finding'
import { CONTACT } from './geometry/contact'
import type { Crown } from './crown'
import type { Grown } from './prepared'
import type { Finding, Inches } from './types'

interface Asked {
  rule: string
  one: Grown
  feature: string
  limit: Inches
  /** What is measured of a crown; null where it is not asked at all. */
  measure(crown: Crown): Inches | null
}

/** A risk where the expected crown passes the limit, held where only shears keep it; null where it never does. */
export function judgeExpected({ rule, one, feature, limit, measure }: Asked): Finding | null {
  const about = { rule, placements: [one.placement.id], feature, limit }
  const past = (crown: Crown) => {
    const measured = measure(crown)
    return measured !== null && measured - limit > CONTACT ? { measured: { low: null, expected: measured, high: null }, excess: measured - limit } : null
  }
  const now = past(one.mature.expected)
  if (now) return findingOf({ ...about, kind: 'risk', ...now })
  const unclipped = one.isKept ? past(one.natural.expected) : null
  return unclipped ? findingOf({ ...about, kind: 'held', ...unclipped }) : null
}

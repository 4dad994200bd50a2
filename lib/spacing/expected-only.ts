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

/** Shares are compared exactly but for the noise of their sums. */
export const SHARE_NOISE = 1e-9

interface AskedOfBed {
  rule: string
  bed: string
  /** A share of the bed's planting, as kept or unclipped; null where there is nothing to share. */
  share(natural: boolean): number | null
  /** The limit a share breaks; null where it breaks none. Shares are compared exactly. */
  limitFor(share: number): number | null
}

/** A note of a bed whose share breaks a limit at expected maturity, held where only shears keep it; null where it never does. */
export function judgeShare({ rule, bed, share, limitFor }: AskedOfBed): Finding | null {
  for (const kind of ['note', 'held'] as const) {
    const found = share(kind === 'held')
    const limit = found === null ? null : limitFor(found)
    if (limit !== null) return findingOf({ rule, kind, placements: [], feature: bed, limit, measured: { low: null, expected: found, high: null } })
  }
  return null
}

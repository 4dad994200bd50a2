/** Findings as data: how they are made, named and put in order. */
import { FINDING_KINDS, type Finding, type FindingKind } from './types'

/** Ids may hold anything: the marks that join them are written otherwise inside them. */
const safe = (id: string) => id.replace(/[%:+]/g, (mark) => `%${mark.charCodeAt(0).toString(16)}`)

/** Identity of a finding: rule, placements and feature, safely joined. */
export function keyOf(rule: string, placements: readonly string[], feature: string | null): string {
  return `${rule}:${placements.map(safe).join('+')}:${feature === null ? '' : safe(feature)}`
}

type Parts = Pick<Finding, 'rule' | 'kind' | 'placements' | 'feature'> & Partial<Pick<Finding, 'limit' | 'measured' | 'excess' | 'year'>>

/** A finding from its parts. */
export function findingOf({ rule, kind, placements, feature, limit = null, measured = null, excess = 0, year = null }: Parts): Finding {
  return { key: keyOf(rule, placements, feature), rule, kind, placements, feature, limit, measured, excess, year, remedies: [] }
}

/** Strings by code unit, as every order of findings goes. */
export const compareText = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0)

const RANK = Object.fromEntries(FINDING_KINDS.map((kind, i) => [kind, i])) as Record<FindingKind, number>
const rounded = (excess: number) => Math.round(excess * 64) / 64

function comparePlacements(a: readonly string[], b: readonly string[]): number {
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    const order = compareText(a[i]!, b[i]!)
    if (order !== 0) return order
  }
  return a.length - b.length
}

function compareFeatures(a: string | null, b: string | null): number {
  return a === null || b === null ? Number(a !== null) - Number(b !== null) : compareText(a, b)
}

/** The one order of findings: kind, worst first; excess to 1/64 in; rule; placements one by one; feature, none first. */
export function compareFindings(a: Finding, b: Finding): number {
  return (
    RANK[a.kind] - RANK[b.kind] ||
    rounded(b.excess) - rounded(a.excess) ||
    compareText(a.rule, b.rule) ||
    comparePlacements(a.placements, b.placements) ||
    compareFeatures(a.feature, b.feature)
  )
}

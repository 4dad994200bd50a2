/** The check: every rule over a sheet, or over one placement as it is moved. */
import { growPlacement, growSheet, type Grown, type Prepared } from './prepared'
import type { Rule } from './rule'
import { RULES } from './rules'
import { resolveStandards } from './standards'
import { FINDING_KINDS, type Finding, type Placement, type Report, type Sheet } from './types'

/** Raised whenever an answer can change: findings are kept with the version that made them. */
export const ENGINE_VERSION = '1.0.0'

/** Makes a sheet ready to be judged, once; `checkPlacement` then asks it as often as a hand moves. */
export const prepare = (sheet: Sheet): Prepared => growSheet(sheet, resolveStandards(sheet))

const only = <S extends Rule['scope']>(scope: S) => RULES.filter((rule): rule is Extract<Rule, { scope: S }> => rule.scope === scope)
const PLACEMENT_RULES = only('placement')
const PAIR_RULES = only('pair')
const SHEET_RULES = only('sheet')

const compareText = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0)
const rounded = (excess: number) => Math.round(excess * 64) / 64

function compareFindings(a: Finding, b: Finding): number {
  const first =
    FINDING_KINDS.indexOf(a.kind) - FINDING_KINDS.indexOf(b.kind) || rounded(b.excess) - rounded(a.excess) || compareText(a.rule, b.rule)
  if (first !== 0) return first
  for (let i = 0; i < Math.max(a.placements.length, b.placements.length); i++) {
    const order = compareText(a.placements[i] ?? '', b.placements[i] ?? '')
    if (order !== 0) return order
  }
  return a.feature === null || b.feature === null ? Number(a.feature !== null) - Number(b.feature !== null) : compareText(a.feature, b.feature)
}

/** Could two plants have to do with each other? Only when they overlap along the wall at their widest. */
const mayMeet = (a: Grown, b: Grown) => Math.abs(a.placement.x - b.placement.x) < a.widest + b.widest

function judgePair(prepared: Prepared, a: Grown, b: Grown): Finding[] {
  return PAIR_RULES.flatMap((rule) => rule.judge(prepared, a, b) ?? [])
}

/** Pairs along the wall, by sweeping from left to right over where each plant begins. */
function judgePairs(prepared: Prepared): Finding[] {
  const sorted = [...prepared.grown].sort((a, b) => a.placement.x - a.widest - (b.placement.x - b.widest))
  const found: Finding[] = []
  sorted.forEach((a, i) => {
    const right = a.placement.x + a.widest
    for (let j = i + 1; j < sorted.length; j++) {
      const b = sorted[j]!
      if (b.placement.x - b.widest >= right) break
      found.push(...judgePair(prepared, a, b))
    }
  })
  return found
}

/**
 * Judges a whole sheet by every rule. Findings come in one order: kind, excess, rule, placements, feature.
 * Trusts its input: parse sheets from outside with `parseSheet` first.
 */
export function check(sheet: Sheet): Report {
  const prepared = prepare(sheet)
  const findings = [
    ...prepared.grown.flatMap((one) => PLACEMENT_RULES.flatMap((rule) => rule.judge(prepared, one))),
    ...judgePairs(prepared),
    ...SHEET_RULES.flatMap((rule) => rule.judge(prepared)),
  ].sort(compareFindings)
  return { engine: ENGINE_VERSION, findings, windows: [], cover: [], pockets: [], upkeep: [] }
}

/**
 * Findings of the size and neighbour rules that name one placement, were it as given: a moved one (its id stands
 * on the sheet) or a new one. Equal to the full check's of the sheet with it in place. [] for a plant that goes
 * or is not known to the sheet.
 */
export function checkPlacement(prepared: Prepared, placement: Placement): Finding[] {
  const plant = prepared.plants.get(placement.plant)
  if (!plant || placement.status === 'goes') return []
  const one = growPlacement(prepared.sheet, plant, placement)
  const neighbours = prepared.grown.filter((other) => other.placement.id !== placement.id && mayMeet(one, other))
  return [
    ...PLACEMENT_RULES.flatMap((rule) => rule.judge(prepared, one)),
    ...neighbours.flatMap((other) => judgePair(prepared, one, other)),
  ].sort(compareFindings)
}

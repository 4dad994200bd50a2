/** The check: every rule over a sheet, or over one placement as it is moved. */
import type { Plant } from '../plants/types'
import { compareFindings } from './finding'
import { growPlacement, growSheet, stretchOf, type Grown, type Prepared } from './prepared'
import type { Rule } from './rule'
import { RULES } from './rules'
import { resolveStandards } from './standards'
import type { Finding, FindingKind, Placement, Report, Sheet } from './types'

/** Raised whenever an answer can change: findings are kept with the version that made them. */
export const ENGINE_VERSION = '1.1.0'

/** Makes a sheet ready to be judged, once; `checkPlacement` then asks it as often as a hand moves. */
export const prepare = (sheet: Sheet): Prepared => growSheet(sheet, resolveStandards(sheet))

const only = <S extends Rule['scope']>(scope: S) => RULES.filter((rule): rule is Extract<Rule, { scope: S }> => rule.scope === scope)
const PLACEMENT_RULES = only('placement')
const PAIR_RULES = only('pair')
const SHEET_RULES = only('sheet')

/** What a studio has set a rule of one fixed kind to; undefined leaves the rule's own. */
function kindSet({ standards }: Prepared, { meta }: Rule): string | undefined {
  const set = meta.fixedKind && standards[`${meta.id}.kind`]
  return typeof set === 'string' ? set : undefined
}

/** Asks rules and calls their findings what the studio has set. */
function ask<R extends Rule>(prepared: Prepared, rules: readonly R[], judge: (rule: R) => readonly Finding[]): Finding[] {
  const found: Finding[] = []
  for (const rule of rules) {
    const kind = kindSet(prepared, rule)
    if (kind === 'off') continue
    for (const finding of judge(rule)) found.push(kind === undefined ? finding : { ...finding, kind: kind as FindingKind })
  }
  return found
}

const judgeOne = (prepared: Prepared, one: Grown) => ask(prepared, PLACEMENT_RULES, (rule) => rule.judge(prepared, one))
const judgePair = (prepared: Prepared, a: Grown, b: Grown) =>
  ask(prepared, PAIR_RULES, (rule) => {
    const found = rule.judge(prepared, a, b)
    return found ? [found] : []
  })

/** Those that could ever touch a placement along the wall, itself left out. */
function neighboursOf({ neighbours }: Prepared, one: Grown): Grown[] {
  const { from, to } = stretchOf(one)
  return neighbours.near(from, to).filter(({ placement }) => placement.id !== one.placement.id)
}

/**
 * Judges a whole sheet by every rule. Findings come in one order: kind, excess, rule, placements, feature; they never
 * depend on `library`, from which swaps are drawn. Trusts its input: parse sheets from outside with `parseSheet` first.
 * Windows, cover, pockets, upkeep and remedies are not worked out by this version: they are empty.
 */
export function check(sheet: Sheet, _options: { library?: readonly Plant[] } = {}): Report {
  const prepared = prepare(sheet)
  const findings = ask(prepared, SHEET_RULES, (rule) => rule.judge(prepared))
  for (const one of prepared.grown) {
    findings.push(...judgeOne(prepared, one))
    for (const other of neighboursOf(prepared, one)) {
      if (one.placement.id < other.placement.id) findings.push(...judgePair(prepared, one, other))
    }
  }
  return { engine: ENGINE_VERSION, findings: findings.sort(compareFindings), windows: [], cover: [], pockets: [], upkeep: [] }
}

/**
 * Findings of the size and neighbour rules that name one placement, were it as given: a moved one (its id stands
 * on the sheet) or a new one. Equal to the full check's of the sheet with it in place. [] for a plant that goes
 * or is not known to the sheet.
 */
export function checkPlacement(prepared: Prepared, placement: Placement): Finding[] {
  const plant = prepared.plants.get(placement.plant)
  if (!plant || placement.status === 'goes') return []
  const one = growPlacement(prepared, plant, placement)
  const findings = judgeOne(prepared, one)
  for (const other of neighboursOf(prepared, one)) {
    const [a, b] = one.placement.id < other.placement.id ? [one, other] : [other, one]
    findings.push(...judgePair(prepared, a, b))
  }
  return findings.sort(compareFindings)
}

/** Asking the rules: of one placement as it stands or is moved, of one plant, of a whole sheet. */
import { judgedPlants, type JudgedPlant } from './by-plant'
import { compareFindings } from './finding'
import { stretchOf, type Grown, type Prepared } from './prepared'
import type { Rule } from './rule'
import { RULES } from './rules'
import type { Finding, FindingKind } from './types'

const only = <S extends Rule['scope']>(scope: S) => RULES.filter((rule): rule is Extract<Rule, { scope: S }> => rule.scope === scope)
const PLACEMENT_RULES = only('placement')
const PAIR_RULES = only('pair')
const PLANT_RULES = only('plant')
const SHEET_RULES = only('sheet')

/** What a studio has set a rule of one fixed kind to; undefined leaves the rule's own. */
function kindSet({ standards }: Prepared, { meta }: Rule): string | undefined {
  const set = meta.fixedKind && standards[`${meta.id}.kind`]
  return typeof set === 'string' ? set : undefined
}

/** Asks rules one after the other and calls their findings what the studio has set. */
function* ask<R extends Rule>(prepared: Prepared, rules: readonly R[], judge: (rule: R) => readonly Finding[]): Generator<Finding> {
  for (const rule of rules) {
    const kind = kindSet(prepared, rule)
    if (kind === 'off') continue
    for (const finding of judge(rule)) yield kind === undefined ? finding : { ...finding, kind: kind as FindingKind }
  }
}

const listed = (found: Finding | null): readonly Finding[] => (found ? [found] : [])

const askPair = (prepared: Prepared, a: Grown, b: Grown) => {
  const [first, second] = a.placement.id < b.placement.id ? [a, b] : [b, a]
  return ask(prepared, PAIR_RULES, (rule) => listed(rule.judge(prepared, first, second)))
}

/** Those that could ever touch a placement along the wall, itself left out. */
function neighboursOf({ neighbours }: Prepared, one: Grown): Grown[] {
  const { from, to } = stretchOf(one)
  return neighbours.near(from, to).filter(({ placement }) => placement.id !== one.placement.id)
}

/** What the size and neighbour rules find of one placement, in no order, as far as it is asked for. */
export function* findingsOfPlacement(prepared: Prepared, one: Grown): Generator<Finding> {
  yield* ask(prepared, PLACEMENT_RULES, (rule) => rule.judge(prepared, one))
  for (const other of neighboursOf(prepared, one)) yield* askPair(prepared, one, other)
}

/** What the site rules find of one plant. */
export const findingsOfPlant = (prepared: Prepared, judged: JudgedPlant): Generator<Finding> =>
  ask(prepared, PLANT_RULES, (rule) => listed(rule.judge(prepared, judged)))

/** All that the rules find, in the one order of findings. */
export function allFindings(prepared: Prepared): Finding[] {
  const findings = [...ask(prepared, SHEET_RULES, (rule) => rule.judge(prepared))]
  for (const judged of judgedPlants(prepared)) findings.push(...findingsOfPlant(prepared, judged))
  for (const one of prepared.grown) {
    findings.push(...ask(prepared, PLACEMENT_RULES, (rule) => rule.judge(prepared, one)))
    for (const other of neighboursOf(prepared, one)) {
      if (one.placement.id < other.placement.id) findings.push(...askPair(prepared, one, other))
    }
  }
  return findings.sort(compareFindings)
}

/** Asking the rules: of one placement as it stands or is moved, of one plant, of a whole sheet. */
import { judgedPlants, type JudgedPlant } from './by-plant'
import { compareFindings } from './finding'
import { stretchOf, type Grown, type Prepared } from './prepared'
import type { Rule } from './rule'
import { RULES } from './rules'
import type { Finding, FindingKind } from './types'

type Scope = Rule['scope']

/** A rule as a studio has it: one of a fixed kind may be called otherwise. */
interface InForce<R extends Rule> {
  rule: R
  kind: FindingKind | null
}

type RulesInForce = { [S in Scope]: InForce<Extract<Rule, { scope: S }>>[] }

function readRules({ standards }: Pick<Prepared, 'standards'>): RulesInForce {
  const of = <S extends Scope>(scope: S) =>
    RULES.flatMap((rule): InForce<Extract<Rule, { scope: S }>>[] => {
      const set = rule.meta.fixedKind && standards[`${rule.meta.id}.kind`]
      if (rule.scope !== scope || set === 'off') return []
      return [{ rule: rule as Extract<Rule, { scope: S }>, kind: typeof set === 'string' ? (set as FindingKind) : null }]
    })
  return { placement: of('placement'), pair: of('pair'), plant: of('plant'), sheet: of('sheet') }
}

const read = new WeakMap<Prepared['standards'], RulesInForce>()

/** The rules by the standards of a sheet, read once. */
function rulesOf({ standards }: Pick<Prepared, 'standards'>): RulesInForce {
  let found = read.get(standards)
  if (!found) read.set(standards, (found = readRules({ standards })))
  return found
}

/** A finding as the studio calls it; what is held stays held, for it is a commitment and no judgement. */
const named = (finding: Finding, kind: FindingKind | null): Finding => (kind === null || finding.kind === 'held' ? finding : { ...finding, kind })

/** Hears findings one by one; answers true to hear no more. */
type Listener = (finding: Finding) => boolean

function tellPlacement(prepared: Prepared, one: Grown, hear: Listener): boolean {
  for (const { rule, kind } of rulesOf(prepared).placement) {
    for (const finding of rule.judge(prepared, one)) if (hear(named(finding, kind))) return true
  }
  return false
}

function tellPair(prepared: Prepared, pair: readonly [Grown, Grown], hear: Listener): boolean {
  for (const { rule, kind } of rulesOf(prepared).pair) {
    const finding = rule.judge(prepared, pair[0], pair[1])
    if (finding && hear(named(finding, kind))) return true
  }
  return false
}

const inOrder = (a: Grown, b: Grown): [Grown, Grown] => (a.placement.id < b.placement.id ? [a, b] : [b, a])

/** Those that could ever touch a placement along the wall, itself left out. */
function neighboursOf({ neighbours }: Prepared, one: Grown): Grown[] {
  const { from, to } = stretchOf(one)
  return neighbours.near(from, to).filter(({ placement }) => placement.id !== one.placement.id)
}

/** Tells what the size and neighbour rules find of one placement, in no order. Answers whether the listener had enough. */
export function tellOfPlacement(prepared: Prepared, one: Grown, hear: Listener): boolean {
  return tellPlacement(prepared, one, hear) || neighboursOf(prepared, one).some((other) => tellPair(prepared, inOrder(one, other), hear))
}

/** Tells what the site rules find of one plant. Answers whether the listener had enough. */
export function tellOfPlant(prepared: Prepared, judged: JudgedPlant, hear: Listener): boolean {
  for (const { rule, kind } of rulesOf(prepared).plant) {
    const finding = rule.judge(prepared, judged)
    if (finding && hear(named(finding, kind))) return true
  }
  return false
}

/** Keeps all that is told, in the one order of findings. */
function listed(tell: (hear: Listener) => unknown): Finding[] {
  const findings: Finding[] = []
  tell((finding) => {
    findings.push(finding)
    return false
  })
  return findings.sort(compareFindings)
}

/** What the size and neighbour rules find of one placement. */
export const findingsOfPlacement = (prepared: Prepared, one: Grown): Finding[] => listed((hear) => tellOfPlacement(prepared, one, hear))

/** All that the rules find on a sheet. */
export function allFindings(prepared: Prepared): Finding[] {
  return listed((hear) => {
    for (const { rule, kind } of rulesOf(prepared).sheet) for (const finding of rule.judge(prepared)) hear(named(finding, kind))
    for (const judged of judgedPlants(prepared)) tellOfPlant(prepared, judged, hear)
    for (const one of prepared.grown) {
      tellPlacement(prepared, one, hear)
      for (const other of neighboursOf(prepared, one)) if (one.placement.id < other.placement.id) tellPair(prepared, [one, other], hear)
    }
  })
}

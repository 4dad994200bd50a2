import type { JudgedPlant } from './by-plant'
import type { Grown, Prepared } from './prepared'
import type { Finding, RuleMeta } from './types'

/**
 * A rule judges single placements, pairs of neighbours, plants with all their placements, or the sheet as a whole.
 * Rules of the first two scopes are asked again for one moved placement; the others only in the full check.
 */
export type Rule =
  | { meta: RuleMeta; scope: 'placement'; judge(prepared: Prepared, one: Grown): Finding[] }
  | { meta: RuleMeta; scope: 'pair'; judge(prepared: Prepared, a: Grown, b: Grown): Finding | null }
  | { meta: RuleMeta; scope: 'plant'; judge(prepared: Pick<Prepared, 'sheet' | 'standards'>, judged: JudgedPlant): Finding | null }
  | { meta: RuleMeta; scope: 'sheet'; judge(prepared: Prepared): Finding[] }

import { RULES } from './rules'
import { UPKEEP_META } from './upkeep'
import type { RuleMeta, Sheet } from './types'

export type Standards = Record<string, number | string>

/** Everything a studio may set, rule by rule, in the order people meet it. */
export const STANDARDS: readonly RuleMeta[] = [...RULES.map(({ meta }) => meta), UPKEEP_META]

const DEFAULTS: Readonly<Standards> = Object.freeze(
  Object.fromEntries(STANDARDS.flatMap((meta) => meta.settings.map((setting) => [setting.name, setting.default]))),
)

/** Every setting of every rule at its default. */
export const defaultStandards = (): Standards => ({ ...DEFAULTS })

/**
 * The settings in force on a sheet: its own where it has them, else the defaults; "<rule>.kind" only where it is set.
 * One flat record by setting name.
 */
export function resolveStandards(sheet: Pick<Sheet, 'standards'>): Standards {
  return { ...DEFAULTS, ...sheet.standards }
}

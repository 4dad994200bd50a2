import { RULES } from './rules'
import type { Sheet } from './types'

export type Standards = Record<string, number | string>

const DEFAULTS: Readonly<Standards> = Object.freeze(
  Object.fromEntries(RULES.flatMap(({ meta }) => meta.settings.map((setting) => [setting.name, setting.default]))),
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

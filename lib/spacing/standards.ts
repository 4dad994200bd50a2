import { RULES } from './rules'
import type { Sheet } from './types'

/** Every setting of every rule at its default. */
export function defaultStandards(): Record<string, number | string> {
  const entries = RULES.flatMap(({ meta }): [string, number | string][] => [
    ...meta.settings.map((setting): [string, number] => [setting.name, setting.default]),
    ...(meta.fixedKind ? [[`${meta.id}.kind`, meta.fixedKind] as [string, string]] : []),
  ])
  return Object.fromEntries(entries)
}

/** The settings in force on a sheet: its own where it has them, else the defaults. One flat record by setting name. */
export function resolveStandards(sheet: Pick<Sheet, 'standards'>): Record<string, number | string> {
  return { ...defaultStandards(), ...sheet.standards }
}

/** From anything to a sheet or to a list of bad fields; never an exception. */
import type { Sheet } from '../spacing'
import { z } from '../zod'
import { findProblems, type Problem } from './problems'
import { sheetSchema } from './schema'

export type ParsedSheet = { ok: true; sheet: Sheet } | { ok: false; problems: Problem[] }

/** Zod's issues as problems: one for each bad field, unknown keys named one by one. */
export function problemsOf(error: z.ZodError): Problem[] {
  return error.issues.flatMap((issue): Problem[] => {
    const path = issue.path.map((step) => (typeof step === 'symbol' ? String(step) : step))
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: [...path, key], message: `There is no field "${key}" here.` }))
    }
    return [{ path, message: issue.message }]
  })
}

/**
 * Reads a sheet from parsed JSON. Refuses unknown keys, non-finite numbers and fields at odds with each other,
 * naming each bad field by its path; rounds nothing.
 */
export function parseSheet(input: unknown): ParsedSheet {
  const shape = sheetSchema.safeParse(input)
  if (!shape.success) return { ok: false, problems: problemsOf(shape.error) }
  const sheet: Sheet = shape.data
  const problems = findProblems(sheet)
  return problems.length > 0 ? { ok: false, problems } : { ok: true, sheet }
}

/** A path as people read it: `openings[2].sill`. */
export function pathText(path: readonly (string | number)[]): string {
  return path.map((step, i) => (typeof step === 'number' ? `[${step}]` : i === 0 ? step : `.${step}`)).join('')
}

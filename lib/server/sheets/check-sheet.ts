import { parseSheet } from '@/lib/sheet'
import { check, type Report } from '@/lib/spacing'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { invalid } from '../http/parse'

/** The report on any sheet, read from parsed JSON; nothing is kept. Throws AppError('invalid') naming each bad field. */
export function checkSheet(context: Pick<Context, 'actor'>, { input }: { input: unknown }): Report {
  authorize(context, 'sheet:check')
  const parsed = parseSheet(input)
  if (!parsed.ok) throw invalid(parsed.problems)
  return check(parsed.sheet)
}

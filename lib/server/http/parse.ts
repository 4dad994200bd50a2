import { AppError, type FieldProblem } from '@/lib/errors'
import { problemsOf } from '@/lib/sheet'
import type { z } from '@/lib/zod'

/** `input` as the schema has it, or AppError('invalid') naming every bad field by its path. */
export function parseInput<T extends z.ZodType>(schema: T, input: unknown): z.infer<T> {
  const parsed = schema.safeParse(input)
  if (parsed.success) return parsed.data
  throw invalid(problemsOf(parsed.error))
}

/** AppError('invalid') that says the first problem in its sentence and carries all of them. */
export function invalid(problems: FieldProblem[]): AppError {
  const first = problems[0]?.message
  return new AppError('invalid', first ? `${first} Nothing was changed.` : undefined, { problems })
}

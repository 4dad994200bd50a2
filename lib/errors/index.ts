/**
 * The one kind of error that people are meant to read. Codes are a closed list; each has one HTTP status and
 * one sentence to fall back on. Anything else that is thrown is a fault of ours: logged with an id, shown as a
 * plain sentence with that id.
 */

const CODES = {
  'signed-out': { status: 401, sentence: 'Sign in to go on.' },
  forbidden: { status: 403, sentence: 'Your role does not allow this.' },
  'not-found': { status: 404, sentence: 'There is nothing here, or it is not yours to see.' },
  conflict: { status: 409, sentence: 'Someone else changed the same thing meanwhile.' },
  invalid: { status: 422, sentence: 'Something entered does not fit. Nothing was changed.' },
  unreadable: { status: 400, sentence: 'This could not be read.' },
  'too-large': { status: 413, sentence: 'This is too large.' },
  'cross-site': { status: 403, sentence: 'This request came from another site and was refused.' },
  'too-many': { status: 429, sentence: 'Too many attempts. Wait a little and try again.' },
  fault: { status: 500, sentence: 'Something went wrong on our side. Nothing was changed.' },
} as const satisfies Record<string, { status: number; sentence: string }>

export type ErrorCode = keyof typeof CODES

/** A field by its path, and what is wrong with it. */
export interface FieldProblem {
  path: (string | number)[]
  message: string
}

/** What every failed API call answers. */
export interface ErrorBody {
  error: { code: ErrorCode; message: string; problems?: FieldProblem[]; id?: string; [detail: string]: unknown }
}

interface Options {
  cause?: unknown
  problems?: FieldProblem[]
  /** Further facts for the caller, such as both versions of a conflict. Goes out with the answer: nothing private. */
  detail?: Record<string, unknown>
}

export class AppError extends Error {
  readonly code: ErrorCode
  readonly problems: FieldProblem[] | undefined
  readonly detail: Record<string, unknown> | undefined

  constructor(code: ErrorCode, message: string = CODES[code].sentence, options: Options = {}) {
    super(message, { cause: options.cause })
    this.name = 'AppError'
    this.code = code
    this.problems = options.problems
    this.detail = options.detail
  }
}

export const statusOf = (code: ErrorCode): number => CODES[code].status
export const sentenceOf = (code: ErrorCode): string => CODES[code].sentence

/** The answer body of an error people are meant to read. */
export function errorBody(error: AppError): ErrorBody {
  const { code, message, problems, detail } = error
  return { error: { ...detail, code, message, ...(problems && { problems }) } }
}

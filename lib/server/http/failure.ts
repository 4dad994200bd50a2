import { AppError, errorBody, sentenceOf, statusOf, type ErrorBody } from '@/lib/errors'
import { newId } from '../new-id'
import { log } from './log'

/**
 * What to answer when something was thrown. Errors people are meant to read go out as they are; anything else is
 * logged with an id, and only a plain sentence with that id goes out.
 */
export function failureOf(error: unknown, where: string): { status: number; body: ErrorBody } {
  if (error instanceof AppError) return { status: statusOf(error.code), body: errorBody(error) }
  const id = newId()
  log.error({ id, where, err: error }, 'fault')
  const message = `${sentenceOf('fault')} If you report it, give this number: ${id}`
  return { status: statusOf('fault'), body: { error: { code: 'fault', message, id } } }
}

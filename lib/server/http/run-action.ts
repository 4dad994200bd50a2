import { unstable_rethrow } from 'next/navigation'
import type { ErrorBody } from '@/lib/errors'
import { failureOf } from './failure'

export type ActionAnswer<T> = { ok: true; value: T } | { ok: false; error: ErrorBody['error'] }

/**
 * Runs the work of a server action and answers with its value or with the error people are meant to read: what
 * `useActionState` shows. Redirects and not-found pass through to Next; anything unknown is logged with an id.
 */
export async function runAction<T>(name: string, work: () => T | Promise<T>): Promise<ActionAnswer<T>> {
  try {
    return { ok: true, value: await work() }
  } catch (error) {
    unstable_rethrow(error)
    return { ok: false, error: failureOf(error, name).body.error }
  }
}

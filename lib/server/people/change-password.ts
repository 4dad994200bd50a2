import { and, eq, ne } from 'drizzle-orm'
import { transact } from '@/db/open'
import { people, sessions } from '@/db/schema'
import { passwordProblem } from '@/lib/access'
import { AppError } from '@/lib/errors'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { hashPassword, isPasswordRight } from './hash-password'
import { hashSecret } from './hashed-sessions'
import { countAttempt } from './throttle'

interface Change {
  current: string
  next: string
  /** Where the attempt comes from: guesses at the current password are counted like sign-ins. */
  address: string
  /** What the session cookie of this request holds: the one session that goes on. */
  secret: string
}

const problem = (field: 'current' | 'next', message: string) =>
  new AppError('invalid', message, { problems: [{ path: [field], message }] })

/**
 * Gives the person a new password and ends all their other sessions. Throws AppError('invalid') naming `current` or
 * `next`, AppError('too-many'), and AppError('conflict') when the password was changed elsewhere meanwhile.
 */
export async function changePassword(context: Context, { current, next, address, secret }: Change): Promise<void> {
  authorize(context, 'own-password:change')
  const { db, actor } = context
  const person = db.select({ email: people.email, passwordHash: people.passwordHash }).from(people).where(eq(people.id, actor.personId)).get()
  if (!person?.passwordHash || !person.email) throw new AppError('not-found')
  const attempt = await countAttempt(db, { email: person.email, address })
  if (!(await isPasswordRight(person.passwordHash, current))) throw problem('current', 'This is not your password now.')
  await attempt.succeeded()
  const weakness = passwordProblem(next, person.email)
  if (weakness) throw problem('next', weakness)
  const passwordHash = await hashPassword(next)
  transact(db, () => {
    const isSame = and(eq(people.id, actor.personId), eq(people.passwordHash, person.passwordHash!))
    const { changes } = db.update(people).set({ passwordHash }).where(isSame).run()
    if (changes !== 1) throw new AppError('conflict', 'Your password was changed elsewhere meanwhile. Nothing was changed here.')
    db.delete(sessions).where(and(eq(sessions.userId, actor.personId), ne(sessions.id, hashSecret(secret)))).run()
  })
}

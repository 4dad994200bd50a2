import { asc, eq } from 'drizzle-orm'
import { members, people } from '@/db/schema'
import { AppError } from '@/lib/errors'
import type { Anonymous } from '../context'
import { isPasswordRight } from './hash-password'
import { createSession, endSession } from './session'
import { countAttempt } from './throttle'

interface Credentials {
  email: string
  password: string
  /** Where the attempt comes from: `callerAddress`. */
  address: string
  /** What the browser's session cookie holds already: that session ends. */
  previous?: string | null
}

const refusal = () => new AppError('invalid', 'That e-mail address and password do not go together.')

function findAccount({ db }: Anonymous, email: string) {
  return db
    .select({ personId: people.id, passwordHash: people.passwordHash, studioId: members.studioId })
    .from(people)
    .innerJoin(members, eq(members.personId, people.id))
    .where(eq(people.email, email))
    .orderBy(asc(members.createdAt), asc(members.studioId))
    .get()
}

/**
 * Signs a member in and answers the secret for the session cookie. Unknown address, wrong password and a person of
 * no studio get the same answer after the same work: AppError('invalid'); too many attempts AppError('too-many').
 */
export async function signIn(access: Anonymous, { email, password, address, previous }: Credentials): Promise<string> {
  const typed = email.trim().toLowerCase()
  const attempt = await countAttempt(access.db, { email: typed, address })
  const account = findAccount(access, typed)
  const isRight = await isPasswordRight(account?.passwordHash ?? null, password)
  if (!account || !isRight) throw refusal()
  await attempt.succeeded()
  if (previous) await endSession(access.db, previous)
  const secret = await createSession(access.db, account.personId, { studioId: account.studioId, projectId: null })
  // A password changed while this one was being judged ends every session but the changer's: this one too.
  if (findAccount(access, typed)?.passwordHash === account.passwordHash) return secret
  await endSession(access.db, secret)
  throw refusal()
}

/** Counted sign-in attempts, in the same database: a restart forgets nothing. */
import { lt } from 'drizzle-orm'
import { RateLimiterRes, RateLimiterSQLite } from 'rate-limiter-flexible'
import type { Db } from '@/db/open'
import { rateLimits } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { hashSecret } from './hashed-sessions'

const QUARTER_HOUR_S = 15 * 60
/** Wrong passwords for one account, and from one address, in a quarter of an hour. */
export const MAX_PER_ACCOUNT = 10
export const MAX_PER_ADDRESS = 60

function limiter(db: Db, keyPrefix: string, points: number) {
  // The table stands by migration: left to itself the limiter makes it late and refuses the first attempt.
  return new RateLimiterSQLite({
    storeClient: db.$client, storeType: 'better-sqlite3', tableName: 'rate_limits', tableCreated: true,
    keyPrefix, points, duration: QUARTER_HOUR_S,
  })
}

async function consume(of: RateLimiterSQLite, key: string): Promise<void> {
  try {
    await of.consume(key)
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal
    const minutes = Math.max(1, Math.ceil(refusal.msBeforeNext / 60_000))
    throw new AppError('too-many', `Too many attempts. Try again in ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}.`)
  }
}

/**
 * Counts one attempt before the password is looked at, so that attempts sent side by side count too. Throws
 * AppError('too-many'). `succeeded` takes the count back once the password was right.
 */
export async function countAttempt(db: Db, { email, address }: { email: string; address: string }) {
  db.delete(rateLimits).where(lt(rateLimits.expire, Date.now())).run()
  const accounts = limiter(db, 'account', MAX_PER_ACCOUNT)
  const addresses = limiter(db, 'address', MAX_PER_ADDRESS)
  // What is typed into the address field may be anything, even a password: only its hash is kept.
  const account = hashSecret(email)
  await consume(addresses, address)
  await consume(accounts, account)
  return {
    succeeded: async () => {
      await accounts.delete(account)
      await addresses.reward(address)
    },
  }
}

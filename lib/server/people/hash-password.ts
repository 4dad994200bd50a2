/** argon2id, 19 MiB and two passes (the figures OWASP's password storage cheat sheet gives; from memory). */
import { hash, verify } from '@node-rs/argon2'

const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/** Each hash takes 19 MiB and a core: more than two at once would let a burst of sign-ins starve the drawing tables. */
const AT_ONCE = 2
let running = 0
const waiting: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) await new Promise<void>((go) => waiting.push(go))
  else running += 1
  try {
    return await work()
  } finally {
    // The place is handed on, not given back, so that nobody slips in between.
    const next = waiting.shift()
    if (next) next()
    else running -= 1
  }
}

/** The hash to store. Passwords are compared in Unicode's composed form: phones and laptops type accents differently. */
export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize('NFC'), COST))
}

let decoy: Promise<string> | undefined

/**
 * Whether the password is the one of this hash. Without a hash (an unknown address, a client) the same work is done
 * against a hash of nothing, so that the time taken tells nobody whether an address is known.
 */
export async function isPasswordRight(stored: string | null, password: string): Promise<boolean> {
  const nothing = await (decoy ??= hashPassword(crypto.randomUUID()))
  const isRight = await inTurn(() => verify(stored ?? nothing, password.normalize('NFC')))
  return isRight && stored !== null
}

import type { Clock } from './editor'

/** The clock of the machine. */
export const systemClock: Clock = {
  now: () => Date.now(),
  after: (ms, callback) => {
    const timer = setTimeout(callback, ms)
    return () => clearTimeout(timer)
  },
}

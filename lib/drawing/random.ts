/** Numbers that look thrown but are not: one seed, one row of numbers, on every machine. */

/** A 32-bit hash of a text (FNV-1a). */
export function hashText(text: string): number {
  let hash = 0x811c9dc5
  for (let i = 0; i < text.length; i += 1) {
    hash ^= text.charCodeAt(i)
    hash = Math.imul(hash, 0x01000193)
  }
  return hash >>> 0
}

export type Random = () => number

/** A generator of numbers in [0, 1) from a seed text (mulberry32). */
export function randomFrom(seed: string): Random {
  let state = hashText(seed)
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let t = Math.imul(state ^ (state >>> 15), 1 | state)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

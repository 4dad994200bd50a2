import type { Sheet } from '../spacing'

/** Letters of a plan: I and O are left out, as drafters do, for they read as 1 and 0. */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ'

function keyAt(index: number): string {
  const last = LETTERS[index % LETTERS.length]!
  return index < LETTERS.length ? last : keyAt(Math.floor(index / LETTERS.length) - 1) + last
}

/**
 * The key letter of each plant on the drawing, by plant id, in the order plants first stand on the sheet:
 * A, B, ... Z, AA. Plants that go have none.
 */
export function plantKeys(sheet: Pick<Sheet, 'placements'>): Map<string, string> {
  const keys = new Map<string, string>()
  for (const { plant, status } of sheet.placements) {
    if (status !== 'goes' && !keys.has(plant)) keys.set(plant, keyAt(keys.size))
  }
  return keys
}

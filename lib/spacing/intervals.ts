/** Lengths of unions of intervals: what scan lines across windows and beds add up. */

export type Interval = readonly [from: number, to: number]

/** Merges intervals in place order; those without length are left out. */
export function union(intervals: Interval[]): Interval[] {
  const sorted = intervals.filter(([from, to]) => to > from).sort((a, b) => a[0] - b[0])
  const merged: [number, number][] = []
  for (const [from, to] of sorted) {
    const last = merged.at(-1)
    if (last && from <= last[1]) last[1] = Math.max(last[1], to)
    else merged.push([from, to])
  }
  return merged
}

/** Length that two lists of disjoint ascending intervals share. */
export function sharedLength(a: readonly Interval[], b: readonly Interval[]): number {
  let [i, j, length] = [0, 0, 0]
  while (i < a.length && j < b.length) {
    length += Math.max(0, Math.min(a[i]![1], b[j]![1]) - Math.max(a[i]![0], b[j]![0]))
    if (a[i]![1] < b[j]![1]) i++
    else j++
  }
  return length
}

export const lengthOf = (intervals: readonly Interval[]): number => intervals.reduce((sum, [from, to]) => sum + to - from, 0)

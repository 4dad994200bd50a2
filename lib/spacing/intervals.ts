/** Lengths of unions of intervals: what scan lines across windows add up. */

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

export const lengthOf = (intervals: readonly Interval[]): number => intervals.reduce((sum, [from, to]) => sum + to - from, 0)

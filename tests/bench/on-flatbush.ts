/** The same rules and arithmetic with an R-tree (flatbush, https://github.com/mourner/flatbush) instead of the grid along the wall. */
import Flatbush from 'flatbush'
import type { Finding, Sheet } from '@/lib/spacing'
import { allFindings } from '@/lib/spacing/judge'
import type { Nearby } from '@/lib/spacing/geometry/strips'
import { growSheet, stretchOf } from '@/lib/spacing/prepared'
import { resolveStandards } from '@/lib/spacing/standards'

function indexOf<T>(things: readonly T[], extentOf: (thing: T) => { from: number; to: number }): Nearby<T> {
  if (things.length === 0) return { near: () => [] }
  const tree = new Flatbush(things.length)
  for (const thing of things) {
    const { from, to } = extentOf(thing)
    tree.add(from, 0, to, 0)
  }
  tree.finish()
  return { near: (from, to) => tree.search(from, 0, to, 0).map((i) => things[i]!) }
}

export function onFlatbush(sheet: Sheet): Finding[] {
  const grid = growSheet(sheet, resolveStandards(sheet))
  return allFindings({ ...grid, neighbours: indexOf(grid.grown, stretchOf) })
}

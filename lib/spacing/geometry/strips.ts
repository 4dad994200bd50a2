/** A uniform grid along the wall: what lies near a stretch of it is found without asking everything. */
import type { Inches } from '../types'

/** Width of a strip: about one plant. */
const WIDTH: Inches = 48
/** Things of many strips are kept apart, so that one endless thing does not fill the grid. */
const MOST_STRIPS = 64

interface Entry<T> {
  thing: T
  from: Inches
  to: Inches
  first: number
}

const stripOf = (x: Inches) => Math.floor(x / WIDTH)

/** Whatever is asked for by its place along the wall. */
export interface Nearby<T> {
  near(from: Inches, to: Inches): T[]
}

export class Strips<T> implements Nearby<T> {
  private readonly strips = new Map<number, Entry<T>[]>()
  private readonly wide: Entry<T>[] = []

  /** @param extentOf the stretch of x a thing takes, ends included. */
  constructor(things: readonly T[], extentOf: (thing: T) => { from: Inches; to: Inches }) {
    for (const thing of things) {
      const { from, to } = extentOf(thing)
      this.add({ thing, from, to, first: stripOf(from) })
    }
  }

  private add(entry: Entry<T>): void {
    const last = stripOf(entry.to)
    if (!(last - entry.first < MOST_STRIPS)) {
      this.wide.push(entry)
      return
    }
    for (let strip = entry.first; strip <= last; strip++) {
      const found = this.strips.get(strip)
      if (found) found.push(entry)
      else this.strips.set(strip, [entry])
    }
  }

  /** The things whose stretch touches that from `from` to `to`; each once. */
  near(from: Inches, to: Inches): T[] {
    const found: T[] = []
    for (const entry of this.wide) if (entry.from <= to && entry.to >= from) found.push(entry.thing)
    const first = stripOf(from)
    const last = stripOf(to)
    if (last - first > this.strips.size) {
      for (const [strip, entries] of this.strips) collect(entries, { from, to, isFirst: (entry) => strip === entry.first }, found)
      return found
    }
    for (let strip = first; strip <= last; strip++) {
      const entries = this.strips.get(strip)
      if (entries) collect(entries, { from, to, isFirst: (entry) => strip === Math.max(first, entry.first) }, found)
    }
    return found
  }
}

interface Wanted<T> {
  from: Inches
  to: Inches
  /** A thing stands in several strips: it counts in the first alone. */
  isFirst(entry: Entry<T>): boolean
}

function collect<T>(entries: readonly Entry<T>[], { from, to, isFirst }: Wanted<T>, found: T[]): void {
  for (const entry of entries) {
    if (entry.from <= to && entry.to >= from && isFirst(entry)) found.push(entry.thing)
  }
}

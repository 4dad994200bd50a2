/**
 * Stretches of a line, kept as two lists of numbers: they are laid and united thousands of times in one check, and an
 * object each would cost more than the sums.
 */
export class Stretches {
  readonly from: number[] = []
  readonly to: number[] = []

  clear(): void {
    this.from.length = 0
    this.to.length = 0
  }

  /** Adds a stretch, in order of its start. An empty one adds nothing. */
  add(from: number, to: number): void {
    if (!(to > from)) return
    let i = this.from.length
    this.from.push(from)
    this.to.push(to)
    for (; i > 0 && this.from[i - 1]! > from; i--) {
      this.from[i] = this.from[i - 1]!
      this.to[i] = this.to[i - 1]!
    }
    this.from[i] = from
    this.to[i] = to
  }

  /** Unites those that touch: what is left stands apart, in order. */
  unite(): this {
    let last = 0
    for (let i = 1; i < this.from.length; i++) {
      if (this.from[i]! <= this.to[last]!) {
        this.to[last] = Math.max(this.to[last]!, this.to[i]!)
      } else {
        last++
        this.from[last] = this.from[i]!
        this.to[last] = this.to[i]!
      }
    }
    if (this.from.length > 0) this.from.length = this.to.length = last + 1
    return this
  }

  /** Length of the line they take together, once united. */
  length(): number {
    let sum = 0
    for (let i = 0; i < this.from.length; i++) sum += this.to[i]! - this.from[i]!
    return sum
  }
}

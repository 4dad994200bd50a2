/** A value that tells when it changes: the shape React's external stores ask for, without React. */
export class Observable<T extends object> {
  private value: T
  private readonly listeners = new Set<() => void>()

  constructor(value: T) {
    this.value = value
  }

  readonly getSnapshot = (): T => this.value

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  protected set(change: Partial<T>): void {
    this.value = { ...this.value, ...change }
    for (const listener of [...this.listeners]) listener()
  }
}

/** Undo and redo as edits of their own: what is taken back is saved like anything else. */
import { applyEdit, inverseOf, targetOf, type Edit } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'
import { targetKey } from './things'

/** One gesture: what it did and what takes it back, both in the order to apply. */
export interface Step {
  label: string
  forward: readonly Edit[]
  back: readonly Edit[]
}

const MOST_STEPS = 200

/** The edits that take `edits` back, last one first, given the sheet before them. */
export function inversesOf(before: Sheet, edits: readonly Edit[], newId: () => string): Edit[] {
  const back: Edit[] = []
  let sheet = before
  for (const edit of edits) {
    const inverse = inverseOf(sheet, edit, newId())
    if (inverse) back.unshift(inverse)
    sheet = applyEdit(sheet, edit)
  }
  return back
}

export class History {
  private past: Step[] = []
  private future: Step[] = []

  constructor(private readonly newId: () => string) {}

  get undoLabel(): string | null {
    return this.past.at(-1)?.label ?? null
  }

  get redoLabel(): string | null {
    return this.future.at(-1)?.label ?? null
  }

  /** Remembers a gesture just made; what had been taken back is forgotten. The oldest of more than 200 is dropped. */
  record(step: Step): void {
    this.past = [...this.past, step].slice(-MOST_STEPS)
    this.future = []
  }

  /** The edits to make now, under ids of their own; null when there is nothing to take back. */
  undo(): Step | null {
    const step = this.past.pop()
    if (!step) return null
    this.future.push(step)
    return { ...step, back: this.anew(step.back) }
  }

  redo(): Step | null {
    const step = this.future.pop()
    if (!step) return null
    this.past.push(step)
    return { ...step, forward: this.anew(step.forward) }
  }

  /** Forgets every gesture that touched a thing: taking it back could undo what the server refused or others did. */
  forget(targets: ReadonlySet<string>): void {
    const isFree = ({ forward }: Step) => !forward.some((edit) => targets.has(targetKey(targetOf(edit))))
    this.past = this.past.filter(isFree)
    this.future = this.future.filter(isFree)
  }

  clear(): void {
    this.past = []
    this.future = []
  }

  private anew(edits: readonly Edit[]): Edit[] {
    return edits.map((edit) => ({ ...edit, id: this.newId() }))
  }
}

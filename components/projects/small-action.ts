/** What a form shows that was never sent. */
export const UNTRIED: SmallState = { error: null, made: null }

/** What a small form of one to three fields shows after an attempt. */
export interface SmallState {
  error: string | null
  /** What the attempt made, where it is to be shown; `id` says which thing that is. */
  made: string | null
  id?: string
  /** What is wrong, by field; then `error` is empty. */
  fields?: Record<string, string>
  /** What was typed, given back when it was refused: React clears a form after its action. */
  typed?: Record<string, string>
}

export type SmallAction = (before: SmallState, form: FormData) => Promise<SmallState>

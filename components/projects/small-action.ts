/** What a small form of one or two fields shows after an attempt. */
export interface SmallState {
  error: string | null
  /** What the attempt made, where it is to be shown. */
  made: string | null
}

export type SmallAction = (before: SmallState, form: FormData) => Promise<SmallState>

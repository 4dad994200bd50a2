import { unstable_rethrow } from 'next/navigation'

/** What a small action of one or two fields answers. */
export interface SmallState {
  error: string | null
  /** What the attempt made, where it is to be shown. */
  made: string | null
}

/** The answer of an action, also when the server is out of reach. What Next throws to lead elsewhere goes on to Next. */
export async function answerOf(work: Promise<SmallState>): Promise<SmallState> {
  try {
    return await work
  } catch (error) {
    unstable_rethrow(error)
    return { error: 'The server could not be reached. Nothing was changed: try again.', made: null }
  }
}

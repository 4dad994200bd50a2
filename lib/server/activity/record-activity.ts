import { activity } from '@/db/schema'
import type { Context } from '../context'
import { newId } from '../new-id'

/** Writes down that the actor did something for a project. Part of the transaction of the operation that calls it. */
export function recordActivity({ db, actor, now }: Context, deed: string, { projectId, detail = '' }: { projectId: string; detail?: string }): void {
  db.insert(activity).values({ id: newId(), studioId: actor.studioId, projectId, personId: actor.personId, deed, detail, at: now }).run()
}

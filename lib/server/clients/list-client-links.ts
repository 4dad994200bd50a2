import { and, desc, eq, gt, isNull } from 'drizzle-orm'
import { people, signInLinks } from '@/db/schema'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findProject } from '../projects/find-project'

/** The links of a project that still open it, the newest first: who made them and until when. Their secrets are not known. */
export function listClientLinks(context: Context, { projectId }: { projectId: string }) {
  authorize(context, 'client-link:create')
  findProject(context, projectId)
  const { db, now } = context
  return db
    .select({ id: signInLinks.id, createdAt: signInLinks.createdAt, expiresAt: signInLinks.expiresAt, createdBy: people.name })
    .from(signInLinks)
    .innerJoin(people, eq(people.id, signInLinks.createdBy))
    .where(and(eq(signInLinks.projectId, projectId), isNull(signInLinks.revokedAt), gt(signInLinks.expiresAt, now)))
    .orderBy(desc(signInLinks.createdAt), desc(signInLinks.id))
    .all()
}

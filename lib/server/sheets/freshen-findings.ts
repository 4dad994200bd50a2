import { and, eq, ne } from 'drizzle-orm'
import { transact, type Db } from '@/db/open'
import { facades, projects } from '@/db/schema'
import { check, ENGINE_VERSION } from '@/lib/spacing'
import type { FoundFacade } from './find-facade'
import { readSheet } from './read-sheet'
import { storeFindings } from './store-findings'

/** Checks a facade as it stands and keeps the findings. Part of the caller's transaction. */
export function recheck(db: Db, found: FoundFacade): void {
  const { id: facadeId, studioId } = found.facade
  const sheet = readSheet(db, found)
  storeFindings({ db, facadeId, studioId, standards: sheet.standards ?? {} }, check(sheet))
}

/** Checks again the facades of a studio that were never checked, or by another version of the engine. */
export function freshenFindings(db: Db, studioId: string): void {
  const isStale = and(eq(facades.studioId, studioId), ne(facades.engine, ENGINE_VERSION))
  const ids = db.select({ id: facades.id }).from(facades).where(isStale).all()
  if (ids.length === 0) return
  transact(db, () => {
    const stale = db.select({ facade: facades, project: projects }).from(facades).innerJoin(projects, eq(projects.id, facades.projectId)).where(isStale).all()
    for (const found of stale) recheck(db, found)
  })
}

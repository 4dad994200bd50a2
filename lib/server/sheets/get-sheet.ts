import { snapshot, transact } from '@/db/open'
import { ENGINE_VERSION, type Finding, type Sheet } from '@/lib/spacing'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { findFacade } from './find-facade'
import { recheck } from './freshen-findings'
import { readSheet } from './read-sheet'
import { storedFindings } from './store-findings'

export interface OpenSheet {
  facade: { id: string; name: string; projectId: string; projectName: string }
  sheet: Sheet
  /** Rises by one with every saved batch of edits. */
  seq: number
  report: { engine: string; findings: Finding[] }
}

/**
 * A facade's sheet with the findings kept beside it. Findings of another engine version are made anew first, so
 * that what is read is what this version says. Throws AppError('not-found').
 */
export function getSheet(context: Context, { facadeId }: { facadeId: string }): OpenSheet {
  authorize(context, 'sheet:read')
  const { db } = context
  if (findFacade(context, facadeId).facade.engine !== ENGINE_VERSION) transact(db, () => recheck(db, findFacade(context, facadeId)))
  return snapshot(db, () => {
    const found = findFacade(context, facadeId)
    const { facade, project } = found
    return {
      facade: { id: facade.id, name: facade.name, projectId: project.id, projectName: project.name },
      sheet: readSheet(db, found),
      seq: facade.seq,
      report: { engine: ENGINE_VERSION, findings: storedFindings(db, facadeId) },
    }
  })
}

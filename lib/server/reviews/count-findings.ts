import { count, eq } from 'drizzle-orm'
import { findings } from '@/db/schema'
import type { Db } from '@/db/open'
import { FINDING_KINDS, type FindingKind } from '@/lib/spacing'

export type Counts = Record<FindingKind, number>

export const noCounts = (): Counts => Object.fromEntries(FINDING_KINDS.map((kind) => [kind, 0])) as Counts

/** The sum of several counts, kind by kind. */
export function sumCounts(all: readonly Counts[]): Counts {
  const sum = noCounts()
  for (const counts of all) for (const kind of FINDING_KINDS) sum[kind] += counts[kind]
  return sum
}

/** How many findings of each kind are kept for each facade of a studio, by facade id; facades without any are absent. */
export function countFindings(db: Db, studioId: string): Map<string, Counts> {
  const rows = db
    .select({ facadeId: findings.facadeId, kind: findings.kind, n: count() })
    .from(findings)
    .where(eq(findings.studioId, studioId))
    .groupBy(findings.facadeId, findings.kind)
    .all()
  const byFacade = new Map<string, Counts>()
  for (const { facadeId, kind, n } of rows) {
    const counts = byFacade.get(facadeId) ?? noCounts()
    counts[kind] = n
    byFacade.set(facadeId, counts)
  }
  return byFacade
}

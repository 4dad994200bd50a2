import { asc, eq } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { facades, findings } from '@/db/schema'
import type { Finding, Report } from '@/lib/spacing'

interface Where {
  db: Db
  facadeId: string
  studioId: string
  /** What the studio had set when they were made. */
  standards: Record<string, number | string>
}

/** Rows of one insert: SQLite binds at most 32,766 values. */
const CHUNK = 1_000

/** Keeps the findings of a report beside its facade in place of the ones before. Part of the caller's transaction. */
export function storeFindings({ db, facadeId, studioId, standards }: Where, report: Report): void {
  db.delete(findings).where(eq(findings.facadeId, facadeId)).run()
  const rows = report.findings.map((body, position) => ({ facadeId, studioId, position, key: body.key, rule: body.rule, kind: body.kind, body }))
  for (let at = 0; at < rows.length; at += CHUNK) db.insert(findings).values(rows.slice(at, at + CHUNK)).run()
  db.update(facades).set({ engine: report.engine, standards }).where(eq(facades.id, facadeId)).run()
}

/** The findings kept beside a facade, in the engine's order. */
export function storedFindings(db: Db, facadeId: string): Finding[] {
  const rows = db.select({ body: findings.body }).from(findings).where(eq(findings.facadeId, facadeId)).orderBy(asc(findings.position)).all()
  return rows.map(({ body }) => body)
}

/** Things of a sheet into rows: the touched ones only, in the order the sheet has them. */
import { and, eq, max } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { beds, facades, fixtures, openings, placements, walks } from '@/db/schema'
import { LISTED_KINDS, listOf, targetOf, type Edit, type ListedKind, type ValueOf } from '@/lib/sheet'
import type { Sheet } from '@/lib/spacing'

const TABLE_OF = { opening: openings, fixture: fixtures, walk: walks, bed: beds, placement: placements } as const

const ROW_OF: { [K in ListedKind]: (value: ValueOf[K]) => object } = {
  opening: (opening) => opening,
  fixture: ({ outlet = null, ...fixture }) => ({ ...fixture, outlet }),
  walk: (walk) => walk,
  bed: (bed) => bed,
  placement: ({ plant, planted, kept, role = null, drift = null, clearStem = null, status = null, ...placement }) => ({
    ...placement,
    plantId: plant,
    plantedHeight: planted.height,
    plantedSpread: planted.spread,
    keptHeight: kept?.height ?? null,
    keptSpread: kept?.spread ?? null,
    role, drift, clearStem, status,
  }),
}

interface Where {
  db: Db
  facadeId: string
  studioId: string
}

function writeKind({ db, facadeId, studioId }: Where, kind: ListedKind, sheet: Sheet, edits: readonly Edit[]) {
  const table = TABLE_OF[kind]
  const touched = new Set<string>()
  for (const edit of edits) {
    const { kind: its, target } = targetOf(edit)
    if (its !== kind) continue
    touched.add(target)
    // Removed and put again, a thing goes to the end of the list: its old row and place must go.
    if (edit.op === 'remove') db.delete(table).where(and(eq(table.facadeId, facadeId), eq(table.id, target))).run()
  }
  if (touched.size === 0) return
  let last = db.select({ last: max(table.position) }).from(table).where(eq(table.facadeId, facadeId)).get()?.last ?? -1
  for (const thing of listOf(sheet, kind)) {
    if (!touched.has(thing.id)) continue
    // The kind says which row its values make: one table for all five.
    const row = ROW_OF[kind](thing as never) as typeof beds.$inferInsert
    const isAt = and(eq(table.facadeId, facadeId), eq(table.id, thing.id))
    if (db.update(table).set(row).where(isAt).run().changes === 0) {
      last += 1
      db.insert(table).values({ ...row, facadeId, studioId, position: last }).run()
    }
  }
}

function writeFacade({ db, facadeId }: Where, sheet: Sheet, edits: readonly Edit[]) {
  const { facade, site } = sheet
  const isAt = eq(facades.id, facadeId)
  if (edits.some(({ kind }) => kind === 'facade')) db.update(facades).set(facade).where(isAt).run()
  if (edits.some(({ kind }) => kind === 'aspect')) db.update(facades).set({ light: site.light, facing: site.facing ?? null }).where(isAt).run()
}

/** Writes what `edits` touched as `sheet`, the sheet after them, has it. Part of the caller's transaction. */
export function writeThings(where: Where, sheet: Sheet, edits: readonly Edit[]): void {
  writeFacade(where, sheet, edits)
  for (const kind of LISTED_KINDS) writeKind(where, kind, sheet, edits)
}

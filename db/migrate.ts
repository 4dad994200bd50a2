/**
 * Brings a database up to date. Reads drizzle's journal and keeps its table of what was applied, so drizzle's own
 * tools agree; but foreign keys are off while tables are rebuilt. SQLite ignores that switch inside a
 * transaction, where the stock migrator runs, and a rebuilt parent would take its children with it.
 */
import { fileURLToPath } from 'node:url'
import { readMigrationFiles, type MigrationMeta } from 'drizzle-orm/migrator'
import type { Db } from './open'

const OWN_FOLDER = fileURLToPath(new URL('./migrations', import.meta.url))

/** The table drizzle's migrator keeps, to the letter. */
const APPLIED = 'create table if not exists __drizzle_migrations (id SERIAL PRIMARY KEY, hash text NOT NULL, created_at numeric)'

function lastApplied({ $client }: Db): number {
  const row = $client.prepare('select max(created_at) as last from __drizzle_migrations').get() as { last: number | null }
  return Number(row.last ?? 0)
}

function apply({ $client }: Db, migration: MigrationMeta) {
  for (const statement of migration.sql) $client.exec(statement)
  $client.prepare('insert into __drizzle_migrations (hash, created_at) values (?, ?)').run(migration.hash, migration.folderMillis)
}

/**
 * Applies what is missing, all in one transaction, and answers how many migrations that were. Before anything is
 * kept, every foreign key of every row is checked. Throws, with the database as it was, when a statement fails,
 * when a row would be left without its parent, or when the database was made by a newer version.
 */
export function migrate(db: Db, folder: string = OWN_FOLDER): number {
  const known = readMigrationFiles({ migrationsFolder: folder })
  const { $client } = db
  $client.pragma('foreign_keys = OFF')
  try {
    return $client
      .transaction(() => {
        $client.exec(APPLIED)
        const last = lastApplied(db)
        if (last > 0 && !known.some(({ folderMillis }) => folderMillis === last)) {
          throw new Error('This database was made by another version of the product: its last migration is not known here.')
        }
        const missing = known.filter(({ folderMillis }) => folderMillis > last)
        for (const migration of missing) apply(db, migration)
        const orphans = $client.pragma('foreign_key_check') as { table: string; parent: string }[]
        if (orphans[0]) throw new Error(`After the migration ${orphans.length} rows have no parent, the first in ${orphans[0].table} (parent ${orphans[0].parent}).`)
        return missing.length
      })
      .immediate()
  } finally {
    $client.pragma('foreign_keys = ON')
  }
}

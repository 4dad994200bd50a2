/** Opens a database file. Every connection, of the server, a script or a test, comes from here. */
import { mkdirSync } from 'node:fs'
import { dirname } from 'node:path'
import Database from 'better-sqlite3'
import { drizzle } from 'drizzle-orm/better-sqlite3'
import * as schema from './schema'

/**
 * Opens (or makes) a database file with the settings every connection has: write-ahead log, each commit on the
 * disk before it is answered (synchronous FULL), foreign keys held, and 5 s of patience with another writer.
 * Throws when the file cannot be opened.
 */
export function openDatabase(file: string) {
  mkdirSync(dirname(file), { recursive: true })
  const client = new Database(file)
  client.pragma('journal_mode = WAL')
  client.pragma('synchronous = FULL')
  client.pragma('foreign_keys = ON')
  client.pragma('busy_timeout = 5000')
  return drizzle(client, { schema })
}

export type Db = ReturnType<typeof openDatabase>

/**
 * Runs `work` in one transaction that takes the write lock at once; everything or nothing is kept. Work must be
 * synchronous: one connection serves all, so an await would let another request in between.
 */
export function transact<T>(db: Db, work: () => T): T {
  return db.$client.transaction(work).immediate()
}

/** Runs reads that must agree with each other on one state of the database, whoever writes meanwhile. */
export function snapshot<T>(db: Db, read: () => T): T {
  return db.$client.transaction(read).deferred()
}

/** Where the database stands: DATABASE_FILE, or the usual place beside the product. */
export const databaseFile = (): string => process.env.DATABASE_FILE ?? './.data/tenth-summer.db'

/** The server's one connection, opened when first asked for: a build or an import opens nothing. */
import 'server-only'
import { databaseFile, openDatabase, type Db } from './open'

const shared = globalThis as { tenthSummerDb?: Db }

/** The open database named by DATABASE_FILE. Reloads of the development server share it. */
export function getDb(): Db {
  shared.tenthSummerDb ??= openDatabase(databaseFile())
  return shared.tenthSummerDb
}

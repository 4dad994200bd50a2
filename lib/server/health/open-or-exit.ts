import { databaseFile, openDatabase } from '@/db/open'
import { log } from '../http/log'
import { checkHealth } from './check-health'

/** Opens the database and reads from it; ends the process with 1 and a line in the log when that fails. */
export function openOrExit(): void {
  try {
    const db = openDatabase(databaseFile())
    checkHealth({ db, now: Date.now() })
    db.$client.close()
  } catch (error) {
    log.fatal({ err: error, file: databaseFile() }, 'The database cannot be read. Was it migrated? npm run db:migrate')
    process.exit(1)
  }
}

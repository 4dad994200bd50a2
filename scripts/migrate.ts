/** Makes the database, or brings it up to date. Prints one line; exits with 1 and a sentence when it cannot. */
import { migrate } from '@/db/migrate'
import { databaseFile, openDatabase } from '@/db/open'

const file = databaseFile()
try {
  const db = openDatabase(file)
  const count = migrate(db)
  db.$client.close()
  console.log(count === 0 ? `${file} is up to date.` : `${file}: ${count} ${count === 1 ? 'migration' : 'migrations'} applied.`)
} catch (error) {
  console.error(`${file} could not be brought up to date: ${error instanceof Error ? error.message : String(error)}`)
  process.exit(1)
}

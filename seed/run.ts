/**
 * Seeds the database named by DATABASE_FILE: the shared plant library always, the demonstration with `--demo` and
 * only where no studio stands yet. Run again it keeps what is there.
 */
import { databaseFile, openDatabase } from '@/db/open'
import { studios } from '@/db/schema'
import { makeDemo } from './demo/make-demo'
import { loadPlants } from './load-plants'

const db = openDatabase(databaseFile())
const now = Date.now()
console.log(`The library holds ${loadPlants(db, { now })} shared plants.`)
if (process.argv.includes('--demo')) {
  const isEmpty = db.select().from(studios).limit(1).all().length === 0
  if (isEmpty) await makeDemo(db, now)
  console.log(isEmpty ? 'The demonstration is in.' : 'The demonstration is kept as it is.')
}
db.$client.close()

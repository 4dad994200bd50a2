/** Prints the demonstration's sign-ins, those that stand in the database named by DATABASE_FILE. */
import { databaseFile, openDatabase } from '@/db/open'
import { people } from '@/db/schema'
import { DEMO_PASSWORD, OTHER_STUDIO, STUDIO } from './demo/people'

const db = openDatabase(databaseFile())
const known = new Set(db.select({ email: people.email }).from(people).all().map(({ email }) => email))
db.$client.close()

console.log(`Sign in with any of these; the password is "${DEMO_PASSWORD}" (unless it was changed since).`)
for (const studio of [STUDIO, OTHER_STUDIO]) {
  console.log(`\n  ${studio.name}`)
  for (const { email, role, name } of studio.people) if (known.has(email)) console.log(`    ${email.padEnd(28)} ${role.padEnd(10)} ${name}`)
}
console.log('\nThe client signs in by a link: make one on a project\'s page.')

/** Real databases for tests: one migrated file is made once per test process and copied for each test. */
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach } from 'vitest'
import { migrate } from '@/db/migrate'
import { openDatabase, type Db } from '@/db/open'

let template: string | undefined
const open: { db: Db; folder: string }[] = []

const folders = new Set<string>()
process.on('exit', () => folders.forEach((folder) => rmSync(folder, { recursive: true, force: true })))

function newFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'tenth-summer-test-'))
  folders.add(folder)
  return folder
}

function templateFile(): string {
  if (template) return template
  const folder = newFolder()
  template = join(folder, 'template.db')
  const db = openDatabase(template)
  migrate(db)
  // One file, no log beside it: it can be copied.
  db.$client.pragma('wal_checkpoint(TRUNCATE)')
  db.$client.close()
  return template
}

/** A fresh migrated database file; gone when the test process ends. */
export function makeDatabaseFile(): string {
  const file = join(newFolder(), 'test.db')
  copyFileSync(templateFile(), file)
  return file
}

/** An open, fresh, migrated database; closed and gone when the test ends. */
export function openTestDatabase(): Db {
  const file = makeDatabaseFile()
  const db = openDatabase(file)
  open.push({ db, folder: join(file, '..') })
  return db
}

afterEach(() => {
  for (const { db, folder } of open.splice(0)) {
    db.$client.close()
    rmSync(folder, { recursive: true, force: true })
    folders.delete(folder)
  }
})

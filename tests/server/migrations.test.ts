import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { migrate } from '@/db/migrate'
import { openDatabase, type Db } from '@/db/open'
import { addStudios } from '../support/actors'
import { openTestDatabase } from '../support/database'

interface Entry {
  idx: number
  version: string
  when: number
  tag: string
  breakpoints: boolean
}

const OWN = join(process.cwd(), 'db/migrations')
const journalOf = (folder: string) => JSON.parse(readFileSync(join(folder, 'meta/_journal.json'), 'utf8')) as { entries: Entry[] }

let folder: string
let db: Db

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'tenth-summer-migrations-'))
  db = openDatabase(join(folder, 'some.db'))
})
afterEach(() => {
  db.$client.close()
  rmSync(folder, { recursive: true, force: true })
})

/** A copy of the migrations with only the first `count` of them, and then one more of the test's own. */
function migrationsWith(count: number, extra?: string): string {
  const copy = join(folder, `m-${count}-${extra ? 'more' : 'only'}`)
  mkdirSync(join(copy, 'meta'), { recursive: true })
  const journal = journalOf(OWN)
  const entries = journal.entries.slice(0, count)
  for (const { tag } of entries) cpSync(join(OWN, `${tag}.sql`), join(copy, `${tag}.sql`))
  if (extra) {
    const idx = entries.length
    entries.push({ idx, version: '6', when: entries.at(-1)!.when + 1, tag: 'more', breakpoints: true })
    writeFileSync(join(copy, 'more.sql'), extra)
  }
  writeFileSync(join(copy, 'meta/_journal.json'), JSON.stringify({ ...journal, entries }))
  return copy
}

const countOf = (table: string) => (db.$client.prepare(`select count(*) as n from ${table}`).get() as { n: number }).n
const orphans = () => db.$client.pragma('foreign_key_check')

/** What drizzle-kit writes for a changed check: a new table, the rows carried over, the old one dropped, the name taken. */
function rebuildOf(table: string): string {
  const { sql } = db.$client.prepare("select sql from sqlite_master where type = 'table' and name = ?").get(table) as { sql: string }
  const made = sql.replace(/CREATE TABLE [`"]?\w+[`"]?/, `CREATE TABLE \`__new_${table}\``).replaceAll(`"${table}".`, `"__new_${table}".`)
  return [made, `INSERT INTO \`__new_${table}\` SELECT * FROM \`${table}\``, `DROP TABLE \`${table}\``, `ALTER TABLE \`__new_${table}\` RENAME TO \`${table}\``].join(';\n--> statement-breakpoint\n')
}

const columnsOf = (of: Db, table: string) => (of.$client.prepare('select name from pragma_table_info(?)').all(table) as { name: string }[]).map(({ name }) => name)

/** The seed of today in the tables of an earlier version: what those had no column for is left out. */
function seedAsItWas(): void {
  const today = openTestDatabase()
  addStudios(today)
  const tables = db.$client.prepare("select name from sqlite_master where type = 'table' and name not like 'sqlite%' and name not like '%migrations%' and name not like '%_fts%'").all() as { name: string }[]
  db.$client.pragma('foreign_keys = off')
  for (const { name } of tables) {
    const then = new Set(columnsOf(db, name))
    const shared = columnsOf(today, name).filter((column) => then.has(column))
    const put = db.$client.prepare(`insert into "${name}" (${shared.map((column) => `"${column}"`).join(', ')}) values (${shared.map(() => '?').join(', ')})`)
    for (const row of today.$client.prepare(`select * from "${name}"`).all() as Record<string, unknown>[]) put.run(shared.map((column) => row[column]))
  }
  db.$client.pragma('foreign_keys = on')
  expect(orphans()).toEqual([])
}

describe('migrations', () => {
  it('make every table, once, and change nothing when run again', () => {
    expect(migrate(db)).toBe(journalOf(OWN).entries.length)
    expect(migrate(db)).toBe(0)
    expect(db.$client.pragma('integrity_check')).toEqual([{ integrity_check: 'ok' }])
  })

  it('keep the rows of a seeded database of each version through every later one', () => {
    const steps = journalOf(OWN).entries.length
    migrate(db, migrationsWith(1))
    seedAsItWas()
    for (let step = 2; step <= steps; step++) expect(migrate(db, migrationsWith(step))).toBe(1)
    expect([countOf('studios'), countOf('projects'), countOf('facades'), countOf('plants'), countOf('clients')]).toEqual([2, 3, 3, 4, 2])
    expect(orphans()).toEqual([])
  })

  it('rebuild a parent table without taking its children with it', () => {
    migrate(db)
    addStudios(db)
    const all = journalOf(OWN).entries.length
    const before = [countOf('projects'), countOf('facades'), countOf('clients'), countOf('members')]
    expect(migrate(db, migrationsWith(all, rebuildOf('projects')))).toBe(1)
    expect([countOf('projects'), countOf('facades'), countOf('clients'), countOf('members')]).toEqual(before)
    expect(orphans()).toEqual([])
    expect(() => db.$client.prepare("delete from studios where id = 'nobody'").run()).not.toThrow()
    expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
  })

  it('refuse a migration that leaves rows without their parent, and keep nothing of it', () => {
    migrate(db)
    addStudios(db)
    const all = journalOf(OWN).entries.length
    expect(() => migrate(db, migrationsWith(all, "DELETE FROM projects WHERE id = 'project-b'"))).toThrow(/have no parent/)
    expect(countOf('projects')).toBe(3)
    expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
    expect(migrate(db)).toBe(0)
  })

  it('keep nothing of a migration whose second statement fails', () => {
    migrate(db)
    const all = journalOf(OWN).entries.length
    const half = 'CREATE TABLE half (id text);\n--> statement-breakpoint\nCREATE TABLE studios (id text);'
    expect(() => migrate(db, migrationsWith(all, half))).toThrow(/already exists/)
    expect(() => countOf('half')).toThrow(/no such table/)
  })

  it('refuse a database of a newer version', () => {
    const all = journalOf(OWN).entries.length
    migrate(db, migrationsWith(all, 'CREATE TABLE later (id text);'))
    expect(() => migrate(db)).toThrow(/another version/)
  })
})

describe('an open database', () => {
  it('has the settings every connection must have', () => {
    const { $client } = openTestDatabase()
    const settings = ['journal_mode', 'synchronous', 'foreign_keys', 'busy_timeout'].map((name) => $client.pragma(name, { simple: true }))
    expect(settings).toEqual(['wal', 2, 1, 5000])
  })
})

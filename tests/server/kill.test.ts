import { spawn } from 'node:child_process'
import { asc, eq } from 'drizzle-orm'
import { describe, expect, it } from 'vitest'
import { openDatabase } from '@/db/open'
import { edits as editLog, facades } from '@/db/schema'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { applyEdits, type Edit } from '@/lib/sheet'
import type { Placement } from '@/lib/spacing'
import { check } from '@/lib/spacing'
import { addStudios, contextOf, placementAt, put } from '../support/actors'
import { makeDatabaseFile } from '../support/database'

/** Runs the writer, kills it outright a while after its first saved edit, and answers the ids it called saved. */
async function savedUntilKilled(file: string, afterMs: number): Promise<string[]> {
  const writer = spawn(process.execPath, ['--import', 'tsx', 'tests/server/kill-writer.ts', file], { stdio: ['ignore', 'pipe', 'pipe'] })
  let out = ''
  let complaints = ''
  writer.stderr.on('data', (chunk) => (complaints += chunk))
  writer.stdout.on('data', (chunk) => {
    if (out === '') setTimeout(() => writer.kill('SIGKILL'), afterMs)
    out += chunk
  })
  const signal = await new Promise((ended) => writer.on('close', (_, how) => ended(how)))
  expect(signal, complaints).toBe('SIGKILL')
  // A last line cut off by the kill was not called saved.
  return out.split('\n').slice(0, -1)
}

describe('a server killed outright in the middle of a stream of edits', () => {
  it.each([1, 2, 3])('has every edit it called saved, and a sound file (time %i)', async () => {
    const file = makeDatabaseFile()
    const seeded = openDatabase(file)
    addStudios(seeded)
    seeded.$client.close()
    const afterMs = Math.round(50 + Math.random() * 400)

    const saved = await savedUntilKilled(file, afterMs)

    const db = openDatabase(file)
    const where = `killed after ${afterMs} ms and ${saved.length} edits`
    expect(saved.length, where).toBeGreaterThan(3)
    expect(db.$client.pragma('integrity_check', { simple: true }), where).toBe('ok')
    const log = db.select().from(editLog).where(eq(editLog.facadeId, 'facade-a')).orderBy(asc(editLog.seq)).all()
    expect(log.map(({ id }) => id).slice(0, saved.length), where).toEqual(saved)
    // One more may have been kept whose answer nobody heard; never half of one.
    expect(log.length - saved.length, where).toBeLessThanOrEqual(1)
    expect(db.select().from(facades).where(eq(facades.id, 'facade-a')).get()!.seq, where).toBe(log.length)
    const context = contextOf(db, 'designer')
    const { sheet, report, seq } = getSheet(context, { facadeId: 'facade-a' })
    const edits = log.map(({ id, body }): Edit => ({ id, op: 'put', kind: 'placement', value: (body as { value: Placement }).value }))
    expect(sheet, where).toEqual(applyEdits({ ...sheet, placements: [] }, edits))
    expect(report.findings, where).toEqual(check(sheet).findings)
    expect(saveEdits(context, { facadeId: 'facade-a', base: seq, editor: 'after', edits: [put(900_000, placementAt('p1', 33))] }).seq).toBe(seq + 1)
    db.$client.close()
  })
})

/** Saves edits one after the other until it is killed; prints each edit's id, on its own line, once it is saved. */
import { writeSync } from 'node:fs'
import { openDatabase } from '@/db/open'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { contextOf, editId, placementAt, put } from '../support/actors'

const db = openDatabase(process.argv[2]!)
let base = 0
for (let n = 1; ; n++) {
  const edits = [put(n, placementAt(`p${n % 40}`, 6 + (n % 340)))]
  base = saveEdits(contextOf(db, 'designer'), { facadeId: 'facade-a', base, editor: 'writer', edits }).seq
  writeSync(1, `${editId(n)}\n`)
}

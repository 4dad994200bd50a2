import type { CsvProblem } from '@/lib/plants/csv'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { readImport } from './read-import'

export interface ImportPreview {
  /** False when nothing of the file can be taken. */
  isReadable: boolean
  /** Plants in the file, good and bad. */
  total: number
  good: { line: number; botanical: string; common: string; heightMin: number; heightMax: number; spreadMin: number; spreadMax: number }[]
  problems: CsvProblem[]
  notes: { line: number; message: string }[]
}

/** What importing this text would do: the good lines, and every bad cell by line and column. Writes nothing. */
export function previewImport(context: Context, { text }: { text: string }): ImportPreview {
  authorize(context, 'plant:edit')
  const { rows, problems, notes, total, isReadable } = readImport(context, text)
  const good = rows.map(({ line, plant: { botanical, common, heightMin, heightMax, spreadMin, spreadMax } }) => ({
    line, botanical, common, heightMin, heightMax, spreadMin, spreadMax,
  }))
  return { isReadable, total, good, problems, notes }
}

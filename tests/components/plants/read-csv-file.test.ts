import { describe, expect, it } from 'vitest'
import { readCsvFile } from '@/components/plants/read-csv-file'

const NAME = 'Abelia × grandiflora é'
const fileOf = (...bytes: (Uint8Array | number[])[]) => new Blob(bytes.map((part) => new Uint8Array(part)))

describe('a chosen file', () => {
  it('is read as UTF-8, as the UTF-16 of a spreadsheet, or else as Windows text, which is said', async () => {
    expect(await readCsvFile(new Blob([NAME]))).toEqual({ text: NAME, note: '' })
    expect(await readCsvFile(fileOf([0xff, 0xfe], Buffer.from(NAME, 'utf16le')))).toEqual({ text: NAME, note: '' })
    const windows = await readCsvFile(fileOf(Buffer.from(NAME, 'latin1')))
    expect(windows?.text).toBe(NAME)
    expect(windows?.note).toContain('not saved as UTF-8')
  })

  it('is not read beyond 1 MB', async () => {
    expect(await readCsvFile(fileOf(new Uint8Array(1_048_577)))).toBeNull()
    expect(await readCsvFile(fileOf(new Uint8Array(1_048_576)))).not.toBeNull()
  })
})

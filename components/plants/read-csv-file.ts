/** The text of a file a spreadsheet saved, in whatever encoding it chose. */

export interface FileText {
  text: string
  /** What the person should know about how it was read; '' when there is nothing. */
  note: string
}

const MAX_BYTES = 1_048_576

function decode(bytes: Uint8Array): FileText {
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)) {
    return { text: new TextDecoder(bytes[0] === 0xff ? 'utf-16le' : 'utf-16be').decode(bytes), note: '' }
  }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), note: '' }
  } catch {
    return {
      text: new TextDecoder('windows-1252').decode(bytes),
      note: 'The file is not saved as UTF-8; it was read as Windows text. Look over names with accents or ×.',
    }
  }
}

/** Reads a chosen file. A file over 1 MB is not read: it answers null. */
export async function readCsvFile(file: Blob): Promise<FileText | null> {
  if (file.size > MAX_BYTES) return null
  return decode(new Uint8Array(await file.arrayBuffer()))
}

/** The two questions of an import, asked of the server. */
import type { ErrorBody } from '@/lib/errors'

export interface LineProblem {
  line: number
  column: string
  message: string
}

export interface Preview {
  isReadable: boolean
  total: number
  good: { line: number; botanical: string; common: string; heightMin: number; heightMax: number; spreadMin: number; spreadMax: number }[]
  problems: LineProblem[]
  notes: { line: number; message: string }[]
}

export type ImportMode = 'good-rows' | 'all-or-none'

type Answer<T> = { ok: true; value: T } | { ok: false; message: string }

async function post<T>(path: string, body: object, signal: AbortSignal): Promise<Answer<T>> {
  try {
    const response = await fetch(path, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body), signal })
    const answer = (await response.json()) as T & Partial<ErrorBody>
    return response.ok ? { ok: true, value: answer } : { ok: false, message: answer.error?.message ?? 'The server answered in a way that cannot be read.' }
  } catch {
    return { ok: false, message: signal.aborted ? 'Stopped.' : 'The server could not be reached. Your text is still here: try again.' }
  }
}

/** What bringing in this text would do. */
export const askPreview = (text: string, signal: AbortSignal) => post<Preview>('/api/plants/import/preview', { text }, signal)

/** Brings the plants in. */
export const askImport = (text: string, mode: ImportMode, signal: AbortSignal) =>
  post<{ added: number; problems: LineProblem[] }>('/api/plants/import', { text, mode }, signal)

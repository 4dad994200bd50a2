/** The server's two doors that measuring uses, as promises that never reject. */
import type { ErrorBody } from '@/lib/errors'
import type { Answer, SheetCalls } from './saver'

const OFFLINE = 'the server cannot be reached. What you measured waits on this page.'

async function ask<T>(address: string, init?: RequestInit): Promise<Answer<T>> {
  try {
    const response = await fetch(address, init)
    const body = (await response.json()) as T & Partial<ErrorBody>
    if (response.ok) return { ok: true, value: body }
    return { ok: false, status: response.status, message: body.error?.message ?? `the server answered ${response.status}.` }
  } catch {
    return { ok: false, status: 0, message: OFFLINE }
  }
}

/** Calls for the sheet of one facade. */
export function sheetCalls(facadeId: string): SheetCalls {
  const address = `/api/facades/${encodeURIComponent(facadeId)}`
  return {
    saveEdits: (body) =>
      ask(`${address}/edits`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body), keepalive: JSON.stringify(body).length < 60_000 }),
    readSheet: () => ask(`${address}/sheet`),
  }
}

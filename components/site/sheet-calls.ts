/** The two doors of the server that saving uses, as promises that never reject. */
import type { ErrorBody } from '@/lib/errors'
import type { Answer, SaveCalls } from '../drawing-table/editor/save-calls'

const OUT_OF_REACH = 'The server cannot be reached just now.'

/** Place in the batch that the first problem points at. */
function placeOf(body: Partial<ErrorBody>): number | undefined {
  const path = body.error?.problems?.[0]?.path
  return path?.[0] === 'edits' && typeof path[1] === 'number' ? path[1] : undefined
}

async function ask<T>(address: string, init?: RequestInit): Promise<Answer<T>> {
  try {
    const response = await fetch(address, init)
    const body = (await response.json()) as T & Partial<ErrorBody>
    if (response.ok) return { ok: true, value: body }
    const at = placeOf(body)
    return { ok: false, status: response.status, message: body.error?.message ?? `The server answered ${response.status}.`, ...(at !== undefined && { at }) }
  } catch {
    return { ok: false, status: 0, message: OUT_OF_REACH }
  }
}

/** Calls for the sheet of one facade. */
export function sheetCalls(facadeId: string): SaveCalls {
  const address = `/api/facades/${encodeURIComponent(facadeId)}`
  return {
    saveEdits: (body) => ask(`${address}/edits`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) }),
    readSheet: () => ask(`${address}/sheet`),
  }
}

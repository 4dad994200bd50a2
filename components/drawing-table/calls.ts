/** The server's two doors that the drawing table uses, as promises that never reject. */
import type { ErrorBody } from '@/lib/errors'
import type { Answer, SaveCalls } from './editor'

const OFFLINE = 'The server cannot be reached.'

/** A page ahead of the server (its data were put back) must not take its edits for bad ones. */
const isAboutBase = ({ problems = [] }: ErrorBody['error']) => problems.some(({ path }) => path[0] === 'base')

/** Which edit of the batch a refusal is about: problems are named by paths such as ["edits", 3, "value", "x"]. */
function placeOf({ problems = [] }: ErrorBody['error']): number | undefined {
  const at = problems.map(({ path }) => (path[0] === 'edits' ? path[1] : undefined)).find((step) => typeof step === 'number')
  return typeof at === 'number' ? at : undefined
}

/** One request whose answer is data, whatever goes wrong. */
export async function ask<T>(address: string, init?: RequestInit): Promise<Answer<T>> {
  try {
    const response = await fetch(address, init)
    const body = (await response.json()) as T & Partial<ErrorBody>
    if (response.ok) return { ok: true, value: body }
    const { error } = body
    const at = error && placeOf(error)
    const message = error?.problems?.[0]?.message ?? error?.message ?? `The server answered ${response.status}.`
    const status = error && isAboutBase(error) ? 400 : response.status
    return { ok: false, status, message, ...(at !== undefined && { at }) }
  } catch {
    return { ok: false, status: 0, message: OFFLINE }
  }
}

/** Calls for the sheet of one facade. */
export function saveCalls(facadeId: string): SaveCalls {
  const address = `/api/facades/${encodeURIComponent(facadeId)}`
  return {
    saveEdits: (body) => ask(`${address}/edits`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) }),
    readSheet: () => ask(`${address}/sheet`, { cache: 'no-store' }),
  }
}

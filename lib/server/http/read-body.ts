import { AppError } from '@/lib/errors'

function tooLarge(maxBytes: number) {
  return new AppError('too-large', `This is too large: at most ${Math.floor(maxBytes / 1024)} KiB are read.`)
}

/** The body as text. Stops reading at the limit, whatever length was announced. Throws AppError('too-large' | 'unreadable'). */
export async function readText(request: Request, maxBytes: number): Promise<string> {
  if (Number(request.headers.get('content-length') ?? 0) > maxBytes) throw tooLarge(maxBytes)
  const chunks: Uint8Array[] = []
  let length = 0
  const reader = request.body?.getReader()
  for (let part = await reader?.read(); part?.value; part = await reader!.read()) {
    length += part.value.byteLength
    if (length > maxBytes) {
      await reader!.cancel()
      throw tooLarge(maxBytes)
    }
    chunks.push(part.value)
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks))
  } catch (cause) {
    throw new AppError('unreadable', 'This is not UTF-8 text.', { cause })
  }
}

/** The body as JSON. Throws AppError('too-large' | 'unreadable'). */
export async function readJson(request: Request, maxBytes: number): Promise<unknown> {
  const text = await readText(request, maxBytes)
  try {
    return JSON.parse(text)
  } catch (cause) {
    throw new AppError('unreadable', 'This is not JSON.', { cause })
  }
}

import { AppError } from '@/lib/errors'

/**
 * Refuses a change asked for by a page of another site. Browsers say where a request comes from: `Sec-Fetch-Site`,
 * and `Origin` on every post. A caller that sends neither is no browser, and carries nobody's cookies unasked.
 * Throws AppError('cross-site').
 */
export function refuseCrossSite({ headers }: Pick<Request, 'headers'>): void {
  const site = headers.get('sec-fetch-site')
  if (site !== null && site !== 'same-origin' && site !== 'none') throw new AppError('cross-site')
  const origin = headers.get('origin')
  if (origin === null) return
  const hosts = [headers.get('host'), headers.get('x-forwarded-host')]
  if (!URL.canParse(origin) || !hosts.includes(new URL(origin).host)) throw new AppError('cross-site')
}

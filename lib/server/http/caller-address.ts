/**
 * The network address a request came from, for counting attempts: the last entry of X-Forwarded-For, the one the
 * nearest proxy wrote (Next writes the socket's own when there is none). Without a proxy a caller can make it up,
 * which is why attempts are counted by account as well.
 */
export function callerAddress(headers: Pick<Headers, 'get'>): string {
  return headers.get('x-forwarded-for')?.split(',').at(-1)?.trim().slice(0, 64) || 'unknown'
}

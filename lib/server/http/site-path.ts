/** Stands in for our own address; nothing is ever fetched from it. */
const HERE = 'http://here.invalid'

/**
 * Where to go on after signing in, when it is a path of this site; null for anything else: another site, a path that
 * a browser reads as another site (`//there`, `/\there`), an address that cannot be read.
 */
export function sitePath(wanted: unknown): string | null {
  if (typeof wanted !== 'string' || !wanted.startsWith('/') || wanted.length > 2000) return null
  if (!URL.canParse(wanted, HERE)) return null
  const { origin, pathname, search, hash } = new URL(wanted, HERE)
  return origin === HERE && !pathname.startsWith('//') ? `${pathname}${search}${hash}` : null
}

/** Security headers of every answer. Nothing is decided here: who may see what is the operations' own. */
import { NextResponse, type NextRequest } from 'next/server'

/**
 * sonner appends an empty <style> and then fills it: both states need a hash. A test recomputes them from the
 * installed package.
 */
export const SONNER_STYLES = ['sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU=', 'sha256-StEaX+se6YS7pqjzrzMIA0KaX9zF/8zAhvQXZAe5epY=']

/** The content security policy of a page whose scripts and styles carry this nonce. */
export function policyOf(nonce: string, isDevelopment: boolean): string {
  const hashes = SONNER_STYLES.map((hash) => `'${hash}'`).join(' ')
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ''}`,
    // The development overlay injects dozens of styles.
    ...(isDevelopment ? ["style-src 'self' 'unsafe-inline'"] : [`style-src-elem 'self' 'nonce-${nonce}' ${hashes}`, "style-src-attr 'unsafe-inline'"]),
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ')
}

export function proxy(request: NextRequest) {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64')
  const policy = policyOf(nonce, process.env.NODE_ENV === 'development')
  // Next finds the nonce for its own scripts in the headers of the request.
  const headers = new Headers(request.headers)
  headers.set('x-nonce', nonce)
  headers.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('content-security-policy', policy)
  // Client links carry a secret in their address: it must not travel on in a referrer.
  response.headers.set('referrer-policy', 'same-origin')
  response.headers.set('x-content-type-options', 'nosniff')
  response.headers.set('x-frame-options', 'DENY')
  response.headers.set('cross-origin-opener-policy', 'same-origin')
  response.headers.set('permissions-policy', 'camera=(), microphone=(), geolocation=()')
  if (process.env.COOKIE_SECURE === '1') response.headers.set('strict-transport-security', 'max-age=31536000')
  return response
}

// Uploads stay out: a body that passes here is cut at 10 MB without an error.
export const config = { matcher: ['/((?!api/upload|_next/static|_next/image|favicon.ico).*)'] }

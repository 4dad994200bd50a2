import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { NextRequest } from 'next/server'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { config, policyOf, proxy, SONNER_STYLES } from '@/proxy'

const ask = (path = '/projects') => proxy(new NextRequest(`http://127.0.0.1:3000${path}`))
afterEach(() => vi.unstubAllEnvs())

describe('the headers of a page', () => {
  it('carry a policy with a fresh nonce that the page itself is told', () => {
    const [one, two] = [ask(), ask()]
    const nonceOf = (response: Response) => /script-src [^;]*'nonce-([^']+)'/.exec(response.headers.get('content-security-policy')!)![1]!
    expect(nonceOf(one)).not.toBe(nonceOf(two))
    expect(one.headers.get('x-middleware-request-x-nonce')).toBe(nonceOf(one))
    expect(one.headers.get('x-middleware-request-content-security-policy')).toBe(one.headers.get('content-security-policy'))
  })

  it('allow no inline script, no eval, no frame and no other host', () => {
    const policy = policyOf('abc', false)
    const scripts = policy.split('; ').find((line) => line.startsWith('script-src'))
    expect(scripts).toBe("script-src 'self' 'nonce-abc' 'strict-dynamic'")
    for (const line of ["default-src 'self'", "object-src 'none'", "base-uri 'self'", "form-action 'self'", "frame-ancestors 'none'", "connect-src 'self'"]) expect(policy.split('; ')).toContain(line)
    expect(policy).not.toMatch(/https?:|unsafe-eval/)
    expect(policyOf('abc', true)).toContain("'unsafe-eval'")
  })

  it('keep types as sent, addresses to ourselves, and pages out of frames', () => {
    const { headers } = ask('/api/health')
    expect(Object.fromEntries(['x-content-type-options', 'referrer-policy', 'x-frame-options'].map((name) => [name, headers.get(name)]))).toEqual({
      'x-content-type-options': 'nosniff', 'referrer-policy': 'same-origin', 'x-frame-options': 'DENY',
    })
    expect(headers.get('strict-transport-security')).toBeNull()
    vi.stubEnv('COOKIE_SECURE', '1')
    expect(ask().headers.get('strict-transport-security')).toMatch(/max-age/)
  })

  it('are on pages and the API, not on uploads and built files', () => {
    const isCovered = (path: string) => new RegExp(`^${config.matcher[0]!}$`).test(path)
    expect(['/', '/projects', '/api/facades/1/edits', '/c/token'].map(isCovered)).toEqual([true, true, true, true])
    expect(['/api/upload/1', '/_next/static/a.js', '/favicon.ico'].map(isCovered)).toEqual([false, false, false])
  })

  it('let in the styles that the installed sonner puts on a page', () => {
    const source = readFileSync('node_modules/sonner/dist/index.mjs', 'utf8')
    const css = /__insertCSS\((".*?(?<!\\)")\)/s.exec(source)?.[1]
    const hashOf = (text: string) => `sha256-${createHash('sha256').update(text).digest('base64')}`
    expect(css, 'sonner no longer puts its styles in this way').toBeTruthy()
    expect(SONNER_STYLES).toEqual([hashOf(''), hashOf(JSON.parse(css!) as string)])
  })
})

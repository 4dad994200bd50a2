/** Stands in for the part of Next that hands a request's cookies and headers to our code. Not our code: mocked. */
import { vi } from 'vitest'

export interface CookieSet {
  name: string
  value: string
  options: Record<string, unknown>
}

const edge = vi.hoisted(() => ({ cookies: new Map<string, string>(), headers: new Headers(), set: [] as unknown[] }))

vi.mock('next/headers', () => ({
  cookies: async () => ({
    get: (name: string) => (edge.cookies.has(name) ? { name, value: edge.cookies.get(name)! } : undefined),
    set: (name: string, value: string, options: Record<string, unknown>) => {
      edge.cookies.set(name, value)
      edge.set.push({ name, value, options })
    },
    delete: (name: string) => edge.cookies.delete(name),
  }),
  headers: async () => edge.headers,
}))

/** The browser's cookies, the request's headers, and what was set. */
export const browser = edge as { cookies: Map<string, string>; headers: Headers; set: CookieSet[] }

export function newBrowser(): void {
  edge.cookies.clear()
  edge.headers = new Headers()
  edge.set.length = 0
}

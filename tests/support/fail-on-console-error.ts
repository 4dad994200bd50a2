/** An unexpected console.error fails the test it happens in. */
import { afterEach, beforeEach, expect, vi } from 'vitest'

beforeEach(() => {
  vi.spyOn(console, 'error').mockImplementation(() => {})
})

afterEach(() => {
  const spy = vi.mocked(console.error)
  const calls = spy.mock.calls.map((call) => call.map(String).join(' '))
  spy.mockRestore()
  expect(calls, 'console.error was called').toEqual([])
})

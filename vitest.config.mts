import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

export default defineConfig({
  resolve: {
    alias: [
      { find: /^@\//, replacement: fileURLToPath(new URL('./', import.meta.url)) },
      // `server-only` throws outside Next; tests run server code on purpose.
      { find: 'server-only', replacement: fileURLToPath(new URL('./tests/support/empty.ts', import.meta.url)) },
    ],
  },
  test: {
    pool: 'forks',
    include: ['tests/{lib,server,reference,golden,components}/**/*.test.{ts,tsx}'],
    setupFiles: ['./tests/support/fail-on-console-error.ts'],
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
})

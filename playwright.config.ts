import { defineConfig } from '@playwright/test'

const PORT = Number(process.env.E2E_PORT ?? 3112)

export default defineConfig({
  testDir: './tests/e2e',
  outputDir: './test-results/browser',
  workers: 1,
  fullyParallel: false,
  retries: 0,
  timeout: 60_000,
  reporter: [['list'], ['json', { outputFile: process.env.PLAYWRIGHT_JSON_OUTPUT_NAME ?? './test-results/playwright.json' }]],
  use: {
    baseURL: `http://127.0.0.1:${PORT}`,
    browserName: 'chromium',
    launchOptions: {
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking',
        '--disable-component-update', '--disable-sync',
      ],
    },
    trace: 'off',
    screenshot: 'only-on-failure',
  },
  projects: [
    { name: 'laptop', use: { viewport: { width: 1440, height: 900 } }, testIgnore: /\.(touch|phone)\.spec/ },
    { name: 'tablet', use: { viewport: { width: 1180, height: 820 }, hasTouch: true }, testMatch: /\.touch\.spec/ },
    { name: 'phone', use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 }, testMatch: /\.phone\.spec/ },
  ],
  webServer: {
    command: 'node scripts/e2e-server.mjs',
    url: `http://127.0.0.1:${PORT}/api/health`,
    reuseExistingServer: false,
    timeout: 120_000,
    env: { E2E_PORT: String(PORT), DATABASE_FILE: './.data/e2e.db' },
    stdout: 'ignore',
    stderr: 'pipe',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5000 },
  },
})

// Brings what the tests need and runs them all: lint, types, import rules, unit, reference, server and browser tests.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs'
import { install, root, run, say, tool } from './lib.mjs'

const out = `${root}/test-results`
const total = { passed: 0, failed: 0, skipped: 0 }
const times = []

function step(name, act) {
  say(`\n== ${name}`)
  const began = Date.now()
  const { passed, failed, skipped = 0 } = act()
  total.passed += passed
  total.failed += failed
  total.skipped += skipped
  times.push(`${name}: ${passed} passed, ${failed} failed (${Math.round((Date.now() - began) / 1000)} s)`)
}

const asCount = (ok) => (ok ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 })

function readJson(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null
}

/** Vitest's report; a run that broke off without one counts as a failure. */
function vitest() {
  const file = `${out}/vitest.json`
  const ok = tool('vitest', ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${file}`])
  const report = readJson(file)
  if (!report) return asCount(false)
  const { numPassedTests: passed, numFailedTests, numPendingTests: skipped } = report
  return { passed, failed: Math.max(numFailedTests, ok ? 0 : 1), skipped }
}

function playwright() {
  const file = `${out}/playwright.json`
  const ok = tool('playwright', ['test'], { env: { PLAYWRIGHT_JSON_OUTPUT_NAME: file } })
  const report = readJson(file)
  if (!report) return asCount(false)
  const { expected, unexpected, flaky, skipped } = report.stats
  return { passed: expected, failed: Math.max(unexpected + flaky, ok ? 0 : 1), skipped }
}

/** Chromium from Debian's packages, unless one stands already. */
function bringBrowser() {
  const path = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium'
  if (existsSync(path)) return true
  const isRoot = process.getuid?.() === 0
  if (!isRoot || !existsSync('/usr/bin/apt-get')) {
    say(`The browser tests need Chromium at ${path}. On Debian: apt-get install chromium. Elsewhere set CHROMIUM_PATH to one.`)
    return false
  }
  say('Installing Chromium from Debian.')
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  return run('apt-get', ['update', '-qq'], { env }) && run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], { env })
}

install()
rmSync(out, { recursive: true, force: true })
mkdirSync(out, { recursive: true })

step('types', () => asCount(tool('next', ['typegen']) && tool('tsc', ['--noEmit'])))
step('lint', () => asCount(tool('eslint', ['.', '--max-warnings', '0'])))
step('import rules', () =>
  asCount(tool('depcruise', ['--config', '.dependency-cruiser.cjs', 'app', 'components', 'db', 'lib', 'seed', 'scripts'])))
step('migrations match the tables', () => asCount(tool('drizzle-kit', ['check'])))
step('unit, reference and server tests', vitest)
step('browser', () => asCount(bringBrowser()))
step('build', () => asCount(tool('next', ['build'])))
step('browser tests', playwright)

say(`\n${times.join('\n')}\n`)
say(`${total.passed} passed, ${total.failed} failed${total.skipped > 0 ? `, ${total.skipped} skipped` : ''}`)
process.exit(total.failed === 0 ? 0 : 1)

/** The lint of who may import whom really bites: each planted violation is found, and under its own rule. */
import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { spawnSync } from 'node:child_process'
import { afterEach, expect, test } from 'vitest'

const root = process.cwd()
const planted: string[] = []

function plant(path: string, source: string) {
  const file = join(root, path)
  mkdirSync(dirname(file), { recursive: true })
  writeFileSync(file, source)
  planted.push(file)
  return file
}

function rulesBrokenBy(path: string): string[] {
  const { stdout } = spawnSync(
    join(root, 'node_modules/.bin/depcruise'),
    ['--config', '.dependency-cruiser.cjs', '--output-type', 'json', path],
    { cwd: root, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 },
  )
  const report = JSON.parse(stdout) as { summary: { violations: { from: string; rule: { name: string } }[] } }
  return report.summary.violations.filter(({ from }) => from === path).map(({ rule }) => rule.name)
}

afterEach(() => {
  for (const file of planted.splice(0)) rmSync(file, { force: true })
})

test.each([
  ['lib/spacing/planted-violation.ts', "import type { Db } from '../../db/open'\nexport type Planted = Db\n", 'spacing-stands-alone'],
  ['lib/access/planted-violation.ts', "import { readFileSync } from 'node:fs'\nexport const planted = readFileSync\n", 'pure-lib-has-no-node'],
  ['components/ui/planted-violation.ts', "import { getDb } from '@/db/client'\nexport const planted = getDb\n", 'components-are-given-data'],
  ['components/ui/planted-canvas.ts', "import Konva from 'konva'\nexport const planted = Konva\n", 'konva-stays-in-the-canvas'],
  ['app/planted-violation.ts', "import { getDb } from '@/db/client'\nexport const planted = getDb\n", 'app-leaves-db-to-operations'],
])('%s is refused', (path, source, rule) => {
  plant(path, source)
  expect(rulesBrokenBy(path)).toContain(rule)
})

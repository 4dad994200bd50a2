/** The check as a command: what it prints, what it refuses, how it ends. */
import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { check, ENGINE_VERSION, waysOut, type Finding, type Sheet } from '@/lib/spacing'

const GOLDEN = 'tests/golden/kitchen-window.json'
const golden = JSON.parse(readFileSync(GOLDEN, 'utf8')) as Sheet
let folder: string

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'check-command-'))
})
afterAll(() => rmSync(folder, { recursive: true, force: true }))

/** Writes a file as given, or as JSON. */
function fileOf(name: string, content: unknown): string {
  const path = join(folder, name)
  writeFileSync(path, typeof content === 'string' ? content : JSON.stringify(content))
  return path
}

function run(...args: string[]) {
  const { status, stdout, stderr } = spawnSync('node_modules/.bin/tsx', ['scripts/check.ts', ...args], { encoding: 'utf8' })
  return { status, stdout, stderr }
}

/** The golden bed with its first shrub moved against the wall: too near it at every size. */
const crowdedWall: Sheet = { ...golden, placements: golden.placements.map((one, i) => (i === 0 ? { ...one, y: 10 } : one)) }

describe('a sheet it can read', () => {
  test('without a conflict ends with 0, a line for each finding', () => {
    const { status, stdout, stderr } = run(GOLDEN)
    expect([status, stderr]).toEqual([0, ''])
    expect(stdout.trimEnd().split('\n')).toHaveLength(check(golden).findings.length)
    expect(stdout).toMatch(/^Risk {6}Exemplum rotundum: .+\. {2}\[a1\]$/m)
  })

  test('with a conflict ends with 1 and says it first', () => {
    const { status, stdout } = run(fileOf('wall.json', crowdedWall))
    expect(status).toBe(1)
    expect(stdout).toMatch(/^Conflict {2}Exemplum rotundum: .+ \[a1\]\n/)
  })

  test('without findings says so', () => {
    const { status, stdout } = run(fileOf('empty.json', { ...golden, placements: [], beds: [], facade: { ...golden.facade, fall: 0.06 } }))
    expect([status, stdout]).toEqual([0, 'Nothing to say: every plant keeps its place.\n'])
  })

  test('asked for ways out it says one below each finding, or that there is none', () => {
    const { stdout } = run('--ways-out', fileOf('wall-out.json', crowdedWall))
    expect(stdout).toMatch(/^Conflict {2}Exemplum rotundum: .+\n {10}(Move|Keep|Swap|No way out)/m)
    const { findings } = JSON.parse(run('--ways-out', '--json', fileOf('wall-json.json', crowdedWall)).stdout) as { findings: Finding[] }
    expect(findings[0]!.remedies).toEqual(waysOut(crowdedWall, check(crowdedWall).findings[0]!))
  })

  test('as JSON it is the report itself, wherever the flag stands, with the same ending', () => {
    const { status, stdout } = run('--json', fileOf('wall-too.json', crowdedWall))
    expect(status).toBe(1)
    expect(JSON.parse(stdout)).toEqual(JSON.parse(JSON.stringify(check(crowdedWall))))
    expect(JSON.parse(stdout).engine).toBe(ENGINE_VERSION)
  })
})

describe('what it refuses, with 2 and nothing on the way out', () => {
  const refused = (...args: string[]) => {
    const { status, stdout, stderr } = run(...args)
    expect([status, stdout]).toEqual([2, ''])
    return stderr
  }

  test('broken JSON, by the name of the file', () => {
    const path = fileOf('broken.json', '{ "version": 1,')
    expect(refused(path)).toContain(`${path} could not be read`)
  })
  test('a file that is not there', () => expect(refused(join(folder, 'nowhere.json'))).toContain('nowhere.json could not be read'))
  test('unknown keys, each by its path', () => {
    const path = fileOf('keys.json', { ...golden, colour: 1, openings: golden.openings.map((one) => ({ ...one, glass: 2 })) })
    const said = refused(path)
    expect(said).toContain('colour: There is no field "colour" here.')
    expect(said).toContain('openings[0].glass: There is no field "glass" here.')
  })
  test('fields at odds with each other, by path', () => {
    const path = fileOf('sill.json', { ...golden, openings: golden.openings.map((one) => ({ ...one, sill: 100 })) })
    expect(refused(path, '--json')).toContain('openings[0].sill: The sill must be below the head.')
  })
  test('JSON that is no sheet at all', () => expect(refused(fileOf('list.json', '[1, 2]'))).toContain('(the whole)'))
  test('no file, two files, an unknown flag', () => {
    expect(refused()).toContain('Give one file')
    expect(refused(GOLDEN, GOLDEN)).toContain('Give one file')
    expect(refused(GOLDEN, '--loud')).toContain('--loud')
  })
})

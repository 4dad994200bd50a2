/** `npm run check -- FILE.json [--json]`: judges a sheet. Exit 0 no conflict, 1 conflicts, 2 unreadable. */
import { readFileSync } from 'node:fs'
import { parseArgs } from 'node:util'
import { parseSheet, pathText } from '@/lib/sheet'
import { check, describe, type FindingKind, type Report, type Sheet } from '@/lib/spacing'

const MARKS: Record<FindingKind, string> = { conflict: 'Conflict', risk: 'Risk', held: 'Held', note: 'Note' }

function refuse(lines: string[]): never {
  for (const line of lines) console.error(line)
  process.exit(2)
}

function readArguments() {
  try {
    return parseArgs({ allowPositionals: true, options: { json: { type: 'boolean', default: false } } })
  } catch (error) {
    return refuse([error instanceof Error ? error.message : String(error)])
  }
}

function readSheet(file: string): Sheet {
  let input: unknown
  try {
    input = JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    return refuse([`${file} could not be read: ${error instanceof Error ? error.message : String(error)}`])
  }
  const parsed = parseSheet(input)
  if (parsed.ok) return parsed.sheet
  return refuse([`${file} is not a sheet:`, ...parsed.problems.map(({ path, message }) => `  ${pathText(path) || '(the whole)'}: ${message}`)])
}

function print(report: Report, sheet: Sheet) {
  if (report.findings.length === 0) console.log('Nothing to say: every plant keeps its place.')
  for (const finding of report.findings) {
    const { title, sentence } = describe(finding, sheet)
    console.log(`${MARKS[finding.kind].padEnd(8)}  ${title}: ${sentence}  [${finding.placements.join(', ')}]`)
  }
}

const { values, positionals } = readArguments()
const [file, ...more] = positionals
if (!file || more.length > 0) refuse(['Give one file: npm run check -- FILE.json [--json]'])
const sheet = readSheet(file)
const report = check(sheet)
if (values.json) console.log(JSON.stringify(report, null, 2))
else print(report, sheet)
process.exit(report.findings.some(({ kind }) => kind === 'conflict') ? 1 : 0)

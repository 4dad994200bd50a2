/** `npm run check -- FILE.json [--json] [--ways-out]`: judges a sheet. Exit 0 no conflict, 1 conflicts, 2 unreadable. */
import { readFileSync } from 'node:fs'
import { parseArgs } from 'node:util'
import { parseSheet, pathText } from '@/lib/sheet'
import { check, describe, describeRemedy, NO_WAY_OUT, waysOut, type Finding, type FindingKind, type Report, type Sheet } from '@/lib/spacing'

const MARKS: Record<FindingKind, string> = { conflict: 'Conflict', risk: 'Risk', held: 'Held', note: 'Note' }

function refuse(lines: string[]): never {
  for (const line of lines) console.error(line)
  process.exit(2)
}

function readArguments() {
  try {
    return parseArgs({ allowPositionals: true, options: { json: { type: 'boolean', default: false }, 'ways-out': { type: 'boolean', default: false } } })
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

const isToMend = ({ kind, placements }: Finding) => (kind === 'conflict' || kind === 'risk') && placements.length > 0

/** The report with the ways out of each finding that wants one. */
function withWaysOut(report: Report, sheet: Sheet): Report {
  return { ...report, findings: report.findings.map((finding) => ({ ...finding, remedies: waysOut(sheet, finding) })) }
}

function print(report: Report, sheet: Sheet) {
  if (report.findings.length === 0) console.log('Nothing to say: every plant keeps its place.')
  for (const finding of report.findings) {
    const { title, sentence } = describe(finding, sheet)
    const named = finding.placements.length > 0 ? `  [${finding.placements.join(', ')}]` : ''
    console.log(`${MARKS[finding.kind].padEnd(8)}  ${title}: ${sentence}${named}`)
    if (!values['ways-out'] || !isToMend(finding)) continue
    const ways = finding.remedies.map((remedy) => describeRemedy(remedy, finding, sheet))
    for (const way of ways.length > 0 ? ways : [NO_WAY_OUT]) console.log(`${' '.repeat(10)}${way}`)
  }
}

const { values, positionals } = readArguments()
const [file, ...more] = positionals
if (!file || more.length > 0) refuse(['Give one file: npm run check -- FILE.json [--json] [--ways-out]'])
const sheet = readSheet(file)
const report = values['ways-out'] ? withWaysOut(check(sheet), sheet) : check(sheet)
if (values.json) console.log(JSON.stringify(report, null, 2))
else print(report, sheet)
process.exit(report.findings.some(({ kind }) => kind === 'conflict') ? 1 : 0)

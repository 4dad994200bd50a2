/**
 * `npm run bench`: the full check beside two plain versions of the same questions, one moved placement, and growth with size.
 * All in one run on one machine; read the ratios, not the milliseconds. Never a test: tests check that the versions agree.
 */
import { readPlants } from '../reference/library'
import { check, checkPlacement, fitsHere, prepare, type Placement, type Sheet } from '@/lib/spacing'
import { allPairs } from './all-pairs'
import { byPolygons } from './by-polygons'
import { onFlatbush } from './on-flatbush'
import { frontOf } from './scenes'

interface Timing { ms: number; runs: number }

/** Runs before the watch starts, so that whoever comes first does not pay for compiling. */
const WARM_RUNS = 8

/** Median over several runs, warmed up (not where one run takes seconds). */
function time(work: () => unknown, { runs, warm = true }: { runs: number; warm?: boolean }): Timing {
  if (warm) for (let i = 0; i < WARM_RUNS; i++) work()
  const taken = Array.from({ length: runs }, () => {
    const start = performance.now()
    work()
    return performance.now() - start
  }).sort((a, b) => a - b)
  const middle = Math.floor(runs / 2)
  return { ms: runs % 2 ? taken[middle]! : (taken[middle - 1]! + taken[middle]!) / 2, runs }
}

const milliseconds = (ms: number) => (ms >= 1000 ? `${(ms / 1000).toFixed(2)} s` : ms >= 1 ? `${ms.toFixed(1)} ms` : `${(ms * 1000).toFixed(0)} us`)
const times = (ratio: number) => (ratio >= 100 ? ratio.toFixed(0) : ratio >= 10 ? ratio.toFixed(1) : ratio.toPrecision(2))

function print(rows: string[][]) {
  const widths = rows[0]!.map((_, column) => Math.max(...rows.map((row) => row[column]!.length)))
  for (const row of rows) console.log(`  ${row.map((cell, i) => (i === 0 ? cell.padEnd(widths[i]!) : cell.padStart(widths[i]!))).join('   ')}`)
}

/** Every placement moved an inch along the wall, in turn; the time of one. */
function moving(sheet: Sheet): Timing {
  const prepared = prepare(sheet)
  const moved = sheet.placements.map((placement) => ({ ...placement, x: placement.x + 1 }))
  const all = time(() => moved.map((placement) => checkPlacement(prepared, placement)), { runs: 7 })
  return { ms: all.ms / moved.length, runs: all.runs }
}

function compare(count: number) {
  const sheet = frontOf(count)
  const full = time(() => check(sheet), { runs: 15 })
  const move = moving(sheet)
  const figures = time(() => JSON.stringify(check(sheet)), { runs: 7 })
  const flat = time(() => onFlatbush(sheet), { runs: 9 })
  const pairs = time(() => allPairs(sheet), { runs: count > 200 ? 1 : 3, warm: false })
  const polygons = count > 200 ? null : time(() => byPolygons(sheet), { runs: count > 100 ? 1 : 3, warm: false })
  const findings = check(sheet).findings.length
  console.log(`\n${count} placements, ${sheet.openings.length} windows, ${sheet.walks.length} walks: ${findings} findings`)
  const row = (name: string, { ms, runs }: Timing) => [name, milliseconds(ms), `${times(ms / full.ms)} x`, `${runs}`]
  print([
    ['', 'median', 'of the full check', 'runs'],
    row('full check, all rules', full),
    row('with windows, cover, pockets, upkeep', figures),
    row('all rules, flatbush for the grid', flat),
    row('one moved placement, size and neighbour rules', move),
    row('six rules, every pair, same arithmetic', pairs),
    ...(polygons ? [row('six rules, polygon library', polygons)] : []),
  ])
}

/** What fits at a spot, over the whole library, beside checking the sheet anew with each candidate in turn. */
function fitting() {
  const sheet = frontOf(60)
  const library = readPlants()
  const spot = { x: 600, y: 70 }
  const prepared = prepare(sheet)
  const fast = time(() => fitsHere(prepared, spot, library), { runs: 15 })
  const candidate = (id: string): Placement => ({ id: 'new', plant: id, ...spot, planted: { height: 6, spread: 6 } })
  const slow = time(() => library.map((plant) => check({ ...sheet, plants: [...sheet.plants, plant], placements: [...sheet.placements, candidate(plant.id)] }).findings), { runs: 1, warm: false })
  console.log(`\nWhat fits at a spot among 60 plants, ${library.length} plants of the library`)
  print([
    ['', 'median', 'of fits-here', 'runs'],
    ['fits-here, with the frontier', milliseconds(fast.ms), '1.0 x', `${fast.runs}`],
    ['each candidate by a full check', milliseconds(slow.ms), `${times(slow.ms / fast.ms)} x`, `${slow.runs}`],
  ])
}

function growth() {
  const [small, large] = [frontOf(500), frontOf(5000)]
  const [few, many] = [time(() => check(small), { runs: 7 }), time(() => check(large), { runs: 3 })]
  console.log('\nTen times the front at the same density')
  print([
    ['', 'median', 'of 500', 'runs'],
    ['500 placements', milliseconds(few.ms), '1.0 x', `${few.runs}`],
    ['5,000 placements', milliseconds(many.ms), `${times(many.ms / few.ms)} x`, `${many.runs}`],
  ])
}

console.log(`Node ${process.version}. Medians; the ratio is what counts.`)
compare(50)
compare(200)
compare(500)
fitting()
growth()

/** What a new thing starts as: usual sizes, standing where there is room, always sound beside what is there. */
import { gradeAt, wallY, type Bed, type Facade, type Fixture, type Opening, type Sheet, type Walk } from '@/lib/spacing'
import { outlineOf } from '@/lib/sheet'
import { roundLength } from '@/lib/measure'

type FixtureKind = Fixture['kind']

const wallEnds = ({ wall }: Facade) => ({ left: wall[0]!.x, right: wall.at(-1)!.x })
const frontMost = ({ wall }: Facade) => Math.max(...wall.map(({ y }) => y))

/** The first stretch of wall at least `width` wide without an opening, by its left edge; the left corner if there is none. */
function freeSpot({ facade, openings }: Sheet, width: number): number {
  const { left, right } = wallEnds(facade)
  const margin = 12
  let x = left + margin
  for (const opening of [...openings].sort((a, b) => a.x - b.x)) {
    if (opening.x - x >= width + margin) break
    x = Math.max(x, opening.x + opening.width + margin)
  }
  return x + width <= right ? x : left
}

/** A number no other thing of that word bears: "Window 3". */
export function freeName(word: string, things: readonly { name: string }[], first = 1): string {
  const taken = new Set(things.map(({ name }) => name.toLowerCase()))
  let count = first
  while (taken.has(`${word} ${count}`.toLowerCase())) count += 1
  return `${word} ${count}`
}

/** A copy counts on from its model: Kitchen, Kitchen 2. */
export const nameOfCopy = ({ name }: { name: string }, things: readonly { name: string }[]): string => freeName(name.replace(/ \d+$/, ''), things, 2)

/** The soil line with one more point: at the right corner where it ends short of it, else amid its widest gap, on the line. */
export function withSoilPoint({ wall, grade }: Facade): Facade['grade'] {
  const last = grade.at(-1)!
  const right = wall.at(-1)!.x
  if (last.x < right) return [...grade, { x: right, z: last.z }]
  const gaps = grade.slice(1).map(({ x }, i) => x - grade[i]!.x)
  const widest = gaps.indexOf(Math.max(...gaps))
  const [from, to] = [grade[widest], grade[widest + 1]]
  if (!from || !to) return [...grade, { x: last.x + 48, z: last.z }]
  return grade.toSpliced(widest + 1, 0, { x: roundLength((from.x + to.x) / 2), z: roundLength((from.z + to.z) / 2) })
}

/** Window 36 in wide, sill 36 and head 84 in above the soil there; door 36 in wide, sill 8 and head 88 in above it. */
export function newOpening(sheet: Sheet, kind: Opening['kind'], id: string): Opening {
  const { left, right } = wallEnds(sheet.facade)
  const width = Math.min(36, right - left)
  const x = freeSpot(sheet, width)
  const soil = roundLength(gradeAt(sheet.facade, x + width / 2))
  const heights = kind === 'window' ? { sill: soil + 36, head: soil + 84 } : { sill: soil + 8, head: soil + 88 }
  return { id, kind, name: freeName(kind === 'window' ? 'Window' : 'Door', sheet.openings), x, width, ...heights }
}

/** Usual sizes of fixtures in inches: width, depth, height, and how high above the soil they start. Practice. */
const FIXTURE_SIZES: Record<FixtureKind, { width: number; depth: number; height: number; above: number }> = {
  'electric-meter': { width: 16, depth: 8, height: 24, above: 48 },
  'gas-meter': { width: 24, depth: 14, height: 30, above: 6 },
  condenser: { width: 32, depth: 32, height: 36, above: 3 },
  'hose-bib': { width: 4, depth: 4, height: 6, above: 24 },
  vent: { width: 6, depth: 4, height: 6, above: 18 },
  downspout: { width: 4, depth: 3, height: 96, above: 0 },
  'house-number': { width: 16, depth: 1, height: 6, above: 66 },
  'entry-light': { width: 8, depth: 8, height: 14, above: 66 },
  'escape-well': { width: 48, depth: 36, height: 6, above: 0 },
}

/** A fixture of usual size on the wall, in the middle of the house front. */
export function newFixture({ facade }: Sheet, kind: FixtureKind, id: string): Fixture {
  const { left, right } = wallEnds(facade)
  const { above, ...size } = FIXTURE_SIZES[kind]
  const x = roundLength((left + right - size.width) / 2)
  const middle = x + size.width / 2
  return { id, kind, x, y: wallY(facade, middle), ...size, z: roundLength(gradeAt(facade, middle)) + above }
}

/** A walk 48 in wide along the whole house front, 72 in out from what stands out most. */
export function newWalk({ facade, walks }: Sheet, id: string): Walk {
  const { left, right } = wallEnds(facade)
  const fromY = frontMost(facade) + 72
  return { id, name: freeName('Walk', walks), outline: outlineOf({ fromX: left, toX: right, fromY, toY: fromY + 48 }) }
}

/** A bed 60 in deep along the whole house front, starting at the wall that stands out most. */
export function newBed({ facade, beds }: Sheet, id: string): Bed {
  const { left, right } = wallEnds(facade)
  const fromY = frontMost(facade)
  return { id, name: freeName('Bed', beds), outline: outlineOf({ fromX: left, toX: right, fromY, toY: fromY + 60 }) }
}

/** A copy beside its model where the wall has room for it, else in its very place. */
export function copyOfOpening({ facade, openings }: Sheet, opening: Opening, id: string): Opening {
  const x = opening.x + opening.width + 12
  const hasRoom = x + opening.width <= wallEnds(facade).right
  return { ...opening, id, name: nameOfCopy(opening, openings), x: hasRoom ? x : opening.x }
}

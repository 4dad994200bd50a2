/**
 * What the fields of a sheet owe each other: sill under head, windows on the wall, outlines that do not cross
 * themselves, plants that are known. Every problem names its field and says a plain sentence.
 */
import { pairsThatMeet, STANDARDS, polygonCrossesItself, polygonArea, type Point, type Sheet } from '../spacing'

/** A field by its path in the sheet, and what is wrong with it. */
export interface Problem {
  path: (string | number)[]
  message: string
}

const EPSILON = 1e-9

function wallProblems({ facade }: Sheet): Problem[] {
  const { wall, grade } = facade
  const found: Problem[] = []
  wall.slice(1).forEach((point, i) => {
    if (point.x < wall[i]!.x) found.push({ path: ['facade', 'wall', i + 1, 'x'], message: 'Wall points run from left to right: this one lies left of the one before.' })
    if (i > 0 && point.x === wall[i]!.x && point.x === wall[i - 1]!.x) {
      found.push({ path: ['facade', 'wall', i + 1, 'x'], message: 'At a jog two wall points share one x, never three.' })
    }
  })
  if (!(wall.at(-1)!.x - wall[0]!.x > EPSILON)) {
    found.push({ path: ['facade', 'wall'], message: 'The wall has no width: its right corner must lie right of its left one.' })
  }
  grade.slice(1).forEach((point, i) => {
    if (point.x <= grade[i]!.x) found.push({ path: ['facade', 'grade', i + 1, 'x'], message: 'Soil points run from left to right, each at its own x.' })
  })
  if (facade.gutter <= Math.max(...grade.map((point) => point.z))) {
    found.push({ path: ['facade', 'gutter'], message: 'The gutter must be above the soil.' })
  }
  return found
}

function openingProblems({ facade, openings }: Sheet): Problem[] {
  const left = facade.wall[0]!.x
  const right = facade.wall.at(-1)!.x
  return openings.flatMap((opening, i) => {
    const found: Problem[] = []
    if (opening.sill >= opening.head) found.push({ path: ['openings', i, 'sill'], message: 'The sill must be below the head.' })
    if (opening.x >= right - EPSILON) found.push({ path: ['openings', i, 'x'], message: `${opening.name} lies beyond the right corner of the wall.` })
    else if (opening.x < left - EPSILON) found.push({ path: ['openings', i, 'x'], message: `${opening.name} starts beyond the left corner of the wall.` })
    else if (opening.x + opening.width > right + EPSILON) found.push({ path: ['openings', i, 'width'], message: `${opening.name} runs beyond the right corner of the wall.` })
    return found
  })
}

/** Do all points lie on one line? Every triangle of the first point and a side is then empty. */
function isFlat(outline: readonly Point[]): boolean {
  const first = outline[0]!
  return outline.slice(1, -1).every((point, i) => Math.abs(polygonArea([first, point, outline[i + 2]!])) < EPSILON)
}

/** What is wrong with one outline, as a sentence; null when it is a fair polygon. */
export function outlineProblem(outline: readonly Point[]): string | null {
  if (isFlat(outline)) return 'The outline encloses no ground.'
  if (polygonCrossesItself(outline)) return 'The outline crosses itself.'
  return Math.abs(polygonArea(outline)) < 1 ? 'The outline encloses no ground.' : null
}

function outlineProblems(sheet: Sheet): Problem[] {
  return (['walks', 'beds'] as const).flatMap((list) =>
    sheet[list].flatMap((thing, i): Problem[] => {
      const message = outlineProblem(thing.outline)
      return message ? [{ path: [list, i, 'outline'], message: `${thing.name}: ${message.charAt(0).toLowerCase()}${message.slice(1)}` }] : []
    }),
  )
}

function placementProblems({ plants, placements }: Sheet): Problem[] {
  const known = new Set(plants.map((plant) => plant.id))
  return placements.flatMap((placement, i) =>
    known.has(placement.plant) ? [] : [{ path: ['placements', i, 'plant'], message: 'This plant is not among the plants of the sheet.' }],
  )
}

/** Pairs of plants that grow into one another, at most: a bed of two thousand has some ten thousand, a heap ten times that. */
export const MAX_PAIRS = 15_000

function heapProblems(sheet: Sheet): Problem[] {
  const pairs = pairsThatMeet(sheet)
  if (pairs <= MAX_PAIRS) return []
  const [found, most] = [pairs, MAX_PAIRS].map((count) => count.toLocaleString('en-US'))
  return [{ path: ['placements'], message: `Too many plants stand in one place: ${found} pairs would grow into each other, and at most ${most} are judged. Set them farther apart, or take some away.` }]
}

function twinProblems(sheet: Sheet): Problem[] {
  return (['openings', 'fixtures', 'walks', 'beds', 'plants', 'placements'] as const).flatMap((list) => {
    const seen = new Set<string>()
    return sheet[list].flatMap(({ id }, i): Problem[] => {
      const twin = seen.has(id)
      seen.add(id)
      return twin ? [{ path: [list, i, 'id'], message: `The id ${id} stands twice.` }] : []
    })
  })
}

/** What is wrong with one entry of the standards, as a sentence; null when it is fair. */
export function standardProblem(key: string, value: number | string): string | null {
  const meta = STANDARDS.find(({ id }) => key.startsWith(`${id}.`))
  const setting = meta?.settings.find(({ name }) => name === key)
  if (setting) {
    return typeof value === 'number' && value >= setting.min && value <= setting.max
      ? null
      : `${setting.label} must be a number from ${setting.min} to ${setting.max}.`
  }
  if (meta?.fixedKind && key === `${meta.id}.kind`) {
    return ['off', 'note', 'risk'].includes(String(value)) ? null : `${meta.title} can be off, note or risk.`
  }
  return 'There is no such setting.'
}

function standardProblems({ standards = {} }: Sheet): Problem[] {
  return Object.entries(standards).flatMap(([key, value]): Problem[] => {
    const message = standardProblem(key, value)
    return message ? [{ path: ['standards', key], message }] : []
  })
}

/** All that is wrong between the fields of a sheet whose single fields are fair; [] when it is sound. */
export function findProblems(sheet: Sheet): Problem[] {
  return [wallProblems, openingProblems, outlineProblems, placementProblems, heapProblems, twinProblems, standardProblems].flatMap((find) => find(sheet))
}

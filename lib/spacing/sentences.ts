/** All that the check says, in plain sentences made from its data. No sentence stands anywhere else. */
import { formatLength } from '../measure'
import { CONTACT } from './geometry/contact'
import type { Finding, Inches, Sheet, Year, YearRange } from './types'

export interface Description {
  /** Who it is about: plants by their botanical names. */
  title: string
  sentence: string
  /** What could be done, where the check has found something; '' where it has looked for nothing. */
  wayOut: string
}

/** A length as it is said: halves under 3 in, whole inches to 3 ft, feet and inches beyond. */
export function lengthText(length: Inches): string {
  const size = Math.abs(length)
  if (size < 0.5) return 'under 1/2 in'
  if (size < 3) return `${formatLength(Math.round(size * 2) / 2, 'inches')}`
  const whole = Math.round(size)
  return whole < 36 ? `${whole} in` : formatLength(whole)
}

const yearNumber = (year: Year) => (year === 'after-30' ? 'after 30' : String(Math.ceil(year)))

/** When a breach begins: "by about year 6 (5-9)". Years are rounded up. */
export function yearsText({ earliest, expected, latest }: YearRange): string {
  if (latest === 0) return 'from the day it is planted'
  if (earliest === 'after-30') return 'after year 30'
  const [first, middle, last] = [earliest, expected, latest].map(yearNumber) as [string, string, string]
  if (expected === 'after-30') return `after year 30 (from year ${first} at the earliest)`
  if (first === last) return `by about year ${middle}`
  return last === 'after 30' ? `by about year ${middle} (${first} or later)` : `by about year ${middle} (${first}-${last})`
}

/** Looks up what a finding speaks of. */
class Names {
  constructor(private readonly sheet: Sheet) {}

  plant(placement: string | undefined): string {
    const found = this.sheet.placements.find(({ id }) => id === placement)
    return this.sheet.plants.find(({ id }) => id === found?.plant)?.botanical ?? 'A plant no longer here'
  }

  plantById(id: string | null): string {
    return this.sheet.plants.find((plant) => plant.id === id)?.botanical ?? 'A plant no longer here'
  }

  feature(id: string | null): string {
    const found = [...this.sheet.openings, ...this.sheet.walks, ...this.sheet.beds].find((thing) => thing.id === id)
    return found?.name ?? 'what is no longer here'
  }
}

type Say = (finding: Finding, names: Names, sheet: Sheet) => string

const when = ({ year }: Finding) => (year ? ` ${yearsText(year)}` : '')
const by = ({ excess }: Finding) => lengthText(excess)

/** "At its largest" where only some of its sizes break the limit. */
const atLargest = ({ kind }: Finding) => (kind === 'risk' ? 'At its largest it ' : 'It ')

/** How the expected size stands to a limit it keeps, for a risk. */
function expectedKeeps({ kind, limit, measured }: Finding, below: string): string {
  const expected = measured?.expected
  if (kind !== 'risk' || limit === null || expected === null || expected === undefined || expected >= limit) return ''
  return ` Its expected size stays ${lengthText(limit - expected)} ${below}.`
}

/** Held findings say what holds them, and what happens once nobody clips. */
const held = (fits: string, unclipped: string, finding: Finding) => `${fits} only while kept clipped. Left alone it ${unclipped}${when(finding)}.`

/** The line a crown may not pass: the sill, or as far below it as the studio keeps free. */
function sillLine({ feature, limit }: Finding, names: Names, { openings }: Sheet): string {
  const sill = `the sill of ${names.feature(feature)}`
  const window = openings.find(({ id }) => id === feature)
  const margin = window && limit !== null ? window.sill - limit : 0
  return margin > CONTACT ? `the line ${lengthText(margin)} below ${sill}` : sill
}

const saySill: Say = (finding, names, sheet) => {
  const limit = sillLine(finding, names, sheet)
  if (finding.kind === 'held') return held(`Stays below ${limit}`, `goes ${by(finding)} past it`, finding)
  if (finding.kind === 'note') return `Stands well out from the wall, yet goes ${by(finding)} past ${limit}${when(finding)}.`
  return `${atLargest(finding)}goes ${by(finding)} past ${limit}${when(finding)}.${expectedKeeps(finding, 'below it')}`
}

const sayGutter: Say = (finding) => {
  const reaches = `comes ${by(finding)} into the room kept free below the gutter`
  if (finding.kind === 'held') return held('Keeps clear of the gutter', reaches, finding)
  return `${atLargest(finding)}${reaches}${when(finding)}.${expectedKeeps(finding, 'below it')}`
}

/** Where it would stop, for a limit measured as a distance. */
const sayByDistance = (finding: Finding, clear: string, reaches: string): string => {
  if (finding.kind === 'held') return held(clear, reaches, finding)
  return `${atLargest(finding)}${reaches}${when(finding)}.`
}

/** Where a studio keeps no gap, the crown may touch the wall and no more. */
function sayTouch(finding: Finding): string {
  if (finding.kind === 'note') return `Grows against the wall, but stays below the siding${when(finding)}.`
  return sayByDistance(finding, 'Keeps off the wall', `presses ${by(finding)} into the wall`)
}

const SAY: Record<string, Say> = {
  sill: saySill,
  gutter: sayGutter,
  'walk-edge': (finding, names) => {
    const walk = names.feature(finding.feature)
    if (finding.year?.latest === 0 && (finding.measured?.low ?? 0) < 0 && finding.excess > 0 && finding.kind === 'conflict') {
      return `Stands in or over ${walk} from the day it is planted, ${lengthText(finding.excess - (finding.limit ?? 0))} past its edge when grown.`
    }
    const limit = finding.limit ? `comes ${by(finding)} into the ${lengthText(finding.limit)} kept clear beside ${walk}` : `leans ${by(finding)} over ${walk}`
    return sayByDistance(finding, `Clears ${walk}`, limit)
  },
  'wall-gap': (finding) => {
    if (!finding.limit) return sayTouch(finding)
    const gap = lengthText(finding.limit)
    if (finding.kind === 'note') return `Comes within ${gap} of the wall, but stays below the siding${when(finding)}.`
    return sayByDistance(finding, `Keeps ${gap} off the wall`, `comes ${by(finding)} into the ${gap} kept free in front of the wall`)
  },
  'outside-bed': (finding) => `Stands ${by(finding)} outside the nearest bed.`,
  crowding: (finding, names) => {
    const [a, b] = finding.placements.map((id) => names.plant(id))
    const pair = a === b ? 'These two' : `${a} and ${b}`
    const most = `${by(finding)} more than they may`
    if (finding.kind === 'held') return `${pair} fit side by side only while kept clipped. Left alone they overlap by ${most}${when(finding)}.`
    return finding.kind === 'risk' ? `At their largest they overlap by ${most}${when(finding)}.` : `They overlap by ${most}${when(finding)}.`
  },
  'layer-order': (finding, names) => {
    const behind = names.plant(finding.placements[1])
    // The rise is told whole, not what is left of it above the rise a studio allows.
    const rise = lengthText(finding.excess + (finding.limit ?? 0))
    const rises = `rises ${rise} above ${behind} behind it`
    if (finding.kind === 'held') return held(finding.limit ? `Keeps its place before ${behind}` : `Stays below ${behind} behind it`, `rises ${rise} above it`, finding)
    if (finding.kind === 'note') return `A specimen: it ${rises}${when(finding)}.`
    return `${atLargest(finding)}${rises}${when(finding)}.`
  },
  hardiness: (finding, _, sheet) => {
    const plant = sheet.plants.find(({ id }) => id === finding.feature)
    const isCold = plant !== undefined && plant.zoneMin !== null && parseInt(sheet.site.zone, 10) < plant.zoneMin
    return isCold
      ? `Hardy from zone ${plant.zoneMin} up; winters here, in zone ${sheet.site.zone}, are colder.`
      : `Grown up to zone ${plant?.zoneMax ?? '?'}; this garden, in zone ${sheet.site.zone}, is warmer.`
  },
  light: (finding, names, sheet) => {
    const plant = sheet.plants.find(({ id }) => id === finding.feature)
    return `Wants ${plant?.light.map((light) => LIGHT_WORDS[light]).join(' or ') ?? 'other light'}; this side has ${LIGHT_WORDS[sheet.site.light]}.`
  },
}

const LIGHT_WORDS = { 'full-sun': 'full sun', 'part-shade': 'part shade', 'full-shade': 'full shade' } as const

function titleOf({ rule, placements, feature }: Finding, names: Names): string {
  if (rule === 'hardiness' || rule === 'light') return names.plantById(feature)
  const shown = rule === 'layer-order' ? placements.slice(0, 1) : placements
  return [...new Set(shown.map((id) => names.plant(id)))].join(' and ')
}

/** A finding in words: who, what, by how much, when. Names what is no longer on the sheet as such. */
export function describe(finding: Finding, sheet: Sheet): Description {
  const names = new Names(sheet)
  const say = SAY[finding.rule]
  const sentence = say ? say(finding, names, sheet) : `Judged by a rule this version does not know: ${finding.rule}.`
  return { title: titleOf(finding, names), sentence, wayOut: '' }
}

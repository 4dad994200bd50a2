/**
 * The questions of the six size and neighbour rules, asked the plain way: every placement against every window and walk,
 * every pair against each other, nothing left out because it is far away. How a single question is answered is for the
 * caller: by the engine's own arithmetic or by a polygon library.
 */
import { BOUNDS, type Bound, type FindingKind, type Opening, type Placement, type Sheet, type Walk } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'
import { isInside } from '../reference/model'

export interface Subject { placement: Placement; plant: Plant }
export interface At { bound: Bound; year: number | 'mature'; natural: boolean }

/** Answers one question about one or two crowns; limits are passed by more than 0.01 in. */
export interface Answers<Crown> {
  crown(subject: Subject, at: At): Crown
  /** Width of the unclipped plant then. */
  spread(subject: Subject, at: At): number
  sill(crown: Crown, window: Opening): boolean
  walk(crown: Crown, walk: Walk): boolean
  wall(crown: Crown): boolean
  gutter(crown: Crown): boolean
  crowd(a: Crown, b: Crown, allowed: number): boolean
  /** Is the front crown's top above the top behind? */
  above(front: Crown, back: Crown): boolean
  /** Do the two share enough of their width, seen from the front? */
  sharesWidth(front: Crown, back: Crown): boolean
}

export interface Verdict {
  rule: string
  placements: string[]
  feature: string | null
  kind: FindingKind
  /** First whole year, then halved to 0.05, for each bound that breaks. */
  years: number[]
}

interface Question {
  rule: string
  subjects: Subject[]
  feature: string | null
  breaks: (at: At) => boolean
  /** Neighbour rules: held only where the unclipped pair would break at the expected bound. */
  heldBy: 'any' | 'expected'
  most?: FindingKind
}

function firstYear(breaks: (year: number) => boolean): number {
  for (let year = 0; year <= 30; year += 1) {
    if (!breaks(year)) continue
    let [before, after] = [year - 1, year]
    while (year > 0 && after - before > 0.05) {
      const middle = (before + after) / 2
      if (breaks(middle)) after = middle
      else before = middle
    }
    return after
  }
  return Infinity
}

function judge({ rule, subjects, feature, breaks, heldBy, most }: Question): Verdict | null {
  const placements = subjects.map(({ placement }) => placement.id)
  const broken = (natural: boolean) => BOUNDS.filter((bound) => breaks({ bound, year: 'mature', natural }))
  const verdict = (kind: FindingKind, natural: boolean, bounds: Bound[]): Verdict => ({
    rule, placements, feature, kind,
    years: bounds.map((bound) => firstYear((year) => breaks({ bound, year, natural }))),
  })
  const kept = broken(false)
  if (kept.length > 0) return verdict(most ?? (kept.length === 3 ? 'conflict' : 'risk'), false, kept)
  if (!subjects.some(({ placement }) => placement.kept)) return null
  const natural = broken(true)
  const held = heldBy === 'any' ? natural.length > 0 : natural.includes('expected')
  return held ? verdict('held', true, natural) : null
}

function alone<C>(sheet: Sheet, subject: Subject, answers: Answers<C>): Question[] {
  const one = (rule: string, feature: string | null, ask: (crown: C) => boolean): Question => ({
    rule, subjects: [subject], feature, heldBy: 'any', breaks: (at) => ask(answers.crown(subject, at)),
  })
  return [
    ...sheet.openings.map((window) => one('sill', window.id, (crown) => answers.sill(crown, window))),
    ...sheet.walks.map((walk) => one('walk-edge', walk.id, (crown) => answers.walk(crown, walk))),
    one('wall-gap', null, (crown) => answers.wall(crown)),
    one('gutter', null, (crown) => answers.gutter(crown)),
  ]
}

function together<C>(sheet: Sheet, [a, b]: [Subject, Subject], answers: Answers<C>): Question[] {
  const drift = a.placement.drift !== undefined && a.placement.drift === b.placement.drift
  const allowed = drift ? 0.25 : 0.1
  const crowding: Question = {
    rule: 'crowding', subjects: [a, b], feature: null, heldBy: 'expected',
    breaks: (at) => {
      const least = Math.min(answers.spread(a, at), answers.spread(b, at))
      return answers.crowd(answers.crown(a, at), answers.crown(b, at), allowed * least)
    },
  }
  const step = a.placement.y - b.placement.y
  const shareBed = sheet.beds.some(({ outline }) => isInside(a.placement, outline) && isInside(b.placement, outline))
  if (Math.abs(step) < 12 || a.plant.id === b.plant.id || !shareBed) return [crowding]
  const [front, back] = step > 0 ? [a, b] : [b, a]
  const kept: At = { bound: 'expected', year: 'mature', natural: false }
  if (!answers.sharesWidth(answers.crown(front, kept), answers.crown(back, kept))) return [crowding]
  const soft = front.plant.category === 'grass' || front.plant.category === 'perennial'
  return [crowding, {
    rule: 'layer-order', subjects: [front, back], feature: null, heldBy: 'expected', ...(soft ? { most: 'risk' as const } : {}),
    breaks: (at) => answers.above(answers.crown(front, at), answers.crown(back, at)),
  }]
}

/** Remembers the crowns at maturity: they are asked for again and again. */
function remembering<C>(answers: Answers<C>): Answers<C> {
  const known = new Map<string, C>()
  return {
    ...answers,
    crown(subject, at) {
      if (at.year !== 'mature') return answers.crown(subject, at)
      const key = `${subject.placement.id}/${at.bound}/${at.natural}`
      const found = known.get(key) ?? answers.crown(subject, at)
      known.set(key, found)
      return found
    },
  }
}

/** All verdicts of the six rules, in the order asked. */
export function askEverything<C>(sheet: Sheet, given: Answers<C>): Verdict[] {
  const answers = remembering(given)
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  const subjects = sheet.placements.map((placement) => ({ placement, plant: plants.get(placement.plant)! }))
  const verdicts: Verdict[] = []
  const keep = (questions: Question[]) => {
    for (const question of questions) {
      const verdict = judge(question)
      if (verdict) verdicts.push(verdict)
    }
  }
  subjects.forEach((subject, i) => {
    keep(alone(sheet, subject, answers))
    for (const other of subjects.slice(i + 1)) keep(together(sheet, [subject, other], answers))
  })
  return verdicts
}

/** The rules asked here. */
export const ASKED_RULES = ['sill', 'walk-edge', 'wall-gap', 'gutter', 'crowding', 'layer-order']

/** One line a verdict, comparable between versions. */
export function lineOf({ rule, placements, feature, kind }: Pick<Verdict, 'rule' | 'placements' | 'feature' | 'kind'>): string {
  const names = rule === 'layer-order' ? placements : [...placements].sort()
  return `${rule} ${names.join('+')} ${feature ?? '-'} ${kind}`
}

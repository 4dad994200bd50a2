/** Each rule in each kind it can have, read out whole, and under a studio's own settings. */
import { describe, expect, test } from 'vitest'
import { check, describe as say, FINDING_KINDS, lengthText, RULES, yearsText, type Placement, type Sheet } from '@/lib/spacing'
import { grown, makePlacement, makePlant, makeSheet, makeWalk, makeWindow, rectangle } from '../../support/sheets'

const ranged = (changes = {}) => makePlant({ heightMin: 20, heightMax: 40, spreadMin: 20, spreadMax: 40, ...changes })
const single = (height: number, changes: Partial<Placement> = {}, sheet: Partial<Sheet> = {}) =>
  makeSheet({ plants: [grown(height, 40)], placements: [makePlacement({ planted: { height, spread: 40 }, ...changes })], ...sheet })
const one = (changes: Partial<Placement>, sheet: Partial<Sheet> = {}) => makeSheet({ plants: [ranged()], placements: [makePlacement(changes)], ...sheet })
const two = (height: number, front: Partial<Placement>, behind: Partial<Placement>, standards = {}) => makeSheet({
  plants: [grown(height, 40), grown(36, 40, { id: 'p2', botanical: 'Exemplum alterum' })],
  placements: [makePlacement({ y: 100, planted: { height, spread: 40 }, ...front }), makePlacement({ id: 'a2', plant: 'p2', y: 50, planted: { height: 36, spread: 40 }, ...behind })],
  standards,
})
const near = { y: 60, x: 265 }
const openings = [makeWindow()]
const walks = [makeWalk(100)]
const beds = [{ id: 'b1', name: 'Front bed', outline: rectangle(0, 480, 0, 96) }]

const SAID: [rule: string, kind: string, sheet: Sheet, sentence: string][] = [
  ['sill', 'conflict', single(50, {}, { openings }), 'It goes 14 in past the sill of Kitchen from the day it is planted.'],
  ['sill', 'risk', one({}, { openings }), 'At its largest it goes 4 in past the sill of Kitchen by about year 4. Its expected size stays 6 in below it.'],
  ['sill', 'held', single(50, { kept: { height: 30 } }, { openings }), 'Stays below the sill of Kitchen only while kept clipped. Left alone it goes 14 in past it from the day it is planted.'],
  ['sill', 'note', single(50, { y: 120 }, { openings }), 'Stands well out from the wall, yet goes 14 in past the sill of Kitchen from the day it is planted.'],
  ['walk-edge', 'conflict', single(40, { y: 90 }, { walks }), 'Stands in or over Front walk from the day it is planted, 10 in past its edge when grown.'],
  ['walk-edge', 'risk', one({ y: 84 }, { walks }), 'At its largest it leans 4 in over Front walk by about year 3.'],
  ['walk-edge', 'held', single(40, { y: 85, kept: { spread: 30 } }, { walks }), 'Clears Front walk only while kept clipped. Left alone it leans 5 in over Front walk from the day it is planted.'],
  ['wall-gap', 'conflict', single(40, { y: 30 }), 'It comes 2 in into the 12 in kept free in front of the wall from the day it is planted.'],
  ['wall-gap', 'risk', one({ y: 30 }), 'At its largest it comes 2 in into the 12 in kept free in front of the wall by about year 4.'],
  ['wall-gap', 'held', single(40, { y: 30, kept: { spread: 30 } }), 'Keeps 12 in off the wall only while kept clipped. Left alone it comes 2 in into the 12 in kept free in front of the wall from the day it is planted.'],
  ['wall-gap', 'note', single(6, { y: 30 }), 'Comes within 12 in of the wall, but stays below the siding from the day it is planted.'],
  ['gutter', 'conflict', single(390.5, { y: 0 }), 'It comes 2 1/2 in into the room kept free below the gutter from the day it is planted.'],
  ['gutter', 'risk', one({ y: 0 }, { facade: { ...makeSheet().facade, gutter: 50 } }), 'At its largest it comes 2 in into the room kept free below the gutter by about year 6. Its expected size stays 8 in below it.'],
  ['gutter', 'held', single(390.5, { y: 0, kept: { height: 300 } }), 'Keeps clear of the gutter only while kept clipped. Left alone it comes 2 1/2 in into the room kept free below the gutter from the day it is planted.'],
  ['outside-bed', 'conflict', single(40, { y: 120 }, { beds }), 'Stands 24 in outside the nearest bed.'],
  ['crowding', 'conflict', two(36, near, { x: 240, y: 60 }), 'They overlap by 11 in more than they may from the day it is planted.'],
  ['crowding', 'held', two(36, { ...near, kept: { spread: 20 } }, { x: 240, y: 60, kept: { spread: 20 } }), 'Exemplum simplex and Exemplum alterum fit side by side only while kept clipped. Left alone they overlap by 11 in more than they may from the day it is planted.'],
  ['layer-order', 'conflict', two(50, {}, {}), 'It rises 14 in above Exemplum alterum behind it from the day it is planted.'],
  ['layer-order', 'held', two(50, { kept: { height: 30 } }, {}), 'Stays below Exemplum alterum behind it only while kept clipped. Left alone it rises 14 in above it from the day it is planted.'],
  ['layer-order', 'note', two(50, { role: 'specimen' }, {}), 'A specimen: it rises 14 in above Exemplum alterum behind it from the day it is planted.'],
  ['hardiness', 'conflict', makeSheet({ plants: [makePlant({ zoneMin: 7 })], placements: [makePlacement()] }), 'Hardy from zone 7 up; winters here, in zone 6a, are colder.'],
  ['hardiness', 'risk', makeSheet({ plants: [makePlant({ zoneMax: 5 })], placements: [makePlacement()] }), 'Grown up to zone 5; this garden, in zone 6a, is warmer.'],
  ['light', 'risk', makeSheet({ plants: [makePlant({ light: ['part-shade', 'full-shade'] })], placements: [makePlacement()] }), 'Wants part shade or full shade; this side has full sun.'],
]

const spoken = (sheet: Sheet, rule: string) => check(sheet).findings.filter((finding) => finding.rule === rule).map((finding) => ({ finding, ...say(finding, sheet) }))

describe('said out loud', () => {
  test.each(SAID)('%s, %s', (rule, kind, sheet, sentence) => {
    expect(spoken(sheet, rule).map(({ finding, sentence: said }) => [finding.kind, said])).toContainEqual([kind, sentence])
  })

  test('every rule is read out above', () => {
    expect(new Set(SAID.map(([rule]) => rule))).toEqual(new Set(RULES.map(({ meta }) => meta.id)))
  })
})

test('whatever kind a finding is called, its sentence is whole and every length has its unit', () => {
  for (const [rule, , sheet] of SAID) {
    for (const kind of FINDING_KINDS) {
      for (const { finding } of spoken(sheet, rule)) {
        const { title, sentence } = say({ ...finding, kind }, sheet)
        expect(title).toMatch(/^Exemplum/)
        expect(sentence).toMatch(/^[A-Z].*\.$/)
        expect(sentence).not.toMatch(/undefined|null|NaN|Infinity|\[object|[{}?]|\s{2}/)
        const rest = sentence.replace(/\d+'(-\d+( \d+\/\d+)?")?|(\d+ )?(\d+\/)?\d+ in\b|years? \d+( \(\d+(-\d+| or later)\))?|zone \d+[ab]?/g, '')
        expect(rest, sentence).not.toMatch(/\d/)
      }
    }
  }
})

describe('under a studio’s own settings a length is that from where the sentence says', () => {
  const first = (sheet: Sheet, rule: string) => spoken(sheet, rule)[0]?.sentence
  test('a margin below the sill', () => {
    expect(first(single(34, {}, { openings, standards: { 'sill.margin': 6 } }), 'sill')).toBe('It goes 4 in past the line 6 in below the sill of Kitchen from the day it is planted.')
  })
  test('no gap to the wall', () => {
    const standards = { 'wall-gap.gap': 0 }
    expect(first(single(40, { y: 15 }, { standards }), 'wall-gap')).toBe('It presses 5 in into the wall from the day it is planted.')
    expect(first(single(6, { y: 15 }, { standards }), 'wall-gap')).toBe('Grows against the wall, but stays below the siding from the day it is planted.')
    expect(first(single(40, { y: 15, kept: { spread: 20 } }, { standards }), 'wall-gap')).toBe('Keeps off the wall only while kept clipped. Left alone it presses 5 in into the wall from the day it is planted.')
  })
  test('a clearance beside the walk: past the edge is past the edge', () => {
    const standards = { 'walk-edge.clearance': 12 }
    expect(first(single(40, { y: 90 }, { walks, standards }), 'walk-edge')).toBe('Stands in or over Front walk from the day it is planted, 10 in past its edge when grown.')
    expect(first(single(40, { y: 72 }, { walks, standards }), 'walk-edge')).toBe('It comes 4 in into the 12 in kept clear beside Front walk from the day it is planted.')
  })
  test('a rise allowed above the plant behind: the rise is told whole', () => {
    const standards = { 'layer-order.tolerance': 6 }
    expect(first(two(50, {}, {}, standards), 'layer-order')).toBe('It rises 14 in above Exemplum alterum behind it from the day it is planted.')
    expect(first(two(50, { kept: { height: 40 } }, {}, standards), 'layer-order')).toBe('Keeps its place before Exemplum alterum only while kept clipped. Left alone it rises 14 in above it from the day it is planted.')
  })
})

test('lengths: halves under 3 in, whole inches to 3 ft, feet beyond', () => {
  expect([0.2, 0.5, 1.3, 2.9, 14.4, 35.4, 35.6, 76.5].map(lengthText)).toEqual(['under 1/2 in', '1/2 in', '1 1/2 in', '3 in', '14 in', '35 in', `3'-0"`, `6'-5"`])
})

test('years that outlast thirty', () => {
  expect(yearsText({ earliest: 12.1, expected: 20, latest: 'after-30' })).toBe('by about year 20 (13 or later)')
  expect(yearsText({ earliest: 12.1, expected: 'after-30', latest: 'after-30' })).toBe('after year 30 (from year 13 at the earliest)')
  expect(yearsText({ earliest: 6.2, expected: 6.6, latest: 6.9 })).toBe('by about year 7')
})

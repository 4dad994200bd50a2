/** Each rule in each kind it can have, read out whole, and under a studio's own settings. */
import { describe, expect, test } from 'vitest'
import { check, describe as say, FINDING_KINDS, lengthText, RULES, yearsText, type Placement, type Sheet } from '@/lib/spacing'
import { grown, makeDoor, makeFixture, makePlacement, makePlant, makeSheet, makeWalk, makeWindow, rectangle } from '../../support/sheets'

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

const CODE = 'Local code and a licensed professional decide.'
const meter = [makeFixture('electric-meter')]
const number = [makeFixture('house-number', { z: 30, height: 8, depth: 1 })]
const thorny = (changes: Partial<Placement> = {}) => makeSheet({ plants: [grown(40, 40, { thorns: true })], walks: [makeWalk(140)], placements: [makePlacement({ y: 90, planted: { height: 40, spread: 40 }, ...changes })] })
const fire = (changes: Partial<Placement>) => single(40, changes, { site: { ...makeSheet().site, fireZone: true } })
const tree = (max: number) => makeSheet({ plants: [makePlant({ category: 'tree', heightMin: 300, heightMax: max, spreadMin: 200, spreadMax: 200 })], placements: [makePlacement({ y: 84 })] })
const sited = (site: Partial<Sheet['site']>, plant: Partial<Parameters<typeof makePlant>[0]>, more: Partial<Sheet> = {}) => makeSheet({ site: { ...makeSheet().site, ...site }, plants: [makePlant(plant)], placements: [makePlacement()], ...more })
const ground = (changes: Partial<Sheet['facade']>) => makeSheet({ facade: { ...makeSheet().facade, ...changes } })
const inBed = (changes: Partial<Placement> = {}, plant = {}) => makeSheet({ beds, plants: [grown(40, 40, plant)], placements: [makePlacement({ planted: { height: 40, spread: 40 }, ...changes })] })
const row = (count: number, changes: Partial<Placement> = {}) => makeSheet({ beds, plants: [grown(40, 40)], placements: Array.from({ length: count }, (_, i) => makePlacement({ id: `a${i}`, x: 60 + 40 * i, planted: { height: 40, spread: 40 }, ...changes })) })

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
  ['service', 'conflict', single(40, { y: 60 }, { fixtures: meter }), `It comes 4 in into the room kept clear about the electric meter from the day it is planted. ${CODE}`],
  ['service', 'risk', one({ y: 60 }, { fixtures: meter }), `At its largest it comes 4 in into the room kept clear about the electric meter by about year 3. ${CODE}`],
  ['service', 'held', single(40, { y: 60, kept: { spread: 24 } }, { fixtures: meter }), `Leaves room about the electric meter only while kept clipped. Left alone it comes 4 in into the room kept clear about the electric meter from the day it is planted. ${CODE}`],
  ['number-view', 'conflict', single(400, {}, { fixtures: number }), 'It hides all of the house number from the day it is planted. Local code asks that it can be seen.'],
  ['number-view', 'held', single(60, { kept: { height: 25 } }, { fixtures: number }), 'Leaves the house number in sight only while kept clipped. Left alone it hides part of it from the day it is planted.'],
  ['tree-distance', 'conflict', tree(300), `Stands 7'-0" from the wall; a tree of its size wants 8'-0".`],
  ['tree-distance', 'conflict', tree(500), `Stands 7'-0" from the wall; a tree of its size wants 15'-0".`],
  ['thorns', 'risk', thorny(), `It brings its thorns 6 in into the 3'-0" kept between thorns and Front walk from the day it is planted.`],
  ['thorns', 'held', thorny({ kept: { spread: 20 } }), `Keeps its thorns off Front walk only while kept clipped. Left alone it brings its thorns 6 in into the 3'-0" kept between thorns and Front walk from the day it is planted.`],
  ['fire-zone', 'conflict', fire({ y: 50 }), `Stands 10 in inside the 5'-0" kept free of plants before the wall in a wildfire area. Local law decides.`],
  ['fire-zone', 'risk', fire({ y: 70 }), `It reaches 10 in into the 5'-0" kept free of plants before the wall in a wildfire area. Local law decides.`],
  ['fire-zone', 'held', fire({ y: 70, kept: { spread: 20 } }), `Keeps out of the 5'-0" kept free of plants before the wall in a wildfire area only while kept clipped. Left alone it comes 10 in into it. Local law decides.`],
  ['open-drift', 'note', makeSheet({ plants: [grown(20, 20)], placements: [makePlacement({ drift: 'd', planted: { height: 20, spread: 20 } }), makePlacement({ id: 'a2', x: 280, drift: 'd', planted: { height: 20, spread: 20 } })] }), `Stands 3'-4" from the nearest of its drift, 10 in too far to grow together.`],
  ['corner-height', 'risk', single(300, { x: 20, y: 20 }), `Grows 33 in above the 22'-3" that suit the left corner of the house.`],
  ['corner-height', 'held', single(300, { x: 460, y: 20, kept: { height: 200 } }), `Suits the right corner of the house only while kept clipped. Left alone it grows 33 in above the 22'-3" that suit it.`],
  ['corner-height', 'note', inBed(), `Nothing here grows 4'-0" high to close the corner.`],
  ['entry-height', 'risk', single(50, {}, { openings: [makeDoor()] }), `Grows 14 in over the 3'-0" that leave the view of Front door open.`],
  ['entry-height', 'held', single(50, { kept: { height: 30 } }, { openings: [makeDoor()] }), `Leaves the view of Front door open only while kept clipped. Left alone it grows 14 in over the 3'-0" that leave the view of Front door open.`],
  ['cover', 'note', inBed(), 'Grown up, plants cover 3 percent of the bed; the rest stays bare soil or mulch. 70 percent closes it.'],
  ['evergreen-share', 'note', inBed(), 'Of its woody plants 0 percent are evergreen by volume: bare in winter. A third is usual.'],
  ['evergreen-share', 'note', inBed({}, { leaf: 'needle-evergreen' }), 'Of its woody plants 100 percent are evergreen by volume: much alike all year. Two thirds is usual at most.'],
  ['bloom-gaps', 'note', inBed({}, { bloomMonths: [4, 5, 6, 7, 8] }), 'Nothing flowers in September and October.'],
  ['same-green', 'note', row(4), 'Side by side stand 4 plants of one leaf color and one texture.'],
  ['odd-drift', 'note', row(4, { drift: 'd' }), 'A drift of 4: odd numbers look less set out.'],
  ['balance', 'note', inBed({ x: 100 }), 'The left side carries 100 percent of the weight about the middle of the bed.'],
  ['balance', 'held', makeSheet({ beds, plants: [grown(40, 40)], placements: [makePlacement({ x: 140, planted: { height: 40, spread: 40 }, kept: { height: 20, spread: 20 } }), makePlacement({ id: 'a2', x: 280, planted: { height: 40, spread: 40 } })] }), 'Otherwise only while kept clipped. Left alone: The left side carries 71 percent of the weight about the middle of the bed.'],
  ['native-share', 'note', { ...inBed(), site: { ...makeSheet().site, brief: ['birds'] } }, 'Native plants are 0 percent of the planting by volume; birds raise young where it is 70 percent or more.'],
  ['moisture', 'risk', sited({ moisture: 'wet' }, { water: ['dry', 'medium'] }), 'Wants dry or medium soil; this soil is wet.'],
  ['rain-shadow', 'note', sited({}, { water: ['medium'] }, { facade: { ...makeSheet().facade, overhang: 60 } }), `Stands 5'-0" from the wall, where the roof keeps the rain off; from 6'-0" on rain reaches it. Water it, or choose a plant for dry soil.`],
  ['walnut', 'risk', sited({ walnut: 'present' }, { juglone: 'sensitive' }), 'Listed as sensitive to black walnut, and one stands near.'],
  ['walnut', 'note', sited({ walnut: 'removed' }, { juglone: 'sensitive' }), 'Listed as sensitive to black walnut. Sources differ on how long the soil harms after the tree is gone: one season to several years.'],
  ['deer', 'risk', sited({ deer: 'high' }, { deer: 'frequently' }), 'Deer damage it often, and many pass here.'],
  ['deer', 'note', sited({ deer: 'high' }, { deer: 'occasionally' }), 'Deer damage it now and then, and many pass here.'],
  ['toxic', 'risk', sited({ brief: ['children', 'pets'] }, { toxicity: 'toxic' }), 'Listed as toxic; the brief names children and pets. No list is complete: ask before planting.'],
  ['toxic', 'note', sited({ brief: ['pets'] }, { toxicity: 'irritant' }), 'Listed as an irritant; the brief names pets. No list is complete: ask before planting.'],
  ['invasive', 'risk', sited({}, { invasive: true }), 'Reported to run wild in some state. The list of your state decides whether it may be planted.'],
  ['hard-to-hold', 'risk', makeSheet({ plants: [makePlant({ heightMin: 100, heightMax: 100 })], placements: [makePlacement({ kept: { height: 50 } })] }), 'Kept at 50 percent of its natural size, 10 in under the 60 percent that shears hold for long. A smaller plant would do.'],
  ['ground-fall', 'risk', ground({ fall: 0.04 }), `The soil falls only 5 in over the first 10 ft from the wall; 6 in of fall carries water away. ${CODE}`],
  ['ground-fall', 'risk', ground({ fall: 0 }), `The soil lies level over the first 10 ft from the wall; 6 in of fall carries water away. ${CODE}`],
  ['ground-fall', 'risk', ground({ fall: -0.02 }), `The soil rises 2 1/2 in over the first 10 ft from the wall; 6 in of fall carries water away. ${CODE}`],
  ['siding-gap', 'risk', ground({ exposed: 5 }), `Only 3 in of foundation shows above the mulch; 6 in keeps the wall dry and in sight. ${CODE}`],
  ['siding-gap', 'risk', ground({ exposed: 0 }), `No foundation shows above the mulch; 6 in keeps the wall dry and in sight. ${CODE}`],
  ['downspout', 'note', makeSheet({ fixtures: [makeFixture('downspout', { outlet: 12 })] }), `Roof water leaves 12 in from the wall; 5'-0" keeps it off the foundation. ${CODE}`],
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
        expect(title).toMatch(/^(Exemplum|Front bed|The (left|right) corner of the house|Fall of the ground|Foundation showing|Downspout)/)
        expect(sentence).toMatch(/^[A-Z].*\.$/)
        expect(sentence).not.toMatch(/undefined|null|NaN|Infinity|\[object|[{}?]|\s{2}/)
        const rest = sentence.replace(/\d+'(-\d+( \d+\/\d+)?")?|(\d+ )?(\d+\/)?\d+ in\b|years? \d+( \(\d+(-\d+| or later)\))?|zone \d+[ab]?|\d+ percent|10 ft|stand \d+ plants|drift of \d+/g, '')
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

import { describe, expect, test } from 'vitest'
import { found, grown, makePlacement, makePlant, makeSheet, makeWindow } from '../../../support/sheets'

const under = (height: number, changes = {}, window = makeWindow()) =>
  found(makeSheet({ plants: [grown(height, 40)], openings: [window], placements: [makePlacement({ planted: { height, spread: 40 }, ...changes })] }), 'sill')

describe('sill', () => {
  test('a top at the sill passes, one 0.02 in higher does not', () => {
    expect(under(36)).toEqual([])
    expect(under(36.02)[0]).toMatchObject({ kind: 'conflict', limit: 36, feature: 'w1', key: 'sill:a1:w1', year: { earliest: 0, latest: 0 } })
  })
  test('beside the window only what reaches in counts', () => {
    expect(under(60, { x: 180 })).toEqual([])
    expect(under(60, { x: 185 })).toHaveLength(1)
  })
  test('past 96 in from the wall it is a note, past 240 in nothing', () => {
    expect(under(40, { y: 96 })[0]?.kind).toBe('conflict')
    expect(under(40, { y: 96.02 })[0]?.kind).toBe('note')
    expect(under(40, { y: 240 })[0]?.kind).toBe('note')
    expect(under(40, { y: 240.02 })).toEqual([])
  })
  test('kept low it is held near the wall, and never held far out', () => {
    expect(under(50, { kept: { height: 30 } })[0]).toMatchObject({ kind: 'held', measured: { expected: 50 }, excess: 14 })
    expect(under(50, { kept: { height: 30 }, y: 120 })).toEqual([])
  })
  test('a crown that starts at the head of the window hides nothing', () => {
    expect(under(200, { clearStem: 84 })).toEqual([])
    expect(under(200, { clearStem: 83.9 })).toHaveLength(1)
  })
  test('doors have no sill, and a plant that goes is ignored', () => {
    expect(under(60, {}, makeWindow({ kind: 'door' }))).toEqual([])
    expect(under(60, { status: 'goes' })).toEqual([])
  })
  test('one size of three past the sill is a risk, with its year', () => {
    const sheet = makeSheet({ plants: [makePlant({ heightMin: 20, heightMax: 40 })], openings: [makeWindow()], placements: [makePlacement()] })
    expect(found(sheet, 'sill')[0]).toMatchObject({ kind: 'risk', measured: { low: 20, expected: 30, high: 40 }, excess: 4 })
  })
  test('a margin below the sill counts, on both sides of it', () => {
    const margin = (height: number) => found(makeSheet({ standards: { 'sill.margin': 6 }, plants: [grown(height, 40)], openings: [makeWindow()], placements: [makePlacement({ planted: { height, spread: 40 } })] }), 'sill')
    expect(margin(30)).toEqual([])
    expect(margin(30.02)[0]).toMatchObject({ kind: 'conflict', limit: 30 })
  })
  test('far out any size that breaks makes a note, even all three', () => {
    const out = (heightMin: number) => found(makeSheet({ plants: [makePlant({ heightMin, heightMax: 40 })], openings: [makeWindow()], placements: [makePlacement({ y: 120 })] }), 'sill')
    expect(out(20)[0]).toMatchObject({ kind: 'note', excess: 4 })
    expect(out(38)[0]).toMatchObject({ kind: 'note', excess: 4 })
  })
  test('the depth is measured from the wall at the window, not from the nearest jog', () => {
    const sheet = makeSheet({ plants: [grown(40, 40)], openings: [makeWindow({ x: 300 })], placements: [makePlacement({ x: 330, y: 126.02, planted: { height: 40, spread: 40 } })] })
    expect(found(sheet, 'sill')[0]?.kind).toBe('note')
    const jogged = { ...sheet, facade: { ...sheet.facade, wall: [{ x: 0, y: 0 }, { x: 300, y: 0 }, { x: 300, y: 30.02 }, { x: 480, y: 30.02 }] } }
    expect(found(jogged, 'sill')[0]?.kind).toBe('conflict')
  })
  test('a plant on the wall and one that stays are judged; three windows are three findings', () => {
    expect(under(40, { role: 'on-wall', y: 4 })[0]?.kind).toBe('conflict')
    expect(under(40, { status: 'stays' })[0]?.kind).toBe('conflict')
    const openings = [makeWindow({ x: 180, width: 30 }), makeWindow({ id: 'w2', x: 215, width: 30 }), makeWindow({ id: 'w3', x: 250, width: 30 })]
    const sheet = makeSheet({ plants: [grown(60, 120)], openings, placements: [makePlacement({ planted: { height: 60, spread: 120 } })] })
    expect(found(sheet, 'sill').map(({ feature }) => feature).sort()).toEqual(['w1', 'w2', 'w3'])
  })
  test('the year is that of the closed form, the later end of a twentieth', () => {
    const sheet = makeSheet({ plants: [makePlant({ heightMin: 20, heightMax: 40, spreadMin: 20, spreadMax: 30 })], openings: [makeWindow()], placements: [makePlacement()] })
    // High: 12 + 28 q = 36.01 at 14 / 28 a year, no lag.
    const worked = -Math.log(1 - 24.01 / 28) / 0.5
    const { earliest, expected, latest } = found(sheet, 'sill')[0]!.year!
    expect([earliest, latest]).toEqual([expected, expected])
    expect(expected).toBeGreaterThanOrEqual(worked)
    expect(expected).toBeLessThan(worked + 0.05)
  })
})

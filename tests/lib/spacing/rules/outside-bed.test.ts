import { describe, expect, test } from 'vitest'
import { found, makePlacement, makeSheet, rectangle } from '../../../support/sheets'

const beds = [{ id: 'b1', name: 'Front bed', outline: rectangle(0, 480, 0, 96) }]
const at = (y: number, changes = {}, sheet = {}) => found(makeSheet({ beds, placements: [makePlacement({ y, ...changes })], ...sheet }), 'outside-bed')

describe('outside-bed', () => {
  test('the edge counts as inside, 0.02 in past it does not', () => {
    expect(at(96)).toEqual([])
    expect(at(96.02)[0]).toMatchObject({ kind: 'conflict', limit: null, measured: null, year: null })
  })
  test('the excess is the distance to the nearest bed', () => expect(at(120)[0]?.excess).toBe(24))
  test('without beds, and for a plant that stays, nothing is judged', () => {
    expect(at(120, {}, { beds: [] })).toEqual([])
    expect(at(120, { status: 'stays' })).toEqual([])
  })
  test('a studio may call it a risk or leave it out', () => {
    expect(at(120, {}, { standards: { 'outside-bed.kind': 'risk' } })[0]?.kind).toBe('risk')
    expect(at(120, {}, { standards: { 'outside-bed.kind': 'off' } })).toEqual([])
  })
  test('two beds that meet leave no gap; of several the nearest counts', () => {
    const two = (from: number) => ({ beds: [{ ...beds[0], outline: rectangle(0, 240, 0, 96) }, { id: 'b2', name: 'Right', outline: rectangle(from, 480, 0, 96) }] })
    expect(at(50, { x: 240 }, two(240))).toEqual([])
    expect(at(50, { x: 250 }, two(280))[0]?.excess).toBe(10)
    expect(at(50, { x: 275 }, two(280))[0]?.excess).toBe(5)
  })
  test('a plant that goes is ignored', () => expect(at(120, { status: 'goes' })).toEqual([]))
})

/** Counting the drawing, and writing it so that no spreadsheet runs a cell. RFC 4180: https://www.rfc-editor.org/rfc/rfc4180 */
import fc from 'fast-check'
import Papa from 'papaparse'
import { describe, expect, it } from 'vitest'
import type { Placement } from '@/lib/spacing'
import { buildPlantList, harmless, partsOf, plantListCsv, totalOf } from '@/lib/takeoff'
import { makePlacement, makePlant } from '../../support/sheets'

const plants = [makePlant({ id: 'p1', botanical: "Ilex glabra 'Shamrock'" }), makePlant({ id: 'p2', botanical: 'Nepeta racemosa' })]
const at = (id: string, x: number, more: Partial<Placement> = {}) => makePlacement({ id, plant: 'p1', x, y: 40, planted: { height: 15, spread: 15 }, ...more })

describe('the plant list', () => {
  it('groups by plant and size at planting, in the order of the keys, with the middle spacing', () => {
    const rows = buildPlantList({ plants, placements: [at('a', 0), at('b', 30), at('c', 70), at('d', 200, { planted: { height: 24, spread: 18 } }), at('e', 9, { plant: 'p2' })] })
    expect(rows.map(({ key, quantity, plantedHeight, spacing }) => [key, quantity, plantedHeight, spacing])).toEqual([['A', 3, 15, 30], ['A', 1, 24, 130], ['B', 1, 15, null]])
  })

  it('measures to the nearest of the plant, whatever its size, and never to one that goes', () => {
    const larger = { planted: { height: 24, spread: 24 } }
    const rows = buildPlantList({ plants, placements: [at('a', 0), at('b', 30, larger), at('c', 60), at('d', 66, { status: 'goes' })] })
    expect(rows.map(({ quantity, spacing }) => [quantity, spacing])).toEqual([[2, 30], [1, 30]])
  })

  it('leaves out what goes and sets apart what stays', () => {
    const rows = buildPlantList({ plants, placements: [at('a', 0), at('b', 40, { status: 'goes' }), at('c', 80, { status: 'stays' })] })
    expect(rows.map(({ quantity, remarks }) => [quantity, remarks])).toEqual([[1, ''], [1, 'existing, stays']])
    expect(partsOf(rows)).toEqual({ fresh: 1, existing: 1 })
  })

  it('says what is kept clipped, the hedge and the drift', () => {
    const [row] = buildPlantList({ plants, placements: [at('a', 0, { role: 'hedge', kept: { height: 36 }, drift: 'front' })] })
    expect(row!.remarks).toBe('hedge; keep clipped at 36 in high; drift front')
  })

  it('counts what the drawing shows, whatever stands on it', () => {
    const any = fc.array(fc.record({ plant: fc.constantFrom('p1', 'p2'), x: fc.integer({ min: 0, max: 500 }), size: fc.constantFrom(12, 18), status: fc.constantFrom('new' as const, 'stays' as const, 'goes' as const) }), { maxLength: 60 })
    fc.assert(fc.property(any, (list) => {
      const placements = list.map(({ plant, x, size, status }, i) => at(`n${i}`, x, { plant, status, planted: { height: size, spread: size } }))
      expect(totalOf(buildPlantList({ plants, placements }))).toBe(placements.filter(({ status }) => status !== 'goes').length)
    }), { seed: 20261201 })
  })
})

describe('the plant list as CSV', () => {
  const [row] = buildPlantList({ plants, placements: [at('a', 0)] })

  it('is this text, to the sign', () => {
    const rows = buildPlantList({ plants, placements: [at('a', 0, { role: 'hedge', kept: { height: 36 } }), at('b', 30.5, { role: 'hedge', kept: { height: 36 } }), at('c', 9, { plant: 'p2', status: 'stays', drift: '=1, "x"' })] })
    expect(plantListCsv(rows, { bom: false })).toBe([
      'Key,Quantity,Botanical name,Common name,"Height at planting, in","Spread at planting, in","Mature height from, in","Mature height to, in","Mature spread from, in","Mature spread to, in","Spacing, in",Remarks',
      "A,2,Ilex glabra 'Shamrock',example,15,15,36,60,36,60,30.5,hedge; keep clipped at 36 in high",
      'B,1,Nepeta racemosa,example,15,15,36,60,36,60,,"existing, stays; drift =1, ""x"""',
      '',
    ].join('\r\n'))
  })

  it('is written by RFC 4180, numbers as numbers', () => {
    const line = plantListCsv([{ ...row!, common: 'inkberry, "Shamrock"', plantedHeight: -15 }], { bom: false }).split('\r\n')[1]
    expect(line).toContain('A,1,')
    expect(line).toContain('"inkberry, ""Shamrock""",-15,')
  })

  it('begins with a byte order mark only by choice', () => {
    expect([...new TextEncoder().encode(plantListCsv([row!], { bom: true })).slice(0, 4)]).toEqual([0xef, 0xbb, 0xbf, 0x4b])
    expect(plantListCsv([row!], { bom: false }).startsWith('Key,Quantity')).toBe(true)
  })

  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '  =1', 'a\n=1', 'a\r\n@x', '\uff1d1'])('makes %j harmless', (text) => {
    for (const line of harmless(text).split(/\r\n|\r|\n/)) expect(line).not.toMatch(/^[\s\u3000]*[=+\-@\uff1d\uff0b\uff0d\uff20\t]/)
  })

  it('leaves no cell a spreadsheet would run, and reads back as it was written', () => {
    const hostile = fc.array(fc.constantFrom('=', '+', '-', '@', '"', ',', '\n', '\r', '\r\n', '\t', ' ', 'a', '1', '\uff1d', '\uff0b', '\uff0d', '\uff20', '\u3000'), { maxLength: 8 }).map((parts) => parts.join(''))
    fc.assert(fc.property(hostile, hostile, (common, remarks) => {
      const csv = plantListCsv([{ ...row!, common, remarks }], { bom: false })
      const cells = Papa.parse<string[]>(csv, { newline: '\r\n', skipEmptyLines: true }).data[1]!
      for (const text of [cells[3]!, cells[11]!]) {
        expect(text).not.toMatch(/^[\t\r\n]/)
        for (const line of text.split(/\r\n|\r|\n/)) expect(line).not.toMatch(/^[\s\u3000]*[=+\-@\uff1d\uff0b\uff0d\uff20\t]/)
      }
      expect(cells[3]!.replaceAll("'", '')).toBe(common)
    }), { seed: 20261201, numRuns: 500 })
  })
})

/**
 * Hidden glass and covered soil beside a general polygon library (polygon-clipping, Martinez-Rueda-Feito on any polygons):
 * silhouettes and discs as fine polygons, united and cut to the window or bed. Windows within 0.01 of the whole, beds (exact here, discs of 720 sides there) within 0.0001.
 */
import polygonClipping, { type Polygon, type MultiPolygon } from 'polygon-clipping'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { check, crownOf, silhouette, type Bound, type Crown, type Sheet } from '@/lib/spacing'
import { anySheet } from '../support/sheets'

const ringArea = (ring: readonly (readonly number[])[]) => Math.abs(ring.reduce((sum, [x, y], i) => sum + x! * ring[(i + 1) % ring.length]![1]! - ring[(i + 1) % ring.length]![0]! * y!, 0)) / 2
const areaOf = (shape: MultiPolygon) => shape.reduce((sum, [outer, ...holes]) => sum + ringArea(outer!) - holes.reduce((less, hole) => less + ringArea(hole), 0), 0)

function shareUnder(whole: Polygon, shapes: Polygon[]): number {
  const [first, ...rest] = shapes
  return first ? areaOf(polygonClipping.intersection([whole], polygonClipping.union(first, ...rest))) / areaOf([whole]) : 0
}

const YEARS = [0, 5, 20, 'mature'] as const

function crownsAt(sheet: Sheet, bound: Bound, year: (typeof YEARS)[number], leaveOut: (role: string | undefined) => boolean): Crown[] {
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  return sheet.placements.filter(({ status, role }) => status !== 'goes' && !leaveOut(role)).map((placement) => crownOf({ plant: plants.get(placement.plant)!, placement, facade: sheet.facade, zone: sheet.site.zone, bound, year }))
}

/** A polygon a hundred-thousandth smaller than none is none: such slivers make the library stumble. */
const isSolid = ({ spread, height, clearStem }: Crown) => spread > 0.01 && height - clearStem > 0.01
const face = (crown: Crown): Polygon => [silhouette(crown, 64).map(({ x, z }): [number, number] => [x, z])]
const disc = ({ x, y, spread }: Crown): Polygon => [Array.from({ length: 720 }, (_, i): [number, number] => [x + (spread / 2) * Math.cos((i * Math.PI) / 360), y + (spread / 2) * Math.sin((i * Math.PI) / 360)])]

test('windows: the share hidden is that of the polygon library', () => {
  fc.assert(fc.property(anySheet, fc.constantFrom('low', 'expected', 'high' as const), fc.constantFrom(...YEARS), (sheet, bound: Bound, year) => {
    const { windows } = check(sheet)
    for (const { id, ...shares } of windows) {
      const { x, width, sill, head } = sheet.openings.find((opening) => opening.id === id)!
      const glass: Polygon = [[[x, sill], [x + width, sill], [x + width, head], [x, head]]]
      const exact = shareUnder(glass, crownsAt(sheet, bound, year, () => false).filter(isSolid).map(face))
      expect(Math.abs(shares[bound][`${year}` as '5'] - exact), `${id} ${bound} ${year}`).toBeLessThan(0.01)
    }
  }), { numRuns: 150, seed: 20261201 })
}, 60_000)

test('beds: the share covered is that of the polygon library', () => {
  fc.assert(fc.property(anySheet, fc.constantFrom('low', 'expected', 'high' as const), fc.constantFrom(...YEARS), (sheet, bound: Bound, year) => {
    const { cover } = check(sheet)
    for (const { id, ...shares } of cover) {
      const bed: Polygon = [sheet.beds.find((one) => one.id === id)!.outline.map(({ x, y }): [number, number] => [x, y])]
      const exact = shareUnder(bed, crownsAt(sheet, bound, year, (role) => role === 'on-wall').filter(isSolid).map(disc))
      expect(Math.abs(shares[bound][`${year}` as '5'] - exact), `${id} ${bound} ${year}`).toBeLessThan(0.0001)
    }
  }), { numRuns: 150, seed: 20261202 })
}, 60_000)

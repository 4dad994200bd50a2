/**
 * Where the two views lie on the sheet: elevation above, plan below, one scale, one x. The frame depends on the
 * house, the ground and how large plants grow, never on the year shown: nothing jumps when the year changes.
 */
import { groundAt, matureSize } from '../spacing'
import type { Box, SceneOptions } from './types'

/** Air for titles, labels and roof edges, inches. */
const MARGIN_IN = 14
const TITLE_IN = 26
const BELOW_SOIL_IN = 16
const BETWEEN_VIEWS_IN = 34
const SCALE_STRIP_IN = 44
/** Crowns wider than the house are followed this far beyond its corners. */
const MOST_BEYOND_IN = 72
/** Thickness of the wall as cut in plan. */
export const WALL_IN = 8

export interface Layout {
  box: Box
  elevation: Box
  plan: Box
  pxPerInch: number
  left: number
  right: number
  /** Heights of the eaves' lower edge and of the ridge, and how far the roof's ends lean in. */
  eaves: number
  ridge: number
  hip: number
  /** How far out the front of the drawn ground lies. */
  front: number
  /** Scene y of the lowest drawn soil. */
  soilEnd: number
  elevationY: (z: number) => number
  planY: (y: number) => number
  heightAt: (sceneY: number) => number
  outAt: (sceneY: number) => number
}

type Measured = Pick<SceneOptions['sheet'], 'facade' | 'walks' | 'beds' | 'plants' | 'placements'>

const most = (values: readonly number[], or: number) => values.reduce((a, b) => Math.max(a, b), or)
const least = (values: readonly number[], or: number) => values.reduce((a, b) => Math.min(a, b), or)

function tallest({ facade, plants, placements }: Measured, cap: number): number {
  const known = new Map(plants.map((plant) => [plant.id, plant]))
  let top = -Infinity
  for (const placement of placements) {
    const plant = known.get(placement.plant)
    if (!plant || placement.status === 'goes') continue
    const height = Math.min(matureSize(plant, placement, 'expected').height, placement.kept?.height ?? Infinity)
    top = Math.max(top, groundAt(facade, placement.x, placement.y) + height)
  }
  return Math.min(top, cap)
}

/** How far crowns reach along the wall, full-grown. */
function crownsAcross({ plants, placements }: Measured): { from: number; to: number }[] {
  const known = new Map(plants.map((plant) => [plant.id, plant]))
  return placements.flatMap((placement) => {
    const plant = known.get(placement.plant)
    if (!plant || placement.status === 'goes') return []
    const radius = Math.min(matureSize(plant, placement, 'expected').spread, placement.kept?.spread ?? Infinity) / 2
    return [{ from: placement.x - radius, to: placement.x + radius }]
  })
}

export interface Air {
  /** Room for a title above the house, inches. */
  title: number
  /** Earth drawn below the lowest soil, pixels: a strip for keys, where there is one. */
  stripPx: number
}

/** The frame of a sheet. `pxPerInch` absent: as if the sheet were seen 960 px wide. */
export function layOut(sheet: Measured, pxPerInch?: number, air: Air = { title: TITLE_IN, stripPx: 0 }): Layout {
  const { facade, walks, beds, placements } = sheet
  const left = facade.wall[0]?.x ?? 0
  const right = facade.wall.at(-1)?.x ?? left
  const width = Math.max(right - left, 1)
  const outlines = [...walks, ...beds].flatMap(({ outline }) => outline)
  const plain = [...outlines, ...placements]
  const widths = crownsAcross(sheet)
  const soil = facade.grade.map(({ z }) => z)
  const eaves = facade.gutter + 5
  const rise = Math.min(Math.max(width * 0.14, 30), 78)
  const low = least(soil, 0)

  const minX = least([...plain.map(({ x }) => x), ...widths.map(({ from }) => Math.max(from, left - MOST_BEYOND_IN))], left - facade.overhang) - MARGIN_IN
  const maxX = most([...plain.map(({ x }) => x), ...widths.map(({ to }) => Math.min(to, right + MOST_BEYOND_IN))], right + facade.overhang) + MARGIN_IN
  const front = Math.min(most(beds.flatMap(({ outline }) => outline.map(({ y }) => y)), 60), 240)
  const minOut = least(facade.wall.map(({ y }) => y), 0) - WALL_IN
  const maxOut = most(plain.map(({ y }) => y), most(facade.wall.map(({ y }) => y), 0) + 48)

  const ridge = eaves + rise
  const top = Math.max(ridge, tallest(sheet, facade.gutter + 1.4 * Math.max(facade.gutter - low, 60)))
  const scale = pxPerInch ?? 960 / (maxX - minX)
  const soilEnd = low - Math.max(0, facade.fall * front)
  const bottom = soilEnd - Math.max(BELOW_SOIL_IN, air.stripPx / scale)
  const elevation: Box = { x: minX, y: -top - air.title, width: maxX - minX, height: top + air.title - bottom }
  const planTop = elevation.y + elevation.height + BETWEEN_VIEWS_IN
  const plan: Box = { x: minX, y: planTop - BETWEEN_VIEWS_IN + 4, width: maxX - minX, height: maxOut - minOut + BETWEEN_VIEWS_IN - 4 + SCALE_STRIP_IN }
  const box: Box = { x: minX, y: elevation.y, width: elevation.width, height: plan.y + plan.height - elevation.y }

  return {
    box, elevation, plan, left, right, eaves, ridge, front,
    hip: Math.min(rise * 0.9, width * 0.3),
    soilEnd: -soilEnd,
    pxPerInch: scale,
    elevationY: (z) => -z,
    heightAt: (sceneY) => -sceneY,
    planY: (y) => planTop + y - minOut,
    outAt: (sceneY) => sceneY - planTop + minOut,
  }
}

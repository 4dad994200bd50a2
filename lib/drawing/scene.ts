/** One sheet, two views: from facts to shapes. Pure and deterministic: the same options give the same scene. */
import { crownOf, groundAt, type Bound, type Crown, type Facade, type Placement } from '../spacing'
import type { Plant } from '../plants'
import { plantKeys } from '../sheet'
import { drawFixture, planFixture } from './fixtures'
import { facingWords, northArrow, scaleBar, titleOf, walkNames } from './furniture'
import { cutWall, dripLine, drawBed, drawWalk } from './grounds'
import { drawFinding, drawSelected } from './highlight'
import { drawHouse, drawSoil } from './house'
import { keyGroups, type KeyGroup } from './key-groups'
import { createLabeler, type Labeler } from './labels'
import { layOut, type Layout } from './layout'
import { elevationLimits, planLimits } from './limits'
import { cutOpening, drawOpening } from './openings'
import { line, path, segment } from './path'
import { drawPlantElevation } from './plant-elevation'
import { drawPlantPlan } from './plant-plan'
import { marginsOf } from './settings'
import type { PlantDrawing, Scene, SceneOptions, Shape, Show, View } from './types'

const JULY = 7
const KEY_PX = 11
const ALL: Required<Show> = { limits: true, keys: true, labels: true, goes: true, notes: true }

interface Grown {
  plant: Plant
  placement: Placement
  crown: Crown
  elevation: PlantDrawing
  plan: PlantDrawing
}

interface Remembered {
  plant: Plant
  facade: Facade
  frame: string
  drawings: Map<string, Grown>
}

/** Drawings of a placement by year, bound and month; forgotten with the placement, or when its plant or ground changes. */
const remembered = new WeakMap<Placement, Remembered>()
const MOST_REMEMBERED = 12

interface Moment {
  year: number | 'mature'
  bound: Bound
  month: number
}

function grow(placement: Placement, plant: Plant, options: SceneOptions, layout: Layout): Grown {
  const { facade, site } = options.sheet
  const { year, bound, month = JULY } = options
  const frame = `${site.zone} ${layout.planY(0)}`
  let memory = remembered.get(placement)
  if (!memory || memory.plant !== plant || memory.facade !== facade || memory.frame !== frame) {
    memory = { plant, facade, frame, drawings: new Map() }
    remembered.set(placement, memory)
  }
  const key = `${year} ${bound} ${month}`
  const known = memory.drawings.get(key)
  if (known) return known
  const drawn = drawGrown(placement, plant, { year, bound, month }, { options, layout })
  if (memory.drawings.size >= MOST_REMEMBERED) memory.drawings.clear()
  memory.drawings.set(key, drawn)
  return drawn
}

function drawGrown(placement: Placement, plant: Plant, moment: Moment, { options, layout }: { options: SceneOptions; layout: Layout }): Grown {
  const { facade, site } = options.sheet
  const at = (year: number | 'mature', bound: Bound) => crownOf({ plant, placement, facade, zone: site.zone, year, bound })
  const crown = at(moment.year, moment.bound)
  const subject = { plant, placement, crown, month: moment.month }
  return {
    plant, placement, crown,
    elevation: drawPlantElevation(subject, layout.elevationY),
    plan: drawPlantPlan({ ...subject, expected: at('mature', 'expected'), high: at('mature', 'high') }, layout.planY),
  }
}

const byDepth = (a: PlantDrawing, b: PlantDrawing) => a.depth - b.depth || (a.placement < b.placement ? -1 : 1)

function groundOfElevation({ sheet }: SceneOptions, layout: Layout): Shape[] {
  return [
    ...drawHouse(sheet.facade, layout),
    ...sheet.openings.flatMap((opening) => drawOpening(opening, layout, sheet.facade)),
    ...sheet.fixtures.flatMap((fixture) => drawFixture(fixture, layout)),
    ...drawSoil(sheet.facade, layout),
  ]
}

function groundOfPlan({ sheet }: SceneOptions, layout: Layout): Shape[] {
  return [
    ...sheet.beds.flatMap((bed) => drawBed(bed, layout)),
    ...sheet.walks.flatMap((walk) => drawWalk(walk, layout)),
    ...cutWall(sheet.facade, layout),
    ...sheet.openings.flatMap((opening) => cutOpening(opening, layout, sheet.facade)),
    ...sheet.fixtures.flatMap((fixture) => planFixture(fixture, layout)),
    ...dripLine(sheet.facade, layout),
  ]
}

interface KeySpot {
  x: number
  y: number
  prefer: { x: number; y: number }[]
}

function keysOf(groups: readonly KeyGroup[], letters: ReadonlyMap<string, string>, spots: ReadonlyMap<string, KeySpot>, { labeler, plan }: { labeler: Labeler; plan: boolean }): Shape[] {
  const ties: Shape[] = []
  const keys = groups.flatMap(({ plant, members }): Shape[] => {
    const points = members.map(({ id }) => spots.get(id)!)
    if (plan && points.length > 1) ties.push(path(line(points), { stroke: 'ink', strokePx: 0.8 }))
    const middle = points[Math.floor((points.length - 1) / 2)]!
    return labeler.setKey({ text: letters.get(plant) ?? '', at: middle, radiusPx: KEY_PX, placements: members.map(({ id }) => id), beside: plan, prefer: middle.prefer })
  })
  return [...ties, ...keys.filter(({ kind }) => kind === 'path'), ...keys.filter(({ kind }) => kind !== 'path')]
}

function labelPlan(options: SceneOptions, layout: Layout, labeler: Labeler, show: Required<Show>): Shape[] {
  if (!show.labels) return []
  const { sheet } = options
  return [
    titleOf('Plan', layout.plan, labeler),
    ...scaleBar(layout, labeler),
    ...northArrow(sheet.site, layout, labeler),
    ...walkNames(sheet, layout, labeler),
  ]
}

/** Places in the strip below the soil, nearest to the plant first. */
function stripSpots(x: number, layout: Layout, px: (pixels: number) => number): { x: number; y: number }[] {
  const step = px(2 * KEY_PX + 3)
  const sideways = [0, 0.5, -0.5, 1, -1, 1.5, -1.5, 2, -2, 2.5, -2.5, 3, -3]
  return [0, 1].flatMap((row) => sideways.map((by) => ({ x: x + by * step, y: layout.soilEnd + px(KEY_PX + 9) + row * step })))
}

function elevationSpot({ crown }: Grown, layout: Layout, labeler: Labeler, strip: boolean): KeySpot {
  const foot = crown.z0 + crown.clearStem
  const top = crown.z0 + crown.height
  const at = { x: crown.x, y: layout.elevationY(foot + (top - foot) * 0.55) }
  const small = Math.min(top - foot, crown.spread) * layout.pxPerInch < KEY_PX * 4.4
  if (strip) return { ...at, prefer: stripSpots(crown.x, layout, labeler.px) }
  return { ...at, prefer: small ? [{ x: crown.x, y: layout.elevationY(top) - labeler.px(KEY_PX + 5) }] : [] }
}

function elevationTitle(options: SceneOptions): string {
  const facing = facingWords(options.sheet.site)
  return facing ? `Elevation, ${facing}` : 'Elevation'
}

/** Both views of a sheet at a year, a bound and a month. 200 plants take less than 30 ms; what is unchanged is not drawn anew. */
export function buildScene(options: SceneOptions): Scene {
  const { sheet, selected, finding } = options
  const show = { ...ALL, ...options.show }
  const layout = layOut(sheet, options.pxPerInch, show.notes ? undefined : { title: 8, stripPx: show.keys ? 4 * KEY_PX + 24 : 0 })
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  const grown = sheet.placements.flatMap((placement): Grown[] => {
    const plant = plants.get(placement.plant)
    return plant && (show.goes || placement.status !== 'goes') ? [grow(placement, plant, options, layout)] : []
  })
  const margins = marginsOf(sheet)
  const labelers = { elevation: createLabeler(layout.elevation, layout.pxPerInch), plan: createLabeler(layout.plan, layout.pxPerInch) }
  const elevation: View = {
    title: elevationTitle(options), box: layout.elevation, ground: groundOfElevation(options, layout),
    plants: grown.map((one) => one.elevation).sort(byDepth), limits: [], labels: [], highlight: [],
  }
  const plan: View = {
    title: 'Plan', box: layout.plan, ground: groundOfPlan(options, layout),
    plants: grown.map((one) => one.plan).sort(byDepth), limits: [], labels: labelPlan(options, layout, labelers.plan, show), highlight: [],
  }
  if (show.labels && show.notes) elevation.labels.push(titleOf(elevation.title, layout.elevation, labelers.elevation))
  const scene: Scene = {
    box: layout.box, pxPerInch: layout.pxPerInch, elevation, plan,
    elevationY: layout.elevationY, heightAt: layout.heightAt, planY: layout.planY, outAt: layout.outAt,
    projection: (x, y) => segment(x, layout.elevationY(groundAt(sheet.facade, x, y)), x, layout.planY(y)),
  }
  if (finding) {
    const shapes = drawFinding({ sheet: options.sheet, plants, layout, margins, finding }, labelers)
    elevation.highlight.push(...shapes.elevation)
    plan.highlight.push(...shapes.plan)
  }
  if (show.limits) addLimits(options, layout, { elevation, plan }, labelers)
  if (show.keys) {
    for (const { x, y } of grown.map((one) => one.plan.at)) labelers.plan.block({ x: x - labelers.plan.px(4), y: y - labelers.plan.px(4), width: labelers.plan.px(8), height: labelers.plan.px(8) })
    const groups = keyGroups(grown.map(({ placement }) => placement), plants)
    const letters = plantKeys(sheet)
    elevation.labels.push(...keysOf(groups, letters, new Map(grown.map((one) => [one.placement.id, elevationSpot(one, layout, labelers.elevation, !show.notes)])), { labeler: labelers.elevation, plan: false }))
    plan.labels.push(...keysOf(groups, letters, new Map(grown.map((one) => [one.placement.id, { ...one.plan.at, prefer: [] }])), { labeler: labelers.plan, plan: true }))
  }
  for (const id of new Set([selected, ...(finding?.placements ?? [])])) {
    const out = id ? sheet.placements.find((one) => one.id === id)?.y : undefined
    if (!id || out === undefined) continue
    const shapes = drawSelected(id, scene, out)
    elevation.highlight.unshift(...shapes.elevation)
    plan.highlight.unshift(...shapes.plan)
  }
  return scene
}

function addLimits(options: SceneOptions, layout: Layout, views: { elevation: View; plan: View }, labelers: { elevation: Labeler; plan: Labeler }): void {
  const margins = options.show?.notes === false ? { ...marginsOf(options.sheet), sill: 0, gutter: 0 } : marginsOf(options.sheet)
  const up = elevationLimits(options.sheet, layout, margins, labelers.elevation)
  const down = planLimits(options.sheet, layout, margins, labelers.plan)
  views.elevation.limits.push(...up.lines)
  views.plan.limits.push(...down.lines)
  if (options.show?.labels === false) return
  views.elevation.labels.push(...up.words)
  views.plan.labels.push(...down.words)
}

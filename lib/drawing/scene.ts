/** One sheet, two views: from facts to shapes. Pure and deterministic: the same options give the same scene. */
import type { Plant } from '../plants'
import { groundAt } from '../spacing'
import { drawFixture, planFixture } from './fixtures'
import { facingWords, northArrow, scaleBar, titleOf, walkNames } from './furniture'
import { cutWall, dripLine, drawBed, drawWalk } from './grounds'
import { grow, type Grown } from './grown'
import { drawFinding, drawSelected } from './highlight'
import { drawPockets, drawSpot } from './spot'
import { drawHouse, drawSoil } from './house'
import { KEY_STRIP_PX, setKeys } from './keys'
import { createLabeler, type Labeler } from './labels'
import { layOut, type Layout } from './layout'
import { elevationLimits, planLimits } from './limits'
import { cutOpening, drawOpening } from './openings'
import { segment } from './path'
import { marginsOf } from './settings'
import type { PlantDrawing, Scene, SceneOptions, Shape, Show, View } from './types'

const ALL: Required<Show> = { limits: true, keys: true, labels: true, goes: true, notes: true }

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

function elevationTitle(options: SceneOptions): string {
  const facing = facingWords(options.sheet.site)
  return facing ? `Elevation, ${facing}` : 'Elevation'
}

interface Work {
  options: SceneOptions
  show: Required<Show>
  layout: Layout
  plants: ReadonlyMap<string, Plant>
  grown: readonly Grown[]
  labelers: { elevation: Labeler; plan: Labeler }
}

function startViews({ options, show, layout, grown, labelers }: Work): { elevation: View; plan: View } {
  const title = elevationTitle(options)
  return {
    elevation: {
      title, box: layout.elevation, ground: groundOfElevation(options, layout), plants: grown.map((one) => one.elevation).sort(byDepth),
      limits: [], labels: show.labels && show.notes ? [titleOf(title, layout.elevation, labelers.elevation)] : [], highlight: [],
    },
    plan: {
      title: 'Plan', box: layout.plan, ground: groundOfPlan(options, layout), plants: grown.map((one) => one.plan).sort(byDepth),
      limits: [], labels: labelPlan(options, layout, labelers.plan, show), highlight: [],
    },
  }
}

function add(scene: Scene, list: 'limits' | 'labels' | 'highlight', shapes: { elevation: readonly Shape[]; plan: readonly Shape[] }): void {
  scene.elevation[list].push(...shapes.elevation)
  scene.plan[list].push(...shapes.plan)
}

function addHighlights(scene: Scene, { options, layout, plants, labelers }: Work): void {
  const { sheet, selected, finding, spot, pockets } = options
  if (pockets) add(scene, 'highlight', { elevation: [], plan: drawPockets(pockets, scene) })
  if (spot) add(scene, 'highlight', drawSpot(spot, sheet.facade, scene))
  for (const id of new Set([selected, ...(finding?.placements ?? [])])) {
    const placement = id ? sheet.placements.find((one) => one.id === id) : undefined
    if (placement) add(scene, 'highlight', drawSelected(placement.id, scene, placement.y))
  }
  if (finding) add(scene, 'highlight', drawFinding({ sheet, plants, layout, margins: marginsOf(sheet), finding }, labelers))
}

function addLimits(scene: Scene, { options: { sheet }, show, layout, labelers }: Work): void {
  const margins = show.notes ? marginsOf(sheet) : { ...marginsOf(sheet), sill: 0, gutter: 0 }
  const up = elevationLimits(sheet, layout, margins, labelers.elevation)
  const down = planLimits(sheet, layout, margins, labelers.plan)
  add(scene, 'limits', { elevation: up.lines, plan: down.lines })
  if (show.labels) add(scene, 'labels', { elevation: up.words, plan: down.words })
}

/**
 * Both views of a sheet at a year, a bound and a month. A plant drawn anew takes about 0.2 ms; what is unchanged is not
 * drawn anew. Placements whose plant is not on the sheet are left out.
 */
export function buildScene(options: SceneOptions): Scene {
  const { sheet } = options
  const show = { ...ALL, ...options.show }
  const layout = layOut(sheet, options.pxPerInch, show.notes ? undefined : { title: 8, stripPx: show.keys ? KEY_STRIP_PX : 0 })
  const plants = new Map(sheet.plants.map((plant) => [plant.id, plant]))
  const grown = sheet.placements.flatMap((placement): Grown[] => {
    const plant = plants.get(placement.plant)
    return plant && (show.goes || placement.status !== 'goes') ? [grow(placement, plant, options, layout)] : []
  })
  const labelers = { elevation: createLabeler(layout.elevation, layout.pxPerInch), plan: createLabeler(layout.plan, layout.pxPerInch) }
  const work: Work = { options, show, layout, plants, grown, labelers }
  const { elevationY, heightAt, planY, outAt, pxPerInch, box } = layout
  const scene: Scene = {
    box, pxPerInch, ...startViews(work), elevationY, heightAt, planY, outAt,
    projection: (x, y) => segment(x, elevationY(groundAt(sheet.facade, x, y)), x, planY(y)),
  }
  addHighlights(scene, work)
  if (show.limits) addLimits(scene, work)
  if (show.keys) add(scene, 'labels', setKeys({ placements: sheet.placements, plants, grown, layout, strip: !show.notes }, labelers))
  return scene
}

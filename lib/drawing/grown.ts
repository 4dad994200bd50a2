/** Plants drawn once and remembered: only what changed is drawn anew. */
import type { Plant } from '../plants'
import { crownOf, type Bound, type Crown, type Facade, type Placement } from '../spacing'
import type { Layout } from './layout'
import { drawPlantElevation } from './plant-elevation'
import { drawPlantPlan } from './plant-plan'
import type { PlantDrawing, SceneOptions } from './types'

const JULY = 7

export interface Grown {
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

/** A placement's drawings in both views, drawn once for each year, bound and month. */
export function grow(placement: Placement, plant: Plant, options: SceneOptions, layout: Layout): Grown {
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

/** Keys of both views: one letter for each group, off the plants where they are small. */
import { plantKeys } from '../sheet'
import type { Plant } from '../plants'
import type { Placement } from '../spacing'
import type { Grown } from './grown'
import { keyGroups, type KeyGroup } from './key-groups'
import type { Labeler } from './labels'
import type { Layout } from './layout'
import { line, path } from './path'
import type { Shape } from './types'

const KEY_PX = 11
/** Two rows of keys below the soil, pixels. */
export const KEY_STRIP_PX = 4 * KEY_PX + 24

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

/** Places in the strip below the soil, nearest to the plant first. */
function stripSpots(x: number, layout: Layout, px: (pixels: number) => number): { x: number; y: number }[] {
  const step = px(2 * KEY_PX + 3)
  const sideways = [0, 0.5, -0.5, 1, -1, 1.5, -1.5, 2, -2, 2.5, -2.5, 3, -3]
  return [0, 1].flatMap((row) => sideways.map((by) => ({ x: x + by * step, y: layout.soilEnd + px(KEY_PX + 9) + row * step })))
}

function elevationSpot({ crown }: Grown, layout: Layout, labeler: Labeler, strip: boolean): KeySpot {
  const foot = crown.z0 + crown.clearStem
  const top = crown.z0 + crown.height
  const at = { x: crown.x, y: layout.elevationY(foot + (top - foot) * (strip ? 0.35 : 0.55)) }
  const small = Math.min(top - foot, crown.spread) * layout.pxPerInch < KEY_PX * 4.4
  if (strip) return { ...at, prefer: stripSpots(crown.x, layout, labeler.px) }
  return { ...at, prefer: small ? [{ x: crown.x, y: layout.elevationY(top) - labeler.px(KEY_PX + 5) }] : [] }
}

export interface Keyed {
  placements: readonly Placement[]
  plants: ReadonlyMap<string, Plant>
  grown: readonly Grown[]
  layout: Layout
  /** Keys of the elevation stand in the strip below the soil. */
  strip: boolean
}

/** Sets the keys of both views; the same groups and letters in each. */
export function setKeys({ placements, plants, grown, layout, strip }: Keyed, labelers: { elevation: Labeler; plan: Labeler }): { elevation: Shape[]; plan: Shape[] } {
  const cross = labelers.plan.px(8)
  for (const { plan: { at } } of grown) labelers.plan.block({ x: at.x - cross / 2, y: at.y - cross / 2, width: cross, height: cross })
  const groups = keyGroups(grown.map(({ placement }) => placement), plants)
  const letters = plantKeys({ placements: [...placements] })
  const up = new Map(grown.map((one) => [one.placement.id, elevationSpot(one, layout, labelers.elevation, strip)]))
  const down = new Map(grown.map((one) => [one.placement.id, { ...one.plan.at, prefer: [] }]))
  return {
    elevation: keysOf(groups, letters, up, { labeler: labelers.elevation, plan: false }),
    plan: keysOf(groups, letters, down, { labeler: labelers.plan, plan: true }),
  }
}

/** Which plants share one key: neighbours of one kind, as a drafter ties them with one line and one letter. */
import { matureSize, type Placement } from '../spacing'
import type { Plant } from '../plants'

export interface KeyGroup {
  plant: string
  /** Left to right. */
  members: Placement[]
}

const isTied = (a: Placement, b: Placement, spread: number) =>
  (a.drift !== undefined && a.drift === b.drift) || Math.hypot(a.x - b.x, a.y - b.y) <= spread * 1.35

/** Takes out of `waiting` what is tied to one placement. */
function takeTied(waiting: Placement[], to: Placement, spread: number): Placement[] {
  const tied = waiting.filter((one) => isTied(to, one, spread))
  for (const one of tied) waiting.splice(waiting.indexOf(one), 1)
  return tied
}

function groupsOf(placements: readonly Placement[], spread: number): Placement[][] {
  const waiting = [...placements].sort((a, b) => a.x - b.x || a.y - b.y || (a.id < b.id ? -1 : 1))
  const groups: Placement[][] = []
  while (waiting.length > 0) {
    const group = [waiting.shift()!]
    for (let i = 0; i < group.length; i += 1) group.push(...takeTied(waiting, group[i]!, spread))
    groups.push(group.sort((a, b) => a.x - b.x || a.y - b.y || (a.id < b.id ? -1 : 1)))
  }
  return groups
}

/** Groups of one plant standing together (one drift, or near each other), in a fixed order. Plants that go have no key. */
export function keyGroups(placements: readonly Placement[], plants: ReadonlyMap<string, Plant>): KeyGroup[] {
  const byPlant = new Map<string, Placement[]>()
  for (const placement of placements) {
    if (placement.status === 'goes' || !plants.has(placement.plant)) continue
    const list = byPlant.get(placement.plant)
    if (list) list.push(placement)
    else byPlant.set(placement.plant, [placement])
  }
  return [...byPlant].flatMap(([plant, list]) => {
    const spread = matureSize(plants.get(plant)!, list[0]!, 'expected').spread
    return groupsOf(list, spread).map((members) => ({ plant, members }))
  })
}

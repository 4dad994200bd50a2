/** The same arithmetic as the engine, its own reach and span, without any thought of what is near. */
import { crownOf, groundAt, pointInPolygon, distanceToPolygon, radiusAt, reach, span, wallDistance, type Crown, type Sheet } from '@/lib/spacing'
import { nearestOnOutline } from '../reference/model'
import { askEverything, type Answers, type Verdict } from './questions'

const TOUCH = 0.01

/** Largest sum of the two radii over the heights both crowns share: concave, so one golden-section search. */
function widestSum(a: Crown, b: Crown): number {
  const foot = (crown: Crown) => crown.z0 + crown.clearStem
  const top = (crown: Crown) => crown.z0 + crown.height
  let [low, high] = [Math.max(foot(a), foot(b)), Math.min(top(a), top(b))]
  if (high - low <= TOUCH) return -Infinity
  const sum = (z: number) => radiusAt(a, z) + radiusAt(b, z)
  const ratio = (Math.sqrt(5) - 1) / 2
  let [left, right] = [high - ratio * (high - low), low + ratio * (high - low)]
  let [atLeft, atRight] = [sum(left), sum(right)]
  let best = Math.max(sum(low), sum(high), atLeft, atRight)
  while (high - low > 1e-6) {
    if (atLeft < atRight) [low, left, atLeft, right] = [left, right, atRight, left + ratio * (high - left)]
    else [high, right, atRight, left] = [right, left, atLeft, right - ratio * (right - low)]
    atLeft = sum(left)
    atRight = sum(right)
    best = Math.max(best, atLeft, atRight)
  }
  return best
}

const topOf = (crown: Crown) => crown.z0 + crown.height

function answersFor({ facade, site }: Sheet): Answers<Crown> {
  return {
    crown: ({ plant, placement }, at) => crownOf({ plant, placement, facade, zone: site.zone, ...at }),
    spread: ({ plant, placement }, at) => crownOf({ plant, placement, facade, zone: site.zone, ...at, natural: true }).spread,
    sill(crown, window) {
      const away = Math.max(0, window.x - crown.x, crown.x - window.x - window.width)
      const part = span(crown, away)
      return part !== null && part.to > window.sill + TOUCH && part.from < window.head - TOUCH
    },
    walk(crown, { outline }) {
      if (pointInPolygon(crown, outline)) return true
      const nearest = nearestOnOutline(crown, outline)
      const soil = groundAt(facade, nearest.x, nearest.y)
      return distanceToPolygon(crown, outline) - reach(crown, soil, soil + 80) < -TOUCH
    },
    wall: (crown) => wallDistance(facade, crown.x, crown.y) - reach(crown, crown.z0, facade.gutter) < 12 - TOUCH,
    gutter(crown) {
      const part = span(crown, Math.max(0, wallDistance(facade, crown.x, crown.y) - facade.overhang))
      return part !== null && part.to > facade.gutter - 12 + TOUCH
    },
    crowd: (a, b, allowed) => widestSum(a, b) - Math.hypot(a.x - b.x, a.y - b.y) > allowed + TOUCH,
    above: (front, back) => topOf(front) > topOf(back) + TOUCH && front.z0 + front.clearStem < topOf(back),
    sharesWidth(front, back) {
      const shared = Math.min(front.x + front.spread / 2, back.x + back.spread / 2) - Math.max(front.x - front.spread / 2, back.x - back.spread / 2)
      return shared >= 0.25 * Math.min(front.spread, back.spread)
    },
  }
}

export function allPairs(sheet: Sheet): Verdict[] {
  return askEverything(sheet, answersFor(sheet))
}

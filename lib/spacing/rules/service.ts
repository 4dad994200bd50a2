import { reach } from '../crown'
import { gapTo, squareToBox, type Box } from '../geometry/box'
import { groundAt } from '../geometry/ground'
import { wallY } from '../geometry/wall'
import { stretchOf, type Grown, type Prepared } from '../prepared'
import type { Rule } from '../rule'
import type { Facade, Finding, Fixture, Inches } from '../types'
import { isOnWall, judgeSizes, type Measure } from '../verdict'
import { ON_WALL_REACH } from './walk-edge'

/** The room that is kept clear about a fixture: a box in plan between two heights. */
interface Room extends Box {
  bottom: Inches
  top: Inches
}

/** Farther along the wall than this no room reaches. */
const WIDEST_ROOM_IN = 36

const PANEL = { width: 30, depth: 36, height: 78 } as const
const AROUND = { 'gas-meter': 36, vent: 36, 'hose-bib': 24 } as const
const CONDENSER = { around: 24, above: 60 } as const
const WELL = { around: 36, height: 80 } as const

const around = ({ x, y, width, depth }: Fixture, by: Inches): Box => ({ left: x - by, right: x + width + by, back: y - by, front: y + depth + by })

/** The room a fixture asks for; null for kinds that ask for none. Heights above soil start from the soil before its middle. */
function roomOf(facade: Facade, fixture: Fixture): Room | null {
  const { kind, x, y, width, depth, z, height } = fixture
  const middle = x + width / 2
  const soil = groundAt(facade, middle, y + depth)
  const top = z + height
  switch (kind) {
    case 'electric-meter': {
      const half = Math.max(PANEL.width, width) / 2
      return { left: middle - half, right: middle + half, back: wallY(facade, middle), front: y + depth + PANEL.depth, bottom: soil, top: Math.max(soil + PANEL.height, top) }
    }
    case 'gas-meter':
    case 'vent':
    case 'hose-bib':
      return { ...around(fixture, AROUND[kind]), bottom: soil, top: top + AROUND[kind] }
    case 'condenser':
      return { ...around(fixture, CONDENSER.around), bottom: soil, top: top + CONDENSER.above }
    case 'escape-well':
      return { ...around(fixture, WELL.around), back: y, bottom: soil, top: soil + WELL.height }
    case 'downspout':
    case 'house-number':
    case 'entry-light':
      return null
  }
}

/** Distance from an axis to a box, less than nothing inside: then the way out of it. */
function toBox(axis: { x: Inches; y: Inches }, box: Box): Inches {
  const outside = Math.sqrt(squareToBox(axis, box))
  return outside > 0 ? outside : -Math.min(axis.x - box.left, box.right - axis.x, axis.y - box.back, box.front - axis.y)
}

/** Clearance of a plant trained on the wall: a strip along it, as wide as the crown and a foot deep. */
function stripClearance(x: Inches, wall: Inches, radius: Inches, box: Box): Inches {
  const along = Math.max(box.left - (x + radius), x - radius - box.right)
  const out = Math.max(box.back - (wall + ON_WALL_REACH), wall - box.front)
  return along <= 0 && out <= 0 ? Math.max(along, out) : Math.hypot(Math.max(0, along), Math.max(0, out))
}

function judgeFixture(prepared: Prepared, one: Grown, fixture: Fixture): Finding | null {
  const { facade } = prepared.sheet
  const room = roomOf(facade, fixture)
  const axis = one.placement
  if (!room || gapTo(axis.x, room.left, room.right) >= one.widest || (!isOnWall(one) && squareToBox(axis, room) >= one.widest ** 2)) return null
  const distance = toBox(axis, room)
  const wall = wallY(facade, axis.x)
  return judgeSizes({
    rule: 'service', placements: [axis.id], feature: fixture.id, limit: 0,
    canHold: one.isKept,
    measure: (bound, year, natural): Measure => {
      const radius = reach(one.crown(bound, year, natural), room.bottom, room.top)
      if (isOnWall(one) && radius === 0) return { measured: null, excess: -Infinity }
      const measured = isOnWall(one) ? stripClearance(axis.x, wall, radius, room) : distance - radius
      return { measured, excess: -measured }
    },
  })
}

export const service: Rule = {
  scope: 'placement',
  meta: {
    id: 'service',
    title: 'Meters and units',
    question: 'Can meters, units and wells still be reached?',
    settings: [],
    sources: [
      { publisher: 'National Fire Protection Association', title: 'National Electrical Code 110.26: 30 in wide, 36 in deep, 6 1/2 ft high (as quoted)', address: 'https://www.ecmag.com/magazine/articles/article-detail/codes-standards-general-installation-requirements-part-xix', known: 'read' },
      { publisher: 'Pensacola Energy', title: 'Meter clearance guidelines: 3 ft about a gas meter', address: 'https://www.pensacolaenergy.com/safety-2/meter-clearance-guidelines', known: 'read' },
      { publisher: 'Montgomery County Fire and Rescue, Maryland', title: 'Furnace vents: 3 ft free of shrubs', address: 'http://mcfrs.blogspot.com/2016/01/important-clear-snow-from-your-furnace.html?m=1', known: 'read' },
      { publisher: 'Action Air', title: 'Landscaping about an air conditioner: 2 ft at the sides, 5 ft above', address: 'https://www.actionairfishers.com/landscaping-tips-for-air-conditioner/', known: 'read' },
      { publisher: 'International Code Council', title: 'International Residential Code R310: escape wells (as quoted)', address: 'http://litchfield-park.org/472/Emergency-EscapeRescue-Openings', known: 'read' },
      { publisher: 'Common practice', title: 'Two feet about a hose bib', address: null, known: 'practice' },
    ],
    notes: 'Local code, the utility and a licensed professional decide; the unit\'s manual goes before these figures. An axis inside the room breaks it at every size, foliage or not.',
  },
  judge: (prepared, one) => {
    const { from, to } = stretchOf(one)
    return prepared.fixtures.near(from - WIDEST_ROOM_IN, to + WIDEST_ROOM_IN).flatMap((fixture) => judgeFixture(prepared, one, fixture) ?? [])
  },
}

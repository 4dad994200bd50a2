/**
 * The same questions through a general polygon library: crowns are silhouettes and discs, limits are regions, and a limit
 * is passed where the two share area. The library compares bounding boxes itself before it clips.
 */
import type { MultiPolygon, Polygon } from 'polygon-clipping'
import type { Point, Sheet } from '@/lib/spacing'
import { disc, extentOf, isInside, nearestOnOutline, overlaps, reachOf, rectangle, silhouetteOf, sizeAt, soilAt, solidOf, wallDistanceOf, type Solid } from '../reference/model'
import { askEverything, type Answers, type Verdict } from './questions'

const TOUCH = 0.01
const FAR = 1e5
const STEPS = 64

interface Shape { solid: Solid; outline: MultiPolygon; box: NonNullable<ReturnType<typeof extentOf>> }

function shift(shapes: MultiPolygon, by: number): MultiPolygon {
  return shapes.map((shape) => shape.map((points) => points.map(([x, z]): [number, number] => [x + by, z])))
}

const polygonOf = (outline: readonly Point[]): Polygon => [outline.map(({ x, y }): [number, number] => [x, y])]

function answersFor({ facade, site }: Sheet): Answers<Shape> {
  const length = facade.wall.at(-1)!.x
  const behind = polygonOf([...facade.wall, { x: length + FAR, y: facade.wall.at(-1)!.y }, { x: length + FAR, y: -FAR }, { x: -FAR, y: -FAR }, { x: -FAR, y: facade.wall[0]!.y }])
  return {
    crown({ plant, placement }, at) {
      const solid = solidOf(plant, placement, { ...at, zone: site.zone, facade })
      const outline = silhouetteOf(solid, { steps: STEPS })
      return { solid, outline, box: extentOf(outline)! }
    },
    spread: ({ plant, placement }, at) => sizeAt(plant, placement, { ...at, zone: site.zone }).spread,
    sill: ({ outline }, window) => overlaps(outline, rectangle(window.x + TOUCH, window.sill + TOUCH, window.x + window.width - TOUCH, window.head - TOUCH)),
    walk({ solid }, { outline }) {
      if (isInside(solid, outline)) return true
      const soil = soilAt(facade, nearestOnOutline(solid, outline))
      const radius = reachOf(solid, soil, soil + 80, STEPS) - TOUCH
      return radius > 0 && overlaps([disc(solid, radius, 180)], polygonOf(outline))
    },
    wall: ({ solid }) => overlaps([disc(solid, reachOf(solid, solid.z0, facade.gutter, STEPS) + 12 - TOUCH, 180)], behind),
    gutter({ solid, outline }) {
      const out = Math.max(0, wallDistanceOf(facade, solid) - facade.overhang)
      return overlaps(shift(outline, -solid.x), rectangle(out + TOUCH, facade.gutter - 12 + TOUCH, FAR, FAR))
    },
    crowd(a, b, allowed) {
      const apart = Math.hypot(a.solid.x - b.solid.x, a.solid.y - b.solid.y)
      return overlaps(shift(a.outline, -a.solid.x), shift(b.outline, apart + allowed + TOUCH - b.solid.x))
    },
    above: (front, back) => front.box.z0 < back.box.z1 && overlaps(front.outline, rectangle(-FAR, back.box.z1 + TOUCH, FAR, FAR)),
    sharesWidth(front, back) {
      const shared = Math.min(front.box.x1, back.box.x1) - Math.max(front.box.x0, back.box.x0)
      return shared >= 0.25 * Math.min(front.box.x1 - front.box.x0, back.box.x1 - back.box.x0)
    },
  }
}

export function byPolygons(sheet: Sheet): Verdict[] {
  return askEverything(sheet, answersFor(sheet))
}

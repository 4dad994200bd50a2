/** House fronts of the demonstration, measured in inches: invented houses. */
import type { Bed, Facade, Fixture, Opening, Walk } from '@/lib/spacing'
import type { Aspect } from '@/lib/sheet'

export interface House {
  name: string
  aspect: Aspect
  facade: Facade
  openings: Opening[]
  fixtures: Fixture[]
  walks: Walk[]
  beds: Bed[]
}

const rectangle = (x1: number, x2: number, y1: number, y2: number) => [
  { x: x1, y: y1 }, { x: x2, y: y1 }, { x: x2, y: y2 }, { x: x1, y: y2 },
]

/** Quarry Cottage: a low front, a door a little left of the middle, beds on both sides. */
export const QUARRY_FRONT: House = {
  name: 'Front',
  aspect: { light: 'full-sun', facing: 178 },
  facade: {
    wall: [{ x: 0, y: 0 }, { x: 480, y: 0 }],
    grade: [{ x: 0, z: 0 }, { x: 240, z: -1 }, { x: 480, z: -3 }],
    fall: 0.05, gutter: 110, overhang: 14, siding: 'lap', exposed: 10, mulch: 2,
  },
  openings: [
    { id: 'w-living', kind: 'window', name: 'Living room', x: 52, width: 72, sill: 42, head: 90 },
    { id: 'd-front', kind: 'door', name: 'Front door', x: 206, width: 40, sill: 8, head: 90 },
    { id: 'w-study', kind: 'window', name: 'Study', x: 330, width: 60, sill: 42, head: 90 },
  ],
  fixtures: [
    { id: 'f-number', kind: 'house-number', x: 254, y: 0, width: 14, depth: 1, z: 62, height: 5 },
    { id: 'f-light', kind: 'entry-light', x: 190, y: 0, width: 7, depth: 6, z: 70, height: 12 },
    { id: 'f-spout', kind: 'downspout', x: 474, y: 0, width: 4, depth: 4, z: 0, height: 108, outlet: 72 },
  ],
  walks: [{ id: 'k-front', name: 'Front walk', outline: rectangle(200, 252, 0, 216) }],
  beds: [
    { id: 'b-left', name: 'Left bed', outline: [...rectangle(0, 192, 0, 100).slice(0, 3), { x: 96, y: 108 }, { x: 0, y: 100 }] },
    { id: 'b-right', name: 'Right bed', outline: [...rectangle(260, 480, 0, 100).slice(0, 3), { x: 370, y: 110 }, { x: 260, y: 100 }] },
  ],
}

/** Kiln Lane: a taller front close to the walk, where an older planting was repeated without looking. */
export const KILN_FRONT: House = {
  name: 'Street front',
  aspect: { light: 'part-shade', facing: 262 },
  facade: {
    wall: [{ x: 0, y: 0 }, { x: 228, y: 0 }, { x: 228, y: 30 }, { x: 528, y: 30 }],
    grade: [{ x: 0, z: 0 }, { x: 228, z: -2 }, { x: 528, z: -6 }],
    fall: 0.04, gutter: 118, overhang: 16, siding: 'lap', exposed: 9, mulch: 2,
  },
  openings: [
    { id: 'w-kitchen', kind: 'window', name: 'Kitchen', x: 60, width: 72, sill: 40, head: 92 },
    { id: 'd-street', kind: 'door', name: 'Street door', x: 176, width: 38, sill: 7, head: 89 },
    { id: 'w-parlor', kind: 'window', name: 'Parlor', x: 276, width: 84, sill: 34, head: 94 },
    { id: 'w-bath', kind: 'window', name: 'Bath', x: 440, width: 36, sill: 60, head: 94 },
  ],
  fixtures: [
    { id: 'f-meter', kind: 'electric-meter', x: 500, y: 30, width: 16, depth: 8, z: 44, height: 24 },
    { id: 'f-bib', kind: 'hose-bib', x: 150, y: 0, width: 4, depth: 5, z: 14, height: 5 },
  ],
  walks: [
    { id: 'k-street', name: 'Street walk', outline: rectangle(0, 528, 128, 176) },
    { id: 'k-door', name: 'Door walk', outline: rectangle(174, 222, 0, 128) },
  ],
  beds: [
    { id: 'b-kitchen', name: 'Kitchen bed', outline: rectangle(0, 168, 0, 120) },
    { id: 'b-parlor', name: 'Parlor bed', outline: [{ x: 232, y: 30 }, { x: 528, y: 30 }, { x: 528, y: 118 }, { x: 232, y: 118 }] },
  ],
}

/** Perry Road: measured this week, nothing drawn on it yet. Two jogs and a porch corner. */
export const PERRY_FRONT: House = {
  name: 'Porch side',
  aspect: { light: 'full-shade', facing: 12 },
  facade: {
    wall: [{ x: 0, y: 0 }, { x: 144, y: 0 }, { x: 144, y: 26 }, { x: 318, y: 26 }, { x: 318, y: 8 }, { x: 456, y: 8 }],
    grade: [{ x: 0, z: 0 }, { x: 456, z: 5 }],
    fall: 0.06, gutter: 126, overhang: 18, siding: 'masonry', exposed: 14, mulch: 3,
  },
  openings: [
    { id: 'w-den', kind: 'window', name: 'Den', x: 36, width: 60, sill: 45.5, head: 93.5 },
    { id: 'd-porch', kind: 'door', name: 'Porch door', x: 208, width: 40, sill: 14, head: 96 },
    { id: 'w-bed', kind: 'window', name: 'Bedroom', x: 356, width: 48, sill: 52.25, head: 94 },
  ],
  fixtures: [{ id: 'f-cond', kind: 'condenser', x: 410, y: 14, width: 32, depth: 32, z: 4, height: 36 }],
  walks: [{ id: 'k-porch', name: 'Porch walk', outline: rectangle(200, 256, 26, 240) }],
  beds: [
    { id: 'b-den', name: 'Den bed', outline: rectangle(0, 144, 0, 96) },
    { id: 'b-porch', name: 'Porch bed', outline: rectangle(264, 400, 26, 104) },
  ],
}

/** The other studio's house: small and plain. */
export const FEN_FRONT: House = {
  name: 'Garden front',
  aspect: { light: 'full-sun', facing: 140 },
  facade: {
    wall: [{ x: 0, y: 0 }, { x: 300, y: 0 }], grade: [{ x: 0, z: 0 }],
    fall: 0.05, gutter: 104, overhang: 12, siding: 'lap', exposed: 8, mulch: 2,
  },
  openings: [{ id: 'w-1', kind: 'window', name: 'Sitting room', x: 90, width: 60, sill: 36, head: 84 }],
  fixtures: [],
  walks: [{ id: 'k-1', name: 'Path', outline: rectangle(0, 300, 100, 136) }],
  beds: [{ id: 'b-1', name: 'Long bed', outline: rectangle(0, 300, 0, 96) }],
}

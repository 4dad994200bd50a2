/** Sheets to draw: one ordinary bed, and random ones. */
import fc from 'fast-check'
import { CATEGORIES, FOLIAGE_COLORS, HABITS, LEAVES, TEXTURES, type Plant } from '@/lib/plants'
import type { Finding, Placement, Sheet } from '@/lib/spacing'

export const plantOf = (change: Partial<Plant> = {}): Plant => ({
  id: 'p1', botanical: 'Ilex glabra', common: 'inkberry', category: 'shrub', leaf: 'broadleaf-evergreen',
  heightMin: 36, heightMax: 60, spreadMin: 36, spreadMax: 60, habit: 'rounded', growth: 'moderate', zoneMin: 4, zoneMax: 9,
  light: ['full-sun'], water: ['medium'], foliageColor: 'dark-green', texture: 'fine', bloomMonths: [5, 6], bloomColor: 'white',
  deer: 'seldom', toxicity: 'unlisted', juglone: 'unknown', thorns: false, invasive: false, native: [], prune: 'none', ...change,
})

export const placementOf = (id: string, x: number, y: number, change: Partial<Placement> = {}): Placement => ({
  id, plant: 'p1', x, y, planted: { height: 15, spread: 15 }, ...change,
})

const rectangle = (x1: number, x2: number, y1: number, y2: number) => [{ x: x1, y: y1 }, { x: x2, y: y1 }, { x: x2, y: y2 }, { x: x1, y: y2 }]

/** A 40 ft front with a window, a door, a walk and a bed; room for plants. */
export const sheetOf = (placements: Placement[], plants: Plant[] = [plantOf()], change: Partial<Sheet> = {}): Sheet => ({
  version: 1, units: 'in',
  site: { zone: '6b', light: 'full-sun', facing: 180, moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false },
  facade: { wall: [{ x: 0, y: 0 }, { x: 240, y: 0 }, { x: 240, y: 20 }, { x: 480, y: 20 }], grade: [{ x: 0, z: 0 }, { x: 480, z: -4 }], fall: 0.05, gutter: 110, overhang: 16, siding: 'lap', exposed: 8, mulch: 2 },
  openings: [{ id: 'w1', kind: 'window', name: 'Kitchen', x: 60, width: 72, sill: 38, head: 92 }, { id: 'd1', kind: 'door', name: 'Door', x: 200, width: 36, sill: 8, head: 88 }],
  fixtures: [{ id: 'f1', kind: 'downspout', x: 470, y: 20, width: 4, depth: 4, z: 0, height: 108, outlet: 72 }],
  walks: [{ id: 'k1', name: 'Front walk', outline: rectangle(0, 480, 110, 150) }],
  beds: [{ id: 'b1', name: 'Front bed', outline: rectangle(0, 480, 20, 104) }],
  plants, placements, ...change,
})

/** Twelve plants of four kinds, as an ordinary bed holds them. */
export const ordinaryBed = (): Sheet => {
  const plants = [
    plantOf(), plantOf({ id: 'p2', habit: 'pyramidal', leaf: 'needle-evergreen', bloomMonths: [], bloomColor: '', heightMin: 60, heightMax: 96, spreadMin: 30, spreadMax: 40 }),
    plantOf({ id: 'p3', leaf: 'deciduous', habit: 'vase', texture: 'coarse', foliageColor: 'green' }),
    plantOf({ id: 'p4', category: 'perennial', leaf: 'herbaceous', habit: 'mounded', heightMin: 12, heightMax: 18, spreadMin: 18, spreadMax: 24, texture: 'medium' }),
  ]
  const back = [40, 100, 160, 290, 350, 410].map((x, i) => placementOf(`back${i}`, x, 58, { plant: ['p1', 'p3', 'p2'][i % 3]! }))
  const front = [30, 54, 78, 300, 324, 348].map((x, i) => placementOf(`front${i}`, x, 92, { plant: 'p4', planted: { height: 6, spread: 8 }, drift: i < 3 ? 'left' : 'right' }))
  return sheetOf([...back, ...front], plants)
}

export const findingOf = (rule: string, placements: string[], feature: string | null, change: Partial<Finding> = {}): Finding => ({
  key: `${rule} ${placements.join()}`, rule, kind: 'conflict', placements, feature, limit: 38, measured: null, excess: 10, year: null, remedies: [], ...change,
})

const length = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true })

const anyPlant = (id: string) => fc.record({
  low: length(3, 300), more: length(0, 200), habit: fc.constantFrom(...HABITS), leaf: fc.constantFrom(...LEAVES), category: fc.constantFrom(...CATEGORIES),
  texture: fc.constantFrom(...TEXTURES), foliageColor: fc.constantFrom(...FOLIAGE_COLORS), bloom: fc.integer({ min: 1, max: 12 }),
}).map(({ low, more, bloom, ...rest }) => plantOf({ id, heightMin: low, heightMax: low + more, spreadMin: low * 0.7, spreadMax: low * 0.7 + more, bloomMonths: [bloom], bloomColor: 'multi', ...rest }))

const anyPlacement = (i: number) => fc.record({
  x: length(-50, 550), y: length(-20, 300), height: length(0.1, 100), spread: length(0.1, 100), plant: fc.constantFrom('p1', 'p2', 'p3'),
  status: fc.constantFrom('new', 'stays', 'goes'), clearStem: fc.option(length(0, 100), { nil: undefined }), kept: fc.option(fc.record({ height: length(1, 80), spread: length(1, 80) }), { nil: undefined }),
}).map(({ x, y, height, spread, plant, status, clearStem, kept }) => placementOf(`a${i}`, x, y, {
  plant, planted: { height, spread }, status: status as 'new', ...(clearStem !== undefined && { clearStem }), ...(kept && { kept }),
}))

/** Any sheet of a believable house: three kinds of plant, up to eight placements. */
export const anySheet = fc.tuple(anyPlant('p1'), anyPlant('p2'), anyPlant('p3'), fc.integer({ min: 0, max: 8 }), length(-0.2, 0.2), fc.boolean())
  .chain(([one, two, three, count, fall, masonry]) => fc.tuple(...Array.from({ length: count }, (_, i) => anyPlacement(i))).map((placements) => {
    const sheet = sheetOf(placements, [one, two, three])
    return { ...sheet, facade: { ...sheet.facade, fall, siding: masonry ? 'masonry' as const : 'lap' as const } }
  }))

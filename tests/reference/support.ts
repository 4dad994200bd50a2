/** Small builders for the outside proofs: a level, plain site on which one figure at a time can be asked. Lengths are inches. */
import { check, type Facade, type Finding, type Placement, type Sheet } from '@/lib/spacing'
import type { Plant } from '@/lib/plants/types'

/** Where a figure was published, and how it is known here. */
export interface Published {
  publisher: string
  title: string
  address: string
  known: 'read' | 'read as quoted' | 'read (data copy)' | 'computed' | 'practice' | 'from memory'
}

/** A title for a test that carries its source. */
export function cited(claim: string, { publisher, title, address, known }: Published): string {
  return `${claim} [${publisher}: ${title}; ${address || 'no address'}; ${known}]`
}

/** A plant without troubles of its own: every site suits it. */
export function plantOf(changes: Partial<Plant> = {}): Plant {
  return {
    id: 'p1', botanical: 'Exemplum planum', common: 'example', category: 'shrub', leaf: 'deciduous',
    heightMin: 36, heightMax: 36, spreadMin: 36, spreadMax: 36, habit: 'mounded', growth: 'moderate',
    zoneMin: 1, zoneMax: 13, light: ['full-sun', 'part-shade', 'full-shade'], water: ['dry', 'medium', 'wet'],
    foliageColor: 'green', texture: 'medium', bloomMonths: [], bloomColor: '', deer: 'unknown', toxicity: 'unlisted',
    juglone: 'unknown', thorns: false, invasive: false, native: [], prune: 'none',
    ...changes,
  }
}

/** A plant whose listed sizes lie well below `height` and `spread`, so that planted at that size it is that size at every bound. */
export function grownPlant(size: { id: string; height: number; spread: number } & Partial<Plant>): Plant {
  const { height, spread, ...rest } = size
  return plantOf({ heightMin: height / 2, heightMax: height / 2, spreadMin: spread / 2, spreadMax: spread / 2, ...rest })
}

export function placementOf(changes: Partial<Placement> = {}): Placement {
  return { id: 'a1', plant: 'p1', x: 120, y: 60, planted: { height: 12, spread: 12 }, ...changes }
}

export const LEVEL: Facade = {
  wall: [{ x: 0, y: 0 }, { x: 480, y: 0 }],
  grade: [{ x: 0, z: 0 }, { x: 480, z: 0 }],
  fall: 0, gutter: 400, overhang: 0, siding: 'lap', exposed: 8, mulch: 2,
}

/** A sheet on level soil before a straight wall, without openings, walks or beds unless given. */
export function sheetOf(changes: Partial<Sheet> = {}): Sheet {
  return {
    version: 1, units: 'in',
    site: { zone: '6a', light: 'full-sun', moisture: 'medium', deer: 'none', walnut: 'none', fireZone: false },
    facade: LEVEL, openings: [], fixtures: [], walks: [], beds: [], plants: [plantOf()], placements: [],
    ...changes,
  }
}

/** The findings of one rule. */
export function findingsOf(sheet: Sheet, rule: string): Finding[] {
  return check(sheet).findings.filter((finding) => finding.rule === rule)
}

/** A small, well-mixed, repeatable source of numbers in [0, 1) (mulberry32). */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
}

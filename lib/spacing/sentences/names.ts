import type { Plant } from '../../plants/types'
import type { Fixture, Placement, Sheet } from '../types'

const FIXTURE_NAMES: Record<Fixture['kind'], string> = {
  'electric-meter': 'the electric meter', 'gas-meter': 'the gas meter', condenser: 'the condenser', 'hose-bib': 'the hose bib', vent: 'the vent',
  downspout: 'the downspout', 'house-number': 'the house number', 'entry-light': 'the entry light', 'escape-well': 'the escape well',
}

/** Things by their ids; of two alike the first. */
const byId = <T extends { id: string }>(things: readonly T[]): Map<string, T> => new Map(things.toReversed().map((thing) => [thing.id, thing]))

/** Looks up what a finding speaks of; what is no longer on the sheet is named as such. */
export class Names {
  private static readonly known = new WeakMap<Sheet, Names>()
  private readonly placements: Map<string, Placement>
  private readonly plants: Map<string, Plant>

  private constructor(private readonly sheet: Sheet) {
    this.placements = byId(sheet.placements)
    this.plants = byId(sheet.plants)
  }

  /** The names of a sheet, listed once for its hundreds of findings. */
  static of(sheet: Sheet): Names {
    let names = Names.known.get(sheet)
    if (!names) Names.known.set(sheet, (names = new Names(sheet)))
    return names
  }

  plantOf(placement: string | undefined): Plant | undefined {
    return this.plantById(this.placements.get(placement ?? '')?.plant ?? null)
  }

  plantById(id: string | null): Plant | undefined {
    return this.plants.get(id ?? '')
  }

  /** The botanical name of a placement's plant. */
  plant(placement: string | undefined): string {
    return this.plantOf(placement)?.botanical ?? 'A plant no longer here'
  }

  /** An opening, a walk or a bed by its own name, a fixture by its kind, a corner by its side. */
  feature(id: string | null): string {
    const { openings, walks, beds, fixtures } = this.sheet
    const named = [...openings, ...walks, ...beds].find((thing) => thing.id === id)
    if (named) return named.name
    const fixture = fixtures.find((thing) => thing.id === id)
    if (fixture) return FIXTURE_NAMES[fixture.kind]
    return id === 'left' || id === 'right' ? `the ${id} corner` : 'what is no longer here'
  }
}

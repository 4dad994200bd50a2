import type { Plant } from '../../plants/types'
import type { Fixture, Sheet } from '../types'

const FIXTURE_NAMES: Record<Fixture['kind'], string> = {
  'electric-meter': 'the electric meter', 'gas-meter': 'the gas meter', condenser: 'the condenser', 'hose-bib': 'the hose bib', vent: 'the vent',
  downspout: 'the downspout', 'house-number': 'the house number', 'entry-light': 'the entry light', 'escape-well': 'the escape well',
}

/** Looks up what a finding speaks of; what is no longer on the sheet is named as such. */
export class Names {
  constructor(private readonly sheet: Sheet) {}

  plantOf(placement: string | undefined): Plant | undefined {
    const found = this.sheet.placements.find(({ id }) => id === placement)
    return this.plantById(found?.plant ?? null)
  }

  plantById(id: string | null): Plant | undefined {
    return this.sheet.plants.find((plant) => plant.id === id)
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

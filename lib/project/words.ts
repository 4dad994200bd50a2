/** The site's values as people say them. */
import type { Aim, Site } from '../spacing'

export const MOISTURE_WORDS: Record<Site['moisture'], string> = { dry: 'Dry', medium: 'Medium', wet: 'Wet' }
export const DEER_PRESSURE_WORDS: Record<Site['deer'], string> = { none: 'None seen', some: 'Some', high: 'Heavy browsing' }
export const WALNUT_WORDS: Record<Site['walnut'], string> = { none: 'None', present: 'Stands nearby', removed: 'Stood nearby, removed' }

export const AIM_WORDS: Record<Aim, string> = {
  birds: 'Birds',
  pollinators: 'Bees and butterflies',
  deer: 'Left alone by deer',
  children: 'Children about',
  pets: 'Pets about',
  'low-upkeep': 'Little upkeep',
  winter: 'Something in winter',
}

/** Hardiness zones with their halves, coldest first: 1a, 1b ... 13b. */
export const ZONES: readonly string[] = Array.from({ length: 26 }, (_, i) => `${Math.floor(i / 2) + 1}${i % 2 === 0 ? 'a' : 'b'}`)

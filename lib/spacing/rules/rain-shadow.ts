import { idsOf, toBePlanted } from '../by-plant'
import { findingOf } from '../finding'
import { CONTACT } from '../geometry/contact'
import type { Rule } from '../rule'
import { isOnWall } from '../verdict'

/** Beyond the edge of the roof rain reaches the roots from here on. */
const BEYOND_EAVES = 12

export const rainShadow: Rule = {
  scope: 'plant',
  meta: {
    id: 'rain-shadow',
    title: 'Rain shadow',
    question: 'Does rain reach it?',
    settings: [],
    fixedKind: 'note',
    sources: [
      { publisher: 'Garden Barber', title: 'Protecting plants: 1 ft or more beyond the drip line of the roof', address: 'http://www.gardenbarber.co.za/protecting-plant-during-spring-winter-and-summer-seasons/', known: 'read' },
      { publisher: 'UF/IFAS Gardening Solutions', title: 'Planting around windows: outside the line of the eaves', address: 'https://gardeningsolutions.ifas.ufl.edu/home/design/landscaping-for-specific-sites/planting-around-windows', known: 'read' },
    ],
    notes: 'Plants listed for dry soil, those trained on the wall, and those whose moisture is not known are not judged. Measured is the nearest of its placements to the wall.',
  },
  judge: ({ sheet: { facade } }, judged) => {
    const { plant } = judged
    if (plant.water.length === 0 || plant.water.includes('dry')) return null
    const limit = facade.overhang + BEYOND_EAVES
    const dry = toBePlanted(judged).filter((one) => !isOnWall(one) && limit - one.wallDistance > CONTACT)
    if (dry.length === 0) return null
    const nearest = Math.min(...dry.map(({ wallDistance }) => wallDistance))
    const measured = { low: nearest, expected: nearest, high: nearest }
    return findingOf({ rule: 'rain-shadow', kind: 'note', placements: idsOf(dry), feature: plant.id, limit, measured, excess: limit - nearest })
  },
}

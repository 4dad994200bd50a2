import { idsOf, toBePlanted } from '../by-plant'
import type { Rule } from '../rule'
import { findingOf } from '../finding'

export const hardiness: Rule = {
  scope: 'plant',
  meta: {
    id: 'hardiness',
    title: 'Hardiness',
    question: 'Will it live through the winters here?',
    settings: [],
    fixedKind: 'conflict',
    sources: [{ publisher: 'USDA Agricultural Research Service', title: 'Plant Hardiness Zone Map 2023', address: 'https://planthardiness.ars.usda.gov/', known: 'read' }],
    notes: 'The number of the zone without its half: a plant of zones 4-8 fits 4a to 8b. The zone says nothing of heat, so above the range is a risk.',
  },
  judge: ({ sheet }, judged) => {
    const { plant } = judged
    const placements = toBePlanted(judged)
    const zone = parseInt(sheet.site.zone, 10)
    const isCold = plant.zoneMin !== null && zone < plant.zoneMin
    const isWarm = plant.zoneMax !== null && zone > plant.zoneMax
    if (placements.length === 0 || (!isCold && !isWarm)) return null
    return findingOf({ rule: 'hardiness', kind: isCold ? 'conflict' : 'risk', placements: idsOf(placements), feature: plant.id })
  },
}

/** What the rules about the site say: one finding per plant, its feature the plant's id. */
import type { RuleWords, Say } from './words'

const LIGHT_WORDS = { 'full-sun': 'full sun', 'part-shade': 'part shade', 'full-shade': 'full shade' } as const

const aboutPlant: Say = ({ feature }, names) => names.plantById(feature)?.botanical ?? names.plant(undefined)

const sayHardiness: Say = ({ feature }, names, { site }) => {
  const plant = names.plantById(feature)
  if (!plant) return `Its plant is no longer here to be compared with zone ${site.zone}.`
  const isCold = plant.zoneMin !== null && parseInt(site.zone, 10) < plant.zoneMin
  return isCold
    ? `Hardy from zone ${plant.zoneMin} up; winters here, in zone ${site.zone}, are colder.`
    : `Grown up to zone ${plant.zoneMax}; this garden, in zone ${site.zone}, is warmer.`
}

const sayLight: Say = ({ feature }, names, { site }) =>
  `Wants ${names.plantById(feature)?.light.map((light) => LIGHT_WORDS[light]).join(' or ') ?? 'other light'}; this side has ${LIGHT_WORDS[site.light]}.`

export const SITE: Record<string, RuleWords> = {
  hardiness: { say: sayHardiness, title: aboutPlant },
  light: { say: sayLight, title: aboutPlant },
}

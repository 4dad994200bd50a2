/** What the rules about the site say: one finding per plant, its feature the plant's id. */
import { lengthText, shareText, type RuleWords, type Say } from './words'

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

const WATER_WORDS = { dry: 'dry', medium: 'medium', wet: 'wet' } as const

const sayMoisture: Say = ({ feature }, names, { site }) =>
  `Wants ${names.plantById(feature)?.water.map((water) => WATER_WORDS[water]).join(' or ') ?? 'other'} soil; this soil is ${WATER_WORDS[site.moisture]}.`

const sayRain: Say = ({ measured, limit }) =>
  `Stands ${lengthText(measured?.expected ?? 0)} from the wall, where the roof keeps the rain off; from ${lengthText(limit ?? 0)} on rain reaches it. Water it, or choose a plant for dry soil.`

const sayWalnut: Say = (_, __, { site }) =>
  site.walnut === 'removed'
    ? 'Listed as sensitive to black walnut. Sources differ on how long the soil harms after the tree is gone: one season to several years.'
    : 'Listed as sensitive to black walnut, and one stands near.'

const BROWSED = { rarely: 'rarely', seldom: 'seldom', occasionally: 'now and then', frequently: 'often', unknown: 'no known class' } as const
const PRESSURE = { none: 'few', some: 'some', high: 'many' } as const
const sayDeer: Say = ({ feature }, names, { site }) =>
  `Deer damage it ${BROWSED[names.plantById(feature)?.deer ?? 'unknown']}, and ${PRESSURE[site.deer]} pass here.`

const sayToxic: Say = ({ feature }, names, { site }) => {
  const who = ['children', 'pets'].filter((aim) => site.brief?.some((one) => one === aim)).join(' and ') || 'children or pets'
  const harm = names.plantById(feature)?.toxicity === 'irritant' ? 'Listed as an irritant' : 'Listed as toxic'
  return `${harm}; the brief names ${who}. No list is complete: ask before planting.`
}

const sayHold: Say = ({ excess, measured, limit }) =>
  `Kept at ${shareText(measured?.expected ?? 0)} of its natural size, ${lengthText(excess)} under the ${shareText(limit ?? 0)} that shears hold for long. A smaller plant would do.`

export const SITE: Record<string, RuleWords> = {
  moisture: { say: sayMoisture, title: aboutPlant },
  'rain-shadow': { say: sayRain, title: aboutPlant },
  walnut: { say: sayWalnut, title: aboutPlant },
  deer: { say: sayDeer, title: aboutPlant },
  toxic: { say: sayToxic, title: aboutPlant },
  invasive: { say: () => 'Reported to run wild in some state. The list of your state decides whether it may be planted.', title: aboutPlant },
  'hard-to-hold': { say: sayHold, title: aboutPlant },
  hardiness: { say: sayHardiness, title: aboutPlant },
  light: { say: sayLight, title: aboutPlant },
}

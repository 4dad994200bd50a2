/**
 * Street and park trees as measured, means by species, city and age group of at least four trees.
 * Source: US Forest Service, Urban tree database, RDS-2016-0005 (2016, errata January 2020),
 * https://doi.org/10.2737/RDS-2016-0005 (public domain). Age is years since planting, as the data say. Heights and crowns in inches.
 *
 * Sizes: `library` = the plant of that name in seed/plants.csv. Species the library does not carry stand here with the
 * size a public list gives, and where it was read; "from memory" where it was not read.
 */
import type { Growth, Habit, Leaf } from '@/lib/plants/types'
import type { Published } from './support'

export interface Cohort {
  species: string
  city: string
  zone: string
  trees: number
  /** Mean years since planting. */
  age: number
  /** Mean height, inches. */
  height: number
  /** Mean width of the crown, inches; null where it was not measured. */
  crown: number | null
}

const rows: [string, string, string, number, number, number, number | null][] = [
  ['Acer palmatum', 'Berkeley', '10a', 4, 13.0, 132, 133],
  ['Acer palmatum', 'Berkeley', '10a', 4, 26.0, 274, 257],
  ['Betula nigra', 'Charlotte', '8a', 5, 8.6, 272, 203],
  ['Betula nigra', 'Charlotte', '8a', 9, 15.0, 470, 346],
  ['Betula nigra', 'Charlotte', '8a', 10, 20.0, 663, 515],
  ['Betula nigra', 'Charlotte', '8a', 12, 26.7, 615, 501],
  ['Cornus florida', 'Charleston', '9a', 7, 9.0, 239, 189],
  ['Cornus florida', 'Charleston', '9a', 12, 20.0, 274, 259],
  ['Cornus florida', 'Charleston', '9a', 7, 26.4, 264, 260],
  ['Crataegus × lavallei', 'Longview', '8b', 21, 18.0, 278, 238],
  ['Crataegus × lavallei', 'Longview', '8b', 10, 29.0, 358, 320],
  ['Ilex opaca', 'Charleston', '9a', 4, 9.2, 143, 81],
  ['Ilex opaca', 'Charleston', '9a', 19, 14.1, 259, 156],
  ['Ilex opaca', 'Charleston', '9a', 8, 19.9, 428, 260],
  ['Ilex opaca', 'Charlotte', '8a', 4, 13.5, 187, 131],
  ['Ilex opaca', 'Charlotte', '8a', 5, 18.0, 213, 131],
  ['Ilex opaca', 'Charlotte', '8a', 6, 25.3, 213, 151],
  ['Juniperus virginiana', 'Charleston', '9a', 5, 15.0, 118, 103],
  ['Juniperus virginiana', 'Charleston', '9a', 7, 20.0, 343, 232],
  ['Juniperus virginiana', 'Charleston', '9a', 16, 27.2, 308, 223],
  ['Lagerstroemia indica', 'Charleston', '9a', 4, 3.5, 137, 133],
  ['Lagerstroemia indica', 'Charleston', '9a', 9, 8.8, 199, 170],
  ['Lagerstroemia indica', 'Charleston', '9a', 7, 14.4, 270, 264],
  ['Lagerstroemia indica', 'Charleston', '9a', 4, 20.0, 300, 254],
  ['Lagerstroemia indica', 'Charleston', '9a', 7, 27.1, 239, 228],
  ['Magnolia grandiflora', 'Charleston', '9a', 4, 13.5, 428, 259],
  ['Magnolia grandiflora', 'Charleston', '9a', 6, 17.0, 272, 213],
  ['Magnolia grandiflora', 'Charleston', '9a', 10, 28.0, 382, 278],
  ['Malus sp.', 'Minneapolis', '5a', 4, 3.8, 141, 93],
  ['Malus sp.', 'Minneapolis', '5a', 7, 8.1, 170, 158],
  ['Malus sp.', 'Minneapolis', '5a', 5, 11.6, 173, 145],
  ['Malus sp.', 'Minneapolis', '5a', 16, 24.9, 278, 271],
  ['Prunus cerasifera', 'Albuquerque', '7b', 4, 4.0, 123, 98],
  ['Prunus cerasifera', 'Albuquerque', '7b', 4, 13.0, 153, 134],
  ['Prunus cerasifera', 'Albuquerque', '7b', 7, 26.3, 206, 245],
  ['Prunus × yedoensis', 'Charlotte', '8a', 10, 7.6, 260, 294],
  ['Prunus × yedoensis', 'Charlotte', '8a', 8, 15.0, 305, 355],
  ['Prunus × yedoensis', 'Charlotte', '8a', 15, 25.3, 354, 456],
  ['Quercus agrifolia', 'Berkeley', '10a', 8, 26.1, 411, 332],
]

export const COHORTS: readonly Cohort[] = rows.map(([species, city, zone, trees, age, height, crown]) => ({ species, city, zone, trees, age, height, crown }))

export interface PublishedSize {
  /** Inches. */
  height: [number, number]
  spread: [number, number]
  growth: Growth
  leaf: Leaf
  habit: Habit
  source: Published
  /** What in the line was not read there. */
  remembered: string
}

const read = (publisher: string, title: string, address: string): Published => ({ publisher, title, address, known: 'read' })
const memory = (title: string): Published => ({ publisher: 'general plant lists', title, address: '', known: 'from memory' })

/** Sizes in inches of the species the library does not carry; read before the comparison was run, and not fitted to it. */
export const SIZES_NOT_IN_LIBRARY: Readonly<Record<string, PublishedSize>> = {
  'Acer palmatum': {
    height: [120, 300], spread: [120, 300], growth: 'slow', leaf: 'deciduous', habit: 'rounded',
    source: memory('Japanese maple, the species: 10-25 ft tall and wide, slow to moderate'), remembered: 'all',
  },
  'Betula nigra': {
    height: [480, 840], spread: [480, 720], growth: 'fast', leaf: 'deciduous', habit: 'upright',
    source: read('Ohio State University', 'plants: Betula nigra (after the Missouri Botanical Garden)', 'https://u.osu.edu/plants/betula-nigra'), remembered: 'growth',
  },
  'Crataegus × lavallei': {
    height: [240, 360], spread: [197, 276], growth: 'moderate', leaf: 'deciduous', habit: 'upright',
    source: read('Oregon State University; Kwantlen Polytechnic University', 'Landscape Plants (height 20-30 ft); plant database (spread 5-7 m)', 'https://landscapeplants.oregonstate.edu/plants/crataegus-lavallei https://plantdatabase.kpu.ca/PlantPrint/crxl'),
    remembered: 'growth',
  },
  'Juniperus virginiana': {
    height: [360, 780], spread: [96, 300], growth: 'moderate', leaf: 'scale-evergreen', habit: 'pyramidal',
    source: read('moreleaf.org', 'Eastern red cedar', 'https://moreleaf.org/product/eastern-red-cedar-juniperus-virginiana/'), remembered: 'growth (medium, as the Arbor Day Foundation is quoted)',
  },
  'Lagerstroemia indica': {
    height: [120, 360], spread: [180, 300], growth: 'moderate', leaf: 'deciduous', habit: 'vase',
    source: memory('University of Florida tree sheet on crapemyrtle: 10-30 ft tall, 15-25 ft wide, moderate'), remembered: 'all',
  },
  'Magnolia grandiflora': {
    height: [720, 960], spread: [360, 600], growth: 'moderate', leaf: 'broadleaf-evergreen', habit: 'pyramidal',
    source: read('Tree Montgomery', 'Southern magnolia: 60-80 ft tall, crown 30-50 ft, up to 1-2 ft a year', 'https://treemontgomery.org/tree/southern-magnolia/'), remembered: 'nothing',
  },
  'Malus sp.': {
    height: [180, 300], spread: [180, 300], growth: 'moderate', leaf: 'deciduous', habit: 'rounded',
    source: memory('flowering crabapples as a group: 15-25 ft tall and wide'), remembered: 'all',
  },
  'Prunus cerasifera': {
    height: [180, 300], spread: [180, 240], growth: 'moderate', leaf: 'deciduous', habit: 'rounded',
    source: read('Plants for Dallas; Meadow Acres', 'Purple leaf plum: 15-20 ft; 25 ft tall and 20 ft wide, medium', 'https://plantsfordallas.com/purple-leaf-plum https://plantsmeadowacres.ca/plants/purpleleaf-plum'), remembered: 'least spread',
  },
  'Prunus × yedoensis': {
    height: [360, 480], spread: [360, 360], growth: 'fast', leaf: 'deciduous', habit: 'spreading',
    source: read('University of Mississippi; City of Beaverton', 'Yoshino cherry: 40 x 30 ft, fast; 30 x 30 ft', 'http://www.olemiss.edu/depts/landscape/yoshino.html https://beavertonoregon.gov/2163/38-Yoshino-Flowering-Cherry'), remembered: 'nothing',
  },
  'Quercus agrifolia': {
    height: [300, 984], spread: [360, 840], growth: 'moderate', leaf: 'broadleaf-evergreen', habit: 'rounded',
    source: read('Pacific Nurseries', 'Quercus agrifolia: 25-82 ft', 'https://pacificnurseries.com/?p=7349'), remembered: 'spread, growth',
  },
}

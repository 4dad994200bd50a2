/** What the library is asked: words, filters, order and page, and how an address says them. */
import { parseLength } from '../measure'
import {
  BLOOM_COLORS, CATEGORIES, DEER_CLASSES, FOLIAGE_COLORS, LEAVES, LIGHTS,
  type BloomColor, type Category, type DeerClass, type FoliageColor, type Leaf, type Light,
} from './types'

export const PLANT_SORTS = ['match', 'botanical', 'common', 'category', 'height', 'spread', 'zone'] as const
export type PlantSort = (typeof PLANT_SORTS)[number]
export const LEAF_FILTERS = ['evergreen', ...LEAVES] as const
export const BLOOM_FILTERS = BLOOM_COLORS.filter((color) => color !== '')
export const OWNERS = ['own', 'shared'] as const
export const PAGE_SIZE = 50
export const MAX_PAGE_SIZE = 200
const LONGEST_QUESTION = 120
const LAST_PAGE = 10_000

/** '' and null ask for nothing. Lengths are inches. */
export interface PlantQuery {
  /** Beginnings of words of a botanical or common name, all of which must be there. */
  q: string
  category: Category | ''
  /** `evergreen` stands for all three evergreen kinds. */
  leaf: Leaf | 'evergreen' | ''
  /** The largest size on record is at most this. */
  heightMax: number | null
  spreadMax: number | null
  /** Hardy in this zone, or grown for one season. */
  zone: number | null
  light: Light | ''
  /** Browsed at most this often; `unknown` finds only those nothing is known of. */
  deer: DeerClass | ''
  foliageColor: FoliageColor | ''
  bloomColor: BloomColor
  owner: (typeof OWNERS)[number] | ''
  /** `match`: best first where words are asked, else by botanical name. */
  sort: PlantSort
  direction: 'asc' | 'desc'
  /** From 1. */
  page: number
  pageSize: number
}

export const EVERY_PLANT: PlantQuery = {
  q: '', category: '', leaf: '', heightMax: null, spreadMax: null, zone: null, light: '', deer: '', foliageColor: '',
  bloomColor: '', owner: '', sort: 'match', direction: 'asc', page: 1, pageSize: PAGE_SIZE,
}

export type QueryField = keyof PlantQuery
export interface QueryProblem {
  field: QueryField
  message: string
}

type Params = Record<string, string | string[] | undefined>

class Reader {
  readonly problems: QueryProblem[] = []
  constructor(private readonly params: Params) {}

  text(field: QueryField): string {
    const value = this.params[field]
    return ((Array.isArray(value) ? value[0] : value) ?? '').trim()
  }

  choice<T extends string, E extends T | ''>(field: QueryField, values: readonly T[], otherwise: E): T | E {
    const text = this.text(field)
    const found = values.find((value) => value === text)
    if (text !== '' && !found) this.problems.push({ field, message: `"${text.slice(0, 40)}" is not a choice here.` })
    return found ?? otherwise
  }

  length(field: QueryField): number | null {
    const text = this.text(field)
    if (text === '') return null
    const read = parseLength(text)
    if (read.ok && read.inches > 0) return read.inches
    this.problems.push({ field, message: read.ok ? 'Give a length above 0.' : read.message })
    return null
  }

  zone(field: QueryField): number | null {
    const text = this.text(field)
    if (text === '') return null
    const zone = /^(\d{1,2})[ab]?$/i.exec(text)
    if (zone && Number(zone[1]) >= 1 && Number(zone[1]) <= 13) return Number(zone[1])
    this.problems.push({ field, message: 'A zone is 1 to 13, with or without a or b.' })
    return null
  }

  count(field: QueryField, otherwise: number, most: number): number {
    const text = this.text(field)
    if (text === '') return otherwise
    if (/^\d{1,9}$/.test(text) && Number(text) >= 1) return Math.min(Number(text), most)
    this.problems.push({ field, message: 'Give a whole number from 1.' })
    return otherwise
  }
}

/**
 * Reads a query from the parameters of an address. What cannot be read asks for nothing and is told in `problems`;
 * parameters of other names are left alone. Lengths may say their unit (`48`, `4 ft`, `1.2 m`); zones may carry a half.
 */
export function readPlantQuery(params: Params): { query: PlantQuery; problems: QueryProblem[] } {
  const read = new Reader(params)
  const query: PlantQuery = {
    q: read.text('q').slice(0, LONGEST_QUESTION),
    category: read.choice('category', CATEGORIES, ''),
    leaf: read.choice('leaf', LEAF_FILTERS, ''),
    heightMax: read.length('heightMax'),
    spreadMax: read.length('spreadMax'),
    zone: read.zone('zone'),
    light: read.choice('light', LIGHTS, ''),
    deer: read.choice('deer', DEER_CLASSES, ''),
    foliageColor: read.choice('foliageColor', FOLIAGE_COLORS, ''),
    bloomColor: read.choice('bloomColor', BLOOM_FILTERS, ''),
    owner: read.choice('owner', OWNERS, ''),
    sort: read.choice('sort', PLANT_SORTS, 'match'),
    direction: read.choice('direction', ['asc', 'desc'], 'asc'),
    page: read.count('page', 1, LAST_PAGE),
    pageSize: read.count('pageSize', PAGE_SIZE, MAX_PAGE_SIZE),
  }
  return { query, problems: read.problems }
}

/** A query as the part of an address behind the "?": only what differs from asking for every plant; '' for that. */
export function plantQueryText(query: PlantQuery): string {
  const params = new URLSearchParams()
  for (const field of Object.keys(EVERY_PLANT) as QueryField[]) {
    const value = query[field]
    if (value !== EVERY_PLANT[field] && value !== null) params.set(field, String(value))
  }
  return params.toString()
}

/** Whether anything narrows the library: words or a filter, order and page aside. */
export function isNarrowed(query: PlantQuery): boolean {
  const { sort, direction, page, pageSize } = EVERY_PLANT
  return plantQueryText({ ...query, sort, direction, page, pageSize }) !== ''
}

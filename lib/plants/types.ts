/**
 * Plant facts, in the trade's words. The value lists are the single source for the zod schema,
 * the table filters and the database checks. Lengths are inches.
 */

export const CATEGORIES = ['tree', 'shrub', 'vine', 'groundcover', 'perennial', 'grass', 'fern', 'bulb', 'annual'] as const
export const LEAVES = ['deciduous', 'semi-evergreen', 'broadleaf-evergreen', 'needle-evergreen', 'scale-evergreen', 'herbaceous'] as const
export const HABITS = [
  'columnar', 'upright', 'pyramidal', 'rounded', 'mounded', 'spreading',
  'vase', 'arching', 'weeping', 'clump', 'multi-stem', 'prostrate',
] as const
export const GROWTHS = ['slow', 'moderate', 'fast'] as const
export const LIGHTS = ['full-sun', 'part-shade', 'full-shade'] as const
export const WATERS = ['dry', 'medium', 'wet'] as const
export const FOLIAGE_COLORS = [
  'green', 'dark-green', 'light-green', 'blue-green', 'silver', 'gold', 'purple', 'red', 'bronze',
  'variegated-white', 'variegated-yellow',
] as const
export const TEXTURES = ['fine', 'medium', 'coarse'] as const
export const BLOOM_COLORS = ['white', 'pink', 'red', 'orange', 'yellow', 'green', 'blue', 'purple', 'multi', ''] as const
export const FALL_COLORS = ['none', 'yellow', 'orange', 'red', 'purple', 'bronze', 'multi'] as const
export const DEER_CLASSES = ['rarely', 'seldom', 'occasionally', 'frequently', 'unknown'] as const
export const BIRD_VALUES = ['fruit', 'seed', 'nectar', 'shelter'] as const
export const NATIVE_REGIONS = ['northeast', 'southeast', 'midwest', 'south-central', 'mountain', 'pacific'] as const
export const TOXICITIES = ['unlisted', 'irritant', 'toxic'] as const
export const JUGLONES = ['tolerant', 'sensitive', 'unknown'] as const
export const PRUNES = ['after-bloom', 'late-winter', 'shear', 'cut-back', 'deadhead', 'minimal', 'none'] as const

export type Category = (typeof CATEGORIES)[number]
export type Leaf = (typeof LEAVES)[number]
export type Habit = (typeof HABITS)[number]
export type Growth = (typeof GROWTHS)[number]
export type Light = (typeof LIGHTS)[number]
export type Water = (typeof WATERS)[number]
export type FoliageColor = (typeof FOLIAGE_COLORS)[number]
export type Texture = (typeof TEXTURES)[number]
export type BloomColor = (typeof BLOOM_COLORS)[number]
export type FallColor = (typeof FALL_COLORS)[number]
export type DeerClass = (typeof DEER_CLASSES)[number]
export type BirdValue = (typeof BIRD_VALUES)[number]
export type NativeRegion = (typeof NATIVE_REGIONS)[number]
export type Toxicity = (typeof TOXICITIES)[number]
export type Juglone = (typeof JUGLONES)[number]
export type Prune = (typeof PRUNES)[number]

/** The facts of a plant that the check, the drawing and the counts use: what stands in a sheet. */
export interface Plant {
  id: string
  botanical: string
  common: string
  category: Category
  leaf: Leaf
  /** Published mature sizes, inches; a single published figure stands as min = max. */
  heightMin: number
  heightMax: number
  spreadMin: number
  spreadMax: number
  habit: Habit
  growth: Growth
  /** Hardiness zone numbers 1-13; null where the plant is grown for one season. */
  zoneMin: number | null
  zoneMax: number | null
  light: Light[]
  water: Water[]
  foliageColor: FoliageColor
  texture: Texture
  /** Months 1-12 in flower, in the order they come; [] for plants grown for leaf alone. */
  bloomMonths: number[]
  bloomColor: BloomColor
  deer: DeerClass
  toxicity: Toxicity
  juglone: Juglone
  thorns: boolean
  invasive: boolean
  native: NativeRegion[]
  prune: Prune
}

/** How a fact is known: read in the source named, common practice, or from memory. */
export type Evidence = 'read' | 'practice' | 'memory'

/** A plant as the library keeps it: the sheet's facts and those only people read. */
export interface LibraryPlant extends Plant {
  /** null = shared library; otherwise the studio that added it. */
  studioId: string | null
  fallColor: FallColor
  /** Fruit colour and months, as printed; '' = none of note. */
  fruitColor: string
  fruitMonths: number[]
  /** What birds have of it; [] = nothing of note. */
  birds: BirdValue[]
  sources: PlantSource[]
}

/**
 * Where facts of a plant were read. `facts` names them as the columns of an import do (see FACTS). Which of several
 * read sources carries which fact is not recorded: they stand for their facts jointly.
 */
export interface PlantSource {
  title: string
  url: string
  evidence: Evidence
  facts: string[]
}

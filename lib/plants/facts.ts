/** The facts that sources carry, named as the columns of an import. */
export const FACTS = [
  'category', 'leaf', 'height_min', 'height_max', 'spread_min', 'spread_max', 'habit', 'growth', 'zone_min', 'zone_max',
  'light', 'water', 'foliage_color', 'texture', 'bloom_months', 'bloom_color', 'fall_color', 'fruit', 'deer', 'birds',
  'native', 'thorns', 'toxicity', 'juglone', 'invasive', 'prune',
] as const
export type Fact = (typeof FACTS)[number]

/** What a fact is called on screen. */
export const FACT_LABELS: Record<Fact, string> = {
  category: 'Type',
  leaf: 'Leaf',
  height_min: 'Smallest height',
  height_max: 'Largest height',
  spread_min: 'Smallest spread',
  spread_max: 'Largest spread',
  habit: 'Habit',
  growth: 'Growth',
  zone_min: 'Coldest zone',
  zone_max: 'Warmest zone',
  light: 'Light',
  water: 'Soil moisture',
  foliage_color: 'Foliage color',
  texture: 'Texture',
  bloom_months: 'Months in flower',
  bloom_color: 'Flower color',
  fall_color: 'Fall color',
  fruit: 'Fruit',
  deer: 'Deer browse',
  birds: 'For birds',
  native: 'Native to',
  thorns: 'Thorns',
  toxicity: 'Toxicity',
  juglone: 'Near walnut',
  invasive: 'Invasive',
  prune: 'Pruning',
}

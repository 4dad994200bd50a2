export * from './types'
export * from './schema'
export { FACTS, FACT_LABELS, type Fact } from './facts'
export { enteredSourcesOf, FROM_MEMORY, knownBy, plantSourcesOf } from './sources'
export { formatMonths, monthName, monthsInWords, parseMonths } from './months'
export { nameKey } from './name-key'
export { searchExpression } from './search-words'
export {
  BLOOM_FILTERS, EVERY_PLANT, isNarrowed, LEAF_FILTERS, OWNERS, PAGE_SIZE, plantQueryText, readPlantQuery,
  type PlantQuery, type PlantSort, type QueryProblem,
} from './query'
export { DEER_WORDS, factGroups, rangeText, wordOf, zonesText, type FactLine } from './words'
export { EMPTY_FORM, formValuesOf, plantFormSchema, type PlantFormValues } from './form'

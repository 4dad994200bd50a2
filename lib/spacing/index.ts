/** The rule engine. This file is its only door. */
export * from './types'
export { check, checkPlacement, ENGINE_VERSION, prepare } from './check'
export type { Prepared } from './prepared'
export { crownVolume, radiusAt, reach, silhouette, silhouetteArea, span, topOf, type Crown } from './crown'
export {
  crownOf, GROWTH_SOURCES, matureSize, sizeAt, sizeRange, yearOfHeight, zoneNumber,
  type CrownArgs, type SizeArgs, type When,
} from './growth'
export { gradeAt, groundAt } from './geometry/ground'
export { wallDistance, wallY } from './geometry/wall'
export { distanceToPolygon, pointInPolygon, polygonArea, polygonCrossesItself } from './geometry/polygon'
export { RULES } from './rules'
export type { Rule } from './rule'
export { defaultStandards, resolveStandards } from './standards'
export { describe, lengthText, yearsText, type Description } from './sentences'

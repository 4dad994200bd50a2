/** The rule engine. This file is its only door. */
export * from './types'
export { check, checkPlacement, ENGINE_VERSION, prepare } from './check'
export type { Prepared } from './prepared'
export { crownVolume, radiusAt, reach, silhouette, silhouetteArea, span, topOf, type Crown } from './crown'
export {
  crownOf, GROWTH_SOURCES, matureSize, sizeAt, sizeRange, yearOfHeight, zoneNumber,
  type CrownArgs, type SizeArgs, type When,
} from './growth'
export { pairsThatMeet } from './pairs'
export { gradeAt, groundAt } from './geometry/ground'
export { wallDistance, wallY } from './geometry/wall'
export { distanceToPolygon, pointInPolygon, polygonArea, polygonCrossesItself } from './geometry/polygon'
export { RULES } from './rules'
export type { Rule } from './rule'
export { defaultStandards, resolveStandards, STANDARDS } from './standards'
export { applyRemedy, changedPlacements, waysOut, type WaysOutOptions } from './remedies'
export { fitsHere, type Fit, type Fits, type NearMiss, type Spot } from './fits'
export { UPKEEP_YEARS } from './upkeep'
export { ANNUAL_SPACING_IN, annualsIn, plantsInArea, type SpacingPattern } from './pockets'
export { bloomGaps } from './by-bed'
export { describe, describeMiss, describeRemedy, lengthText, NO_WAY_OUT, yearsText, type Description } from './sentences'

/** Units of length people write on site, and how many inches each is. */

/** Units a bare number can be meant in. */
export const LENGTH_UNITS = ['in', 'ft', 'cm', 'm', 'mm'] as const
export type LengthUnit = (typeof LENGTH_UNITS)[number]

/** The international inch is 25.4 mm exactly (international yard and pound agreement, 1959). */
const MM_PER_INCH = 25.4
export const CM_PER_INCH = 2.54

/** Lengths typed or dragged are kept to this part of an inch, so that equal means equal. */
export const PARTS_PER_INCH = 64

/** No house front is longer than this (1,000 ft): larger numbers are slips of unit or of finger. */
export const MAX_LENGTH_IN = 12_000

/** A number in one unit as inches, not rounded. */
export function toInches(value: number, unit: LengthUnit): number {
  switch (unit) {
    case 'in':
      return value
    case 'ft':
      return value * 12
    case 'cm':
      return (value * 10) / MM_PER_INCH
    case 'm':
      return (value * 1000) / MM_PER_INCH
    case 'mm':
      return value / MM_PER_INCH
  }
}

/** To the nearest 1/64 in; never minus zero. */
export function roundLength(inches: number): number {
  return Math.round(inches * PARTS_PER_INCH) / PARTS_PER_INCH + 0
}

const WORDS: Record<string, LengthUnit> = {
  "'": 'ft', ft: 'ft', foot: 'ft', feet: 'ft',
  '"': 'in', in: 'in', ins: 'in', inch: 'in', inches: 'in',
  cm: 'cm', cms: 'cm', centimeter: 'cm', centimeters: 'cm', centimetre: 'cm', centimetres: 'cm',
  m: 'm', meter: 'm', meters: 'm', metre: 'm', metres: 'm',
  mm: 'mm', millimeter: 'mm', millimeters: 'mm', millimetre: 'mm', millimetres: 'mm',
}

const FOREIGN: Record<string, string> = {
  km: 'Kilometers', kilometer: 'Kilometers', kilometers: 'Kilometers', kilometre: 'Kilometers', kilometres: 'Kilometers',
  mi: 'Miles', mile: 'Miles', miles: 'Miles',
}

const lookUp = <T>(table: Record<string, T>, word: string): T | null => {
  const key = word.toLowerCase()
  return Object.hasOwn(table, key) ? table[key]! : null
}

/** The unit a word or a mark stands for, in any case; null when it stands for none. */
export const unitOf = (word: string): LengthUnit | null => lookUp(WORDS, word)

/** Units that exist but never measure a house front, by their plural name; null for other words. */
export const foreignUnitOf = (word: string): string | null => lookUp(FOREIGN, word)

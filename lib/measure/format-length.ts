/** Writes lengths as drawings and lists show them; `parseLength` reads every form back. */
import { CM_PER_INCH, PARTS_PER_INCH } from './units'

export type LengthStyle = 'imperial' | 'metric' | 'inches'

/** Whole inches and the reduced fraction of a count of 1/64 in: 4, 4 1/2, 1/2. */
function inchText(parts: number): string {
  const whole = Math.floor(parts / PARTS_PER_INCH)
  let above = parts % PARTS_PER_INCH
  let below = PARTS_PER_INCH
  while (above > 0 && above % 2 === 0) {
    above /= 2
    below /= 2
  }
  if (above === 0) return String(whole)
  return whole === 0 ? `${above}/${below}` : `${whole} ${above}/${below}`
}

function feetText(parts: number): string {
  const perFoot = 12 * PARTS_PER_INCH
  const feet = Math.floor(parts / perFoot)
  if (feet === 0) return `${inchText(parts)}"`
  const rest = parts % perFoot
  return `${feet}'-${rest < PARTS_PER_INCH && rest > 0 ? `0 ${inchText(rest)}` : inchText(rest)}"`
}

/**
 * A length in words of the trade, to the nearest 1/64 in (metric: to the nearest millimetre).
 * - imperial: `6'-4 1/2"`, `8'-0"`, `6'-0 1/2"`; under a foot `4 1/2"`
 * - inches: `76 1/2 in`
 * - metric: `194.3 cm`
 *
 * A minus stands in front; nothing is ever minus zero. What is no finite number is shown as `?`.
 */
export function formatLength(inches: number, style: LengthStyle = 'imperial'): string {
  if (!Number.isFinite(inches)) return '?'
  if (style === 'metric') {
    const cm = Math.abs(inches * CM_PER_INCH).toFixed(1)
    return `${inches < 0 && Number(cm) > 0 ? '-' : ''}${cm} cm`
  }
  const parts = Math.round(Math.abs(inches) * PARTS_PER_INCH)
  const minus = inches < 0 && parts > 0 ? '-' : ''
  return style === 'inches' ? `${minus}${inchText(parts)} in` : `${minus}${feetText(parts)}`
}

/** Both ways of writing a length, to echo what was understood: `6'-4 1/2" = 194.3 cm`. */
export function echoLength(inches: number): string {
  return `${formatLength(inches)} = ${formatLength(inches, 'metric')}`
}

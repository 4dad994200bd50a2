/** Reads a length as people write it, or says in one sentence why it cannot be one. */
import { tokensOf, type Token } from './tokens'
import { MAX_LENGTH_IN, foreignUnitOf, roundLength, toInches, unitOf, type LengthUnit } from './units'

export type ParsedLength = { ok: true; inches: number } | { ok: false; message: string }

/** One number with the unit written after it, if any. `isWhole`: no decimals, no fraction. */
interface Part {
  value: number
  isWhole: boolean
  text: string
  unit: LengthUnit | null
}

class Refusal extends Error {}
const refuse = (message: string): never => {
  throw new Refusal(message)
}

const EXAMPLES = `such as 6'-4 1/2", 76.5 or 193 cm`
const LONGEST_TEXT = 60

/** A decimal comma counts where it can mean nothing else: 193,5 - but 1,930 may be one thousand or one point nine. */
function decimalOf(text: string): number {
  if (/,.*[.,]|\..*[.,]/.test(text.replace(/\.$/, ''))) refuse(`"${text}" has two decimal marks.`)
  if (/^[1-9]\d{0,2},\d{3}$/.test(text)) {
    refuse(`"${text}" can be read two ways: write ${text.replace(',', '')} or ${text.replace(',', '.')}.`)
  }
  const value = Number(text.replace(',', '.'))
  return Number.isFinite(value) ? value : refuse('That number is far too large.')
}

/** Walks along the tokens. */
class Reader {
  private at = 0
  constructor(private readonly tokens: readonly Token[]) {}

  peek(ahead = 0): Token | undefined {
    return this.tokens[this.at + ahead]
  }

  takeSign(...signs: string[]): boolean {
    const token = this.peek()
    if (token?.kind !== 'sign' || !signs.includes(token.text)) return false
    this.at += 1
    return true
  }

  takeNumber(): string {
    const token = this.peek()
    if (token?.kind !== 'number') return this.refuseHere()
    this.at += 1
    return token.text
  }

  takeUnit(): LengthUnit | null {
    const token = this.peek()
    if (token?.kind !== 'word') return null
    const unit = unitOf(token.text) ?? this.refuseHere()
    this.at += 1
    return unit
  }

  /** Is a fraction next, `ahead` tokens on? */
  fractionNext(ahead = 0): boolean {
    const slash = this.peek(ahead + 1)
    return this.peek(ahead)?.kind === 'number' && slash?.kind === 'sign' && slash.text === '/'
  }

  refuseHere(): never {
    const token = this.peek()
    if (!token) return refuse(`Something is missing at the end. Write a length ${EXAMPLES}.`)
    const foreign = foreignUnitOf(token.text)
    if (foreign) return refuse(`${foreign} are not a size of a house front. Use feet and inches, m, cm or mm.`)
    if (token.kind === 'word') return refuse(`"${token.text}" is not part of a length. Write it ${EXAMPLES}.`)
    return refuse(`"${token.text}" does not belong there. Write a length ${EXAMPLES}.`)
  }
}

function readFraction(reader: Reader): { value: number; text: string } {
  const above = reader.takeNumber()
  reader.takeSign('/')
  const below = reader.takeNumber()
  const text = `${above}/${below}`
  if (!/^\d+$/.test(above) || !/^\d+$/.test(below)) refuse(`A fraction has whole numbers above and below: "${text}" has not.`)
  if (Number(below) === 0) refuse(`A fraction cannot have 0 below the line: "${text}".`)
  return { value: decimalOf(above) / decimalOf(below), text }
}

function readAmount(reader: Reader): Omit<Part, 'unit'> {
  if (reader.fractionNext()) return { ...readFraction(reader), isWhole: false }
  const text = reader.takeNumber()
  const value = decimalOf(text)
  const dash = reader.peek()
  const isJoined = dash?.kind === 'sign' && dash.text === '-' && reader.fractionNext(1)
  if (!isJoined && !reader.fractionNext()) return { value, isWhole: Number.isInteger(value), text }
  if (!Number.isInteger(value)) refuse(`"${text}" has decimals and a fraction: use one of them.`)
  if (isJoined) reader.takeSign('-')
  const fraction = readFraction(reader)
  if (fraction.value >= 1) refuse(`${fraction.text} is a whole or more: add it to the ${text} before it.`)
  return { value: value + fraction.value, isWhole: false, text: `${text} ${fraction.text}` }
}

function readParts(reader: Reader): Part[] {
  const parts: Part[] = []
  while (reader.peek()) {
    const before = parts.at(-1)
    if (before?.unit) reader.takeSign('-', ',')
    parts.push({ ...readAmount(reader), unit: reader.takeUnit() })
  }
  return parts
}

/** Units that may follow one another, and how many of the second make one of the first. */
const PAIRS = [{ first: 'ft', second: 'in', per: 12, name: 'a foot' }, { first: 'm', second: 'cm', per: 100, name: 'a meter' }] as const

function pairInches(first: Part, second: Part): number {
  if (!first.unit) return refuse(`Two numbers, and the first has no unit: write ${first.text}' ${second.text}" if feet and inches are meant.`)
  const pair = PAIRS.find((known) => known.first === first.unit && (second.unit === null || second.unit === known.second))
  if (!pair) return refuse(`One length has one unit, or feet and then inches. Write it ${EXAMPLES}.`)
  if (!first.isWhole) return refuse(`${first.text} ${pair.first} has a part left over, and ${pair.second} follow: use one of them.`)
  if (second.value === pair.per) return refuse(`${second.text} ${pair.second} is ${pair.name}: carry it over.`)
  if (second.value > pair.per) return refuse(`${second.text} ${pair.second} is more than ${pair.name}.`)
  return toInches(first.value, pair.first) + toInches(second.value, pair.second)
}

function inchesOf(parts: readonly Part[], bareUnit: LengthUnit): number {
  const [first, second, third] = parts
  if (!first) return refuse(`Write a length ${EXAMPLES}.`)
  if (third) return refuse(`Too many numbers for one length. Write it ${EXAMPLES}.`)
  return second ? pairInches(first, second) : toInches(first.value, first.unit ?? bareUnit)
}

function read(text: string, bareUnit: LengthUnit): number {
  if (text.length > LONGEST_TEXT) refuse(`That is too long to be a length. Write it ${EXAMPLES}.`)
  if (/\d\s*e\s*[-+]?\d/i.test(text)) refuse('Write the number out, without an exponent.')
  const tokens = tokensOf(text)
  if (tokens.length === 0) refuse(`Write a length ${EXAMPLES}.`)
  const reader = new Reader(tokens)
  const isMinus = reader.takeSign('-')
  if (!isMinus) reader.takeSign('+')
  const inches = inchesOf(readParts(reader), bareUnit)
  if (inches > MAX_LENGTH_IN) refuse('That is more than 1,000 ft: no house front is so large.')
  return roundLength(isMinus ? -inches : inches)
}

/**
 * The length a text means, in inches, rounded to 1/64 in.
 *
 * Takes feet and inches with any quotes, dashes and spaces (`6'-4 1/2"`, `6 ft 4`, `6' 4½"`), inches with decimals
 * or fractions, decimal feet, m, cm and mm, a minus sign in front, and a decimal comma where it can mean nothing else.
 * @param unit what a number without a unit is meant in; inches that follow feet need none.
 * @returns the length, or one sentence for the person who typed: nothing written, letters, exponents, a fraction over 0,
 * 12 in or more after feet, two numbers without a unit, more than 1,000 ft. Never throws.
 * @example parseLength(`6'-4 1/2"`) // { ok: true, inches: 76.5 }
 */
export function parseLength(text: string, unit: LengthUnit = 'in'): ParsedLength {
  try {
    return { ok: true, inches: read(text, unit) }
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, message: error.message }
    throw error
  }
}

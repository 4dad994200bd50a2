/** Every way of writing a length that people use on site is read; everything else gets a sentence. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { MAX_LENGTH_IN, formatLength, parseLength, type LengthUnit } from '@/lib/measure'

function inchesOf(text: string, unit?: LengthUnit): number {
  const parsed = parseLength(text, unit)
  if (!parsed.ok) throw new Error(`${text}: ${parsed.message}`)
  return parsed.inches
}

function messageOf(text: string): string {
  const parsed = parseLength(text)
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.inches}`)
  return parsed.message
}

describe('feet and inches', () => {
  test.each([
    [`6'-4 1/2"`, 76.5], [`6' 4½"`, 76.5], [`6’4”`, 76], [`6′ 4″`, 76], [`6‘4“`, 76], [`6'4''`, 76], ['6 ft 4', 76],
    ['6ft4in', 76], ['6 ft. 4 in.', 76], ['6 feet, 4 inches', 76], ['6 foot 4', 76], [`6'-4-1/2"`, 76.5], [`6' - 4"`, 76],
    [`6'–4"`, 76], [`6'4.25"`, 76.25], [`6'0"`, 72], [`6'`, 72], ['6 FT', 72], [`6.5'`, 78], [`6 1/2'`, 78], [`6½ ft`, 78],
    [`6'\u00a04\u00a01/2"`, 76.5], [`6'-1/2"`, 72.5], [`6'½`, 72.5], [`6´4`, 76], [`0'-4"`, 4],
  ])('%s is %d in', (text, inches) => expect(inchesOf(text)).toBe(inches))
})

describe('inches', () => {
  test.each([
    ['76.5', 76.5], ['76 1/2', 76.5], ['76-1/2', 76.5], ['76½', 76.5], ['76 ½ in', 76.5], ['1/2', 0.5], ['⅛"', 0.125], ['3/2', 1.5],
    ['76"', 76], ['76 in', 76], ['76 inches', 76], ['.5', 0.5], ['76.', 76], ['0', 0], [' 76 ', 76], ['76 1⁄2', 76.5], ['76,5', 76.5],
    ['+4', 4],
  ])('%s is %d in', (text, inches) => expect(inchesOf(text)).toBe(inches))
})

describe('metric', () => {
  test.each([['193 cm', 193 / 2.54], ['1.93 m', 193 / 2.54], ['1930 mm', 193 / 2.54], ['193,5 cm', 193.5 / 2.54], ['1,93 m', 193 / 2.54], ['0,125 m', 12.5 / 2.54],
    ['1 m 93 cm', 193 / 2.54], ['1 m 93', 193 / 2.54], ['193cm', 193 / 2.54], ['2 metres', 200 / 2.54]])('%s', (text, exact) => {
    expect(inchesOf(text)).toBe(Math.round(exact * 64) / 64)
  })
})

describe('a minus in front', () => {
  test.each([['-4 in', -4], ['−4 in', -4], ['- 4', -4], [`-6'-4"`, -76], ['–4 1/2', -4.5], ['-10 cm', -252 / 64]])('%s', (text, inches) => {
    expect(inchesOf(text)).toBe(inches)
  })
  test('minus zero is zero', () => expect(Object.is(inchesOf('-0'), 0)).toBe(true))
})

describe('a number without a unit', () => {
  test('is meant in the unit asked for', () => {
    expect(inchesOf('6.5', 'ft')).toBe(78)
    expect(inchesOf('254', 'cm')).toBe(100)
    expect(inchesOf('2.54', 'm')).toBe(100)
    expect(inchesOf('254', 'mm')).toBe(10)
  })
  test('a unit that is written wins', () => expect(inchesOf('76 in', 'cm')).toBe(76))
  test('inches follow feet, whatever bare numbers mean', () => expect(inchesOf('6 ft 4', 'cm')).toBe(76))
})

describe('what cannot be a length gets a sentence', () => {
  test.each([
    ['', 'Write a length'], ['   ', 'Write a length'], ['\u00a0', 'Write a length'], ['abc', '"abc" is not part of a length'], ['NaN', '"NaN" is not part'],
    ['Infinity', '"Infinity"'], ['-Infinity', '"Infinity"'], ['1e400', 'without an exponent'], ['1e2', 'without an exponent'], ['10 km', 'Kilometers are not a size of a house front'],
    ['1 mile', 'Miles are not'], ['6 4', 'Two numbers'], ['6 4 in', 'Two numbers'], [`6' 14"`, '14 in is more than a foot'], [`6' 12"`, '12 in is a foot'],
    ['1/0', 'cannot have 0'], ['4 1/0"', 'cannot have 0'], ['1,930 mm', 'write 1930 or 1.930'], ['1.2.3', 'two decimal marks'], ['1,234.5', 'two decimal marks'],
    [`4" 6'`, 'One length has one unit'], [`6' 4'`, 'One length has one unit'], [`6.5' 4"`, 'use one of them'], ['76.5 1/2', 'use one of them'],
    ['76 3/2', 'a whole or more'], ['1.5/2', 'whole numbers above and below'], [`6' 4" 2"`, 'Too many numbers'], ['--4', 'does not belong'], ['4-', 'does not belong'],
    ['1/', 'missing at the end'], ['4 $', 'does not belong'], ['12001', 'more than 1,000 ft'], ['-12001', 'more than 1,000 ft'], ['305 m', 'more than 1,000 ft'],
    ['9'.repeat(59), 'more than 1,000 ft'], ['9'.repeat(400), 'too long'], ['6 ft constructor', '"constructor"'], ['1 m 100 cm', '100 cm is a meter'], ['=1+1', 'does not belong'],
  ])('%s', (text, part) => {
    const message = messageOf(text)
    expect(message).toContain(part)
    expect(message).toMatch(/^["A-Z0-9].*\.$/)
  })

  test('1,000 ft is the last that is taken', () => expect(inchesOf('1000 ft')).toBe(MAX_LENGTH_IN))

  test('no text at all makes it throw or answer a number that is not finite', () => {
    const pieces = fc.constantFrom('6', '4', '12', '0', '1/2', '½', "'", '"', ' ', '-', ',', '.', 'ft', 'in', 'cm', 'e', '/', '’', '−', 'x')
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.array(pieces).map((all) => all.join(''))), (text) => {
        const parsed = parseLength(text)
        if (parsed.ok) expect(Number.isFinite(parsed.inches) && Number.isInteger(parsed.inches * 64)).toBe(true)
        else expect(parsed.message.length).toBeGreaterThan(10)
      }),
      { numRuns: 2_000 },
    )
  })
})

const sixtyFourths = fc.integer({ min: -MAX_LENGTH_IN * 64, max: MAX_LENGTH_IN * 64 }).map((parts) => parts / 64 + 0)

describe('what is written is read back', () => {
  test('feet and inches, and inches, to the same length', () => {
    fc.assert(
      fc.property(sixtyFourths, (inches) => {
        expect(inchesOf(formatLength(inches))).toBe(inches)
        expect(inchesOf(formatLength(inches, 'inches'))).toBe(inches)
      }),
      { numRuns: 2_000 },
    )
  })

  test('centimetres to the same text', () => {
    fc.assert(
      fc.property(sixtyFourths, (inches) => {
        const text = formatLength(inches * 0.99, 'metric')
        expect(formatLength(inchesOf(text), 'metric')).toBe(text)
      }),
    )
  })
})

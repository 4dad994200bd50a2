import { expect, test } from 'vitest'
import { echoLength, formatLength, roundLength } from '@/lib/measure'

test.each([
  [76.5, `6'-4 1/2"`], [96, `8'-0"`], [72.5, `6'-0 1/2"`], [4.5, `4 1/2"`], [0.5, `1/2"`], [0, `0"`], [-4, `-4"`], [-76.5, `-6'-4 1/2"`],
  [76 + 1 / 64, `6'-4 1/64"`], [76 + 1 / 200, `6'-4"`], [95.9999, `8'-0"`], [-0.001, `0"`], [12, `1'-0"`],
])('%d in is %s', (inches, text) => expect(formatLength(inches)).toBe(text))

test.each([[76.5, '76 1/2 in'], [0, '0 in'], [0.375, '3/8 in'], [-3, '-3 in']])('%d in inches is %s', (inches, text) => {
  expect(formatLength(inches, 'inches')).toBe(text)
})

test.each([[76.5, '194.3 cm'], [0, '0.0 cm'], [-0.001, '0.0 cm'], [-10, '-25.4 cm']])('%d in is %s', (inches, text) => {
  expect(formatLength(inches, 'metric')).toBe(text)
})

test('what is no number is not dressed up as one', () => {
  expect(formatLength(NaN)).toBe('?')
  expect(formatLength(Infinity, 'metric')).toBe('?')
})

test('an echo says both', () => expect(echoLength(76.5)).toBe(`6'-4 1/2" = 194.3 cm`))

test('a length is kept to 1/64 in', () => {
  expect(roundLength(1 / 3)).toBe(21 / 64)
  expect(Object.is(roundLength(-0.001), 0)).toBe(true)
})

import { expect, test } from 'vitest'
import { plantKeys } from '@/lib/sheet'
import type { Placement } from '@/lib/spacing'

const stand = (plant: string, status?: Placement['status']): Placement => ({ id: `at-${plant}`, plant, x: 0, y: 0, planted: { height: 1, spread: 1 }, ...(status && { status }) })

test('letters follow the order in which plants first stand; what goes has none', () => {
  const keys = plantKeys({ placements: [stand('b'), stand('x', 'goes'), stand('a', 'stays'), stand('b')] })
  expect([...keys]).toEqual([['b', 'A'], ['a', 'B']])
})

test('I and O are left out, and AA follows Z', () => {
  const keys = [...plantKeys({ placements: Array.from({ length: 26 }, (_, i) => stand(`p${i}`)) }).values()]
  expect(keys.slice(0, 9).join('')).toBe('ABCDEFGHJ')
  expect(keys.slice(22)).toEqual(['Y', 'Z', 'AA', 'AB'])
})

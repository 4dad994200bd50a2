import { expect, test } from 'vitest'
import type { Placement } from '@/lib/spacing'
import { found, makePlacement, makePlant, makeSheet } from '../../../support/sheets'

/** Expected 100 in both ways. */
const kept = (size: Placement['kept'], changes: Partial<Placement> = {}) =>
  found(makeSheet({ plants: [makePlant({ heightMin: 80, heightMax: 120, spreadMin: 80, spreadMax: 120 })], placements: [makePlacement({ ...(size && { kept: size }), ...changes })] }), 'hard-to-hold')

test('six tenths of its natural size can be held, less cannot', () => {
  expect(kept({ height: 60 })).toEqual([])
  expect(kept({ height: 59.98 })[0]).toMatchObject({ kind: 'risk', feature: 'p1', limit: 0.6, measured: { low: null, expected: 0.5998, high: null }, excess: expect.closeTo(0.02, 6), year: null })
})
test('height or spread, whichever is harder', () => {
  expect(kept({ height: 90, spread: 50 })[0]).toMatchObject({ measured: { expected: 0.5 }, excess: 10 })
})
test('what is not clipped is not judged, what stays is', () => {
  expect(kept(undefined)).toEqual([])
  expect(kept({ height: 40 }, { status: 'stays' })).toHaveLength(1)
})

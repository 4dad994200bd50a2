/** Published distances between two shrubs, and the order of layers. */
import { describe, expect, test } from 'vitest'
import { cited, findingsOf, grownPlant, placementOf, sheetOf, type Published } from './support'

const SHRUB_SPACING: Published = {
  publisher: 'biologyinsights.com (unsigned; taken for its arithmetic only)', title: 'How far apart should you plant shrubs', known: 'read',
  address: 'https://biologyinsights.com/how-far-apart-should-you-plant-shrubs',
}
const PETAL_PUSHERS: Published = {
  publisher: 'Petal Pushers Farm', title: 'Plant spacing', known: 'read',
  address: 'https://petalpushersfarm.com/blog?post=20&title=Plants',
}
const HEDGE: Published = {
  publisher: 'hotelsabruzzo.com (unsigned; taken for its arithmetic only)', title: 'How do you measure shrub spacing', known: 'read',
  address: 'https://hotelsabruzzo.com/how-do-you-measure-shrub-spacing',
}
const LAYERS: Published = {
  publisher: 'landscape trade', title: 'a plant nearer the walk is not taller than the one behind it', known: 'practice', address: '',
}

interface Pair {
  spreads: [number, number]
  apart: number
  drift?: string
  role?: 'hedge'
  standards?: Record<string, number>
}

/** Two grown domes of unlike plants side by side on level soil: they are widest at one height, the soil's. */
function pair({ spreads: [a, b], apart, drift, role, standards }: Pair) {
  const plants = [grownPlant({ id: 'p1', height: 40, spread: a }), grownPlant({ id: 'p2', height: 40, spread: b })]
  const shared = { ...(drift ? { drift } : {}), ...(role ? { role } : {}) }
  const placements = [
    placementOf({ id: 'a1', plant: 'p1', x: 100, planted: { height: 40, spread: a }, ...shared }),
    placementOf({ id: 'a2', plant: 'p2', x: 100 + apart, planted: { height: 40, spread: b }, ...shared }),
  ]
  return findingsOf(sheetOf({ plants, placements, ...(standards ? { standards } : {}) }), 'crowding')
}

describe('crowding', () => {
  test.each([
    [cited('48 and 72 in wide: 60 in on centre touches exactly', SHRUB_SPACING), [48, 72], 60],
    [cited('60 and 36 in wide: 48 in on centre touches exactly', PETAL_PUSHERS), [60, 36], 48],
  ] as const)('%s', (_title, spreads, apart) => {
    const standards = { 'crowding.unlike': 0 }
    expect(pair({ spreads: [...spreads], apart, standards })).toEqual([])
    const [finding] = pair({ spreads: [...spreads], apart: apart - 0.02, standards })
    expect(finding).toMatchObject({ kind: 'conflict', placements: ['a1', 'a2'] })
    expect(finding?.measured?.expected).toBeCloseTo(0.02 / Math.min(...spreads), 6)
  })

  test(cited('a mixed border may stand 10 % closer: the default allows a tenth of the smaller spread, no more', HEDGE), () => {
    expect(pair({ spreads: [48, 72], apart: 60 - 4.8 })).toEqual([])
    expect(pair({ spreads: [48, 72], apart: 60 - 4.83 })).toHaveLength(1)
  })

  test(cited('a hedge stands at half the spread: 48 in plants 24 in apart', HEDGE), () => {
    expect(pair({ spreads: [48, 48], apart: 24, role: 'hedge' })).toEqual([])
    expect(pair({ spreads: [48, 48], apart: 23.98, role: 'hedge' })).toHaveLength(1)
  })

  test('one drift may mingle by a quarter of the spread (practice)', () => {
    expect(pair({ spreads: [48, 48], apart: 36, drift: 'd1' })).toEqual([])
    expect(pair({ spreads: [48, 48], apart: 35.98, drift: 'd1' })).toHaveLength(1)
  })
})

describe('layer-order', () => {
  function layers(front: number, back: number) {
    const plants = [grownPlant({ id: 'p1', height: front, spread: 40 }), grownPlant({ id: 'p2', height: back, spread: 40 })]
    const placements = [
      placementOf({ id: 'a1', plant: 'p1', x: 100, y: 100, planted: { height: front, spread: 40 } }),
      placementOf({ id: 'a2', plant: 'p2', x: 100, y: 40, planted: { height: back, spread: 40 } }),
    ]
    return findingsOf(sheetOf({ plants, placements }), 'layer-order')
  }

  test(cited('equal heights pass, one inch more in front does not', LAYERS), () => {
    expect(layers(36, 36)).toEqual([])
    expect(layers(37, 36)[0]).toMatchObject({ kind: 'conflict', placements: ['a1', 'a2'], limit: 0 })
    expect(layers(37, 36)[0]?.measured?.expected).toBeCloseTo(1, 6)
  })
})

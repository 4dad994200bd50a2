import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { buildScene, type PathShape, type Scene, type Shape } from '@/lib/drawing'
import { crownOf, radiusAt, type Sheet } from '@/lib/spacing'
import { anySheet, findingOf, ordinaryBed, placementOf, plantOf, sheetOf } from './scenes'

const at10 = (sheet: Sheet, more: Partial<Parameters<typeof buildScene>[0]> = {}): Scene =>
  buildScene({ sheet, year: 10, bound: 'expected', pxPerInch: 2, ...more })

const shapesOf = ({ elevation, plan }: Scene): Shape[] => [elevation, plan].flatMap((view) => [
  ...view.ground, ...view.plants.flatMap(({ shapes }) => shapes), ...view.limits, ...view.labels, ...view.highlight,
])

/** Every coordinate pair of path data, control points included; arcs are skipped. */
function dotsOf(d: string): { x: number; y: number }[] {
  return [...d.matchAll(/[MLQ ](-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => ({ x: Number(x), y: Number(y) }))
}

const fresh = (sheet: Sheet): Sheet => structuredClone(sheet)

describe('a scene', () => {
  it('is the same for the same sheet, drawn anew', () => {
    expect(JSON.stringify(at10(fresh(ordinaryBed())))).toBe(JSON.stringify(at10(fresh(ordinaryBed()))))
  })

  it('stands each plant at one x in both views', () => {
    const { elevation, plan } = at10(ordinaryBed())
    for (const drawing of elevation.plants) {
      expect(plan.plants.find(({ placement }) => placement === drawing.placement)?.at.x).toBe(drawing.at.x)
    }
  })

  it('draws every placement once in each view, nearest the viewer last', () => {
    const sheet = ordinaryBed()
    const { elevation, plan } = at10(sheet)
    const ids = sheet.placements.map(({ id }) => id).sort()
    expect(elevation.plants.map(({ placement }) => placement).sort()).toEqual(ids)
    expect(plan.plants.map(({ placement }) => placement).sort()).toEqual(ids)
    const depths = elevation.plants.map(({ depth }) => depth)
    expect(depths).toEqual([...depths].sort((a, b) => a - b))
  })

  it('leaves out what goes when told to, and draws it dashed and crossed otherwise', () => {
    const sheet = sheetOf([placementOf('a', 100, 60, { status: 'goes' })])
    expect(at10(sheet, { show: { goes: false } }).elevation.plants).toEqual([])
    const shapes = at10(sheet).elevation.plants[0]!.shapes as PathShape[]
    expect(shapes.some(({ dashPx }) => dashPx)).toBe(true)
  })

  it('keeps the frame where it is while the years go by', () => {
    const sheet = ordinaryBed()
    const boxes = ([0, 5, 20, 'mature'] as const).map((year) => at10(sheet, { year }).box)
    for (const box of boxes) expect(box).toEqual(boxes[0])
  })

  it('holds no number that is none, whatever the sheet', () => {
    fc.assert(fc.property(anySheet, fc.integer({ min: 1, max: 12 }), fc.constantFrom('low', 'expected', 'high'), fc.constantFrom(0, 0.5, 10, 'mature' as const), (sheet, month, bound, year) => {
      const scene = buildScene({ sheet, year, bound: bound as 'low', month, selected: sheet.placements[0]?.id ?? null })
      for (const shape of shapesOf(scene)) expect(JSON.stringify(shape)).not.toMatch(/NaN|Infinity|null/)
    }), { numRuns: 60 })
  })

  it('draws bare branches in January and leaves in July', () => {
    const sheet = sheetOf([placementOf('a', 100, 60)], [plantOf({ leaf: 'deciduous' })])
    const inks = (month: number) => (at10(sheet, { month }).elevation.plants[0]!.shapes as PathShape[]).map(({ stroke, fill }) => fill ?? stroke)
    expect(inks(7)).toContain('foliage-dark-green')
    expect(inks(1)).not.toContain('foliage-dark-green')
    expect(inks(1)).toContain('bark')
  })

  it('shows flowers in their months alone', () => {
    const sheet = sheetOf([placementOf('a', 100, 60)])
    const blooms = (month: number) => at10(sheet, { month }).elevation.plants[0]!.shapes.some((shape) => shape.kind === 'path' && shape.fill === 'bloom-white')
    expect([4, 5, 6, 7].map(blooms)).toEqual([false, true, true, false])
  })
})

describe('a drawn silhouette', () => {
  it('stays within the crown it stands for, and touches its top', () => {
    fc.assert(fc.property(anySheet, (sheet) => {
      const scene = buildScene({ sheet, year: 10, bound: 'expected', month: 5 })
      for (const drawing of scene.elevation.plants) {
        const placement = sheet.placements.find(({ id }) => id === drawing.placement)!
        const plant = sheet.plants.find(({ id }) => id === placement.plant)!
        const crown = crownOf({ plant, placement, facade: sheet.facade, zone: '6b', bound: 'expected', year: 10 })
        const filled = drawing.shapes.filter((shape): shape is PathShape => shape.kind === 'path' && shape.fill !== undefined && !shape.fill.startsWith('bloom'))
        const dots = filled.flatMap(({ d }) => dotsOf(d))
        // Coordinates are written to hundredths of an inch; radii are read where the crown is widest near that height.
        for (const { x, y } of dots) {
          const z = scene.heightAt(y)
          const radius = Math.max(...[-0.02, 0, 0.02].map((by) => radiusAt(crown, Math.min(Math.max(z + by, crown.z0 + crown.clearStem), crown.z0 + crown.height))))
          expect(Math.abs(x - crown.x)).toBeLessThanOrEqual(radius + 0.03)
          expect(z).toBeLessThanOrEqual(crown.z0 + crown.height + 0.11)
        }
        expect(Math.max(...dots.map(({ y }) => scene.heightAt(y)))).toBeCloseTo(crown.z0 + crown.height, 0)
      }
    }), { numRuns: 60 })
  })
})

describe('hatching', () => {
  const hatchOf = (scene: Scene, view: 'elevation' | 'plan') => scene[view].highlight.filter((shape) => shape.kind === 'hatch')
  const tall = plantOf({ heightMin: 60, heightMax: 90, spreadMin: 40, spreadMax: 60 })

  it('covers the crown above the sill within the window, and nothing else', () => {
    const scene = at10(sheetOf([placementOf('a', 60, 60)], [tall]), { finding: findingOf('sill', ['a'], 'w1') })
    const [hatch] = hatchOf(scene, 'elevation')
    expect(hatchOf(scene, 'plan')).toEqual([])
    const window = dotsOf(hatch!.kind === 'hatch' ? hatch!.clip[1]! : '')
    expect(Math.min(...window.map(({ x }) => x))).toBe(60)
    expect(Math.max(...window.map(({ x }) => x))).toBe(132)
    expect(Math.max(...window.map(({ y }) => y))).toBe(scene.elevationY(38))
  })

  it('is absent where the crown keeps the limit', () => {
    const low = plantOf({ heightMin: 20, heightMax: 30, spreadMin: 20, spreadMax: 30 })
    const scene = at10(sheetOf([placementOf('a', 90, 60)], [low]), { finding: findingOf('sill', ['a'], 'w1') })
    expect(hatchOf(scene, 'elevation')).toEqual([])
  })

  it('is cut to the walk in plan', () => {
    const scene = at10(sheetOf([placementOf('a', 300, 96)], [tall]), { finding: findingOf('walk-edge', ['a'], 'k1') })
    const [hatch] = hatchOf(scene, 'plan')
    const walk = dotsOf(hatch!.kind === 'hatch' ? hatch!.clip[1]! : '')
    expect(Math.min(...walk.map(({ y }) => y))).toBe(scene.planY(110))
  })

  it('is a lens between two that crowd, and nothing between two that do not', () => {
    const finding = findingOf('crowding', ['a', 'b'], null)
    const near = at10(sheetOf([placementOf('a', 300, 60), placementOf('b', 330, 60)], [tall]), { finding })
    expect(hatchOf(near, 'plan')[0]).toMatchObject({ clip: [expect.any(String), expect.any(String)] })
    const far = at10(sheetOf([placementOf('a', 260, 60), placementOf('b', 400, 60)], [tall]), { finding })
    expect(hatchOf(far, 'plan')).toEqual([])
  })

  it('says by how much, once', () => {
    const scene = at10(sheetOf([placementOf('a', 60, 60)], [tall]), { finding: findingOf('sill', ['a'], 'w1', { excess: 14.2 }) })
    const words = scene.elevation.highlight.flatMap((shape) => (shape.kind === 'text' ? [shape.text] : []))
    expect(words).toEqual([`1'-2"`])
  })
})

import { eq } from 'drizzle-orm'
import { describe, expect, it } from 'vitest'
import { facades, plants } from '@/db/schema'
import type { Context } from '@/lib/server/context'
import { createPlant } from '@/lib/server/plants/create-plant'
import { getPlant } from '@/lib/server/plants/get-plant'
import { removePlant } from '@/lib/server/plants/remove-plant'
import { enteredPlantOf, savePlant } from '@/lib/server/plants/save-plant'
import { saveEdits } from '@/lib/server/sheets/save-edits'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import { placementAt, put, type Who } from '../../support/actors'
import { plantInput } from '../../lib/plants/sample'
import { countOf, errorOf, openLibrary } from './support'

const place = (context: Context, plant: string) => saveEdits(context, { facadeId: 'facade-a', base: 0, editor: 'tablet', edits: [put(1, placementAt('p-1', 100, { plant }))] })

describe('a plant of the studio', () => {
  it('is added with its sources and read back as it was entered', () => {
    const { as } = openLibrary()
    const { id } = createPlant(as('designer'), { plant: plantInput() })
    const plant = getPlant(as('reviewer'), { plantId: id })
    expect(plant).toMatchObject({ botanical: "Ilex glabra 'Testing'", studioId: 'studio-a', birds: ['fruit', 'shelter'] })
    expect({ ...enteredPlantOf(plant), memoryFacts: enteredPlantOf(plant).memoryFacts.sort() }).toEqual({ ...plantInput(), memoryFacts: ['growth', 'texture'] })
  })

  it('is refused with each bad field named, and nothing is kept', () => {
    const { db, as } = openLibrary()
    const error = errorOf(() => createPlant(as('designer'), { plant: plantInput({ heightMin: 60, botanical: ' ' }) }))
    expect(error.code).toBe('invalid')
    expect(error.problems?.map(({ path }) => path[0])).toContain('botanical')
    expect(errorOf(() => createPlant(as('designer'), { plant: { ...plantInput(), studioId: 'studio-b' } as never })).code).toBe('invalid')
    expect(countOf(db, 'plants')).toBe(348)
  })

  it('cannot share a name with another of the studio, but may with the shared library and another studio', () => {
    const { as } = openLibrary()
    createPlant(as('designer'), { plant: plantInput({ botanical: 'Acer griseum' }) })
    const error = errorOf(() => createPlant(as('designer'), { plant: plantInput({ botanical: 'ACER  griseum' }) }))
    expect(error.problems).toEqual([{ path: ['botanical'], message: 'Your studio has a plant of this name already.' }])
    expect(createPlant(as('stranger'), { plant: plantInput({ botanical: 'Acer griseum' }) }).id).toBeTruthy()
  })

  it('is changed only by those who may, and only one’s own', () => {
    const { as } = openLibrary()
    const { id } = createPlant(as('designer'), { plant: plantInput() })
    const base = enteredPlantOf(getPlant(as('designer'), { plantId: id }))
    const change = (who: Who, plantId = id) => () => savePlant(as(who), { plantId, plant: { ...base, common: 'renamed' }, base })
    for (const who of ['reviewer', 'estimator', 'client'] as const) expect(errorOf(change(who)).code).toBe('forbidden')
    expect(errorOf(change('stranger')).code).toBe('not-found')
    expect(errorOf(change('designer', 'nowhere')).code).toBe('not-found')
    expect(errorOf(change('designer', 'plant-small')).message).toContain('shared library')
    change('owner')()
    expect(getPlant(as('designer'), { plantId: id }).common).toBe('renamed')
    expect(errorOf(() => getPlant(as('stranger'), { plantId: id })).code).toBe('not-found')
  })

  it('is not written over unseen: who read it before a change is told', () => {
    const { as } = openLibrary()
    const { id } = createPlant(as('designer'), { plant: plantInput() })
    const base = enteredPlantOf(getPlant(as('designer'), { plantId: id }))
    savePlant(as('owner'), { plantId: id, plant: { ...base, heightMax: 60 }, base })
    const error = errorOf(() => savePlant(as('designer'), { plantId: id, plant: { ...base, common: 'mine' }, base }))
    expect(error.code).toBe('conflict')
    expect(error.detail?.current).toMatchObject({ heightMax: 60 })
    savePlant(as('designer'), { plantId: id, plant: { ...base, common: 'mine' }, base: error.detail!.current as typeof base })
    expect(getPlant(as('designer'), { plantId: id })).toMatchObject({ common: 'mine', heightMax: 48 })
  })

  it('has the drawings it stands on checked again when its figures change', () => {
    const { db, as } = openLibrary()
    const before = place(as('designer'), 'plant-a').report.findings
    const base = enteredPlantOf(getPlant(as('designer'), { plantId: 'plant-a' }))
    savePlant(as('designer'), { plantId: 'plant-a', plant: { ...base, zoneMin: 9, zoneMax: 10 }, base })
    const { report, sheet } = getSheet(as('designer'), { facadeId: 'facade-a' })
    expect(sheet.plants.find(({ id }) => id === 'plant-a')?.zoneMin).toBe(9)
    expect(before.some(({ rule }) => rule === 'hardiness')).toBe(false)
    expect(report.findings.some(({ rule }) => rule === 'hardiness')).toBe(true)
    expect(db.select().from(facades).where(eq(facades.id, 'facade-a')).get()?.seq).toBe(1)
  })

  it('is taken out, but not while it stands on a drawing', () => {
    const { db, as } = openLibrary()
    place(as('designer'), 'plant-a')
    const error = errorOf(() => removePlant(as('designer'), { plantId: 'plant-a' }))
    expect(error).toMatchObject({ code: 'conflict', message: 'It is placed 1 time: on Front of project-a of House of project-a. Take it off the drawing first.' })
    const { id } = createPlant(as('designer'), { plant: plantInput() })
    expect(errorOf(() => removePlant(as('reviewer'), { plantId: id })).code).toBe('forbidden')
    expect(errorOf(() => removePlant(as('stranger'), { plantId: id })).code).toBe('not-found')
    expect(errorOf(() => removePlant(as('owner'), { plantId: 'plant-small' })).code).toBe('forbidden')
    removePlant(as('owner'), { plantId: id })
    expect(db.select().from(plants).where(eq(plants.id, id)).get()).toBeUndefined()
    expect(db.$client.prepare('select count(*) as n from plant_sources where plant_id = ?').get(id)).toEqual({ n: 0 })
  })
})

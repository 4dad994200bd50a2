import { describe, expect, it } from 'vitest'
import { getPlant } from '@/lib/server/plants/get-plant'
import { importPlants } from '@/lib/server/plants/import-plants'
import { previewImport } from '@/lib/server/plants/preview-import'
import { searchPlants } from '@/lib/server/plants/search-plants'
import { fileOf } from '../../lib/plants/sample'
import { countOf, errorOf, namesFor, openLibrary } from './support'

const MIXED = fileOf({}, { habit: 'lumpy' }, {}, { botanical: 'Ilex domestica' }, { botanical: 'Acer griseum' })

describe('an import', () => {
  it('is shown first: good lines, bad cells, what the studio has already, what the shared library has too', () => {
    const { db, as } = openLibrary()
    const preview = previewImport(as('designer'), { text: MIXED })
    expect(preview.total).toBe(5)
    expect(preview.good.map(({ line }) => line)).toEqual([2, 4, 6])
    expect(preview.problems.map(({ line, column }) => [line, column])).toEqual([[3, 'habit'], [5, 'botanical']])
    expect(preview.notes.map(({ line }) => line)).toEqual([6])
    expect(countOf(db, 'plants')).toBe(348)
  })

  it('keeps the good lines and answers the others', () => {
    const { as } = openLibrary()
    const { added, problems } = importPlants(as('designer'), { text: MIXED, mode: 'good-rows' })
    expect(added).toBe(3)
    expect(problems.map(({ line }) => line)).toEqual([3, 5])
    expect(namesFor(as('designer'), { owner: 'own' })).toEqual(['Acer griseum', 'Ilex domestica', "Ilex probata 'A'", "Ilex probata 'C'"])
    expect(namesFor(as('designer'), { q: 'testing ink', owner: 'own' })).toHaveLength(3)
    const { plants } = searchPlants(as('designer'), { q: 'probata' })
    expect(getPlant(as('designer'), { plantId: plants[0]!.id }).sources.map(({ title }) => title)).toEqual(['A grower', 'A garden', 'From memory'])
  })

  it('takes all or nothing where that is asked', () => {
    const { db, as } = openLibrary()
    const error = errorOf(() => importPlants(as('designer'), { text: MIXED, mode: 'all-or-none' }))
    expect(error).toMatchObject({ code: 'invalid', message: 'Nothing was brought in: 2 lines have problems.' })
    expect(error.problems?.map(({ path }) => path)).toEqual([[3, 'habit'], [5, 'botanical']])
    expect([countOf(db, 'plants'), countOf(db, 'plants_fts')]).toEqual([348, 348])
    expect(importPlants(as('designer'), { text: fileOf({}, {}), mode: 'all-or-none' }).added).toBe(2)
  })

  it('brings the same file in once', () => {
    const { as } = openLibrary()
    const text = fileOf({}, {})
    importPlants(as('designer'), { text, mode: 'good-rows' })
    expect(importPlants(as('designer'), { text, mode: 'good-rows' })).toMatchObject({ added: 0, problems: [{ line: 2 }, { line: 3 }] })
    expect(importPlants(as('stranger'), { text, mode: 'all-or-none' }).added).toBe(2)
  })

  it('writes nothing when a row cannot be kept halfway', () => {
    const { db, as } = openLibrary()
    db.$client.exec("create trigger halfway before insert on plants when new.botanical like '%''B''' begin select raise(abort, 'disk is full'); end")
    expect(() => importPlants(as('designer'), { text: fileOf({}, {}), mode: 'good-rows' })).toThrow('disk is full')
    expect([countOf(db, 'plants'), countOf(db, 'plants_fts')]).toEqual([348, 348])
  })

  it('says what is wrong with a file that cannot be taken at all', () => {
    const { as } = openLibrary()
    expect(errorOf(() => importPlants(as('designer'), { text: 'botanical\nIlex', mode: 'good-rows' })).message).toMatch(/^Nothing was brought in\. Line 1, common: /)
    expect(previewImport(as('designer'), { text: '' })).toMatchObject({ isReadable: false, good: [], problems: [{ line: 1, message: 'The file is empty.' }] })
  })

  it('is for those who may change plants', () => {
    const { as } = openLibrary()
    for (const who of ['reviewer', 'estimator', 'client'] as const) {
      expect(errorOf(() => previewImport(as(who), { text: '' })).code).toBe('forbidden')
      expect(errorOf(() => importPlants(as(who), { text: fileOf({}), mode: 'good-rows' })).code).toBe('forbidden')
    }
  })
})

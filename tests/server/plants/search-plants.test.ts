import { describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { plants, studios } from '@/db/schema'
import { nameKey } from '@/lib/plants'
import { searchPlants } from '@/lib/server/plants/search-plants'
import { libraryPlantId, loadPlants } from '@/seed/load-plants'
import { NOW } from '../../support/actors'
import { countOf, errorOf, namesFor, openLibrary } from './support'

describe('the words of a search', () => {
  it('find a plant by the beginnings of its botanical or common name', () => {
    const { as } = openLibrary()
    const find = (q: string) => namesFor(as('designer'), { q })
    expect(find('ilex gla').every((name) => name.startsWith('Ilex glabra'))).toBe(true)
    expect(find('ilex gla')).toContain("Ilex glabra 'Shamrock'")
    expect(find('inkb')).toContain("Ilex glabra 'Shamrock'")
    expect(find('shamrock')).toContain("Ilex glabra 'Shamrock'")
    expect(find('SHAMROCK ilex')).toEqual(["Ilex glabra 'Shamrock'"])
    expect(find('lex gla')).toEqual([])
  })

  it('take accents, the hybrid sign and quotation marks as they come, and never fail', () => {
    const { as } = openLibrary()
    const all = searchPlants(as('designer'), {}).total
    expect(namesFor(as('designer'), { q: 'abelia x grandi' })).toEqual(namesFor(as('designer'), { q: 'Abelia × Grandi' }))
    expect(namesFor(as('designer'), { q: 'ábélia' })).toEqual(namesFor(as('designer'), { q: 'abelia' }))
    for (const q of ['"', "'", "'; drop table plants; --", 'a AND', 'NOT', 'OR', 'NEAR(', '*', '^ilex', 'botanical:ilex', '-ilex', '{a b}', '\u0000', '😀', '%_', 'x'.repeat(500), 'ａ']) {
      expect(searchPlants(as('designer'), { q }).total).toBeLessThanOrEqual(all)
    }
    expect(searchPlants(as('designer'), { q: '"*"' }).total).toBe(all)
  })

  it('put the closest names first', () => {
    const { as } = openLibrary()
    expect(namesFor(as('designer'), { q: 'ilex' })[0]).toMatch(/^Ilex/)
  })
})

describe('the filters', () => {
  it('hold for every plant found and leave out none that fits', () => {
    const { as } = openLibrary()
    const every = searchPlants(as('designer'), { pageSize: 1000 }).plants
    const browsed = { rarely: 0, seldom: 1, occasionally: 2, frequently: 3, unknown: 9 }
    const fits: [Parameters<typeof namesFor>[1], (plant: (typeof every)[number]) => boolean][] = [
      [{ category: 'fern' }, ({ category }) => category === 'fern'],
      [{ leaf: 'semi-evergreen' }, ({ leaf }) => leaf === 'semi-evergreen'],
      [{ leaf: 'evergreen' }, ({ leaf }) => leaf.endsWith('-evergreen') && leaf !== 'semi-evergreen'],
      [{ heightMax: 36 }, ({ heightMax }) => heightMax <= 36],
      [{ spreadMax: 24 }, ({ spreadMax }) => spreadMax <= 24],
      [{ zone: 3 }, ({ zoneMin, zoneMax }) => (zoneMin ?? 1) <= 3 && 3 <= (zoneMax ?? 13)],
      [{ light: 'full-shade' }, ({ light }) => light.includes('full-shade')],
      [{ deer: 'seldom' }, ({ deer }) => browsed[deer] <= 1],
      [{ deer: 'unknown' }, ({ deer }) => deer === 'unknown'],
      [{ foliageColor: 'gold' }, ({ foliageColor }) => foliageColor === 'gold'],
      [{ bloomColor: 'blue' }, ({ bloomColor }) => bloomColor === 'blue'],
      [{ owner: 'own' }, ({ studioId }) => studioId !== null],
      [{ leaf: 'evergreen', zone: 6, heightMax: 60, q: 'ilex' }, ({ leaf, zoneMin, zoneMax, heightMax, botanical, common }) => leaf.endsWith('-evergreen') && leaf !== 'semi-evergreen' && (zoneMin ?? 1) <= 6 && 6 <= (zoneMax ?? 13) && heightMax <= 60 && /\bilex/i.test(`${botanical} ${common}`)],
    ]
    for (const [query, isWanted] of fits) {
      const wanted = every.filter(isWanted).map(({ botanical }) => botanical)
      expect(wanted.length, JSON.stringify(query)).toBeGreaterThan(0)
      expect(namesFor(as('designer'), query).sort(), JSON.stringify(query)).toEqual(wanted.sort())
    }
  })
})

describe('order and pages', () => {
  it('sort either way, and show each plant on one page', () => {
    const { as } = openLibrary()
    for (const sort of ['match', 'botanical', 'common', 'category', 'height', 'spread', 'zone'] as const) {
      for (const direction of ['asc', 'desc'] as const) {
        const { total, pages } = searchPlants(as('designer'), { sort, direction })
        const seen = Array.from({ length: pages }, (_, i) => searchPlants(as('designer'), { sort, direction, page: i + 1 }).plants).flat()
        expect(new Set(seen.map(({ id }) => id)).size).toBe(total)
        if (sort === 'height') {
          const heights = seen.map(({ heightMax }) => heightMax)
          expect(heights).toEqual([...heights].sort((a, b) => (direction === 'asc' ? a - b : b - a)))
        }
      }
    }
  })

  it('show the last page when asked beyond it', () => {
    const { as } = openLibrary()
    const { page, pages, plants: shown } = searchPlants(as('designer'), { page: 999 })
    expect(page).toBe(pages)
    expect(shown.length).toBeGreaterThan(0)
    expect(searchPlants(as('designer'), { q: 'zzzz', page: 3 })).toEqual({ plants: [], total: 0, page: 1, pages: 1 })
  })
})

describe('whose plants', () => {
  it('are the shared ones and the own, never another studio’s', () => {
    const { as } = openLibrary()
    expect(namesFor(as('designer'), { q: 'ilex' })).toEqual(expect.arrayContaining(['Ilex domestica', 'Ilex exempla']))
    expect(namesFor(as('designer'), { q: 'aliena' })).toEqual([])
    expect(namesFor(as('stranger'), { q: 'ilex domestica' })).toEqual([])
    expect(namesFor(as('stranger'), { owner: 'own' })).toEqual(['Ilex aliena'])
  })

  it('are not for clients', () => {
    const { as } = openLibrary()
    expect(errorOf(() => searchPlants(as('client'), {})).code).toBe('forbidden')
  })
})

describe('the index of names', () => {
  const found = (db: ReturnType<typeof openLibrary>['db'], word: string) =>
    (db.$client.prepare('select plant_id from plants_fts where plants_fts match ?').all(`"${word}"*`) as { plant_id: string }[]).map((row) => row.plant_id)

  it('follows plants that are added, renamed and removed, also with their studio', () => {
    const { db } = openLibrary()
    expect(found(db, 'domest')).toContain('plant-a')
    db.update(plants).set({ botanical: 'Ilex xrenata' }).where(eq(plants.id, 'plant-a')).run()
    expect(found(db, 'domest')).not.toContain('plant-a')
    expect(found(db, 'xren')).toEqual(['plant-a'])
    db.update(plants).set({ heightMax: 99 }).where(eq(plants.id, 'plant-a')).run()
    expect(found(db, 'xren')).toEqual(['plant-a'])
    db.delete(plants).where(eq(plants.id, 'plant-a')).run()
    expect(found(db, 'xren')).toEqual([])
    db.delete(studios).where(eq(studios.id, 'studio-b')).run()
    expect(found(db, 'aliena')).toEqual([])
    expect(countOf(db, 'plants_fts')).toBe(countOf(db, 'plants'))
  })
})

describe('the shared library', () => {
  it('comes once however often it is loaded, under the same ids', () => {
    const { db } = openLibrary()
    const before = [countOf(db, 'plants'), countOf(db, 'plant_sources'), countOf(db, 'plants_fts')]
    expect(before[0]).toBe(344 + 4)
    expect(loadPlants(db, { now: NOW + 1 })).toBe(344)
    expect([countOf(db, 'plants'), countOf(db, 'plant_sources'), countOf(db, 'plants_fts')]).toEqual(before)
    const row = db.select().from(plants).where(eq(plants.botanical, "Ilex glabra 'Shamrock'")).get()
    expect(row).toMatchObject({ id: libraryPlantId("Ilex glabra 'Shamrock'"), studioId: null, createdAt: NOW })
  })

  it('brings a changed plant up to date', () => {
    const { db } = openLibrary()
    const id = libraryPlantId('Acer griseum')
    db.update(plants).set({ heightMax: 9_999, common: 'wrong' }).where(eq(plants.id, id)).run()
    loadPlants(db, { now: NOW })
    expect(db.select().from(plants).where(eq(plants.id, id)).get()).toMatchObject({ heightMax: 360, common: 'paperbark maple' })
  })

  it('says for every fact whether it was read or is from memory', () => {
    const { as } = openLibrary()
    const [plant] = searchPlants(as('designer'), { q: 'acer griseum' }).plants
    expect(plant?.sources.map(({ evidence }) => evidence)).toEqual(['read', 'memory'])
    expect(plant?.sources[1]?.facts).toEqual(['leaf', 'habit', 'growth', 'foliage_color', 'texture', 'fall_color', 'thorns', 'toxicity', 'prune'])
    expect(plant?.sources[0]).toMatchObject({ url: expect.stringMatching(/^https:/) })
    expect(plant?.sources[0]?.facts).toContain('height_max')
  })

  it('has an id of its own for every plant', () => {
    const { db } = openLibrary()
    const names = db.select({ botanical: plants.botanical }).from(plants).all().map(({ botanical }) => nameKey(botanical))
    expect(new Set(names).size).toBe(names.length)
  })
})

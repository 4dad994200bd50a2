import { describe, expect, it } from 'vitest'
import { EMPTY_FACADE, EMPTY_PROJECT, facadeFormSchema, projectFormSchema, projectFormValuesOf, projectInputSchema, ZONES } from '@/lib/project'

const typed = (changes: Partial<typeof EMPTY_PROJECT> = {}) => ({ ...EMPTY_PROJECT, name: 'Alder House', zone: '6b', ...changes })
const problemAt = (values: unknown) => projectFormSchema.safeParse(values).error?.issues.map(({ path, message }) => [path.join('.'), message])

describe('the project form', () => {
  it('asks for a name and a zone, and for nothing else', () => {
    expect(problemAt(EMPTY_PROJECT)?.map(([field]) => field).sort()).toEqual(['name', 'zone'])
    expect(projectFormSchema.safeParse(typed()).success).toBe(true)
  })

  it.each([['41.52', 41.52], [' 41,52 ', 41.52], ['41.52° N', 41.52], ['41.52 s', -41.52], ['−12', -12]])('reads a latitude typed as %j', (latitude, degrees) => {
    expect(projectFormSchema.parse(typed({ latitude })).latitude).toBe(degrees)
  })

  it.each(['north', '41 30', '41.52 E', 'NaN', '1e3'])('names a latitude of %j as none', (latitude) => {
    expect(problemAt(typed({ latitude }))).toEqual([['latitude', 'Latitude is a number of degrees, such as 41.52.']])
  })

  it('holds degrees to the globe', () => {
    expect(projectFormSchema.safeParse(typed({ latitude: '90', longitude: '180 W' })).success).toBe(true)
    expect(problemAt(typed({ latitude: '90.01', longitude: '-180.01' }))?.map(([field]) => field)).toEqual(['latitude', 'longitude'])
  })

  it('leaves degrees out where they were not typed', () => expect(projectFormSchema.parse(typed())).not.toHaveProperty('latitude'))

  it('shows what was saved so that saving it again changes nothing', () => {
    const saved = projectInputSchema.parse({ ...projectFormSchema.parse(typed({ latitude: '41.5', brief: ['birds', 'winter'], fireZone: true })) })
    expect(projectFormSchema.parse(projectFormValuesOf(saved))).toEqual(saved)
  })

  it('refuses keys it does not know', () => expect(projectFormSchema.safeParse({ ...typed(), stage: 'approved' }).success).toBe(false))

  it('offers every zone that the schema takes', () => {
    expect(ZONES).toHaveLength(26)
    for (const zone of ZONES) expect(projectFormSchema.safeParse(typed({ zone })).success, zone).toBe(true)
  })
})

describe('the form of a new facade', () => {
  it('starts from lengths it can read', () => expect(facadeFormSchema.parse({ ...EMPTY_FACADE, name: 'Front' })).toEqual({ name: 'Front', width: 360, gutter: 108 }))
  it.each([['width', '0'], ['width', ''], ['gutter', 'tall'], ['gutter', '-9 ft']])('names a %s of %j', (field, text) => {
    const fault = facadeFormSchema.safeParse({ ...EMPTY_FACADE, name: 'Front', [field]: text }).error?.issues
    expect(fault?.map(({ path }) => path[0])).toEqual([field])
  })
})

import { afterEach, describe, expect, it, vi } from 'vitest'
import { people } from '@/db/schema'
import { listDemoSignIns } from '@/lib/server/people/list-demo-sign-ins'
import { eq } from 'drizzle-orm'
import { addStudios, NOW } from '../support/actors'
import { openTestDatabase } from '../support/database'

afterEach(() => vi.unstubAllEnvs())

function withAddresses() {
  const db = openTestDatabase()
  addStudios(db)
  db.update(people).set({ email: 'ada@thimblehill.example' }).where(eq(people.id, 'owner')).run()
  db.update(people).set({ email: 'real.person@mail.invalid' }).where(eq(people.id, 'designer')).run()
  return { db, now: NOW }
}

describe('the sign-ins of the demonstration', () => {
  it('are told nowhere but in a demonstration', () => {
    vi.stubEnv('TENTH_SUMMER_DEMO', undefined)
    expect(listDemoSignIns(withAddresses())).toBeNull()
    vi.stubEnv('TENTH_SUMMER_DEMO', '0')
    expect(listDemoSignIns(withAddresses())).toBeNull()
  })

  it('are those whose address nobody can own, studio by studio', () => {
    vi.stubEnv('TENTH_SUMMER_DEMO', '1')
    const told = listDemoSignIns(withAddresses())!.studios.flatMap((studio) => studio.people.map(({ email }) => email))
    expect(told).toContain('ada@thimblehill.example')
    expect(told).not.toContain('real.person@mail.invalid')
  })

  it('are none where no such account stands', () => {
    vi.stubEnv('TENTH_SUMMER_DEMO', '1')
    expect(listDemoSignIns({ db: openTestDatabase(), now: NOW })).toBeNull()
  })
})

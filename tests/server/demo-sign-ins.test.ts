import { eq } from 'drizzle-orm'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { Db } from '@/db/open'
import { people } from '@/db/schema'
import { listDemoSignIns } from '@/lib/server/people/list-demo-sign-ins'
import { addStudios, emailOf, NOW } from '../support/actors'
import { openTestDatabase } from '../support/database'

let db: Db
beforeEach(() => {
  db = openTestDatabase()
  addStudios(db)
  db.update(people).set({ email: 'owner@garden.example' }).where(eq(people.email, emailOf('owner'))).run()
})
afterEach(() => vi.unstubAllEnvs())

describe('the sign-ins of the demonstration', () => {
  it('are told by no server but one started as the demonstration', () => {
    vi.stubEnv('TENTH_SUMMER_DEMO', '')
    expect(listDemoSignIns({ db, now: NOW })).toBeNull()
  })

  it('are those whose addresses nobody can own, and no others', () => {
    vi.stubEnv('TENTH_SUMMER_DEMO', '1')
    const told = listDemoSignIns({ db, now: NOW })!
    expect(told.studios.flatMap((studio) => studio.people.map(({ email }) => email))).toEqual(['owner@garden.example'])
  })
})

import { asc, eq, like } from 'drizzle-orm'
import { members, people, studios } from '@/db/schema'
import type { MemberRole } from '@/lib/access'
import type { Anonymous } from '../context'
import { DEMO_PASSWORD } from './demo-password'

export interface DemoSignIns {
  password: string
  studios: { name: string; people: { name: string; email: string; role: MemberRole }[] }[]
}

/**
 * Who can sign in to the demonstration, studio by studio; null unless the server was started as one
 * (TENTH_SUMMER_DEMO=1). Addresses of the demonstration end in `.example`, which nobody can own (RFC 2606): no others are told.
 */
export function listDemoSignIns({ db }: Anonymous): DemoSignIns | null {
  if (process.env.TENTH_SUMMER_DEMO !== '1') return null
  const rows = db
    .select({ studio: studios.name, name: people.name, email: people.email, role: members.role })
    .from(members)
    .innerJoin(people, eq(people.id, members.personId))
    .innerJoin(studios, eq(studios.id, members.studioId))
    .where(like(people.email, '%.example'))
    .orderBy(asc(studios.createdAt), asc(studios.id), asc(members.createdAt), asc(people.id))
    .all()
  const byStudio = new Map<string, DemoSignIns['studios'][number]>()
  for (const { studio, name, email, role } of rows) {
    const known = byStudio.get(studio) ?? { name: studio, people: [] }
    if (email) known.people.push({ name, email, role })
    byStudio.set(studio, known)
  }
  return byStudio.size > 0 ? { password: DEMO_PASSWORD, studios: [...byStudio.values()] } : null
}

/** Column habits shared by all tables: ids are text UUIDs (v7), instants integer milliseconds UTC, lengths REAL inches. */
import { integer, real, text } from 'drizzle-orm/sqlite-core'

export const id = () => text('id').primaryKey()
export const createdAt = () => integer('created_at').notNull()
export const inches = (name: `${string}_in`) => real(name).notNull()
export const optionalInches = (name: `${string}_in`) => real(name)
export const yesNo = (name: string) => integer(name, { mode: 'boolean' }).notNull()
/** A list or small structure kept as JSON text: never searched inside, always read whole. */
export const json = <T>(name: string) => text(name, { mode: 'json' }).$type<T>().notNull()

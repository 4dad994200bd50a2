import { and, eq, ne } from 'drizzle-orm'
import type { Db } from '@/db/open'
import { plants } from '@/db/schema'
import { AppError } from '@/lib/errors'
import { nameKey } from '@/lib/plants'
import type { Context } from '../context'

/** The names of a studio's own plants, spelled alike (see nameKey), with the plant each stands for. */
export function studioNames(db: Db, studioId: string): Map<string, string> {
  const rows = db.select({ id: plants.id, botanical: plants.botanical }).from(plants).where(eq(plants.studioId, studioId)).all()
  return new Map(rows.map(({ id, botanical }) => [nameKey(botanical), id]))
}

export const TAKEN = 'Your studio has a plant of this name already.'

/** Throws AppError('invalid') at the name when another plant of the studio has it. */
export function refuseTakenName({ db, actor }: Context, botanical: string, ownId?: string): void {
  const others = and(eq(plants.studioId, actor.studioId), ownId ? ne(plants.id, ownId) : undefined)
  const rows = db.select({ botanical: plants.botanical }).from(plants).where(others).all()
  const key = nameKey(botanical)
  if (rows.some((row) => nameKey(row.botanical) === key)) throw new AppError('invalid', `${TAKEN} Nothing was changed.`, { problems: [{ path: ['botanical'], message: TAKEN }] })
}

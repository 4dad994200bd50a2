import type { Anonymous } from '../context'

/** Reads one value from the database; throws when it cannot be read. */
export function checkHealth({ db }: Anonymous): { ok: true } {
  db.$client.prepare('select count(*) from studios').get()
  return { ok: true }
}

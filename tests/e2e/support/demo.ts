/** What the browser tests know of the demonstration: sign-ins, ids, and a client's link. */
import Database from 'better-sqlite3'
import { expect, type Page } from '@playwright/test'
import type { Viewer } from '../../support/endpoints'

export const PASSWORD = 'quiet hedges at noon'
export const EMAILS = {
  owner: 'orla@thimblehill.example',
  designer: 'ines@thimblehill.example',
  reviewer: 'piet@thimblehill.example',
  estimator: 'rue@thimblehill.example',
  stranger: 'wilf@lowfen.example',
} as const satisfies Partial<Record<Viewer, string>>

export function ask<T>(sql: string, ...values: unknown[]): T[] {
  const db = new Database(process.env.DATABASE_FILE ?? './.data/e2e.db', { readonly: true })
  try {
    return db.prepare(sql).all(...values) as T[]
  } finally {
    db.close()
  }
}

/** The facade of a project of the demonstration, by the project's name. */
export function facadeOf(project: string): { facadeId: string; projectId: string } {
  const [found] = ask<{ facadeId: string; projectId: string }>(
    'select f.id facadeId, p.id projectId from facades f join projects p on p.id = f.project_id where p.name = ?', project)
  if (!found) throw new Error(`The demonstration has no ${project}`)
  return found
}

export const tablePath = (project: string, rest = '') => {
  const { facadeId, projectId } = facadeOf(project)
  return `/projects/${projectId}/facades/${facadeId}${rest}`
}

/** A plant of the first studio's own, made from a shared one where it does not stand yet. */
export function ownPlantId(): string {
  const db = new Database(process.env.DATABASE_FILE ?? './.data/e2e.db')
  try {
    const columns = (db.prepare('select name from pragma_table_info(?)').all('plants') as { name: string }[]).map(({ name }) => `"${name}"`)
    const values = columns.map((name) => (name === '"id"' ? "'own-plant'" : name === '"studio_id"' ? "(select studio_id from projects where name = 'Kiln Lane')" : name))
    db.prepare(`insert or ignore into plants (${columns.join(', ')}) select ${values.join(', ')} from plants where botanical like 'Ilex glabra%' limit 1`).run()
    return 'own-plant'
  } finally {
    db.close()
  }
}

/** How often each placement of a facade stands in the database. */
export const placementsOf = (project: string) =>
  ask<{ id: string; x: number; y: number }>('select id, x_in x, y_in y from placements where facade_id = ? order by position', facadeOf(project).facadeId)

export async function signIn(page: Page, who: keyof typeof EMAILS, password: string = PASSWORD) {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(EMAILS[who])
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
}

/** Opens a project as a designer and makes a client link there; answers its path. */
export async function makeClientLink(page: Page, project: string): Promise<string> {
  await signIn(page, 'designer')
  await page.goto(`/projects/${facadeOf(project).projectId}`)
  await page.getByRole('button', { name: 'Make a client link' }).click()
  const address = await page.getByLabel('The new link').inputValue()
  const path = /\/c\/[\w-]+/.exec(address)?.[0]
  expect(path, 'the link is shown').toBeTruthy()
  return path!
}

/** Fails when the page logs an error or breaks its content security policy. */
export function watchConsole(page: Page): string[] {
  const complaints: string[] = []
  page.on('console', (message) => {
    if (message.type() === 'error' && !message.text().startsWith('Failed to load resource')) complaints.push(message.text())
  })
  page.on('pageerror', (error) => complaints.push(String(error)))
  return complaints
}

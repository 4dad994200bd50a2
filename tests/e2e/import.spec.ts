/** Bringing plants in from a file: bad lines named, good ones kept or all refused, nothing half-written. */
import { expect, test, type Page } from '@playwright/test'
import { ask, signIn, watchConsole } from './support/demo'

const ownPlants = () => ask<{ botanical: string }>("select botanical from plants where studio_id is not null and botanical like 'Fictus%' order by botanical").map(({ botanical }) => botanical)

/** The template's own line under other names, with the cells given changed. */
async function fileOf(page: Page, rows: Record<string, string>[]): Promise<string> {
  const [head, example] = (await (await page.request.get('/api/plants/import/template')).text()).trim().split('\r\n') as [string, string]
  const columns = head.split(',')
  const cells = example.split(',')
  return [head, ...rows.map((row) => columns.map((column, i) => row[column] ?? cells[i]).join(','))].join('\r\n')
}

test('bad lines are named by line and column, and the person chooses', async ({ page }) => {
  const complaints = watchConsole(page)
  await signIn(page, 'designer')
  await page.goto('/plants/import')
  const text = await fileOf(page, [
    { botanical: "Fictus bonus 'One'", common: 'first' },
    { botanical: "Fictus malus 'Two'", common: 'second', height_min: 'tall' },
    { botanical: "Fictus bonus 'Three'", common: 'third', habit: 'wobbly' },
    { botanical: "Fictus bonus 'Four'", common: 'fourth' },
  ])
  await page.getByLabel('Choose a file').setInputFiles({ name: 'plants.csv', mimeType: 'text/csv', buffer: Buffer.from(text) })
  await page.getByRole('button', { name: 'Look it over' }).click()
  const problems = page.getByRole('region', { name: 'Lines with problems' }).getByRole('row')
  await expect(problems.filter({ hasText: 'height_min' })).toContainText('3')
  await expect(problems.filter({ hasText: 'habit' })).toContainText('4')
  expect(ownPlants(), 'looking writes nothing').toEqual([])

  await page.getByRole('radio', { name: /Refuse all/ }).check()
  await expect(page.getByRole('button', { name: /^Bring in/ })).toHaveCount(0)
  await page.getByRole('radio', { name: /Keep the good lines/ }).check()
  await page.getByRole('button', { name: 'Bring in 2 plants' }).click()
  await expect(page.getByRole('status').filter({ hasText: '2 plants brought in, 2 lines left out' })).toBeVisible()
  expect(ownPlants()).toEqual(["Fictus bonus 'Four'", "Fictus bonus 'One'"])

  // What came in is found by name at once.
  await page.goto('/plants?q=fictus+bon')
  await expect(page.getByRole('row').filter({ hasText: 'Fictus bonus' })).toHaveCount(2)
  expect(complaints).toEqual([])
})

test('a file that is none of plants is refused in a sentence', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto('/plants/import')
  await page.getByLabel('Or paste it').fill('name;price\nrose;12')
  await page.getByRole('button', { name: 'Look it over' }).click()
  await expect(page.getByRole('status').filter({ hasText: 'This file cannot be brought in as it is.' })).toBeVisible()
  await expect(page.getByRole('button', { name: /^Bring in/ })).toHaveCount(0)
})

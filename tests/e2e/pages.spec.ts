/** Every page, for everyone: who sees it, who is told that there is nothing, who is sent elsewhere. */
import { expect, test, type BrowserContext } from '@playwright/test'
import { PAGES, VIEWERS, type Viewer } from '../support/endpoints'
import { contextFor, ids } from './support/viewers'

const contexts = new Map<Viewer, BrowserContext>()

test.describe.configure({ mode: 'serial' })

test.beforeAll(async ({ browser }) => {
  test.setTimeout(180_000)
  for (const viewer of VIEWERS) contexts.set(viewer, await contextFor(browser, viewer))
})

test.afterAll(async () => {
  for (const context of contexts.values()) await context.close()
})

for (const viewer of VIEWERS) {
  test(`every page as ${viewer}`, async () => {
    test.setTimeout(120_000)
    const page = await contexts.get(viewer)!.newPage()
    for (const { file, path, outcome } of PAGES) {
      const where = `${file} as ${viewer}`
      await page.goto(path(ids()))
      const wanted = outcome[viewer]
      if (wanted.startsWith('/')) await expect(page, where).toHaveURL(new RegExp(`${wanted}(\\?.*)?$`))
      else if (wanted === 'absent') await expect(page.getByRole('heading', { level: 1 }), where).toContainText(/nothing here|not here|no such|not found/i)
      else if (wanted === 'refused') await expect(page.getByText(/does not allow/i), where).toBeVisible()
      else await expect(page.getByRole('heading', { level: 1 }).first(), where).toBeVisible()
    }
    await page.close()
  })
}

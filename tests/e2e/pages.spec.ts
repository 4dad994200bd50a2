/** Every page, for everyone: who sees it, who is told that there is nothing, who is sent elsewhere. */
import { expect, test, type Browser, type BrowserContext } from '@playwright/test'
import { PAGES, VIEWERS, type Viewer } from '../support/endpoints'
import { EMAILS, facadeOf, makeClientLink, ownPlantId, signIn } from './support/demo'

const contexts = new Map<Viewer, BrowserContext>()

async function contextFor(browser: Browser, viewer: Viewer): Promise<BrowserContext> {
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 } })
  const page = await context.newPage()
  if (viewer in EMAILS) await signIn(page, viewer as keyof typeof EMAILS)
  if (viewer === 'client' || viewer === 'otherClient') {
    const maker = await (await browser.newContext()).newPage()
    await page.goto(await makeClientLink(maker, viewer === 'client' ? 'Kiln Lane' : 'Perry Road'))
    await page.getByRole('button').first().click()
    await page.waitForURL('**/view')
    await maker.context().close()
  }
  await page.close()
  return context
}

const ids = () => ({ ...facadeOf('Kiln Lane'), plantId: ownPlantId() })

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

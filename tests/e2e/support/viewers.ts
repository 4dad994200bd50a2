/** Browsers signed in as each kind of viewer. */
import type { Browser, BrowserContext, BrowserContextOptions } from '@playwright/test'
import type { Viewer } from '../../support/endpoints'
import { EMAILS, facadeOf, makeClientLink, ownPlantId, signIn } from './demo'

const LAPTOP: BrowserContextOptions = { viewport: { width: 1440, height: 900 } }

/** A context signed in as the viewer; a client comes in by a link made for them. */
export async function contextFor(browser: Browser, viewer: Viewer, options = LAPTOP): Promise<BrowserContext> {
  const context = await browser.newContext(options)
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

/** What the addresses of pages are filled with: the first studio's. */
export const ids = () => ({ ...facadeOf('Kiln Lane'), plantId: ownPlantId() })

/** axe finds nothing on any page, in either theme, at the size its people use. */
import AxeBuilder from '@axe-core/playwright'
import { expect, test } from '@playwright/test'
import { PAGES, type Viewer } from '../support/endpoints'
import { watchConsole } from './support/demo'
import { contextFor, ids } from './support/viewers'

/** Whoever comes first and sees a page reads it. */
const READERS = ['nobody', 'designer', 'client'] as const satisfies readonly Viewer[]

/** The second theme changes colors and nothing else: pages that between them hold every part. */
const EVERY_PART = [/sign-in/, /projects\/page/, /\[projectId\]\/page/, /\[facadeId\]\/page/, /measure/, /\[plantId\]\/page/, /standards/, /view/]

for (const theme of ['paper', 'outdoors'] as const) {
  for (const viewer of READERS) {
    const asked = PAGES.filter(({ file }) => theme === 'paper' || EVERY_PART.some((part) => part.test(file)))
    const pages = asked.filter(({ outcome }) => READERS.find((one) => outcome[one] === 'shown') === viewer)
    test(`axe finds nothing on the ${pages.length} pages that ${viewer === 'nobody' ? 'anybody sees' : `a ${viewer} sees first`}, ${theme}`, async ({ browser }) => {
      test.setTimeout(180_000)
      const context = await contextFor(browser, viewer)
      await context.addCookies([{ name: 'theme', value: theme, url: test.info().project.use.baseURL! }])
      for (const { file, path } of pages) {
        const page = await context.newPage()
        const complaints = watchConsole(page)
        await page.goto(path(ids()))
        await page.waitForLoadState('networkidle')
        // Rows after the fifth repeat those before them.
        const axe = new AxeBuilder({ page }).exclude('tbody tr:nth-child(n+6)')
        const { violations } = await (theme === 'paper' ? axe : axe.withRules(['color-contrast'])).analyze()
        expect.soft(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`), file).toEqual([])
        expect.soft(complaints, file).toEqual([])
        await page.close()
      }
      await context.close()
    })
  }
}

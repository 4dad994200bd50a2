/** The client on a phone: from the link to the garden, with the page running and as plain pages. */
import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Browser, type Page } from '@playwright/test'
import { makeClientLink, watchConsole } from './support/demo'

async function linkTo(browser: Browser, project: string): Promise<string> {
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 } })
  const path = await makeClientLink(await context.newPage(), project)
  await context.close()
  return path
}

async function openGarden(page: Page, path: string) {
  await page.goto(path)
  await page.getByRole('button', { name: 'Show me the garden' }).click()
  await page.waitForURL('**/view')
  await expect(page.getByRole('heading', { level: 1, name: 'Kiln Lane' })).toBeVisible()
}

const drawing = (page: Page) => page.getByRole('img', { name: /house front/ }).first()

/** What is drawn and read is the client's alone. */
async function expectNothingInternal(page: Page) {
  const source = await page.content()
  for (const word of [/conflict/i, /\brisk\b/i, /past the sill/, /check everything before showing/, /thimblehill\.example/]) expect(source).not.toMatch(word)
}

test('the garden at any year, with the limits and the keys, nothing internal, nothing cut off', async ({ page, browser }) => {
  const complaints = watchConsole(page)
  await openGarden(page, await linkTo(browser, 'Kiln Lane'))
  await expect(drawing(page)).toContainText('sill')
  await expect(drawing(page)).toContainText('gutter')
  const cards = page.getByRole('list', { name: /^Plants of/ }).getByRole('listitem')
  const keys = await cards.locator('[aria-label^="Key "]').allInnerTexts()
  expect(keys.length).toBeGreaterThan(5)
  for (const key of keys) await expect(drawing(page).getByText(key, { exact: true }).first()).toBeAttached()

  const tenth = await drawing(page).innerHTML()
  await page.getByRole('slider').fill('3')
  await expect(page).toHaveURL(/year=3/)
  await expect.poll(() => drawing(page).innerHTML()).not.toBe(tenth)
  await page.getByRole('button', { name: 'One year later' }).click()
  await expect(page).toHaveURL(/year=4/)
  await page.getByRole('navigation', { name: 'Season' }).getByRole('link', { name: 'Winter' }).click()
  await expect(page).toHaveURL(/season=winter/)

  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390)
  await expectNothingInternal(page)
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`)).toEqual([])
  expect(complaints).toEqual([])
})

test('without JavaScript the link opens, the garden is drawn, and other years are a tap away', async ({ browser }, info) => {
  const { baseURL, viewport } = info.project.use
  const context = await browser.newContext({ javaScriptEnabled: false, viewport, baseURL })
  const page = await context.newPage()
  await openGarden(page, await linkTo(browser, 'Kiln Lane'))
  await expect(drawing(page)).toContainText('sill')
  const tenth = await drawing(page).innerHTML()
  await page.getByRole('navigation', { name: 'Year' }).getByRole('link', { name: 'Year 1', exact: true }).click()
  await expect(page).toHaveURL(/year=1/)
  expect(await drawing(page).innerHTML()).not.toBe(tenth)
  await expectNothingInternal(page)
  await context.close()
})

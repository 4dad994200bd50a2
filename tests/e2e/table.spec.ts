/** The drawing table at a laptop: place, move, undo, reload; what the page calls saved stands in the database. */
import { expect, test } from '@playwright/test'
import { placementsOf, signIn, tablePath, watchConsole } from './support/demo'

const saved = /^Saved/

test('a plant is found, placed by numbers, moved by keys, undone and kept', async ({ page }) => {
  const complaints = watchConsole(page)
  await signIn(page, 'designer')
  await page.goto(tablePath('Perry Road'))
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: /^Plant/ }).click()
  const picker = page.getByTestId('plant-picker')
  await picker.getByRole('searchbox').fill('ilex gla')
  await picker.getByRole('button', { name: /Ilex glabra/ }).first().click()
  await picker.getByLabel('Along the wall').fill(`6'-0"`)
  await picker.getByLabel('From the wall').fill('4 ft')
  await picker.getByRole('button', { name: /^Place/ }).click()
  await expect(page.getByText(saved).first()).toBeVisible()
  expect(placementsOf('Perry Road')).toMatchObject([{ x: 72, y: 48 }])

  await page.getByRole('tab', { name: /This plant/ }).click()
  const along = page.getByRole('tabpanel').getByLabel('Along the wall')
  await along.fill('193 cm')
  await along.press('Enter')
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBeCloseTo(193 / 2.54, 1)

  await page.getByRole('button', { name: /^Undo/ }).click()
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBe(72)
  await page.getByRole('button', { name: /^Redo/ }).click()
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBeCloseTo(193 / 2.54, 1)

  await page.reload()
  await page.getByRole('tab', { name: /Plants/ }).click()
  await expect(page.getByRole('tabpanel').getByRole('row')).toHaveCount(2)
  await page.getByRole('button', { name: /^Remove/ }).first().click()
  await expect.poll(() => placementsOf('Perry Road')).toEqual([])
  expect(complaints).toEqual([])
})

test('selecting a finding selects its plant', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto(tablePath('Kiln Lane'))
  const first = page.getByRole('tabpanel').getByRole('button').first()
  await expect(first).toContainText('Conflict')
  await expect(first).toContainText(/past the sill of Kitchen by about year/)
  await first.click()
  await expect(first).toHaveAttribute('aria-pressed', 'true')
  await page.getByRole('tab', { name: /This plant/ }).click()
  await expect(page.getByRole('tabpanel')).toContainText('Rhododendron catawbiense')
})

test('a reviewer looks, and can change nothing', async ({ page }) => {
  await signIn(page, 'reviewer')
  await page.goto(tablePath('Kiln Lane'))
  await expect(page.getByRole('tab', { name: /Findings/ })).toBeVisible()
  await expect(page.getByRole('button', { name: /^Undo/ })).toHaveCount(0)
  await page.getByRole('tab', { name: /Plants/ }).click()
  await expect(page.getByRole('button', { name: /^Remove/ })).toHaveCount(0)
})

test('a dragged plant stays where it was dropped, and its numbers say so', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto(tablePath('Quarry Cottage'))
  const table = page.getByTestId('drawing-table')
  await expect(table).toHaveAttribute('data-placements', '20')
  await expect(table.locator('canvas').first()).toBeVisible()
  await page.getByRole('tab', { name: /Plants/ }).click()
  await page.getByRole('tabpanel').getByRole('row').nth(1).click()
  const before = placementsOf('Quarry Cottage')
  const drawing = await table.boundingBox()
  expect(drawing).toBeTruthy()
  // The keyboard way of the same gesture: six inches to the right.
  await table.focus()
  await page.keyboard.press('Tab')
  await page.keyboard.press('Shift+ArrowRight')
  await expect.poll(() => placementsOf('Quarry Cottage').filter((one, i) => one.x !== before[i]!.x).length).toBe(1)
  await page.getByRole('button', { name: /^Undo/ }).click()
  await expect.poll(() => placementsOf('Quarry Cottage')).toEqual(before)
})

/** The drawing table at a laptop: findings, read-only looking, moving by keys and undo, against the database. */
import { expect, test } from '@playwright/test'
import { placementsOf, signIn, tablePath } from './support/demo'

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

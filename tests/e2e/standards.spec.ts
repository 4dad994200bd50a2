/** The studio's standards: set by the owner in plain lengths, every facade checked anew; others read them. */
import { expect, test } from '@playwright/test'
import { ask, signIn } from './support/demo'

const findings = (rule: string) => ask<{ n: number }>('select count(*) n from findings where rule = ?', rule)[0]!.n

test('a changed number changes what every facade is found to break, and back', async ({ page }) => {
  await signIn(page, 'owner')
  await page.goto('/standards')
  const before = findings('wall-gap')
  expect(before).toBeGreaterThan(0)
  const gap = page.getByLabel('Kept free in front of the wall', { exact: true })
  await gap.fill('nine feet')
  await page.getByRole('button', { name: 'Save and check every facade' }).click()
  await expect(page.getByText('Nothing was changed.')).toBeVisible()
  await expect(gap).toHaveValue('nine feet')
  await gap.fill('0 in')
  await page.getByRole('button', { name: 'Save and check every facade' }).click()
  await expect(page.getByText(/facades of the studio were checked anew/)).toBeVisible()
  expect(findings('wall-gap')).toBeLessThan(before)
  await gap.fill('')
  await page.getByRole('button', { name: 'Save and check every facade' }).click()
  await expect.poll(() => findings('wall-gap')).toBe(before)
})

test('a rule is found by its words; a designer reads and cannot set', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto('/standards')
  await page.getByLabel('Find a rule').fill('deer')
  await expect(page.getByRole('region', { name: 'Deer' })).toBeVisible()
  await expect(page.getByRole('region', { name: 'Window sill' })).toBeHidden()
  await expect(page.getByRole('button', { name: /^Save/ })).toHaveCount(0)
  await page.getByLabel('Find a rule').fill('')
  await expect(page.getByLabel('Kept free in front of the wall', { exact: true })).not.toBeEditable()
})

/** Measuring a house front by numbers: lengths as people write them, the drawing following, impossible ones refused. */
import { expect, test, type Page } from '@playwright/test'
import { ask, facadeOf, signIn, tablePath, watchConsole } from './support/demo'

const GARDEN = 'Perry Road'

const stored = () => ask<{ gutter: number; overhang: number; wall: string }>('select gutter_in gutter, overhang_in overhang, wall from facades where id = ?', facadeOf(GARDEN).facadeId)[0]!
const windows = () => ask<{ id: string; x: number; sill: number; head: number }>("select id, x_in x, sill_in sill, head_in head from openings where facade_id = ? and kind = 'window' order by position", facadeOf(GARDEN).facadeId)

async function openMeasure(page: Page) {
  await signIn(page, 'designer')
  await page.goto(tablePath(GARDEN, '/measure'))
}

async function type(page: Page, section: string, label: string, text: string) {
  const field = page.getByRole('region', { name: section }).getByRole('textbox', { name: label, exact: true })
  await field.fill(text)
  await field.press('Tab')
  return field
}

test('a length is taken in every form, echoed back, drawn and saved', async ({ page }) => {
  const complaints = watchConsole(page)
  await openMeasure(page)
  const before = stored()
  const drawn = () => page.getByRole('img', { name: /elevation/i }).first().innerHTML()
  const first = await drawn()
  for (const [text, inches] of [[`8'-6 1/2"`, 102.5], ['101.5', 101.5], ['8 ft 4', 100], ['250 cm', 98.4], ['8’ 3½”', 99.5]] as const) {
    const field = await type(page, 'House front', 'Gutter above zero', text)
    await expect.poll(() => stored().gutter, text).toBeCloseTo(inches, 1)
    await expect(field).toHaveAccessibleDescription(/cm/)
  }
  expect(await drawn()).not.toBe(first)
  // Back by undo, one step each.
  for (let i = 0; i < 5; i++) await page.getByRole('button', { name: 'Undo' }).click()
  await expect.poll(stored).toEqual(before)
  expect(complaints).toEqual([])
})

test('impossible measures get a sentence at the field and change nothing', async ({ page }) => {
  await openMeasure(page)
  const before = [stored(), windows()]
  for (const [section, label, text, sentence] of [
    ['House front', 'Width', '10 km', /length|ft|in/i],
    ['House front', 'Gutter above zero', 'NaN', /length/i],
    ['House front', 'Roof overhang', '-3', /./],
    ['Windows and doors', 'Den, sill', `30 ft`, /sill|head/i],
    ['Windows and doors', 'Den, left edge', `200 ft`, /wall/i],
  ] as const) {
    const field = await type(page, section, label, text)
    await expect(field, `${label} ${text}`).toHaveAttribute('aria-invalid', 'true')
    await expect(field).toHaveAccessibleDescription(sentence)
    await page.waitForTimeout(200)
    expect([stored(), windows()], `${label} ${text}`).toEqual(before)
    await page.reload()
  }
})

/** The drawing table at a laptop: place, move, undo, reload; what the page calls saved stands in the database. */
import AxeBuilder from '@axe-core/playwright'
import { expect, test } from '@playwright/test'
import { facadeOf, placementsOf, signIn, tablePath, watchConsole } from './support/demo'
import { spotsOn } from './support/spots'

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

const SAVED = /^Saved/

test('a plant is found, placed by numbers, changed in the table, undone, kept and removed', async ({ page }) => {
  const complaints = watchConsole(page)
  await signIn(page, 'designer')
  await page.goto(tablePath('Perry Road'))
  await page.getByRole('tab', { name: /Plants/ }).click()
  await page.getByRole('button', { name: 'Add a plant' }).click()
  const picker = page.getByTestId('plant-picker')
  await picker.getByRole('searchbox').fill('ilex gla')
  await picker.getByRole('button', { name: /Ilex glabra/ }).first().click()
  await picker.getByLabel('Along the wall').fill(`6'-0"`)
  await picker.getByLabel('From the wall').fill('4 ft')
  await picker.getByRole('button', { name: 'Plant it here' }).click()
  await expect(page.getByTestId('save-state')).toContainText(SAVED)
  expect(placementsOf('Perry Road')).toMatchObject([{ x: 72, y: 48 }])
  await picker.getByRole('button', { name: 'Done' }).click()

  // In the table beside the drawing: the same numbers, and the same powers.
  await page.getByRole('tab', { name: /Plants/ }).click()
  const table = page.getByTestId('plants-table')
  const along = table.getByRole('textbox', { name: /along the wall/ })
  await expect(along).toHaveValue(`6'-0"`)
  await expect(table.getByRole('textbox', { name: /from the wall/ })).toHaveValue(`4'-0"`)
  await along.fill('193 cm')
  await along.press('Enter')
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBeCloseTo(193 / 2.54, 1)
  await page.getByRole('button', { name: /^Undo/ }).click()
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBe(72)
  await page.getByRole('button', { name: /^Redo/ }).click()
  await expect.poll(() => placementsOf('Perry Road')[0]!.x).toBeCloseTo(193 / 2.54, 1)

  // A length that is none: a sentence, and the plant stays where it is.
  await along.fill('six')
  await along.press('Enter')
  await expect(table.getByText(/length/i).first()).toBeVisible()
  expect(placementsOf('Perry Road')[0]!.x).toBeCloseTo(193 / 2.54, 1)

  await page.reload()
  await page.getByRole('tab', { name: /Plants/ }).click()
  await expect(page.getByTestId('plants-table').locator('tbody tr')).toHaveCount(1)
  await page.getByRole('button', { name: /^Remove/ }).first().click()
  await expect.poll(() => placementsOf('Perry Road')).toEqual([])
  expect(complaints).toEqual([])
})

test('a mouse drags a plant, the wheel and the buttons come nearer and go back', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto(tablePath('Quarry Cottage'))
  await expect(page.getByTestId('drawing-table').locator('canvas').first()).toBeVisible()
  await page.waitForTimeout(500)
  const spots = await spotsOn(page, facadeOf('Quarry Cottage').facadeId)
  const before = placementsOf('Quarry Cottage')
  const one = before[0]!
  const from = spots.inPlan(one.x, one.y)
  await page.mouse.move(from.x, from.y)
  await page.mouse.down()
  await page.mouse.move(from.x + 12 * spots.scale, from.y, { steps: 6 })
  await page.mouse.up()
  await expect.poll(() => placementsOf('Quarry Cottage')[0]!.x).toBeCloseTo(one.x + 12, 0)
  // Escape during a drag puts it back.
  await page.mouse.down()
  await page.mouse.move(from.x + 40 * spots.scale, from.y, { steps: 6 })
  await page.keyboard.press('Escape')
  await page.mouse.up()
  await page.getByRole('button', { name: /^Undo/ }).click()
  await expect.poll(() => placementsOf('Quarry Cottage')).toEqual(before)
  await page.mouse.wheel(0, -400)
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'Farther' }).click()
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'Whole' }).click()
  expect(placementsOf('Quarry Cottage')).toEqual(before)
})

test('a way out is offered, applied by one tap, and undo takes it back', async ({ page }) => {
  const complaints = watchConsole(page)
  await signIn(page, 'designer')
  await page.goto(tablePath('Kiln Lane'))
  const panel = page.getByRole('tabpanel')
  const before = placementsOf('Kiln Lane')
  const risks = panel.getByRole('button').filter({ hasText: /^[A-Z ]*.*Risk\./ })
  const ways = panel.getByRole('list').getByRole('button', { name: /^(Move|Keep|Swap|Let)/ })
  // Down the findings until one has a way out: each says when it has none.
  for (let i = 0; i < 20; i++) {
    await risks.nth(i).click()
    await expect(panel.getByText(/^(Ways out|No way out found|This is about the house)/).first()).toBeVisible()
    if ((await ways.count()) > 0) break
  }
  const said = await panel.getByRole('button', { pressed: true }).innerText()
  await ways.first().click()
  await expect(page.getByTestId('save-state')).toContainText(SAVED)
  await expect(panel.getByRole('button').filter({ hasText: said.replace(/\s+/g, ' ') })).toHaveCount(0)
  await page.getByRole('button', { name: /^Undo: / }).click()
  await expect.poll(() => placementsOf('Kiln Lane')).toEqual(before)
  expect(complaints).toEqual([])
})

test('what fits at a spot is drawn, listed and planted; beds tell their years', async ({ page }) => {
  const complaints = watchConsole(page)
  await signIn(page, 'designer')
  await page.goto(tablePath('Perry Road'))
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'What fits' }).click()
  const room = page.getByTestId('room-panel')
  await room.getByLabel('Along the wall').fill('4 ft')
  await room.getByLabel('From the wall').fill('4 ft')
  await room.getByRole('button', { name: 'What fits there?' }).click()
  await expect(room.getByRole('status').filter({ hasText: /Holds a crown up to .* plants of the library fit/ })).toBeVisible()
  await room.getByRole('button', { name: /^Plant .* here$/ }).first().click()
  await expect.poll(() => placementsOf('Perry Road').map(({ x, y }) => [x, y])).toEqual([[48, 48]])
  await room.getByRole('button', { name: 'Done' }).click()
  await page.getByRole('tab', { name: 'Beds' }).click()
  const beds = page.getByRole('tabpanel')
  await expect(beds.getByRole('region', { name: 'Den bed', exact: true })).toContainText(/Cover: \d+ % of the soil under plants when grown/)
  await expect(beds.getByRole('table', { name: /Flower.*by month/ }).getByRole('row')).toHaveCount(2)
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`)).toEqual([])
  await page.getByRole('button', { name: /^Undo: / }).click()
  await expect.poll(() => placementsOf('Perry Road')).toEqual([])
  expect(complaints).toEqual([])
})

test('years, sizes and seasons redraw both views', async ({ page }) => {
  await signIn(page, 'reviewer')
  await page.goto(tablePath('Kiln Lane'))
  const table = page.getByTestId('drawing-table')
  await expect(table.locator('canvas').first()).toBeVisible()
  await page.waitForTimeout(600)
  const spots = await spotsOn(page, facadeOf('Kiln Lane').facadeId)
  const frame = (await table.boundingBox())!
  const seam = spots.inPlan(0, 0).y - 40
  const views = async () => {
    await page.waitForTimeout(300)
    const [x, width] = [frame.x, frame.width]
    return Promise.all([
      page.screenshot({ clip: { x, y: frame.y, width, height: seam - frame.y } }),
      page.screenshot({ clip: { x, y: seam, width, height: frame.y + frame.height - seam } }),
    ])
  }
  let before = await views()
  for (const change of [
    () => page.getByRole('slider').fill('2'),
    () => page.getByText('High', { exact: true }).click(),
    () => page.getByText('Winter', { exact: true }).click(),
  ]) {
    await change()
    const after = await views()
    expect(Buffer.compare(after[0], before[0]), 'the elevation follows').not.toBe(0)
    expect(Buffer.compare(after[1], before[1]), 'the plan follows').not.toBe(0)
    before = after
  }
})

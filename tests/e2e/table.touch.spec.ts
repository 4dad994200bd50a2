/** The drawing table on a tablet: a finger moves what it picked, taps do the same, two fingers pan and zoom. */
import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'
import { facadeOf, placementsOf, signIn, tablePath, watchConsole } from './support/demo'
import { Fingers } from './support/fingers'
import { spotsOn } from './support/spots'

const GARDEN = 'Quarry Cottage'

async function openTable(page: Page) {
  await signIn(page, 'designer')
  await page.goto(tablePath(GARDEN))
  await expect(page.getByTestId('drawing-table').locator('canvas').first()).toBeVisible()
  // Labels settle and fonts come: the first full drawing is behind us.
  await page.waitForTimeout(500)
  return { fingers: await Fingers.on(page), spots: await spotsOn(page, facadeOf(GARDEN).facadeId) }
}

test('a finger drags a plant, taps carry it, undo brings it back, two fingers only look', async ({ page }) => {
  const complaints = watchConsole(page)
  const { fingers, spots } = await openTable(page)
  const before = placementsOf(GARDEN)
  const one = before[0]!
  const here = () => placementsOf(GARDEN).find(({ id }) => id === one.id)!
  const by = (from: { x: number; y: number }, x: number, y: number) => ({ x: from.x + x * spots.scale, y: from.y + y * spots.scale })

  const from = spots.inPlan(one.x, one.y)
  await fingers.stroke([from, by(from, 18, 6)])
  await expect.poll(() => Math.hypot(here().x - one.x - 18, here().y - one.y - 6)).toBeLessThan(2)
  await expect(page.getByTestId('save-state')).toContainText(/^Saved/)
  const dragged = here()

  // Tap what is selected: it is picked up. Tap the ground: it is set down there.
  await fingers.tap(spots.inPlan(dragged.x, dragged.y))
  await fingers.tap(spots.inPlan(one.x, one.y))
  await expect.poll(() => Math.hypot(here().x - one.x, here().y - one.y)).toBeLessThan(2)
  const carried = placementsOf(GARDEN)

  const middle = spots.inPlan(one.x, one.y)
  await fingers.stroke([middle, by(middle, -30, 0)], [by(middle, 40, 0), by(middle, 90, 0)])
  await page.waitForTimeout(300)
  expect(placementsOf(GARDEN), 'two fingers move no plant').toEqual(carried)

  for (const back of [dragged, one]) {
    await page.getByRole('button', { name: /^Undo/ }).click()
    await expect.poll(() => here()).toEqual(back)
  }
  expect(placementsOf(GARDEN)).toEqual(before)
  expect(complaints).toEqual([])
})

test('two fingers apart come nearer without a jump', async ({ page }) => {
  const { fingers, spots } = await openTable(page)
  const picture = () => page.getByTestId('drawing-table').screenshot()
  const whole = await picture()
  const middle = spots.inPlan(spots.sheet.placements[0]!.x, 60)
  await fingers.stroke([{ x: middle.x - 40, y: middle.y }, { x: middle.x - 120, y: middle.y }], [{ x: middle.x + 40, y: middle.y }, { x: middle.x + 120, y: middle.y }])
  await page.waitForTimeout(400)
  expect(Buffer.compare(await picture(), whole)).not.toBe(0)
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'Whole' }).click()
  await page.waitForTimeout(400)
  expect(Buffer.compare(await picture(), whole), 'the whole drawing is back').toBe(0)
})

test('axe finds nothing on the table in use', async ({ page }) => {
  await openTable(page)
  const look = async (where: string) => {
    const { violations } = await new AxeBuilder({ page }).analyze()
    expect.soft(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`), where).toEqual([])
  }
  await page.getByRole('tab', { name: /Plants/ }).click()
  await look('plants')
  await page.getByRole('tabpanel').getByRole('row').nth(1).getByRole('button').first().click()
  await page.getByRole('tab', { name: /This plant/ }).click()
  await look('this plant')
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'Keys' }).click()
  await look('keys')
  await page.keyboard.press('Escape')
  await page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name: 'Plant', exact: true }).click()
  await page.getByTestId('plant-picker').getByRole('button', { name: /Abelia/ }).first().click()
  await look('choosing a plant')
})

test('a pen drags as a finger does', async ({ page }) => {
  const { spots } = await openTable(page)
  const before = placementsOf(GARDEN)
  const one = before[0]!
  const session = await page.context().newCDPSession(page)
  const from = spots.inPlan(one.x, one.y)
  const send = (type: 'mousePressed' | 'mouseMoved' | 'mouseReleased', x: number, y: number) =>
    session.send('Input.dispatchMouseEvent', { type, x, y, button: 'left', buttons: type === 'mouseReleased' ? 0 : 1, clickCount: 1, pointerType: 'pen' })
  await send('mousePressed', from.x, from.y)
  for (let step = 1; step <= 6; step++) await send('mouseMoved', from.x + 3 * step * spots.scale, from.y)
  await send('mouseReleased', from.x + 18 * spots.scale, from.y)
  await expect.poll(() => Math.abs(placementsOf(GARDEN)[0]!.x - one.x - 18)).toBeLessThan(2)
  await page.getByRole('button', { name: /^Undo/ }).click()
  await expect.poll(() => placementsOf(GARDEN)).toEqual(before)
})

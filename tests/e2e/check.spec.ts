/** The check over HTTP: it answers as the engine does, and a bad sheet is refused by its fields. */
import { expect, test } from '@playwright/test'
import { check } from '../../lib/spacing'
import { signIn, facadeOf } from './support/demo'

test('POST /api/check answers the report the engine gives', async ({ page }) => {
  await signIn(page, 'estimator')
  const { sheet } = await (await page.request.get(`/api/facades/${facadeOf('Kiln Lane').facadeId}/sheet`)).json()
  const headers = { origin: new URL(page.url()).origin }
  const answer = await page.request.post('/api/check', { data: sheet, headers })
  expect(answer.status()).toBe(200)
  expect(await answer.json()).toEqual(JSON.parse(JSON.stringify(check(sheet))))

  const refused = await page.request.post('/api/check', { data: { ...sheet, surprise: 1 }, headers })
  expect(refused.status()).toBe(422)
  expect((await refused.json()).error.problems).toContainEqual({ path: ['surprise'], message: 'There is no field "surprise" here.' })

  const elsewhere = await page.request.post('/api/check', { data: sheet, headers: { origin: 'https://elsewhere.example' } })
  expect(elsewhere.status()).toBe(403)
})

/** Signing in and out; what is asked of strangers. */
import { expect, test } from '@playwright/test'
import { EMAILS, signIn } from './support/demo'

test('an unknown address and a wrong password get the same answer, and the address stays typed', async ({ page }) => {
  const answers: string[] = []
  for (const email of ['nobody@nowhere.example', EMAILS.estimator]) {
    await page.goto('/sign-in')
    await page.getByLabel('E-mail address').fill(email)
    await page.getByLabel('Password', { exact: true }).fill('not the right words')
    await page.getByRole('button', { name: 'Sign in' }).click()
    const answer = page.locator('form').getByRole('alert')
    await expect(answer).toBeVisible()
    await expect(page.getByLabel('E-mail address')).toHaveValue(email)
    answers.push(await answer.innerText())
  }
  expect(answers[0]).toBe(answers[1])
})

test('signing out ends the session', async ({ page, context }) => {
  await signIn(page, 'owner')
  const cookies = await context.cookies()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await page.waitForURL('**/sign-in')
  await context.addCookies(cookies)
  await page.goto('/plants')
  await expect(page).toHaveURL(/sign-in/)
})

test('answers carry a policy with a nonce, and cookies are not for scripts', async ({ page, context }) => {
  const answer = await page.goto('/sign-in')
  const policy = answer!.headers()['content-security-policy']!
  expect(policy).toMatch(/script-src 'self' 'nonce-[^']+' 'strict-dynamic'/)
  expect(policy).not.toMatch(/script-src[^;]*unsafe-inline/)
  await signIn(page, 'owner')
  for (const cookie of (await context.cookies()).filter(({ name }) => name !== 'theme')) {
    expect(cookie).toMatchObject({ httpOnly: true, sameSite: 'Lax' })
  }
})

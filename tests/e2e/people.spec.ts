import { expect, test } from '@playwright/test'
import { pageOf } from './support/people'

test('sign up makes a person and a shop, sign out ends it, a wrong password is refused in the same words as an unknown address', async ({ page }) => {
  const email = `someone.${Date.now()}@workshop.example`
  await page.goto('/sign-up')
  await page.getByLabel('Your name').fill('Some One')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password').fill('short')
  await page.getByLabel(/shop/i).fill('Some Workshop')
  await page.getByRole('button', { name: /account|sign up|start/i }).click()
  await expect(page.locator('main')).toContainText(/10 characters/)
  await expect(page.getByLabel('E-mail address')).toHaveValue(email)
  await page.getByLabel('Password').fill('long enough a password')
  await page.getByRole('button', { name: /account|sign up|start/i }).click()
  await page.waitForURL(/\/(scenarios|plans|engines)/)
  await page.goto('/scenarios')
  await expect(page.locator('main')).toContainText(/no scenario/i)
  await expect(page.locator('body')).not.toContainText('J260')
  await page.locator('details summary').filter({ hasText: 'Some One' }).click()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await page.waitForURL(/\/sign-in/)
  expect((await page.context().cookies()).filter(({ name }) => /sid|session/i.test(name))).toEqual([])
  const refusals: (string | null)[] = []
  for (const address of [email, `nobody.${Date.now()}@workshop.example`]) {
    await page.getByLabel('E-mail address').fill(address)
    await page.getByLabel('Password').fill('not the password')
    await page.getByRole('button', { name: 'Sign in' }).click()
    const refusal = page.locator('main').getByRole('alert').first()
    await expect(refusal).toContainText('do not belong together')
    refusals.push(await refusal.textContent())
    await page.reload()
  }
  expect(refusals[0]).toBe(refusals[1])
  await page.goto('/scenarios')
  await expect(page).toHaveURL(/\/sign-in\?next=/)
})

test('a role that may not is told so', async ({ browser }) => {
  const page = await pageOf(browser, 'technician')
  for (const path of ['/scenarios', '/engines', '/engines/new']) {
    expect((await page.goto(path))?.status()).toBe(403)
    await expect(page.getByRole('heading', { level: 1 })).toContainText(/permission|role/i)
  }
  await page.goto('/plans')
  await expect(page.locator('main a[href^="/plans/"]').first()).toBeVisible()
  await page.context().close()
})

test('a body of 10 MB is refused in a sentence', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await page.goto('/scenarios')
  const answer = await page.request.post('/scenarios', { data: 'x'.repeat(10_000_000), headers: { 'content-type': 'text/plain' } }).then((response) => ({ status: response.status(), text: response.text() }))
  expect(answer.status).toBe(413)
  expect(await answer.text).toMatch(/1 MB/)
  await page.context().close()
})

import { expect, test } from '@playwright/test'
import { pageOf, watch } from './support/people'
import { field, finding, newScenario, saveSheet } from './support/sheet'

const messageAt = (name: string) => `[id="f-${name}-error"]`

test('half typed, wrong units, tables out of order: said at the place, kept, the rest goes on computing', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  const clean = watch(page)
  await newScenario(page, 'Nonsense typed')
  const ratio = await finding(page, 'backupPowerRatio.backup')
  const before = await ratio.locator('.val').textContent()
  for (const [typed, words] of [['', /empty/], ['abc', /no number/], ['28 deg before', /plain number/], ['9 kPa', /pressure/], ['999', /at most 60/]] as const) {
    await field(page, 'backup.fixed.deg').fill(typed)
    await expect(page.locator(messageAt('backup.fixed.deg'))).toHaveText(words)
    await expect(ratio).toHaveClass(/stale/)
    await expect(ratio.locator('.val')).toHaveText(before ?? '')
  }
  // What does not stand on that field goes on: another run-up speed gives another expectation.
  await field(page, 'runUpRpm').fill('1500')
  await expect(page.getByRole('heading', { name: /Expected at run-up/ })).toContainText('1500')
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.getByRole('alert').filter({ hasText: 'Not saved' })).toBeVisible()
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('999')
  await expect(page.locator('.over')).toContainText('revision 1 ')

  await field(page, 'backup.kind').selectOption('table')
  await field(page, 'backup.table').fill('2200 27\n1000 25')
  await expect(page.locator(messageAt('backup.table'))).toHaveText(/rise/)
  await field(page, 'backup.table').fill('rpm\tdeg\n1000\t15,5\n2200\t17')
  await expect(page.locator(messageAt('backup.table'))).toHaveCount(0)
  await saveSheet(page, 2)
  clean()
  await page.context().close()
})

test('a formula says its fault under the character and computes when it is mended', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await newScenario(page, 'Formula typed')
  await field(page, 'primary.kind').selectOption('formula')
  await field(page, 'primary.formula').fill('min(26, 8 + rpm / evil)')
  await expect(page.locator('.formula .fmsg')).toContainText('evil')
  await expect(page.locator('.formula mark')).toHaveAttribute('data-at', '18')
  await field(page, 'primary.formula').fill('min(26, 8 + rpm / 120)')
  await expect(page.locator('.formula .fmsg')).toHaveCount(0)
  await expect(page.getByRole('img', { name: /Degree wheel/ }).first()).toHaveAttribute('aria-label', /A fires 26\.0/)
  await saveSheet(page, 2)
  await page.reload()
  await expect(page.getByRole('img', { name: /Degree wheel/ }).first()).toHaveAttribute('aria-label', /A fires 26\.0/)
  await page.context().close()
})

test('units can be typed and each person sees their own system', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  const path = await newScenario(page, 'Inches typed')
  await page.locator('summary', { hasText: 'Rotor and plate' }).click()
  await field(page, 'rotor.plateRadiusMm').fill('1.3 in')
  await expect(page.getByText(/1\.3 in is 33\.0/)).toBeVisible()
  await saveSheet(page, 2)
  await page.locator('details summary').filter({ hasText: 'Noor Adeyemi' }).click()
  await page.getByRole('button', { name: 'US' }).click()
  await expect(page.locator('main')).toContainText('lbf')
  await page.goto(path)
  await page.locator('summary', { hasText: 'Rotor and plate' }).click()
  await expect(field(page, 'rotor.plateRadiusMm')).toHaveValue('1.3')
  await expect(page.getByRole('heading', { name: 'Torque at full throttle' })).toBeVisible()
  await expect(page.locator('main')).toContainText('lbf')
  await page.locator('details summary').filter({ hasText: 'Noor Adeyemi' }).click()
  await page.getByRole('button', { name: 'Metric' }).click()
  await page.context().close()
})

test('no connection, and a session that ended: nothing typed is lost', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await newScenario(page, 'Interrupted')
  await field(page, 'backup.fixed.deg').fill('15.5')
  await page.context().setOffline(true)
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.getByRole('alert').filter({ hasText: 'No connection' })).toBeVisible()
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('15.5')
  await page.context().setOffline(false)

  const cookies = await page.context().cookies()
  await page.context().clearCookies()
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.getByRole('alert').filter({ hasText: 'session ended' })).toBeVisible()
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('15.5')
  await page.context().addCookies(cookies)
  await saveSheet(page, 2)
  await page.context().close()
})

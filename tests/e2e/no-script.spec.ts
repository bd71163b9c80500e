import { expect, test } from '@playwright/test'
import { pageOf } from './support/people'
import { field, newScenario } from './support/sheet'

test('the sheet computes and saves without a script', async ({ browser }) => {
  const scripted = await pageOf(browser, 'designer')
  const path = await newScenario(scripted, 'No script')
  await scripted.context().close()
  const page = await pageOf(browser, 'designer', { javaScriptEnabled: false })
  await page.goto(path)
  await field(page, 'backup.fixed.deg').fill('12.5')
  await page.getByRole('button', { name: 'Compute without saving' }).click()
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('12.5')
  await expect(page.getByRole('img', { name: /B 12\.5 degrees/ }).first()).toBeAttached()
  await expect(page.locator('.over')).toContainText('revision 1 ')
  await field(page, 'backup.fixed.deg').fill('twelve')
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.locator('[id="f-backup.fixed.deg-error"]')).toContainText('no number')
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('twelve')
  await field(page, 'backup.fixed.deg').fill('12.5')
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.locator('.over')).toContainText('revision 2 ')
  await page.goto(path)
  await expect(field(page, 'backup.fixed.deg')).toHaveValue('12.5')
  await page.context().close()
})

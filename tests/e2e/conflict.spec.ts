import { expect, test } from '@playwright/test'
import { pageOf } from './support/people'
import { field, newScenario, saveSheet } from './support/sheet'

test('two people save one scenario: the second sees both versions and loses nothing', async ({ browser }) => {
  const first = await pageOf(browser, 'designer')
  const second = await pageOf(browser, 'owner')
  const path = await newScenario(first, 'Two editors')
  await second.goto(path)
  await expect(second.locator('#scenario-form')).toBeVisible()
  await field(first, 'backup.fixed.deg').fill('16.5')
  await field(first, 'runUpRpm').fill('1650')
  await saveSheet(first, 2)
  await field(second, 'backup.fixed.deg').fill('14.5')
  await second.getByRole('button', { name: 'Save', exact: true }).click()
  const conflict = second.getByRole('alert').filter({ hasText: 'Noor Adeyemi' })
  await expect(conflict).toBeVisible()
  await expect(second.locator('.conflict')).toContainText('16.5')
  await expect(second.locator('.conflict')).toContainText('14.5')
  await expect(field(second, 'backup.fixed.deg')).toHaveValue('14.5')
  await second.getByRole('button', { name: /Save mine on top, as revision 3/ }).click()
  await expect(second.locator('.over')).toContainText('revision 3 ')
  // Both stand in the records.
  await second.goto(`${path}/revisions`)
  for (const number of [1, 2, 3]) await expect(second.getByRole('link', { name: new RegExp(`(Revision )?${number}\\b`) }).first()).toBeVisible()
  await second.goto(`${path}/revisions/2`)
  await expect(second.locator('main')).toContainText('16.5')

  // The other way: the first one's page is old now and takes theirs.
  await field(first, 'backup.fixed.deg').fill('13.5')
  await first.getByRole('button', { name: 'Save', exact: true }).click()
  await first.getByRole('button', { name: 'Take theirs into the form' }).click()
  await expect(field(first, 'backup.fixed.deg')).toHaveValue('14.5')
  await first.context().close()
  await second.context().close()
})

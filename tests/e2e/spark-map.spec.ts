import AxeBuilder from '@axe-core/playwright'
import { expect, test } from '@playwright/test'
import { pageOf, watch } from './support/people'
import { field, newScenario, saveSheet } from './support/sheet'

test('a map of spark is computed, cancelled, computed, read as a table, copied into the backup and saved', async ({ browser }) => {
  // Three maps are computed: on a busy machine that takes its time.
  test.slow()
  const page = await pageOf(browser, 'designer')
  const clean = watch(page)
  const path = await newScenario(page, 'Mapped spark')
  const panel = page.locator('.map-panel')
  await page.getByRole('heading', { name: 'Spark over speed and charge' }).click()
  await expect(panel.getByRole('note')).toContainText('Detonation can destroy an engine in seconds')

  // As many lines as there may be: long enough to be cancelled by hand.
  await panel.getByLabel('Speeds, idle to full power').fill('40')
  await panel.getByLabel('Charge pressures').fill('30')
  await panel.getByRole('button', { name: 'Compute the map' }).click()
  await expect(panel.getByRole('progressbar', { name: /Row \d+ of 40/ })).toBeVisible()
  await panel.getByRole('button', { name: 'Cancel' }).press('Enter')
  await expect(panel.getByText('Cancelled.')).toBeVisible()
  await expect(panel.getByRole('progressbar')).toHaveCount(0)
  await expect(panel.getByRole('figure')).toHaveCount(0)

  // An edit of what it stands on ends the run too, and typing goes on meanwhile.
  await panel.getByRole('button', { name: 'Compute the map' }).click()
  await expect(panel.getByRole('progressbar')).toBeVisible()
  await field(page, 'mbtDeg').fill('33')
  await expect(panel.getByText('Stopped: something the map stands on was changed.')).toBeVisible()

  await panel.getByLabel('Speeds, idle to full power').fill('6')
  await panel.getByLabel('Charge pressures').fill('5')
  await panel.getByRole('button', { name: 'Compute the map' }).press('Enter')
  await expect(panel.getByText('The map is drawn.')).toBeVisible()
  await expect(panel.getByRole('img', { name: /Spark over speed and charge pressure as contour lines/ })).toBeVisible()
  await expect(panel.getByText(/^Of 30 places best torque sets the spark at/)).toBeVisible()
  expect((await new AxeBuilder({ page }).include('.map-panel').analyze()).violations).toEqual([])
  await panel.getByRole('button', { name: 'Detonation limit' }).click()
  await panel.getByRole('button', { name: 'Detonation limit' }).press('t')
  await expect(panel.getByText(/Coming from late sparks detonation begins at/)).toBeVisible()
  await panel.getByRole('button', { name: 'numbers as a table' }).click()
  await expect(panel.getByRole('table', { name: /Detonation limit in degrees/ }).getByRole('row')).toHaveCount(8)
  await panel.getByRole('button', { name: 'drawing', exact: true }).click()

  // What was drawn is not taken for the sheet as it is now.
  await field(page, 'mbtDeg').fill('34')
  await expect(panel.getByText(/This map is an older one: the sheet has changed since/)).toBeVisible()
  await expect(panel.getByRole('button', { name: /Use as the backup’s map/ })).toHaveAttribute('aria-disabled', 'true')
  await panel.getByRole('button', { name: 'Compute the map' }).click()
  await expect(panel.getByText(/This map is an older one/)).toHaveCount(0)

  await panel.getByRole('button', { name: 'Use as the backup’s map' }).click()
  await expect(panel.getByText(/The backup advances by this map now, 6 speeds by 5 pressures/)).toBeVisible()
  await expect(field(page, 'backup.kind')).toHaveValue('map')
  const typed = await field(page, 'backup.map').inputValue()
  expect(typed.split('\n')).toHaveLength(7)
  await saveSheet(page, 2)
  await page.goto(path)
  await expect(field(page, 'backup.map')).toHaveValue(typed)
  clean()
  await page.context().close()
})

import { expect, test, type Page } from '@playwright/test'
import { pageOf, typeSignIn, watch } from './support/people'
import { field, finding, saveSheet } from './support/sheet'

/**
 * The whole job by hand, on the figures of common practice (no published source): a backup fixed at 18° makes about nine tenths of
 * the power of 28°, an electronic primary takes out 10° below 400 rpm, a six on five keeps 78 to 80 %. They live in this check alone.
 */
const engine: Record<string, string> = {
  name: 'Six of common practice', code: 'CP6', cylinders: '6', firingOrder: '1 6 2 4 3 5',
  boreMm: '92 mm', strokeMm: '70', rodMm: '138', compressionRatio: '8',
  ratedPowerKw: '60', ratedRpm: '2700', powerTimingDeg: '28', mechanicalEfficiency: '0.80',
  crankingSlowestRpm: '150', crankingRpm: '200', crankingFastestRpm: '260', idleSlowestRpm: '480', idleRpm: '500', maxRpm: '2700',
  damperDiameterMm: '6.5 in', capTerminals: '1 6 2 4 3 5',
}
const sheet: Record<string, string> = {
  'primary.fixed.deg': '28', 'primary.retardDeg': '10', 'primary.retardBelowRpm': '400', 'primary.retardHysteresisRpm': '0',
  'backup.fixed.deg': '18', mbtDeg: '34', curvaturePerDeg2: '3.9e-4',
}

async function enterEngine(page: Page): Promise<void> {
  await page.goto('/engines/new')
  for (const [name, value] of Object.entries(engine)) await field(page, name).fill(value)
  await page.getByRole('button', { name: 'Save the engine' }).first().click()
  await page.waitForURL(/\/engines\/[0-9a-f-]{36}/)
}

test('an engine and two channels by hand, read, saved, released, read by others, hidden from the other shop', async ({ browser }) => {
  // A session of its own: it is ended below.
  const page = await (await browser.newContext()).newPage()
  await page.goto('/sign-in')
  await typeSignIn(page, 'designer')
  const clean = watch(page)
  await enterEngine(page)
  await page.goto('/scenarios/new')
  await page.getByLabel('Engine').selectOption({ label: (await page.getByLabel('Engine').locator('option').allTextContents()).find((text) => text.includes('CP6')) ?? '' })
  await page.getByLabel('Name', { exact: true }).fill('Common practice')
  await page.locator('main form button[type=submit]').click()
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/)
  for (const [name, value] of Object.entries(sheet)) await field(page, name).fill(value)

  await expect(await finding(page, 'crankingAdvanceDeg.primary')).toContainText('18.0°')
  await expect(await finding(page, 'crankingAdvanceDeg.backup')).toContainText('18.0°')
  await expect(await finding(page, 'backupPowerRatio.backup')).toContainText('0.91')
  const cold = page.getByRole('table', { name: /cold cylinders, on either channel/ })
  await expect(cold.getByRole('row').filter({ has: page.getByRole('rowheader', { name: '1', exact: true }) }).getByRole('cell').first()).toHaveText(/^79\s%$/)
  for (const channel of ['primary', 'backup']) {
    const proof = await finding(page, `proofAboveIdleRpm.${channel}`)
    await expect(proof).toContainText('Full timing shows at idle')
    await expect(proof).toContainText('500 rpm')
  }
  // 10° of stagger at idle and above, none at cranking.
  const speed = page.getByRole('slider', { name: 'Speed' })
  const wheel = page.getByRole('img', { name: /Degree wheel/ }).first()
  await speed.focus()
  for (const [key, words] of [['1', /at 200 rpm.*both at once/], ['2', /at 500 rpm.*stagger 10\.0 degrees/], ['3', /stagger 10\.0 degrees/], ['4', /at 2700 rpm.*stagger 10\.0 degrees.*B later/]] as const) {
    await page.keyboard.press(key)
    await expect(wheel).toHaveAttribute('aria-label', words)
  }

  await saveSheet(page, 2)
  const address = new URL(page.url()).pathname
  await page.reload()
  for (const [name, value] of Object.entries(sheet)) await expect(field(page, name)).toHaveValue(name === 'curvaturePerDeg2' ? '0.00039' : value)

  await page.getByRole('link', { name: /^Release a plan/ }).click()
  await page.waitForURL(/\/release$/)
  await expect(page.getByRole('heading', { level: 1, name: /^Release / })).toBeVisible()
  for (const reason of await page.getByRole('textbox').all()) await reason.fill('Common practice, released as a check.')
  await page.getByRole('button', { name: 'Release the plan' }).click()
  await page.waitForURL(/\/plans\//)
  const plan = new URL(page.url()).pathname
  await page.locator('details summary').filter({ hasText: 'Noor Adeyemi' }).click()
  await page.getByRole('button', { name: 'Sign out' }).click()
  await page.waitForURL(/\/sign-in/)
  clean()

  await typeSignIn(page, 'builder')
  await page.goto('/plans')
  await expect(page.getByRole('link', { name: /Common practice/ }).first()).toBeVisible()
  await page.goto(plan)
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Common practice')
  await expect(page.locator('main')).toContainText('18.0°')
  expect((await page.goto(address))?.status()).toBe(404)

  const stranger = await pageOf(browser, 'other shop')
  expect((await stranger.goto(plan))?.status()).toBe(404)
  expect((await stranger.goto(address))?.status()).toBe(404)
  await expect(stranger.getByRole('heading', { level: 1 })).toContainText(/not|no such/i)
  await page.context().close()
  await stranger.context().close()
})

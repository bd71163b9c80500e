import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { expect, test, type Page } from '@playwright/test'
import { pageOf, watch } from './support/people'
import { finding } from './support/sheet'

const folder = path.resolve(import.meta.dirname, '../published/cases')
const total = readdirSync(folder).reduce((sum, name) => sum + JSON.parse(readFileSync(path.join(folder, name), 'utf8')).checks.length, 0)

const allWithin = `All ${total} checks within their tolerance`
/** The last check may come late where the machine has other work; looking for its words all over a long page would hold it up more. */
async function computed(page: Page): Promise<void> {
  await page.locator('.summary[data-done]').waitFor({ timeout: 45_000 })
  await expect(page.locator('.summary .stamp b')).toHaveText(allWithin)
}
const topicHeads = (page: Page) => page.getByRole('main').getByRole('heading', { level: 2 })

test.describe.configure({ timeout: 90_000 })

test('every published check is computed in the browser and lies within its tolerance', async ({ page }) => {
  const clean = watch(page)
  await page.goto('/method')
  await computed(page)
  await expect(page.getByRole('status')).toHaveText(`${total} checks, ${total} within, 0 outside.`)
  await expect(page.locator('li.chk')).toHaveCount(total)
  await expect(page.locator('li.chk').getByText('Within', { exact: true })).toHaveCount(total)
  await expect(page.locator('li.chk').getByText('not yet')).toHaveCount(0)
  const row = page.getByRole('list', { name: 'Morse test of a six' }).first().getByRole('listitem').first()
  await expect(row).toContainText(/indicated power, kW\s*expected 69\.9\s*computed 69\.900\s*difference 0\s*tolerance ±0\.05/)
  await expect(page.locator('.case', { hasText: 'A backup at 18° against full timing of 28°' }).first()).toContainText('common practice')
  clean()
})

test('formulas are set in the face that carries their measures', async ({ page }) => {
  await page.goto('/method')
  await computed(page)
  const faces = await page.evaluate(async () => {
    await document.fonts.ready
    const family = getComputedStyle(document.documentElement).getPropertyValue('--font-formula').replaceAll(/['"]/g, '').trim()
    return [...document.fonts].filter((face) => face.family.replaceAll(/['"]/g, '') === family).map(({ status }) => status)
  })
  expect(faces).toEqual(['loaded'])
  // A fraction is set upright: its numerator above its denominator.
  const [over, under] = await page.locator('#arc mfrac > *').all()
  expect((await over?.boundingBox())?.y).toBeLessThan((await under?.boundingBox())?.y ?? 0)
})

test('from the contents to an equation and its inputs by keyboard alone', async ({ page }) => {
  await page.goto('/method')
  await computed(page)
  await page.keyboard.press('Tab')
  await expect(page.getByRole('link', { name: 'To the content' })).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(page.locator('#main')).toBeFocused()
  await page.keyboard.press('Tab')
  const contents = page.getByRole('navigation', { name: 'Contents' }).filter({ visible: true })
  await expect(contents.getByRole('link', { name: 'Angle, time and arc' })).toBeFocused()
  for (let i = 0; i < 3; i += 1) await page.keyboard.press('Tab')
  await expect(contents.getByRole('link', { name: 'Dead cylinders and friction' })).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/#dead-cylinders$/)
  await expect(page.locator('#dead-cylinders')).toBeFocused()
  await page.keyboard.press('Tab')
  const equation = page.locator('#dead-cylinder-power').getByRole('link', { name: 'Power with cold cylinders' })
  await expect(equation).toBeFocused()
  await expect(equation).toBeInViewport()
  const inputs = page.locator('#dead-cylinders .inputs').first()
  for (let i = 0; i < 40 && !(await inputs.locator('summary').evaluate((summary) => summary === document.activeElement)); i += 1) await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  await expect(inputs.locator('code').first()).toContainText('deadCylinderPower({')
})

test('on a phone the contents unfold, and a wide formula takes the focus', async ({ browser }) => {
  const context = await browser.newContext({ viewport: { width: 360, height: 780 } })
  const page = await context.newPage()
  await page.goto('/method')
  await computed(page)
  expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBeLessThanOrEqual(0)
  await page.getByText('Contents', { exact: true }).filter({ visible: true }).click()
  await page.getByRole('navigation', { name: 'Contents' }).filter({ visible: true }).getByRole('link', { name: 'Detonation' }).click()
  await expect(page.getByRole('heading', { name: 'Detonation', exact: true })).toBeInViewport()
  await expect(page.locator('#cylinder-volume').getByRole('group', { name: 'Equation: Volume against crank angle' })).toHaveAttribute('tabindex', '0')
  await context.close()
})

test('on paper everything stands and nothing that is operated', async ({ page }) => {
  await page.goto('/method')
  await computed(page)
  await page.setViewportSize({ width: 718, height: 1000 })
  await page.emulateMedia({ media: 'print' })
  await expect(page.getByRole('navigation')).toHaveCount(0)
  await expect(page.getByRole('banner')).toBeHidden()
  await expect(page.locator('.inputs').first()).toBeHidden()
  for (const head of await topicHeads(page).all()) await expect(head).toBeVisible()
  const unseen = await page.locator('.eq, .weak li, li.chk, .srclist li').evaluateAll((parts) => parts.filter((part) => part.getClientRects().length === 0).length)
  expect(unseen).toBe(0)
  const cut = await page.locator('.eqn').evaluateAll((parts) => parts.filter((part) => part.scrollWidth > part.clientWidth + 1).map((part) => part.closest('.eq')?.id))
  expect(cut).toEqual([])
  expect(await page.locator('.eq, li.chk').evaluateAll((parts) => parts.filter((part) => getComputedStyle(part).breakInside !== 'avoid').length)).toBe(0)
  const pdf = await page.pdf({ format: 'A4' })
  expect(pdf.length).toBeGreaterThan(50_000)
})

test('without a script equations and expected figures stand, and a line says what is missing', async ({ browser }) => {
  const context = await browser.newContext({ javaScriptEnabled: false })
  const page = await context.newPage()
  await page.goto('/method')
  await expect(page.getByText('The computed column needs a script.')).toBeVisible()
  await expect(page.locator('li.chk')).toHaveCount(total)
  await expect(page.locator('li.chk').getByText('Waits', { exact: true })).toHaveCount(total)
  await expect(page.getByRole('list', { name: 'Morse test of a six' }).first()).toContainText('69.9')
  expect(await page.locator('math').count()).toBeGreaterThan(200)
  await page.getByRole('navigation', { name: 'Contents' }).filter({ visible: true }).getByRole('link', { name: 'Detonation' }).click()
  await expect(page.locator('#detonation')).toBeInViewport()
  await context.close()
})

test('a finding leads to its equation beside the sheet', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await page.goto('/scenarios')
  await page.locator('main li a').first().click()
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/)
  const opened = page.context().waitForEvent('page')
  await (await finding(page, 'backupPowerRatio.backup')).getByRole('link', { name: /^equation of/ }).click()
  const method = await opened
  await expect(method).toHaveURL(/\/method#timing-torque$/)
  await expect(method.getByRole('link', { name: 'Torque kept at a timing' })).toBeInViewport()
  await expect(method.getByRole('link', { name: 'Back to the shop' })).toBeVisible()
  await page.context().close()
})

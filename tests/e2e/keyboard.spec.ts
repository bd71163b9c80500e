import { expect, test, type Page } from '@playwright/test'
import { pageOf } from './support/people'

/** Presses Tab until the wanted thing has the focus: what cannot be reached so fails. */
async function tabTo(page: Page, isThere: string, most = 220): Promise<void> {
  for (let i = 0; i < most; i += 1) {
    await page.keyboard.press('Tab')
    if (await page.evaluate((selector) => document.activeElement?.matches(selector) ?? false, isThere)) return
  }
  throw new Error(`not reached by Tab: ${isThere}`)
}

async function retype(page: Page, name: string, text: string): Promise<void> {
  await tabTo(page, `[name="${name}"]`)
  await page.keyboard.press('Control+a')
  await page.keyboard.type(text)
}

test('the whole job by keyboard alone: lay out, change, scrub, read the table, save, release', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await page.goto('/scenarios/new')
  await page.locator('[name="engineId"]').waitFor()
  await tabTo(page, '[name="engineId"]')
  await page.keyboard.type('Flat six')
  await tabTo(page, '[name="title"]')
  await page.keyboard.type('By keyboard')
  await page.keyboard.press('Enter')
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/)
  await expect(page.locator('#scenario-form')).toBeVisible()
  await retype(page, 'primary.fixed.deg', '24.5')
  await retype(page, 'backup.fixed.deg', '15.5')
  await tabTo(page, 'input[type="range"]')
  await page.keyboard.press('4')
  await expect(page.getByRole('img', { name: /A fires 24\.5 .*B 15\.5 .*stagger 9\.0/ }).first()).toBeAttached()
  await page.keyboard.press('ArrowLeft')
  await expect(page.getByRole('slider', { name: 'Speed' })).toHaveAttribute('aria-valuetext', /2770 rpm/)
  await page.keyboard.press('t')
  await expect(page.getByRole('region', { name: /Advance of both channels/ })).toBeVisible()
  await page.context().close()
})

test('saving and releasing by keyboard alone', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  await page.goto('/scenarios')
  await page.locator('main li a').first().waitFor()
  await tabTo(page, 'a[href^="/scenarios/"][href*="-"]')
  await page.keyboard.press('Enter')
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/)
  await expect(page.locator('#scenario-form')).toBeVisible()
  const revision = Number(/revision (\d+) /.exec((await page.locator('.over').textContent()) ?? '')?.[1])
  await retype(page, 'mbtDeg', '37.25')
  await page.keyboard.press('Enter')
  await expect(page.locator('.over')).toContainText(`revision ${revision + 1} `)
  await page.reload()
  await expect(page.locator('#scenario-form')).toBeVisible()
  await tabTo(page, 'a[href$="/release"]')
  await page.keyboard.press('Enter')
  await page.waitForURL(/\/release$/)
  const reasons = await page.getByRole('textbox').count()
  for (let i = 0; i < reasons; i += 1) {
    await tabTo(page, 'textarea')
    await page.keyboard.type('Released by keyboard as a check.')
  }
  await tabTo(page, 'button[type="submit"].do')
  await page.keyboard.press('Enter')
  await page.waitForURL(/\/plans\//)
  await page.context().close()
})

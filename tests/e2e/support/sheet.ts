import { expect, type Locator, type Page } from '@playwright/test'

/** A finding's row on the working sheet, folded ones unfolded first. */
export async function finding(page: Page, id: string): Promise<Locator> {
  const show = page.getByRole('button', { name: 'show', exact: true })
  if (await show.isVisible()) await show.click()
  return page.locator(`[data-finding="${id}"]`).first()
}

/** The sheet's field by its form name: labels repeat between the channels. */
export const field = (page: Page, name: string): Locator => page.locator(`[name="${name}"]:not([type="hidden"])`)

export async function saveSheet(page: Page, revision: number): Promise<void> {
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.locator('.over')).toContainText(`revision ${revision} `)
  await expect(page.locator('.sheet-state')).toHaveText('')
}

/** Opens a new scenario on the demo's flat six and returns its address. */
export async function newScenario(page: Page, title: string, engine: RegExp = /J260/): Promise<string> {
  await page.goto('/scenarios/new')
  await page.getByLabel('Name', { exact: true }).fill(title)
  const select = page.getByLabel('Engine')
  const label = (await select.locator('option').allTextContents()).find((text) => engine.test(text))
  if (label) await select.selectOption({ label })
  await page.getByRole('button', { name: /Lay out|Start|Create|Open/ }).click()
  await page.waitForURL(/\/scenarios\/[0-9a-f-]{36}/)
  await expect(page.locator('#scenario-form')).toBeVisible()
  return new URL(page.url()).pathname
}

import { expect, test } from '@playwright/test'
import { pageOf, watch } from './support/people'
import { field, newScenario, saveSheet } from './support/sheet'

/** The margin of the primary as planned, in the ledger's first row. */
const marginOf = (text: string | null) => Number(/−?\d+\.\d/.exec((text ?? '').replace('at least ', ''))?.[0]?.replace('−', '-') ?? NaN)

/** Two figures shown to a tenth of a degree. */
const shown = 0.11

test('detonation follows the sheet beside the typing, is computed again on the server, and a poorer fuel costs margin', async ({ browser }) => {
  const page = await pageOf(browser, 'designer')
  const clean = watch(page)
  await newScenario(page, 'Margins followed')
  const ledger = page.getByRole('region', { name: 'Detonation', exact: true })
  const margin = ledger.getByRole('row').nth(1).getByRole('cell').nth(4)
  await expect(ledger.getByRole('note').or(ledger.getByText('Detonation can destroy an engine in seconds')).first()).toBeVisible()
  const offFrom = async (expected: number) => Math.abs(marginOf(await margin.textContent()) - expected)
  const before = marginOf(await margin.textContent())
  expect(Number.isFinite(before)).toBe(true)

  const spark = Number(await field(page, 'primary.fixed.deg').inputValue())
  await field(page, 'primary.fixed.deg').fill(String(spark - 4))
  await expect.poll(() => offFrom(before + 4), { timeout: 20_000 }).toBeLessThan(shown)

  // Quick typing leaves the newest sheet's figures, whatever was computed on the way.
  for (const deg of [3, 9, 1, 7, 2]) await field(page, 'primary.fixed.deg').fill(String(spark - deg))
  await expect.poll(() => offFrom(before + 2), { timeout: 20_000 }).toBeLessThan(shown)
  await expect(ledger.locator('[aria-busy="true"]')).toHaveCount(0)

  // Half typed: the last figures stay. Then another fuel.
  await field(page, 'primary.fixed.deg').fill('twenty')
  expect(await offFrom(before + 2)).toBeLessThan(shown)
  await field(page, 'primary.fixed.deg').fill(String(spark))
  await page.getByRole('heading', { name: 'Fuel and detonation' }).click()
  const octane = Number(await field(page, 'fuel.octane').inputValue())
  await field(page, 'fuel.octane').fill(String(octane - 4))
  await field(page, 'fuel.worseOctane').fill(String(octane - 8))
  await expect.poll(async () => marginOf(await margin.textContent()), { timeout: 20_000 }).toBeLessThan(before - 1)
  const poorer = marginOf(await margin.textContent())
  await saveSheet(page, 2)
  await page.reload()
  expect(await offFrom(poorer)).toBeLessThan(shown)
  clean()
})

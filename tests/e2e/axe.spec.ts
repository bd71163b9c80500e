import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'
import { pageOf, watch } from './support/people'

type Scheme = 'light' | 'dark'

/** Every rule in the light theme; in the dark one, which changes inks alone, those that look at inks. */
async function judge(page: Page, scheme: Scheme): Promise<void> {
  // Formulas have no rule of their own, and their thousands of parts in one ink would take the longest.
  const axe = new AxeBuilder({ page }).options({ resultTypes: ['violations'] }).exclude('math')
  const { violations } = await (scheme === 'light'
    ? axe.withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    : axe.withRules(['color-contrast', 'link-in-text-block'])).analyze()
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.slice(0, 3).map((node) => node.target.join(' ')).join(' | ')}`)).toEqual([])
}

/** Each page the demo has, by the links it offers. */
async function pagesOf(page: Page): Promise<string[]> {
  const firstLink = async (list: string, pattern: RegExp) => {
    await page.goto(list)
    await page.locator('main li a').first().waitFor()
    const hrefs = await page.locator('main a').evaluateAll((links) => links.map((link) => link.getAttribute('href') ?? ''))
    const found = hrefs.find((href) => pattern.test(href))
    if (!found) throw new Error(`no link like ${pattern} on ${list}`)
    return found
  }
  const scenario = await firstLink('/scenarios', /^\/scenarios\/[0-9a-f-]{36}/)
  const reworked = await firstLink('/scenarios?search=97+RON', /^\/scenarios\/[0-9a-f-]{36}/)
  const engine = await firstLink('/engines', /^\/engines\/[0-9a-f-]{36}/)
  const plan = await firstLink('/plans', /^\/plans\/[0-9a-f-]{36}/)
  return [
    '/scenarios', '/scenarios?search=nothing+like+this', '/scenarios/new', scenario, `${scenario}/revisions`, `${scenario}/revisions/1`, `${scenario}/release`,
    `${reworked}/revisions/compare?left=1&right=2`,
    '/engines', '/engines/new', engine, '/plans', plan, '/nowhere',
  ]
}

for (const colorScheme of ['light', 'dark'] as const satisfies readonly Scheme[]) {
  test(`nothing to mend on any page behind sign-in, ${colorScheme}`, async ({ browser }) => {
    test.setTimeout(180_000)
    const page = await pageOf(browser, 'designer', { colorScheme, reducedMotion: 'reduce' })
    const clean = watch(page)
    for (const path of await pagesOf(page)) {
      await page.goto(path)
      await page.waitForLoadState('networkidle')
      await test.step(path, () => judge(page, colorScheme))
    }
    clean()
    await page.context().close()
  })
  test(`nothing to mend on the public pages, ${colorScheme}`, async ({ browser }) => {
    test.setTimeout(180_000)
    const context = await browser.newContext({ colorScheme })
    const page = await context.newPage()
    const clean = watch(page)
    for (const path of ['/', '/method', '/sign-in', '/sign-up', '/nowhere']) {
      await page.goto(path)
      if (path === '/method') {
        await page.locator('.summary[data-done]').waitFor()
        // The whole of it once; in the other theme the first topics, which hold every kind of piece: it is the longest page of all.
        if (colorScheme === 'dark') await page.locator('.mtopic').evaluateAll((topics) => topics.slice(4).forEach((topic) => topic.remove()))
      }
      await test.step(path, () => judge(page, colorScheme))
    }
    await page.goto('/sign-in')
    await page.getByRole('button', { name: 'Sign in' }).click()
    await test.step('sign-in with faults', () => judge(page, colorScheme))
    clean()
    await context.close()
  })
}

test('nothing scrolls sideways at 360 px', async ({ browser }) => {
  test.setTimeout(120_000)
  const page = await pageOf(browser, 'designer', { viewport: { width: 360, height: 780 } })
  for (const path of await pagesOf(page)) {
    await page.goto(path)
    const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)
    expect(over, path).toBeLessThanOrEqual(0)
  }
  await page.context().close()
})

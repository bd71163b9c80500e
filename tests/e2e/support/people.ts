import { expect, type Browser, type BrowserContext, type Page } from '@playwright/test'
import { demoSignIns } from '../../../scripts/lib/demo-sign-ins.mjs'

export type DemoRole = 'builder' | 'designer' | 'technician' | 'inspector' | 'instructor' | 'owner'

type State = Awaited<ReturnType<BrowserContext['storageState']>>

/** Signed in once a person and file: attempts are limited per address. */
const states = new Map<string, State>()

const personOf = (role: DemoRole | 'other shop') => {
  const person = demoSignIns.find((each) => (role === 'other shop' ? each.email.endsWith('@saltmarsh.example') : each.role === role && each.email.endsWith('@juniper.example')))
  if (!person) throw new Error(`the demo has no ${role}`)
  return person
}

/** Types the demo person's sign-in into the page it stands on. */
export async function typeSignIn(page: Page, role: DemoRole | 'other shop'): Promise<void> {
  const { email, password } = personOf(role)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
}

/** A page of its own for a person of the demo, signed in. */
export async function pageOf(browser: Browser, role: DemoRole | 'other shop', options: Parameters<Browser['newContext']>[0] = {}): Promise<Page> {
  const { email } = personOf(role)
  if (!states.has(email)) {
    const context = await browser.newContext()
    const page = await context.newPage()
    await page.goto('/sign-in')
    await typeSignIn(page, role)
    states.set(email, await context.storageState())
    await context.close()
  }
  const context = await browser.newContext({ ...options, storageState: states.get(email) })
  return context.newPage()
}

/** Fails the test on any script error or refused resource of the page. */
export function watch(page: Page): () => void {
  const seen: string[] = []
  page.on('pageerror', (error) => seen.push(error.message))
  page.on('console', (message) => {
    if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) seen.push(message.text())
  })
  return () => expect(seen).toEqual([])
}

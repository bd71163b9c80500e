#!/usr/bin/env node
/** npm run screens: pictures of every page at three widths in both themes, from a fresh demo, into docs/screens. */
import fs from 'node:fs'
import { chromium } from '@playwright/test'
import { endAllGroups } from './lib/children.mjs'
import { chromiumPath, installChromium } from './lib/debian.mjs'
import { demoSignIns } from './lib/demo-sign-ins.mjs'
import { Failure, sentenceOf } from './lib/failure.mjs'
import { migrate, seed } from './lib/migrate.mjs'
import { build, isBuilt } from './lib/next-build.mjs'
import { inRoot } from './lib/paths.mjs'
import { cluster } from './lib/pg-cluster.mjs'
import { freePort } from './lib/port.mjs'
import { startWeb } from './lib/web.mjs'

const widths = [1440, 768, 390]
const themes = /** @type {const} */ (['light', 'dark'])
const folder = inRoot('docs', 'screens')
const database = cluster('pg-test', console.log)
const name = `screens_${process.pid}`

/** Name of a picture → address; `{scenario}` and the like are filled in from the demo. */
const publicPages = { landing: '/', method: '/method', 'sign-in': '/sign-in', 'sign-up': '/sign-up' }
const shopPages = {
  scenarios: '/scenarios', 'scenarios-none-found': '/scenarios?search=nothing+like+this', 'scenario-new': '/scenarios/new',
  sheet: '/scenarios/{scenario}', revisions: '/scenarios/{scenario}/revisions', revision: '/scenarios/{scenario}/revisions/1',
  compare: '/scenarios/{scenario}/revisions/compare?left=1&right=3', release: '/scenarios/{scenario}/release',
  engines: '/engines', 'engine-new': '/engines/new', engine: '/engines/{engine}',
  plans: '/plans', plan: '/plans/{scenario}/2', 'not-found': '/scenarios/{engine}',
}

async function run() {
  await installChromium(console.log)
  if (!isBuilt() && !(await build({ show: true })).ok) throw new Failure('The build failed.')
  await database.start()
  database.query(`create database ${name}`)
  await migrate(database, name)
  await seed(database, name)
  const [scenario] = database.query(`select id from scenarios where released_revision is not null and current_revision > 2 limit 1`, name)
  const [engine] = database.query(`select engine_id from scenarios where id = '${scenario}'`, name)
  const address = (/** @type {string} */ path) => path.replace('{scenario}', scenario ?? '').replace('{engine}', engine ?? '')
  const web = await startWeb({ port: await freePort(), databaseUrl: database.url(name), development: false })
  fs.mkdirSync(folder, { recursive: true })
  const browser = await chromium.launch({ executablePath: chromiumPath(), args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'] })
  const context = await browser.newContext({ reducedMotion: 'reduce' })
  const page = await context.newPage()
  const picture = async (/** @type {string} */ title, /** @type {string} */ path, prepare = async () => {}) => {
    for (const width of widths) for (const theme of themes) {
      await page.setViewportSize({ width, height: width === 390 ? 844 : 1000 })
      await page.emulateMedia({ colorScheme: theme })
      await page.goto(web.address + address(path))
      await page.waitForLoadState('networkidle')
      await prepare()
      await page.screenshot({ path: inRoot('docs', 'screens', `${title}-${width}-${theme}.jpg`), type: 'jpeg', quality: 80, fullPage: width !== 1440 || title === 'sheet' })
    }
    console.log(title)
  }
  for (const [title, path] of Object.entries(publicPages)) await picture(title, path)
  const designer = demoSignIns.find(({ role }) => role === 'designer')
  await page.goto(`${web.address}/sign-in`)
  await page.getByLabel('E-mail address').fill(designer?.email ?? '')
  await page.getByLabel('Password').fill(designer?.password ?? '')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
  for (const [title, path] of Object.entries(shopPages)) await picture(title, path)
  await picture('sheet-inputs', '/scenarios/{scenario}', async () => {
    const inputs = page.getByRole('button', { name: 'Inputs' })
    if (await inputs.isVisible()) await inputs.click()
    await page.locator('[name="backup.fixed.deg"]').fill('28 deg before')
    await page.locator('[name="backup.fixed.deg"]').blur()
  })
  await browser.close()
}

try {
  await run()
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 1
} finally {
  await endAllGroups()
  try {
    database.query(`drop database if exists ${name} with (force)`)
  } catch (error) {
    console.error(sentenceOf(error))
  }
}

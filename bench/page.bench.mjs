/**
 * Paint after an edit, frames while the wheel is scrubbed, and JavaScript of two pages beyond the framework's own, in headless
 * Chromium against a built server. Prints JSON. BASE_URL, CHROMIUM and the demo's designer come from scripts/bench.mjs.
 */
import fs from 'node:fs'
import path from 'node:path'
import { gzipSync } from 'node:zlib'
import { chromium } from '@playwright/test'
import { demoSignIns } from '../scripts/lib/demo-sign-ins.mjs'

const base = process.env.BASE_URL ?? 'http://127.0.0.1:3000'
const edits = 100
const rounds = 3
const person = demoSignIns.find(({ role }) => role === 'designer')
if (!person) throw new Error('The demo has no designer.')

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
})
const page = await (await browser.newContext({ viewport: { width: 1440, height: 1000 } })).newPage()

/** Scripts a page loads beyond the framework's own chunks, gzip bytes. */
async function scriptBytes(/** @type {string} */ address) {
  const manifest = JSON.parse(fs.readFileSync(path.join('.next', 'build-manifest.json'), 'utf8'))
  const own = new Set([...manifest.rootMainFiles, ...manifest.polyfillFiles].map((/** @type {string} */ file) => path.basename(file)))
  const seen = new Map()
  const note = async (/** @type {import('@playwright/test').Response} */ response) => {
    const file = path.basename(new URL(response.url()).pathname)
    if (file.endsWith('.js') && !own.has(file)) seen.set(file, gzipSync(await response.body()).length)
  }
  page.on('response', note)
  await page.goto(base + address)
  await page.waitForLoadState('networkidle')
  page.off('response', note)
  return [...seen.values()].reduce((sum, bytes) => sum + bytes, 0)
}

const signInBytes = await scriptBytes('/sign-in')
await page.getByLabel('E-mail address').fill(person.email)
await page.getByLabel('Password').fill(person.password)
await page.getByRole('button', { name: 'Sign in' }).click()
await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
await page.goto(`${base}/scenarios?sort=code`)
await page.locator('main li a').first().waitFor()
const links = await page.locator('main a').evaluateAll((all) => all.map((link) => link.getAttribute('href') ?? ''))
const scenario = links.find((href) => /^\/scenarios\/[0-9a-f-]{36}$/.test(href))
if (!scenario) throw new Error('The demo has no scenario.')
// A fresh context: what the lists had loaded counts for the workbench too.
const workbenchBytes = await scriptBytes(scenario)

/** From the input event to the paint in which finding and wheel show the new figure, ms, one value an edit. */
const timeEdits = (/** @type {number} */ count) => page.evaluate(async (times) => {
  const input = /** @type {HTMLInputElement} */ (document.querySelector('[name="mbtDeg"]'))
  const backup = /** @type {HTMLInputElement | null} */ (document.querySelector('[name="backup.fixed.deg"]'))
  const set = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set
  const painted = () => new Promise((resolve) => requestAnimationFrame(() => {
    const channel = new MessageChannel()
    channel.port1.onmessage = () => resolve(performance.now())
    channel.port2.postMessage(null)
  }))
  const wheel = () => document.querySelector('.wheel svg')?.getAttribute('aria-label')
  const durations = []
  for (let i = 0; i < times; i += 1) {
    const field = backup ?? input
    const before = wheel()
    const from = performance.now()
    set?.call(field, String(10 + ((i * 7) % 80) / 10))
    field.dispatchEvent(new Event('input', { bubbles: true }))
    const to = await painted()
    if (backup && wheel() === before) throw new Error('the wheel did not follow within a frame')
    durations.push(Number(to) - from)
    await new Promise((resolve) => setTimeout(resolve, 60))
  }
  return durations
}, count)

/** Longest frame while the handle of the speed axis is dragged over its whole length, ms. */
const longestScrubFrame = () => page.evaluate(async () => {
  const slider = /** @type {HTMLInputElement} */ (document.querySelector('.scrub input'))
  const set = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set
  let longest = 0
  let last = await new Promise((resolve) => requestAnimationFrame(resolve))
  for (let i = 0; i < 120; i += 1) {
    set?.call(slider, String(200 + i * 20))
    slider.dispatchEvent(new Event('input', { bubbles: true }))
    const now = await new Promise((resolve) => requestAnimationFrame(resolve))
    longest = Math.max(longest, Number(now) - Number(last))
    last = now
  }
  return longest
})

const at = (/** @type {number[]} */ values, /** @type {number} */ share) => [...values].sort((one, other) => one - other)[Math.min(values.length - 1, Math.floor(values.length * share))] ?? NaN
await page.locator('[name="backup.fixed.deg"], [name="mbtDeg"]').first().waitFor()
await timeEdits(20)
const runs = []
for (let i = 0; i < rounds; i += 1) {
  const times = await timeEdits(edits)
  runs.push({ median: at(times, 0.5), p95: at(times, 0.95), scrub: await longestScrubFrame() })
}
console.log(JSON.stringify({ signInBytes, workbenchBytes, runs }))
await browser.close()

#!/usr/bin/env node
/** npm run bench: the measured hot paths against their aims, as a table of ratios. Never a test: machines differ. */
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { endAllGroups, runToEnd } from './lib/children.mjs'
import { chromiumPath, installChromium, installPostgres } from './lib/debian.mjs'
import { Failure, sentenceOf } from './lib/failure.mjs'
import { migrate, seed } from './lib/migrate.mjs'
import { build, isBuilt } from './lib/next-build.mjs'
import { installPackages } from './lib/packages.mjs'
import { inRoot } from './lib/paths.mjs'
import { cluster } from './lib/pg-cluster.mjs'
import { freePort } from './lib/port.mjs'
import { startWeb } from './lib/web.mjs'

const say = (/** @type {string} */ line) => console.log(line)
const database = cluster('pg-test', say)
const name = `bench_${process.pid}`

/** @typedef {{ what: string, measured: number, aim: number, unit: string }} Row */

/**
 * Runs a measurement in a process of its own and reads the JSON it closes with.
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} [env]
 */
async function measure(args, env = {}) {
  const outcome = await runToEnd(process.execPath, args, { minutes: 8, env })
  if (!outcome.ok) throw new Failure(`A measurement failed:\n${outcome.tail}`)
  return JSON.parse(outcome.tail.trim().split('\n').at(-1) ?? '')
}

/**
 * Cycles a second of the same algorithm in C, with the equations as they stand and with the powers gathered; none where there is no compiler.
 * Its figures must be the library's to 1e-9.
 * @param {{ workJ: number, heatLossJ: number, knock: number }} ours
 * @returns {Promise<(number | null)[]>}
 */
async function nativeCycles(ours) {
  const folder = mkdtempSync(path.join(tmpdir(), 'halfspeed-bench-'))
  try {
    return await Promise.all([[], ['-DMERGED']].map(async (flags, i) => {
      const program = path.join(folder, `cycle-${i}`)
      const built = await runToEnd('gcc', ['-O2', '-std=c99', ...flags, '-o', program, inRoot('bench', 'limit', 'cycle.c'), '-lm'], { minutes: 1 }).catch(() => ({ ok: false, tail: '' }))
      if (!built.ok) return null
      /** @type {number[]} */
      const speeds = []
      for (let round = 0; round < 4; round += 1) {
        const outcome = await runToEnd(program, ['4000'], { minutes: 2 })
        const theirs = JSON.parse(outcome.tail.trim().split('\n').at(-1) ?? '')
        for (const name of /** @type {const} */ (['workJ', 'heatLossJ', 'knock'])) {
          if (Math.abs(theirs[name] / ours[name] - 1) > 1e-9) throw new Failure(`The cycle in C and the library differ in ${name}: ${theirs[name]} and ${ours[name]}.`)
        }
        speeds.push(theirs.perSecond)
      }
      return Math.max(...speeds)
    }))
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

/** @returns {Promise<Row[]>} */
async function run() {
  await installPackages(say)
  await installPostgres(say)
  await installChromium(say)
  if (!isBuilt()) {
    say('Building.')
    const outcome = await build()
    if (!outcome.ok) throw new Failure(`The build failed:\n${outcome.tail}`)
  }
  await database.start()
  database.query(`create database ${name}`)
  await migrate(database, name)
  await seed(database, name)
  const url = database.url(name)
  const evaluate = await measure(['--import', 'tsx', inRoot('bench', 'evaluate.bench.ts')])
  const faults = await measure(['--import', 'tsx', inRoot('bench', 'redundancy.bench.ts')])
  const cycle = await measure(['--import', 'tsx', inRoot('bench', 'cycle.bench.ts')])
  const [asWritten, merged] = await nativeCycles(cycle)
  const port = await freePort()
  const web = await startWeb({ port, databaseUrl: url, development: false })
  const page = await measure([inRoot('bench', 'page.bench.mjs')], { BASE_URL: web.address, CHROMIUM: chromiumPath() })
  const list = await measure(['--conditions=react-server', '--import', 'tsx', inRoot('bench', 'list.bench.ts')], { DATABASE_URL: url })
  return [
    { what: 'closed forms of a scenario, table schedule, median', measured: evaluate.table, aim: 5, unit: 'ms' },
    { what: 'closed forms of a scenario, formula schedule, median', measured: evaluate.formula, aim: 5, unit: 'ms' },
    { what: 'simulateCycle, 0.5° steps', measured: cycle.ours, aim: 4000, unit: '1/s, at least' },
    { what: 'simulateCycle, 2° steps', measured: cycle.oursAt2, aim: 17_000, unit: '1/s, at least' },
    ...(asWritten ? [{ what: 'simulateCycle over the same in C, as the equations stand', measured: cycle.ours / asWritten, aim: 0.7, unit: '×, at least' }] : []),
    ...(merged ? [{ what: 'simulateCycle over the same in C, powers gathered', measured: cycle.ours / merged, aim: 0.7, unit: '×, at least' }] : []),
    { what: `the same accuracy: ${cycle.stepDeg}° steps over adaptive, ${cycle.tolerance}`, measured: cycle.oursAsExact / cycle.adaptive, aim: 12, unit: '×, at least' },
    { what: 'spark map of 21 speeds by 11 pressures', measured: cycle.map, aim: 1000, unit: 'ms' },
    { what: 'cycle layer of a scenario', measured: cycle.layer, aim: 250, unit: 'ms' },
    { what: 'fault tree, 25 events: cut sets, value, importance', measured: faults.solved, aim: 5, unit: 'ms' },
    { what: 'the same, first call', measured: faults.first, aim: 50, unit: 'ms' },
    { what: 'the same, mean over two intervals', measured: faults.averaged, aim: 5, unit: 'ms' },
    ...faults.sets.flatMap((/** @type {number} */ sets, /** @type {number} */ i) => [
      { what: `60 events, 80 gates, tree ${i + 1}, exact value`, measured: faults.exact[i], aim: 100, unit: 'ms' },
      { what: `60 events, 80 gates, ${sets} cut sets`, measured: faults.cutSets[i], aim: 2000, unit: 'ms' },
    ]),
    ...page.runs.flatMap((/** @type {{ median: number, p95: number, scrub: number }} */ { median, p95, scrub }, /** @type {number} */ i) => [
      { what: `edit to paint, run ${i + 1}, median of 100`, measured: median, aim: 50, unit: 'ms' },
      { what: `edit to paint, run ${i + 1}, 95th percentile`, measured: p95, aim: 50, unit: 'ms' },
      { what: `longest frame while scrubbing, run ${i + 1}`, measured: scrub, aim: 100, unit: 'ms' },
    ]),
    { what: 'sign-in, JavaScript beyond the framework, gzip', measured: page.signInBytes / 1000, aim: 45, unit: 'kB' },
    { what: 'workbench, JavaScript beyond the framework, gzip', measured: page.workbenchBytes / 1000, aim: 300, unit: 'kB' },
    { what: '10 000 scenarios, first page, data layer, median', measured: list.first, aim: 20, unit: 'ms' },
    { what: '10 000 scenarios, next page', measured: list.next, aim: 20, unit: 'ms' },
    { what: '10 000 scenarios, by title', measured: list.byTitle, aim: 20, unit: 'ms' },
    { what: '10 000 scenarios, searched', measured: list.search, aim: 20, unit: 'ms' },
  ]
}

try {
  const rows = await run()
  say('')
  say(`${'what'.padEnd(54)} ${'measured'.padStart(10)} ${'aim'.padStart(8)}    ratio`)
  for (const { what, measured, aim, unit } of rows) say(`${what.padEnd(54)} ${measured.toFixed(2).padStart(10)} ${String(aim).padStart(8)} ${unit} ${(measured / aim).toFixed(2)}`)
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 1
} finally {
  await endAllGroups()
  try {
    database.query(`drop database if exists ${name} with (force)`)
    await database.stop()
  } catch (error) {
    console.error(sentenceOf(error))
  }
}

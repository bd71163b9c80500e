#!/usr/bin/env node
/** npm run bench: the measured hot paths against their aims, as a table of ratios. Never a test: machines differ. */
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
  const port = await freePort()
  const web = await startWeb({ port, databaseUrl: url, development: false })
  const page = await measure([inRoot('bench', 'page.bench.mjs')], { BASE_URL: web.address, CHROMIUM: chromiumPath() })
  const list = await measure(['--conditions=react-server', '--import', 'tsx', inRoot('bench', 'list.bench.ts')], { DATABASE_URL: url })
  return [
    { what: 'whole evaluation, table schedule, median', measured: evaluate.table, aim: 5, unit: 'ms' },
    { what: 'whole evaluation, formula schedule, median', measured: evaluate.formula, aim: 5, unit: 'ms' },
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

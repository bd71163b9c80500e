import fs from 'node:fs'
import { chromiumPath, installChromium } from './debian.mjs'
import { runToEnd } from './children.mjs'
import { readIfThere } from './keep-file.mjs'
import { migrate, seed } from './migrate.mjs'
import { build, clearDevelopmentTypes, isBuilt } from './next-build.mjs'
import { inData, inRoot } from './paths.mjs'
import { freePort } from './port.mjs'
import { isAlive } from './processes.mjs'
import { runningHere } from './running-here.mjs'
import { countOne, countPlaywright, countVitest } from './test-counts.mjs'

/** @typedef {import('./pg-cluster.mjs').Cluster} Cluster */
/** @typedef {{ name: string, run: () => Promise<import('./test-counts.mjs').Count> }} Step */

/** Each long run with its 30-second form; one is left out as long as its script does not exist. */
const SOAKS = ['kill']

const inTests = (/** @type {string[]} */ ...folders) => (/** @type {string} */ file) => folders.some((folder) => file.startsWith(inRoot('tests', folder)))
const PROJECTS = [
  { name: 'calc', holds: inTests('calc', 'units', 'schemas', 'scripts') },
  { name: 'published', holds: inTests('published') },
  { name: 'data', holds: inTests('data') },
  { name: 'components', holds: inTests('components') },
]

/**
 * Everything npm test runs, in order.
 * @param {Cluster} database
 * @param {(line: string) => void} say
 * @returns {Step[]}
 */
export function testSteps(database, say) {
  const node = (/** @type {string[]} */ args, /** @type {number} */ minutes, /** @type {NodeJS.ProcessEnv} */ env = {}) => runToEnd(process.execPath, args, { minutes, env, show: true })
  const npm = (/** @type {string} */ script, /** @type {number} */ minutes) => runToEnd('npm', ['run', '--silent', script], { minutes, show: true })
  return [
    { name: 'lint', run: async () => countOne(await npm('lint', 10)) },
    {
      name: 'typecheck',
      run: async () => {
        if (!runningHere()?.development) clearDevelopmentTypes()
        return countOne(await npm('typecheck', 10))
      },
    },
    {
      name: 'unit, published, data and component tests',
      run: async () => {
        const report = freshReport('vitest.json')
        const outcome = await node([
          inRoot('node_modules', 'vitest', 'vitest.mjs'), 'run', ...PROJECTS.flatMap(({ name }) => ['--project', name]),
          '--reporter=default', '--reporter=json', `--outputFile.json=${report}`,
        ], 15)
        return countVitest(readIfThere(report), outcome, PROJECTS)
      },
    },
    {
      name: 'build',
      run: async () => {
        if (isBuilt()) {
          say('The build of these sources is there already.')
          return countOne({ ok: true, timedOut: false })
        }
        if (runningHere()) say('The build is made anew under the npm start that runs here: start that one again afterwards.')
        return countOne(await build({ show: true }))
      },
    },
    {
      name: 'browser tests',
      run: async () => {
        if (!isBuilt()) return { passed: 0, failed: 1, notes: ['There is no build to test.'] }
        await installChromium(say)
        const report = freshReport('e2e.json')
        const outcome = await withSeededDatabase(database, async (url) =>
          node([inRoot('node_modules', '@playwright', 'test', 'cli.js'), 'test'], 20, { DATABASE_URL: url, E2E_PORT: String(await freePort()), CHROMIUM: chromiumPath() }))
        return countPlaywright(readIfThere(report), outcome)
      },
    },
    ...SOAKS.map((name) => ({ name, script: inRoot('scripts', `soak-${name}.mjs`) }))
      .filter(({ script }) => fs.existsSync(script))
      .map(({ name, script }) => ({ name: `soak:${name}, short`, run: async () => countOne(await node([script, '--short'], 5)) })),
  ]
}

/** A report of an earlier run must never be counted. @param {string} name */
function freshReport(name) {
  const file = inData(name)
  fs.rmSync(file, { force: true })
  return file
}

/**
 * @template T
 * @param {Cluster} database
 * @param {(url: string) => Promise<T>} work
 */
async function withSeededDatabase(database, work) {
  const name = `e2e_${process.pid}`
  for (const left of database.query(String.raw`select datname from pg_database where datname ~ '^e2e_\d+$'`))
    if (left === name || !isAlive(Number(left.slice(4)))) database.query(`drop database if exists ${left} with (force)`)
  database.query(`create database ${name}`)
  try {
    await migrate(database, name)
    await seed(database, name)
    return await work(database.url(name))
  } finally {
    database.query(`drop database if exists ${name} with (force)`)
  }
}

import fs from 'node:fs'
import { askedToStop } from './asked-to-stop.mjs'
import { endAllGroups } from './children.mjs'
import { installPostgres } from './debian.mjs'
import { requireSpace } from './disk-space.mjs'
import { sentenceOf } from './failure.mjs'
import { installPackages } from './packages.mjs'
import { dataFolder, root } from './paths.mjs'
import { cluster } from './pg-cluster.mjs'
import { closingLine, isGreen } from './test-counts.mjs'
import { testSteps } from './test-steps.mjs'

const say = (/** @type {string} */ line) => console.log(line)
const seconds = (/** @type {number} */ from) => `${((performance.now() - from) / 1000).toFixed(1)} s`

/**
 * npm test: installs what is missing, runs every step, and closes with one line of counts.
 * A failing step does not keep the later ones from being counted.
 * @returns {Promise<number>} the exit code
 */
export async function testHere() {
  const database = cluster('pg-test', say)
  const began = performance.now()
  /** @type {import('./test-counts.mjs').Count[]} */
  const counts = []
  /** @type {{ name: string, took: string, line: string }[]} */
  const table = []

  const asked = askedToStop().then(() => 'stopped')
  const run = async () => {
    fs.mkdirSync(dataFolder, { recursive: true })
    requireSpace(root, 500, 'the tests')
    await installPackages(say)
    await installPostgres(say)
    await database.start()
    say(`Ready after ${seconds(began)}.`)
    for (const step of testSteps(database, say)) {
      const stepBegan = performance.now()
      say(`\n── ${step.name}`)
      const count = await step.run().catch((error) => ({ passed: 0, failed: 1, notes: [sentenceOf(error)] }))
      counts.push(count)
      for (const note of count.notes) say(note)
      table.push({ name: step.name, took: seconds(stepBegan), line: `${count.passed} passed, ${count.failed} failed` })
      say(`── ${step.name}: ${table.at(-1)?.line} (${table.at(-1)?.took})`)
    }
    return 'ran'
  }
  const how = await Promise.race([asked, run()]).catch((error) => {
    console.error(sentenceOf(error))
    counts.push({ passed: 0, failed: 1, notes: [] })
    return 'failed'
  })
  await tidyUp(database)
  if (how === 'stopped') {
    say('Stopped before the end.')
    return 130
  }
  say('')
  for (const { name, took, line } of table) say(`${name.padEnd(46)} ${took.padStart(8)}   ${line}`)
  say(`In all ${seconds(began)}.`)
  say(closingLine(counts))
  return isGreen(counts) ? 0 : 1
}

/**
 * The test database is left running only while another command works in it.
 * @param {import('./pg-cluster.mjs').Cluster} database
 */
async function tidyUp(database) {
  await endAllGroups()
  try {
    if (!database.pid()) return
    const [others] = database.query("select count(*) from pg_stat_activity where backend_type = 'client backend' and pid <> pg_backend_pid()")
    if (others === '0') await database.stop()
    else say('The test database stays up: another command works in it.')
  } catch (error) {
    console.error(sentenceOf(error))
  }
}

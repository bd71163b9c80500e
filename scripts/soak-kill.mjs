#!/usr/bin/env node
/**
 * Saves scenarios while the web server and PostgreSQL are killed again and again, then looks whether every acknowledged revision
 * is there:  npm run soak:kill [-- --short | --minutes 10]
 */
import { setTimeout as sleep } from 'node:timers/promises'
import { askedToStop } from './lib/asked-to-stop.mjs'
import { endAllGroups, endGroup } from './lib/children.mjs'
import { demoSignIns } from './lib/demo-sign-ins.mjs'
import { Failure, sentenceOf } from './lib/failure.mjs'
import { migrate, seed } from './lib/migrate.mjs'
import { build, isBuilt } from './lib/next-build.mjs'
import { cluster } from './lib/pg-cluster.mjs'
import { freePort } from './lib/port.mjs'
import { enter, keepSaving, visitor } from './lib/soak-writer.mjs'
import { startWeb } from './lib/web.mjs'

const SHORT_SECONDS = 30
const BETWEEN_KILLS_MS = 4_000
const WRITERS = 3

const option = (/** @type {string} */ name) => process.argv[process.argv.indexOf(name) + 1]
const seconds = process.argv.includes('--short') ? SHORT_SECONDS : Number(process.argv.includes('--minutes') ? option('--minutes') : 10) * 60

const database = cluster('pg-soak', console.log)

async function run() {
  if (!isBuilt()) {
    const outcome = await build({ show: true })
    if (!outcome.ok) throw new Failure('The build failed, so there is nothing to try.')
  }
  await database.destroy()
  const { url } = await database.start()
  await migrate(database)
  await seed(database)
  const port = await freePort()
  const serve = () => startWeb({ port, databaseUrl: url, development: false })
  let web = await serve()

  const person = demoSignIns.find(({ role }) => role === 'owner')
  if (!person) throw new Failure('The demo has no owner to save as.')
  const writer = visitor(() => `http://127.0.0.1:${port}`)
  await enter(writer, person)
  const scenarios = database.query(`select s.id from scenarios s join shops h on h.id = s.shop_id where h.name like 'Juniper%' and s.archived_at is null order by s.code limit ${WRITERS}`)
  if (scenarios.length < WRITERS) throw new Failure(`The demo has ${scenarios.length} scenarios to save; ${WRITERS} are needed.`)

  /** @type {import('./lib/soak-writer.mjs').Acknowledged[]} */
  const acknowledged = []
  let over = false
  const writers = scenarios.map((scenario) => keepSaving(writer, scenario, () => over, acknowledged))
  let kills = 0
  for (const until = Date.now() + seconds * 1000; Date.now() < until; kills += 1) {
    await sleep(BETWEEN_KILLS_MS * (0.5 + (kills % 3) / 2))
    if (kills % 2 === 0) {
      process.kill(-(web.group ?? 0), 'SIGKILL')
      await endGroup(web.group, 0)
      web = await serve()
    } else {
      process.kill(database.pid(), 'SIGKILL')
      await database.start()
    }
  }
  over = true
  await Promise.all(writers)

  const rows = database.query(`select scenario_id || ' ' || number || ' ' || (sheet ->> 'notes') from revisions`)
  const stored = new Set(rows)
  const lost = acknowledged.filter(({ scenario, number, token }) => !stored.has(`${scenario} ${number} ${token}`))
  const broken = database.query('select code from scenarios s where current_revision <> (select max(number) from revisions r where r.scenario_id = s.id) or current_revision <> (select count(*) from revisions r where r.scenario_id = s.id)')
  console.log(`${kills} kills in ${seconds} s: ${acknowledged.length} revisions acknowledged, ${lost.length} lost, ${broken.length} scenarios whose count does not agree.`)
  for (const each of lost.slice(0, 5)) console.log(`lost: revision ${each.number} of ${each.scenario}, “${each.token}”`)
  if (acknowledged.length < kills) throw new Failure(`Only ${acknowledged.length} saves were acknowledged: that proves too little.`)
  if (lost.length > 0 || broken.length > 0) throw new Failure('An acknowledged revision is gone.')
}

try {
  // Stopped half-way it still takes its database away.
  await Promise.race([run(), askedToStop(() => { process.exitCode = 130 })])
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 1
} finally {
  await endAllGroups()
  await database.destroy().catch((error) => console.error(sentenceOf(error)))
}
process.exit()

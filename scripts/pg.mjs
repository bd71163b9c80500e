#!/usr/bin/env node
// The private database of this checkout by hand: npm run pg start | stop | status | destroy | url [-- --test]
import './lib/require-node.mjs'

const { sentenceOf } = await import('./lib/failure.mjs')
const { cluster } = await import('./lib/pg-cluster.mjs')

const args = process.argv.slice(2)
const command = args.find((arg) => !arg.startsWith('--'))
const database = cluster(args.includes('--test') ? 'pg-test' : 'pg', (line) => console.error(line))

try {
  process.exitCode = await run()
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 1
}

/** Exit code 3 for a stopped database, as pg_ctl has it. */
async function run() {
  switch (command) {
    case 'start':
      console.log((await database.start()).url)
      return 0
    case 'stop':
      await database.stop()
      return 0
    case 'status':
      console.log(database.pid() ? `running, process ${database.pid()}, ${database.info()?.folder}, port ${database.info()?.port}` : 'stopped')
      return database.pid() ? 0 : 3
    case 'url':
      console.log(database.url())
      return 0
    case 'destroy':
      await database.destroy()
      return 0
    default:
      console.error('npm run pg start | stop | status | url | destroy, with -- --test for the database of the tests')
      return 2
  }
}

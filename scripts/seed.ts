/**
 * The demo's people, engines, scenarios and plans, once:
 *   node --conditions=react-server --import tsx scripts/seed.ts [--print-sign-ins]
 */
import { closeAuthPool } from '@/lib/auth/pool'
import { closeOrm } from '@/lib/data/support/orm'
import { layDemo } from './lib/demo'
import { demoLines } from './lib/demo-sign-ins.mjs'

if (process.argv.includes('--print-sign-ins')) {
  console.log(demoLines().join('\n'))
} else {
  try {
    console.log(await layDemo() ? 'The demo is laid in.' : 'The demo is there already.')
  } catch (error) {
    console.error(`The demo could not be laid in: ${error instanceof Error ? error.message : String(error)}`)
    process.exitCode = 1
  } finally {
    await closeAuthPool()
    await closeOrm()
  }
}

import { setTimeout as sleep } from 'node:timers/promises'
import { startGroup } from './children.mjs'
import { lastLines } from './failed-step.mjs'
import { Failure } from './failure.mjs'
import { inRoot } from './paths.mjs'

const READY_MS = 60_000
const FIRST_PAGE = '/sign-in'

/**
 * Starts the web server and waits until it answers. Until then its output is kept back: only a failure needs it.
 * @param {{ port: number, databaseUrl: string, development: boolean }} options
 */
export async function startWeb({ port, databaseUrl, development }) {
  const address = `http://127.0.0.1:${port}`
  const child = startGroup(process.execPath, [inRoot('node_modules', 'next', 'dist', 'bin', 'next'), development ? 'dev' : 'start', '-H', '127.0.0.1', '-p', String(port)], {
    DATABASE_URL: databaseUrl, NODE_ENV: development ? 'development' : 'production',
  })
  /** @type {string | null} */
  let kept = ''
  const pass = (/** @type {NodeJS.WriteStream} */ stream) => (/** @type {Buffer} */ part) => {
    if (kept === null) stream.write(part)
    else kept += part.toString('utf8')
  }
  child.stdout.on('data', pass(process.stdout))
  child.stderr.on('data', pass(process.stderr))
  /** @type {Promise<string>} resolves, never rejects, when the server ends, with how it ended */
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message))
    child.once('exit', (code, signal) => resolve(signal ?? `exit code ${code}`))
  })

  const trouble = await Promise.race([awaitAnswer(address), ended.then((how) => `it ended with ${how}`)])
  if (trouble) {
    console.error(lastLines(kept))
    throw new Failure(`The web server did not come up (${trouble}): its own words stand above.`)
  }
  kept = null
  return { address, ended, group: child.pid }
}

/**
 * Undefined once the first page comes, else what stands against it.
 * @param {string} address
 */
async function awaitAnswer(address) {
  let last = 'no answer in a minute'
  for (const until = Date.now() + READY_MS; Date.now() < until; await sleep(100)) {
    try {
      const response = await fetch(address + FIRST_PAGE, { redirect: 'manual', signal: AbortSignal.timeout(30_000) })
      await response.arrayBuffer()
      if (response.status < 500) return undefined
      last = `${FIRST_PAGE} answers with error ${response.status}`
      await sleep(1_000)
    } catch {
      // Not listening yet.
    }
  }
  return last
}

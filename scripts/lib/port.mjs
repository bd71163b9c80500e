import net from 'node:net'
import { Failure } from './failure.mjs'

const LOOPBACK = '127.0.0.1'

/**
 * Tries to listen on loopback; resolves to the port it got, or to the error code that stood against it.
 * @param {number} port 0 for any free one
 * @returns {Promise<{ port: number } | { code: string }>}
 */
function tryListen(port) {
  return new Promise((resolve) => {
    const server = net.createServer()
    server.once('error', (error) => resolve({ code: /** @type {NodeJS.ErrnoException} */ (error).code ?? 'UNKNOWN' }))
    server.listen(port, LOOPBACK, () => {
      const address = /** @type {net.AddressInfo} */ (server.address())
      server.close(() => resolve({ port: address.port }))
    })
  })
}

/**
 * The preferred port when it is free, else any free one.
 * @param {number} [preferred]
 */
export async function freePort(preferred = 0) {
  const first = await tryListen(preferred)
  if ('port' in first) return first.port
  const other = await tryListen(0)
  if ('port' in other) return other.port
  throw new Failure(`No port of ${LOOPBACK} can be opened (${other.code}): check that the loopback network is up.`)
}

/**
 * Throws the sentence when the port cannot be served on.
 * @param {number} port
 */
export async function requirePort(port) {
  const result = await tryListen(port)
  if ('port' in result) return
  throw new Failure(portSentence(port, result.code))
}

/**
 * @param {number} port
 * @param {string} code
 */
export function portSentence(port, code) {
  if (code === 'EADDRINUSE') return `Port ${port} is taken by another program: stop that program, or choose another port with npm start -- --port ${port < 65535 ? port + 1 : 3000}.`
  if (code === 'EACCES') return `Port ${port} is not open to this user: choose one from 1024 to 65535 with npm start -- --port 3000.`
  return `Port ${port} of ${LOOPBACK} cannot be opened (${code}): choose another with npm start -- --port 3001.`
}

/**
 * The port a person asked for; throws the sentence when the text is none.
 * @param {string | undefined} text
 * @param {number} otherwise
 */
export function readPort(text, otherwise) {
  if (text === undefined || text.trim() === '') return otherwise
  const port = Number(text)
  if (!/^\s*\d+\s*$/.test(text) || port < 1 || port > 65535) throw new Failure(`“${text}” is no port: give a whole number from 1 to 65535, as in npm start -- --port 3001.`)
  return port
}

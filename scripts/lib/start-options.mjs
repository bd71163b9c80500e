import { parseArgs } from 'node:util'
import { Failure } from './failure.mjs'
import { readPort } from './port.mjs'

/** @typedef {{ port: number, development: boolean }} StartOptions */

/**
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env
 * @returns {StartOptions}
 */
export function readStartOptions(args, env) {
  try {
    const { values } = parseArgs({ args, options: { dev: { type: 'boolean' }, port: { type: 'string', short: 'p' } } })
    return { port: readPort(values.port ?? env.PORT, 3000), development: values.dev ?? false }
  } catch (error) {
    if (error instanceof Failure) throw error
    throw new Failure(`${args.join(' ')} is not understood: npm start takes only a port, as in npm start -- --port 3001.`)
  }
}

import fs from 'node:fs'
import { runToEnd } from './children.mjs'
import { requireSpace } from './disk-space.mjs'
import { readIfThere } from './keep-file.mjs'
import { inRoot, root } from './paths.mjs'
import { sourceHash } from './source-hash.mjs'

const stampFile = () => inRoot('.next', 'halfspeed-sources')

/** Whether .next holds a whole build of the sources as they are now. */
export const isBuilt = () => fs.existsSync(inRoot('.next', 'BUILD_ID')) && readIfThere(stampFile()) === sourceHash(root)

/**
 * Builds. The sources are hashed before, so that an edit made meanwhile calls for another build.
 * @param {{ show?: boolean }} [options]
 */
export async function build({ show = false } = {}) {
  requireSpace(root, 500, 'the build and its cache')
  const hash = sourceHash(root)
  fs.rmSync(stampFile(), { force: true })
  const outcome = await runToEnd(process.execPath, [inRoot('node_modules', 'next', 'dist', 'bin', 'next'), 'build'], { minutes: 20, show, env: { NODE_ENV: 'production' } })
  if (outcome.ok) fs.writeFileSync(stampFile(), hash)
  return outcome
}

/** Types of routes that are gone stay behind a development server and would fail the type check. */
export const clearDevelopmentTypes = () => fs.rmSync(inRoot('.next', 'dev'), { recursive: true, force: true })

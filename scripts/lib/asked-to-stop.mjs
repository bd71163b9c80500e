/** How often to look whether npm still lives. */
const LOOK_EVERY_MS = 500

/**
 * Resolves when this command shall end: by Ctrl-C, by a signal, or since the npm that started it was ended.
 * npm's shell does not pass a signal on, so a command run by npm would otherwise outlive it unseen.
 * @param {() => void} [at] called at once, before anything else goes on
 * @returns {Promise<void>}
 */
export function askedToStop(at = () => {}) {
  // A terminal that was closed must not keep the tidying up from happening.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
  return new Promise((resolve) => {
    const stop = () => {
      at()
      resolve()
    }
    for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(signal, stop)
    if (!process.env.npm_lifecycle_event) return
    const parent = process.ppid
    const look = setInterval(() => {
      if (process.ppid === parent) return
      clearInterval(look)
      stop()
    }, LOOK_EVERY_MS)
    look.unref()
  })
}

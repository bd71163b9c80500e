import fs from 'node:fs'

/** True where the kernel tells about processes under /proc (Linux). */
const hasProc = fs.existsSync('/proc/self/stat')

/**
 * Name, state and start time of a process, from /proc; null when it is gone.
 * The name may hold spaces and brackets, so the fields are counted from its last bracket.
 * @param {number} pid
 */
function statOf(pid) {
  try {
    const text = fs.readFileSync(`/proc/${pid}/stat`, 'utf8')
    const open = text.indexOf('(')
    const close = text.lastIndexOf(')')
    const rest = text.slice(close + 2).split(' ')
    return { name: text.slice(open + 1, close), state: rest[0] ?? '', startedTicks: rest[19] ?? '' }
  } catch {
    return null
  }
}

/**
 * A zombie counts as dead: containers without a reaping init keep them, and a signal to one still succeeds.
 * @param {number} pid
 */
export function isAlive(pid) {
  if (!Number.isInteger(pid) || pid <= 0) return false
  if (hasProc) {
    const stat = statOf(pid)
    return stat !== null && stat.state !== 'Z' && stat.state !== 'X'
  }
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM'
  }
}

/** The command name the kernel keeps, '' when unknown. @param {number} pid */
export const nameOf = (pid) => statOf(pid)?.name ?? ''

/**
 * Names one run of one process: a process id alone is given out again after a while or a reboot.
 * @param {number} pid
 */
export const identityOf = (pid) => `${pid}:${statOf(pid)?.startedTicks ?? ''}`

/** @param {string | null | undefined} identity what identityOf gave */
export function isSameAlive(identity) {
  const pid = Number((identity ?? '').split(':')[0])
  return isAlive(pid) && identityOf(pid) === identity
}

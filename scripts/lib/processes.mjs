import fs from 'node:fs'

/** True where the kernel tells about processes under /proc (Linux). */
const hasProc = fs.existsSync('/proc/self/stat')

/**
 * Name, state, parent, group and start time of a process, from /proc; null when it is gone.
 * The name may hold spaces and brackets, so the fields are counted from its last bracket.
 * @param {number} pid
 */
function statOf(pid) {
  try {
    const text = fs.readFileSync(`/proc/${pid}/stat`, 'utf8')
    const close = text.lastIndexOf(')')
    const rest = text.slice(close + 2).split(' ')
    return { name: text.slice(text.indexOf('(') + 1, close), state: rest[0] ?? '', parent: Number(rest[1]), group: Number(rest[2]), startedTicks: rest[19] ?? '' }
  } catch {
    return null
  }
}

/** A zombie counts as dead: containers without a reaping init keep them, and a signal to one still succeeds. */
const isDead = (/** @type {string} */ state) => state === 'Z' || state === 'X'

/** @param {number} pid */
export function isAlive(pid) {
  if (!Number.isInteger(pid) || pid <= 0) return false
  if (!hasProc) return answers(pid)
  const stat = statOf(pid)
  return stat !== null && !isDead(stat.state)
}

/** @param {number} pid negative for a group */
function answers(pid) {
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
 * Whether anything of a process group still lives.
 * @param {number} group
 */
export function isGroupAlive(group) {
  if (!hasProc) return answers(-group)
  return allProcesses().some((each) => each.group === group && !isDead(each.state))
}

const allProcesses = () => fs.readdirSync('/proc').flatMap((entry) => {
  const stat = /^\d+$/.test(entry) ? statOf(Number(entry)) : null
  return stat ? [{ pid: Number(entry), ...stat }] : []
})

/**
 * The identities of all that a process started, directly or not, also of those that left its group.
 * @param {number} pid
 * @returns {string[]}
 */
export function descendantsOf(pid) {
  if (!hasProc) return []
  const all = allProcesses()
  /** @type {(parent: number) => number[]} */
  const below = (parent) => all.filter((each) => each.parent === parent).flatMap((each) => [each.pid, ...below(each.pid)])
  return below(pid).map(identityOf)
}

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

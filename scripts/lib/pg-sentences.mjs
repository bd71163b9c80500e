import { diskFullSentence } from './failure.mjs'

/**
 * Why PostgreSQL did not start, in one sentence, from what it wrote to its log meanwhile.
 * @param {string} log
 * @param {string} folder
 * @param {string} logFile
 */
export function startSentence(log, folder, logFile) {
  const damaged = `put back a copy of it, or ${beginAnew}`
  if (/shared memory|semaphore/i.test(log) && /No space left|Cannot allocate/i.test(log)) return 'PostgreSQL got no shared memory from this machine: close other programs or give the machine more memory, then start again.'
  if (/No space left on device|Disk quota exceeded/i.test(log)) return diskFullSentence(folder)
  if (/wrong ownership|invalid permissions|Permission denied/i.test(log)) return `PostgreSQL may not use the database folder ${folder}: it and all in it must belong to the user that runs the database, with mode 0700 (chown -R, chmod 700).`
  if (/incompatible with server/i.test(log)) return `The database folder ${folder} was made by another version of PostgreSQL: install that version, or ${damaged}`
  if (/not a valid data directory|pg_control|valid checkpoint|PANIC|could not open (file|directory)|invalid (page|data in|magic|record)|configuration file .* contains errors/i.test(log)) return `The database folder ${folder} is damaged (“${lastComplaint(log)}”): ${damaged}`
  return `PostgreSQL did not start (“${lastComplaint(log)}”): see ${logFile}.`
}

/** Both go together: the small file remembers the folder and its password. */
const beginAnew = 'move it aside together with the .json file of the same name in .data, and start again with an empty database.'

/** The log says itself why the port was lost between choosing and opening it. @param {string} log */
export const lostPort = (log) => /could not (bind|create any TCP)|Address already in use/i.test(log)

/** @param {string} log */
export function lastComplaint(log) {
  const lines = log.split('\n').filter((line) => /\b(FATAL|PANIC|ERROR)\b|: error:/.test(line))
  return (lines.at(-1) ?? log.trim().split('\n').at(-1) ?? '').replace(/^.*?(FATAL|PANIC|ERROR|error):\s*/, '').replace(/^but /, '').trim().replace(/\.$/, '') || 'no reason given'
}

/** @param {string} folder */
export const missingVersionSentence = (folder) =>
  `The database folder ${folder} is damaged, its file PG_VERSION is missing: put back a copy of it, or ${beginAnew}`

/** @param {string} folder */
export const goneSentence = (folder) =>
  `The database folder ${folder} is not there any more: put it back, or remove the file that remembers it with npm run pg destroy and start again with an empty database.`

/**
 * @param {string} folder
 * @param {string} infoFile
 */
export const lostPasswordSentence = (folder, infoFile) =>
  `There is a database in ${folder}, but ${infoFile} with its password is missing: put that file back, or move the folder aside and start again with an empty database.`

/**
 * @param {string} folder
 * @param {number} made
 * @param {number[]} installed
 */
export const otherMajorSentence = (folder, made, installed) =>
  `The database folder ${folder} was made by PostgreSQL ${made}, but this machine has ${installed.length ? `only ${installed.join(' and ')}` : 'none'}: install the package postgresql-${made}, or ${beginAnew}`

/** @param {string} folder */
export const unreachableSentence = (folder) =>
  `The user that runs the database cannot enter ${folder}: give the folder back to it (chown -R postgres:) and let every user pass through the folders above (chmod a+x), then start again.`

import path from 'node:path'
import { Failure } from './failure.mjs'
import { DATABASE, USER, majorOfFolder } from './pg-info.mjs'
import { installedPrograms, runAs } from './pg-programs.mjs'
import { otherMajorSentence } from './pg-sentences.mjs'

/**
 * The full path of a server program that fits the folder: a folder opens only with the major version that made it.
 * @param {string} folder
 * @param {'initdb' | 'pg_ctl' | 'pg_isready' | 'psql'} program
 */
export function programFor(folder, program) {
  const installed = installedPrograms()
  const made = majorOfFolder(folder)
  const found = made === null ? installed[0] : installed.find(({ major }) => major === made)
  if (found) return path.join(found.bin, program)
  if (made === null) throw new Failure('PostgreSQL’s server programs are not on this machine: npm start installs them, or says how.')
  throw new Failure(otherMajorSentence(folder, made, installed.map(({ major }) => major)))
}

/**
 * Runs one statement and returns its rows as lines of |-separated text.
 * @param {import('./pg-info.mjs').ClusterInfo} info
 * @param {string} sql
 * @param {string} [database]
 */
export function runSql(info, sql, database = DATABASE) {
  const result = runAs(undefined, programFor(info.folder, 'psql'),
    ['-X', '-A', '-t', '-q', '-v', 'ON_ERROR_STOP=1', '-h', '127.0.0.1', '-p', String(info.port), '-U', USER, '-d', database, '-c', sql],
    { PGPASSWORD: info.password, PGCONNECT_TIMEOUT: '10' })
  if (!result.ok) throw new Failure(`The database refused “${sql}”: ${result.err.trim().split('\n')[0]}.`)
  return result.out.split('\n').filter(Boolean)
}

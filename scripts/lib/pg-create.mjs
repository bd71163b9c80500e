import { randomBytes } from 'node:crypto'
import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { Failure } from './failure.mjs'
import { inData, root } from './paths.mjs'
import { USER, infoFileOf, logOf, majorOfFolder, readInfo, writeInfo } from './pg-info.mjs'
import { farFolder, isReachable, makeClusterFolder } from './pg-place.mjs'
import { programFor } from './pg-programs-for.mjs'
import { ownerFor, runAs } from './pg-programs.mjs'
import { goneSentence, lostPasswordSentence, missingVersionSentence, startSentence, unreachableSentence } from './pg-sentences.mjs'

/**
 * Makes the cluster's files. Not ready yet: its database is made once the server runs.
 * @param {import('./pg-info.mjs').ClusterName} name
 * @param {(line: string) => void} say
 */
export function createCluster(name, say) {
  const known = readInfo(name)
  const forgotten = [inData(name), path.join(farFolder(root), name)].find((folder) => majorOfFolder(folder) !== null)
  if (!known && forgotten) throw new Failure(lostPasswordSentence(forgotten, infoFileOf(name)))
  // An earlier first start was cut short before its database existed: nothing of anybody's is in there.
  if (known) fs.rmSync(known.folder, { recursive: true, force: true })
  const info = { folder: makeClusterFolder(name, say), port: 0, password: randomBytes(18).toString('base64url'), ready: false }
  writeInfo(name, info)

  const owner = ownerFor(info.folder)
  const passwordFile = path.join(os.tmpdir(), `halfspeed-${randomBytes(8).toString('hex')}`)
  try {
    fs.writeFileSync(passwordFile, `${info.password}\n`, { mode: 0o600, flag: 'wx' })
    if (owner) fs.chownSync(passwordFile, owner.uid, owner.gid)
    const made = runAs(owner, programFor(info.folder, 'initdb'), [
      '-D', info.folder, '-U', USER, '-A', 'scram-sha-256', `--pwfile=${passwordFile}`, '-E', 'UTF8', '--locale=C.UTF-8', '--no-instructions',
      ...(name === 'pg' ? ['--data-checksums'] : ['--no-sync']),
    ])
    if (!made.ok) throw new Failure(startSentence(made.err, info.folder, logOf(info)))
  } finally {
    fs.rmSync(passwordFile, { force: true })
  }
  return info
}

/**
 * Looks at a folder with people's records before anything touches it: what is damaged is told, never made anew.
 * @param {import('./pg-info.mjs').ClusterInfo} info
 */
export function checkCluster(info) {
  if (!fs.existsSync(info.folder)) throw new Failure(goneSentence(info.folder))
  if (!isReachable(info.folder)) throw new Failure(unreachableSentence(info.folder))
  if (majorOfFolder(info.folder) === null) throw new Failure(missingVersionSentence(info.folder))
}

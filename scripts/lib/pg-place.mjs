import { createHash } from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'
import { Failure, fileSentence } from './failure.mjs'
import { dataFolder, root } from './paths.mjs'
import { isRoot, ownerFor, postgresIds, runAs } from './pg-programs.mjs'

/** For a checkout that the database user cannot enter, such as one below root's home; one folder a checkout. */
export const farFolder = (/** @type {string} */ checkout) =>
  path.join('/var/lib/halfspeed', createHash('sha256').update(checkout).digest('hex').slice(0, 12))

/**
 * Makes the empty database folder where the database user can reach it and returns its path.
 * @param {string} name
 * @param {(line: string) => void} say
 */
export function makeClusterFolder(name, say) {
  const near = path.join(dataFolder, name)
  if (makeReachable(near)) return near
  const far = path.join(farFolder(root), name)
  if (!makeReachable(far)) throw new Failure(`The database user postgres can reach neither ${near} nor ${far}: move the project to a folder that every user may enter, such as /opt/halfspeed, then start again.`)
  say(`The database user postgres cannot reach ${near}, so the database is kept in ${far}.`)
  return far
}

/** @param {string} folder */
function makeReachable(folder) {
  try {
    fs.mkdirSync(folder, { recursive: true, mode: 0o700 })
    if (!isRoot) return true
    const owner = postgresIds()
    if (!owner) throw new Failure('There is no user postgres on this machine to run the database as: install the package postgresql, or start as an ordinary user.')
    // The folders above are made with root's umask; they only need to let the database user through.
    for (const parent of [path.dirname(folder), path.dirname(path.dirname(folder))])
      if (parent.startsWith('/var/lib/halfspeed') || parent === dataFolder) fs.chmodSync(parent, 0o755)
    fs.chownSync(folder, owner.uid, owner.gid)
    if (runAs(owner, 'test', ['-w', folder, '-a', '-x', folder]).ok) return true
  } catch (error) {
    if (error instanceof Failure) throw error
    const refused = /** @type {NodeJS.ErrnoException} */ (error)
    // A disk that knows no owners (a network or host mount) refuses chown: the other folder may do.
    if (!isRoot || !['EPERM', 'EACCES', 'EINVAL', 'ENOTSUP', 'EROFS'].includes(refused.code ?? ''))
      throw new Failure(fileSentence(refused, folder) ?? `${folder} cannot be made: ${refused.message}.`)
  }
  // Only an empty folder is taken away again; what lies in any other is not ours to judge here.
  if (fs.existsSync(folder) && fs.readdirSync(folder).length === 0) fs.rmdirSync(folder)
  return false
}

/**
 * Whether the user who runs the server can still enter the folder it made.
 * @param {string} folder
 */
export const isReachable = (folder) => runAs(ownerFor(folder), 'test', ['-x', folder]).ok

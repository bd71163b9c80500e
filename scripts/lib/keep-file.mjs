import fs from 'node:fs'
import path from 'node:path'

/**
 * Replaces a small file whole or not at all: a full disk or a kill in the middle leaves the old one.
 * It keeps its owner, so that one start as root does not lock the usual user out.
 * @param {string} file
 * @param {string} text
 */
export function writeWhole(file, text) {
  fs.mkdirSync(path.dirname(file), { recursive: true })
  const part = `${file}.${process.pid}.part`
  try {
    const fd = fs.openSync(part, 'w', 0o600)
    try {
      fs.writeFileSync(fd, text)
      if (process.getuid?.() === 0) {
        const { uid, gid } = fs.statSync(fs.existsSync(file) ? file : path.dirname(file))
        fs.fchownSync(fd, uid, gid)
      }
      fs.fsyncSync(fd)
    } finally {
      fs.closeSync(fd)
    }
    fs.renameSync(part, file)
  } catch (error) {
    fs.rmSync(part, { force: true })
    // A write names no path of its own, and the sentence for a full disk wants one.
    throw Object.assign(/** @type {Error} */ (error), { path: file })
  }
}

/**
 * The text of a file, or null where there is none.
 * @param {string} file
 */
export function readIfThere(file) {
  try {
    return fs.readFileSync(file, 'utf8')
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') return null
    throw error
  }
}

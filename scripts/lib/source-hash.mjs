import { createHash } from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'

/** What a build is made of. The published cases belong to it: a page shows them. */
const FOLDERS = ['app', 'components', 'entities', 'lib', 'migrations', 'public', 'tests/published']

/** Files beside package.json that configure a build, except what a build writes itself. */
const isBuildFile = (/** @type {string} */ name) =>
  /\.(ts|tsx|mts|js|mjs|cjs|json|css)$/.test(name) && !/^(next-env\.d\.ts|vitest\.config\.|playwright\.config\.|eslint\.config\.)/.test(name)

/**
 * Every source file of a checkout, sorted, relative to it.
 * @param {string} checkout
 * @returns {string[]}
 */
export function sourceFiles(checkout) {
  const top = fs.readdirSync(checkout, { withFileTypes: true }).filter((entry) => entry.isFile() && isBuildFile(entry.name)).map(({ name }) => name)
  const below = FOLDERS.filter((folder) => fs.existsSync(path.join(checkout, folder))).flatMap((folder) =>
    fs.readdirSync(path.join(checkout, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => path.relative(checkout, path.join(entry.parentPath, entry.name))))
  return [...top, ...below].sort()
}

/**
 * One hash over names and contents: moving, adding, removing or editing any source changes it; touching one does not.
 * @param {string} checkout
 */
export function sourceHash(checkout) {
  const hash = createHash('sha256').update(`node ${process.versions.node.split('.')[0]}\n`)
  for (const file of sourceFiles(checkout)) {
    const content = fs.readFileSync(path.join(checkout, file))
    hash.update(`${file}\n${content.length}\n`).update(content)
  }
  return hash.digest('hex')
}

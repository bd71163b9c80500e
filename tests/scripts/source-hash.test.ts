import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { sourceFiles, sourceHash } from '@/scripts/lib/source-hash.mjs'

let checkout = ''
const put = (name: string, text: string) => {
  fs.mkdirSync(path.dirname(path.join(checkout, name)), { recursive: true })
  fs.writeFileSync(path.join(checkout, name), text)
}
beforeEach(() => {
  checkout = fs.mkdtempSync(path.join(os.tmpdir(), 'halfspeed-hash-'))
  for (const [name, text] of [['package.json', '{}'], ['proxy.ts', 'p'], ['app/page.tsx', 'a'], ['lib/calc/x.ts', 'x'], ['tests/published/one.json', '1']] as const) put(name, text)
})
afterEach(() => fs.rmSync(checkout, { recursive: true, force: true }))

test('what a build is made of is hashed, what it writes or never reads is not', () => {
  for (const name of ['next-env.d.ts', 'README.md', 'vitest.config.ts', 'tests/calc/x.test.ts', 'scripts/start.mjs', '.next/x.js', 'node_modules/y/index.js', 'tsconfig.tsbuildinfo']) put(name, 'z')
  expect(sourceFiles(checkout)).toEqual(['app/page.tsx', 'lib/calc/x.ts', 'package.json', 'proxy.ts', 'tests/published/one.json'])
})

test.each([
  ['edited', () => put('app/page.tsx', 'b')],
  ['added', () => put('app/new/page.tsx', 'a')],
  ['removed', () => fs.rmSync(path.join(checkout, 'lib/calc/x.ts'))],
  ['renamed', () => fs.renameSync(path.join(checkout, 'proxy.ts'), path.join(checkout, 'proxy2.ts'))],
  ['configured', () => put('package.json', '{ }')],
])('a source that was %s changes the hash', (_, change) => {
  const before = sourceHash(checkout)
  change()
  expect(sourceHash(checkout)).not.toBe(before)
})

test('text that moves from one file to the next changes the hash', () => {
  put('lib/a.ts', '12')
  put('lib/b.ts', '3')
  const before = sourceHash(checkout)
  put('lib/a.ts', '1')
  put('lib/b.ts', '23')
  expect(sourceHash(checkout)).not.toBe(before)
})

test('a touched file keeps the hash', () => {
  const before = sourceHash(checkout)
  fs.utimesSync(path.join(checkout, 'app/page.tsx'), new Date(0), new Date(0))
  expect(sourceHash(checkout)).toBe(before)
})

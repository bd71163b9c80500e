import { expect, test } from 'vitest'
import { missingSentence, withoutMainCluster } from '@/scripts/lib/debian.mjs'
import { compareMigrations } from '@/scripts/lib/migrate.mjs'
import { isInstalled, packagesStamp } from '@/scripts/lib/packages.mjs'
import { majorOf } from '@/scripts/lib/pg-programs.mjs'
import { readStartOptions } from '@/scripts/lib/start-options.mjs'

const list = (packages: Record<string, object>) => JSON.stringify({ packages })
const wanted = list({ '': {}, 'node_modules/a': { version: '1.0.0' }, 'node_modules/b-win': { version: '2.0.0', optional: true } })

test('packages are there when each has its version; optional ones for other machines may be absent', () => {
  expect(isInstalled(wanted, list({ 'node_modules/a': { version: '1.0.0' } }))).toBe(true)
})

test.each([
  ['another version', list({ 'node_modules/a': { version: '1.0.1' } })],
  ['a missing package', list({})],
  ['an optional one of another version', list({ 'node_modules/a': { version: '1.0.0' }, 'node_modules/b-win': { version: '1.9.9' } })],
  ['a broken list', '{ half'],
  ['no list', null],
])('%s calls for an installation', (_, installed) => {
  expect(isInstalled(wanted, installed)).toBe(false)
})

test('the stamp changes with the lock file', () => {
  expect(packagesStamp('a')).toBe(packagesStamp('a'))
  expect(packagesStamp('a')).not.toBe(packagesStamp('b'))
})

test('migrations still to run, and those only a newer version knows', () => {
  expect(compareMigrations(['m1', 'm2', 'm3'], ['m1'])).toEqual({ pending: ['m2', 'm3'], unknown: [] })
  expect(compareMigrations(['m1'], ['m1', 'm2'])).toEqual({ pending: [], unknown: ['m2'] })
})

test('the major version is read from what the server says of itself', () => {
  expect(majorOf('postgres (PostgreSQL) 15.13 (Debian 15.13-0+deb12u1)')).toBe(15)
  expect(majorOf('postgres (PostgreSQL) 18beta1')).toBe(18)
  expect(majorOf('command not found')).toBe(0)
})

test.each([
  ['#create_main_cluster = true\nx = 1\n', 'create_main_cluster = false\nx = 1\n'],
  ['create_main_cluster = true', 'create_main_cluster = false'],
  ['x = 1', 'x = 1\ncreate_main_cluster = false\n'],
])('Debian is told not to start a database for all: %j', (before, after) => {
  expect(withoutMainCluster(before)).toBe(after)
})

test('a missing package gives the exact line to type, or says that there is no such line', () => {
  expect(missingSentence('Chromium', 'apt-get install -y chromium', true)).toContain('sudo sh -c "apt-get install -y chromium"')
  expect(missingSentence('Chromium', 'apt-get install -y chromium', false)).not.toContain('sudo')
})

test('a port comes from the command line, else from PORT, else it is 3000', () => {
  expect(readStartOptions(['--port', '3005'], { PORT: '4000' } as unknown as NodeJS.ProcessEnv)).toEqual({ port: 3005, development: false })
  expect(readStartOptions(['--dev'], { PORT: '4000' } as unknown as NodeJS.ProcessEnv)).toEqual({ port: 4000, development: true })
  expect(readStartOptions([], {} as NodeJS.ProcessEnv)).toEqual({ port: 3000, development: false })
  expect(() => readStartOptions(['--fast'], {} as NodeJS.ProcessEnv)).toThrow('--fast is not understood')
})

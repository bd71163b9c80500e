import { expect, test } from 'vitest'
import { firstError, knownCause, lastLines } from '@/scripts/lib/failed-step.mjs'
import { Failure, fileSentence, sentenceOf } from '@/scripts/lib/failure.mjs'
import { lastComplaint, lostPort, otherMajorSentence, startSentence } from '@/scripts/lib/pg-sentences.mjs'

const folder = '/srv/x/.data/pg'
const log = (level: string, words: string) => `LOG:  starting PostgreSQL 15.13\nx UTC [7] ${level}:  ${words}\nx UTC [7] LOG:  database system is shut down\n`

test.each([
  [log('FATAL', 'could not write to file "pg_wal/xlogtemp.7": No space left on device'), /disk that holds \/srv\/x\/\.data\/pg is full/],
  [log('FATAL', 'could not create shared memory segment: No space left on device'), /shared memory/],
  [log('FATAL', 'data directory "/srv/x/.data/pg" has wrong ownership'), /chown -R/],
  [log('FATAL', 'data directory "/srv/x/.data/pg" has invalid permissions'), /mode 0700/],
  [log('PANIC', 'could not locate a valid checkpoint record'), /is damaged \(“could not locate a valid checkpoint record”\)/],
  [log('FATAL', 'database files are incompatible with server'), /another version of PostgreSQL/],
  [log('FATAL', 'something nobody foresaw.'), /did not start \(“something nobody foresaw”\): see \/srv\/x\/\.data\/pg\.log/],
])('PostgreSQL’s log becomes one sentence: %s', (text, sentence) => {
  const words = startSentence(text, folder, `${folder}.log`)
  expect(words).toMatch(sentence)
  expect(words).not.toContain('\n')
})

test('a lost port is told apart from damage', () => {
  expect(lostPort(log('FATAL', 'could not create any TCP/IP sockets'))).toBe(true)
  expect(lostPort(log('PANIC', 'could not locate a valid checkpoint record'))).toBe(false)
})

test('the last complaint of an empty log still reads as a sentence', () => {
  expect(lastComplaint('')).toBe('no reason given')
})

test('another major version names the package to install', () => {
  expect(otherMajorSentence(folder, 14, [15, 17])).toMatch(/PostgreSQL 14, but this machine has only 15 and 17: install the package postgresql-14/)
})

test.each([
  ['npm error code ENOTFOUND', true, /found no network/],
  ['E: Failed to fetch http://deb/x  Could not connect', true, /found no network/],
  ['npm error code ENOSPC', true, /disk that holds .* is full/],
  ["E: You don't have enough free space in /var/cache/apt/archives/.", true, /is full/],
  ['E: Could not get lock /var/lib/dpkg/lock-frontend', true, /another installation/],
  ['spawn npm ENOENT', true, /needs the program npm/],
  ['FATAL ERROR: Reached heap limit - JavaScript heap out of memory', false, /ran out of memory/],
])('a failed step names a known cause: %s', (tail, download, sentence) => {
  expect(knownCause('The step', tail, download)).toMatch(sentence)
})

test('a refused connection is no missing network where nothing is fetched, and an unknown cause is none', () => {
  expect(knownCause('The build', 'connect ECONNREFUSED 127.0.0.1:5432')).toBeNull()
  expect(knownCause('The build', 'Type error: x')).toBeNull()
})

test.each([['ENOSPC', 'is full'], ['EROFS', 'read-only'], ['EACCES', 'cannot be reached'], ['ENOTDIR', 'is in the way']])('%s of a file becomes a sentence with its path', (code, words) => {
  const sentence = sentenceOf(Object.assign(new Error('raw'), { code, path: '/srv/x' }))
  expect(sentence).toContain('/srv/x')
  expect(sentence).toContain(words)
  expect(sentence).not.toContain('raw')
})

test('an unexpected error shows its first line only, and a failure exactly its sentence', () => {
  expect(sentenceOf(new Error('odd\n    at stack'))).toBe('Something unexpected stopped this command: odd')
  expect(sentenceOf(new Failure('Do this.'))).toBe('Do this.')
  expect(fileSentence({ code: 'EBUSY' })).toBeUndefined()
})

test('the line that names the error is found, without class names and stack', () => {
  const tail = `Options:\n  -h help\nMigrationError: Migration Migration1_bad (up) failed: Original error: relation "nowhere" does not exist\n    at Umzug.run (x.js:1:2)\n  code: '42P01'\n`
  expect(firstError(tail)).toBe('Migration Migration1_bad (up) failed: relation "nowhere" does not exist')
  expect(firstError('nothing said')).toBe('nothing said')
  expect(firstError('')).toBe('no reason given')
})

test('the last lines show no stack', () => {
  expect(lastLines('one\n    at run (x.js:1:2)\n    at async y (z.js:3:4)\ntwo\n')).toBe('one\ntwo')
  expect(lastLines('a\nb\nc', 2)).toBe('b\nc')
})

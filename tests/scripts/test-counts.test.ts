import { expect, test } from 'vitest'
import { closingLine, countOne, countPlaywright, countVitest, isGreen } from '@/scripts/lib/test-counts.mjs'

const ok = { ok: true, timedOut: false }
const red = { ok: false, timedOut: false }
const projects = [
  { name: 'calc', holds: (file: string) => file.startsWith('/x/tests/calc') },
  { name: 'data', holds: (file: string) => file.startsWith('/x/tests/data') },
]
const file = (name: string, states: string[], status = states.includes('failed') ? 'failed' : 'passed') =>
  ({ name: `/x/tests/${name}`, status, assertionResults: states.map((state) => ({ status: state })) })
const vitest = (...files: object[]) => JSON.stringify({ testResults: files })

test('passed and failed tests of all files are summed', () => {
  const count = countVitest(vitest(file('calc/a.test.ts', ['passed', 'passed']), file('data/b.test.ts', ['passed', 'failed'])), red, projects)
  expect(count).toEqual({ passed: 3, failed: 1, notes: [] })
})

test('a project that ran no test counts as one failure and is named', () => {
  const count = countVitest(vitest(file('calc/a.test.ts', ['passed'])), ok, projects)
  expect(count).toEqual({ passed: 1, failed: 1, notes: ['data: no test ran.'] })
})

test('a file that did not load counts as one failure', () => {
  const count = countVitest(vitest(file('calc/a.test.ts', ['passed']), file('data/b.test.ts', [], 'failed')), red, projects)
  expect(count.failed).toBe(1)
  expect(count.notes[0]).toContain('b.test.ts')
})

test('a file without a test counts as one failure', () => {
  expect(countVitest(vitest(file('calc/a.test.ts', ['passed']), file('data/b.test.ts', [])), ok, projects).failed).toBe(1)
})

test('skipped tests count as failed', () => {
  const count = countVitest(vitest(file('calc/a.test.ts', ['passed', 'skipped', 'todo']), file('data/b.test.ts', ['passed'])), ok, projects)
  expect(count).toMatchObject({ passed: 2, failed: 2 })
})

test('an error outside the tests counts although every test passed', () => {
  const count = countVitest(vitest(file('calc/a.test.ts', ['passed']), file('data/b.test.ts', ['passed'])), red, projects)
  expect(count).toMatchObject({ passed: 2, failed: 1 })
})

test.each([null, '', '{ half', 'null', '{}'])('no results (%j) count as one failure, whatever the exit code', (text) => {
  expect(countVitest(text, ok, projects)).toMatchObject({ passed: 0, failed: 1 })
  expect(countPlaywright(text, ok)).toMatchObject({ passed: 0, failed: 1 })
})

test('a run past its time is named as such', () => {
  expect(countVitest(null, { ok: false, timedOut: true }, projects).notes[0]).toContain('did not end in its time')
  expect(countOne({ ok: false, timedOut: true })).toMatchObject({ passed: 0, failed: 1 })
})

test('a step that only holds or not counts as one', () => {
  expect(countOne(ok)).toEqual({ passed: 1, failed: 0, notes: [] })
  expect(countOne(red)).toEqual({ passed: 0, failed: 1, notes: [] })
})

const playwright = (stats: object, errors: object[] = []) => JSON.stringify({ stats, errors })

test('browser tests are summed; flaky and skipped ones count as failed', () => {
  const count = countPlaywright(playwright({ expected: 5, unexpected: 1, flaky: 1, skipped: 2 }), red)
  expect(count).toMatchObject({ passed: 5, failed: 4 })
  expect(count.notes).toHaveLength(2)
})

test('a browser run without a test, and one that broke off, are failures', () => {
  expect(countPlaywright(playwright({ expected: 0, unexpected: 0, flaky: 0, skipped: 0 }), ok)).toMatchObject({ passed: 0, failed: 1 })
  const broken = countPlaywright(playwright({ expected: 3, unexpected: 0, flaky: 0, skipped: 0 }, [{ message: 'webServer did not start\nstack' }]), red)
  expect(broken).toMatchObject({ passed: 3, failed: 1 })
  expect(broken.notes).toContain('webServer did not start')
})

test('the closing line is plain, and a run that counted nothing is not green', () => {
  expect(closingLine([{ passed: 2, failed: 0, notes: [] }, { passed: 3, failed: 1, notes: [] }])).toBe('5 passed, 1 failed')
  expect(closingLine([])).toBe('0 passed, 1 failed')
  expect(isGreen([])).toBe(false)
  expect(isGreen([{ passed: 1, failed: 0, notes: [] }])).toBe(true)
  expect(isGreen([{ passed: 1, failed: 0, notes: [] }, { passed: 9, failed: 1, notes: [] }])).toBe(false)
})

/**
 * What a step adds to the closing line. `notes` are sentences for a person, printed under the step.
 * @typedef {{ passed: number, failed: number, notes: string[] }} Count
 */

/**
 * A step that either holds or not, such as the type check, counts as one.
 * @param {{ ok: boolean, timedOut: boolean }} outcome
 * @returns {Count}
 */
export const countOne = ({ ok, timedOut }) => ({ passed: ok ? 1 : 0, failed: ok ? 0 : 1, notes: timedOut ? ['It did not end in its time and was stopped.'] : [] })

/**
 * Vitest's JSON report. A file that did not load, an error outside any test, a skipped test and a project
 * that ran no test are failures too: none of them shows that the code works.
 * @param {string | null} text the report, null when none was written
 * @param {{ ok: boolean, timedOut: boolean }} outcome
 * @param {{ name: string, holds: (file: string) => boolean }[]} projects
 * @returns {Count}
 */
export function countVitest(text, outcome, projects) {
  const report = parsed(text)
  if (!report || !Array.isArray(report.testResults)) return nothing(outcome)
  const count = { passed: 0, failed: 0, notes: timeNote(outcome) }
  for (const file of report.testResults) {
    const states = file.assertionResults.map((/** @type {{ status: string }} */ each) => each.status)
    const passed = states.filter((/** @type {string} */ state) => state === 'passed').length
    const skipped = states.filter((/** @type {string} */ state) => state !== 'passed' && state !== 'failed').length
    const failed = states.length - passed
    count.passed += passed
    count.failed += failed
    if (skipped > 0) count.notes.push(`${file.name}: ${skipped} skipped, which counts as failed.`)
    if (file.status === 'failed' && failed === 0) fail(count, `${file.name}: the file itself failed.`)
    else if (states.length === 0) fail(count, `${file.name}: no test in it.`)
  }
  for (const { name, holds } of projects)
    if (!report.testResults.some((/** @type {{ name: string }} */ file) => holds(file.name))) fail(count, `${name}: no test ran.`)
  return closeCount(count, outcome)
}

/**
 * Playwright's JSON report; a test that failed at first and passed later counts as failed.
 * @param {string | null} text
 * @param {{ ok: boolean, timedOut: boolean }} outcome
 * @returns {Count}
 */
export function countPlaywright(text, outcome) {
  const report = parsed(text)
  if (!report?.stats) return nothing(outcome)
  const { expected, unexpected, flaky, skipped } = report.stats
  const count = { passed: expected, failed: unexpected + flaky + skipped, notes: timeNote(outcome) }
  if (skipped > 0) count.notes.push(`${skipped} skipped, which counts as failed.`)
  if (flaky > 0) count.notes.push(`${flaky} passed only when repeated, which counts as failed.`)
  for (const error of report.errors ?? []) count.notes.push(String(error.message ?? error).split('\n')[0] ?? '')
  if (count.passed + count.failed === 0) fail(count, 'No browser test ran.')
  return closeCount(count, outcome)
}

/** @param {Count[]} counts */
export function closingLine(counts) {
  const { passed, failed } = counts.reduce((sum, each) => ({ passed: sum.passed + each.passed, failed: sum.failed + each.failed }), { passed: 0, failed: 0 })
  // A run that counted nothing proved nothing.
  return passed + failed === 0 ? '0 passed, 1 failed' : `${passed} passed, ${failed} failed`
}

/** @param {Count[]} counts */
export const isGreen = (counts) => counts.some(({ passed }) => passed > 0) && counts.every(({ failed }) => failed === 0)

/**
 * The program's own verdict is heard even where its report counts no failure.
 * @param {Count} count
 * @param {{ ok: boolean }} outcome
 */
function closeCount(count, { ok }) {
  if (!ok && count.failed === 0) fail(count, 'It ended with an error outside its tests.')
  return count
}

/**
 * @param {Count} count
 * @param {string} note
 */
function fail(count, note) {
  count.failed += 1
  count.notes.push(note)
}

/** @param {{ timedOut: boolean }} outcome @returns {Count} */
const nothing = (outcome) => ({ passed: 0, failed: 1, notes: [...timeNote(outcome), 'It left no results.'] })

/** @param {{ timedOut: boolean }} outcome */
const timeNote = ({ timedOut }) => (timedOut ? ['It did not end in its time and was stopped.'] : [])

/** @param {string | null} text */
function parsed(text) {
  try {
    return JSON.parse(text ?? 'null')
  } catch {
    return null
  }
}

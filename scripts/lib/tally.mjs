import { readFileSync, rmSync } from 'node:fs'

/**
 * What a step that is one check came to.
 * @param {number} code its exit code
 */
export function tallyOfCheck(code) {
  return code === 0 ? { passed: 1, failed: 0, skipped: 0 } : { passed: 0, failed: 1, skipped: 0 }
}

/**
 * What a test runner's report came to. A run without a test, one whose report is missing, and one
 * that ended badly although each test passed, count as one failure.
 * @param {number} code the runner's exit code
 * @param {(report: object) => {passed: number, failed: number, skipped: number}} read
 */
export function tallyOfReport(code, path, read) {
  let tally = { passed: 0, failed: 0, skipped: 0 }
  try {
    tally = read(JSON.parse(readFileSync(path, 'utf8')))
  } catch {
    // The runner ended before it could write: its exit code and the empty tally say so.
  }
  const ranNothing = tally.passed + tally.failed === 0
  return tally.failed === 0 && (code !== 0 || ranNothing) ? { ...tally, failed: 1 } : tally
}

/** Reads Vitest's JSON report. A file that could not be loaded is one failure. */
export function readVitest(report) {
  const broken = report.testResults.filter(
    (file) =>
      file.status === 'failed' && file.assertionResults.every((test) => test.status !== 'failed'),
  )
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken.length,
    skipped: report.numPendingTests + report.numTodoTests,
  }
}

/** Reads Playwright's JSON report. A test that passed only when repeated has failed. */
export function readPlaywright({ stats, errors }) {
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + errors.length,
    skipped: stats.skipped,
  }
}

/**
 * Adds up what the steps came to.
 * @param {{passed: number, failed: number, skipped: number}[]} tallies
 */
export function sum(tallies) {
  return tallies.reduce(
    (all, each) => ({
      passed: all.passed + each.passed,
      failed: all.failed + each.failed,
      skipped: all.skipped + each.skipped,
    }),
    { passed: 0, failed: 0, skipped: 0 },
  )
}

/** The last line of a test run. */
export function lastLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`
}

/**
 * Whether a test run may call itself good: something ran, and nothing failed.
 * @param {{passed: number, failed: number}} total
 */
export function isGood({ passed, failed }) {
  return failed === 0 && passed > 0
}

/** Removes an old report, so that it cannot be taken for a new one. */
export function clearReport(path) {
  rmSync(path, { force: true })
}

import { writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { describe, expect, test } from 'vitest'

import {
  isGood,
  lastLine,
  readPlaywright,
  readVitest,
  sum,
  tallyOfCheck,
  tallyOfReport,
} from '../../../scripts/lib/tally.mjs'
import { temporaryFolder } from './temporary-folder'

function vitestReport(passed: number, failed: number, brokenFiles = 0) {
  return {
    numPassedTests: passed,
    numFailedTests: failed,
    numPendingTests: 0,
    numTodoTests: 0,
    testResults: [
      ...(failed ? [{ status: 'failed', assertionResults: [{ status: 'failed' }] }] : []),
      ...Array.from({ length: brokenFiles }, () => ({ status: 'failed', assertionResults: [] })),
    ],
  }
}

function written(report: unknown): string {
  const path = join(temporaryFolder(), 'report.json')
  writeFileSync(path, JSON.stringify(report))
  return path
}

describe('a step of one check', () => {
  test('passes on exit code 0 only', () => {
    expect(tallyOfCheck(0)).toMatchObject({ passed: 1, failed: 0 })
    expect(tallyOfCheck(2)).toMatchObject({ passed: 0, failed: 1 })
  })
})

describe('a step with a report', () => {
  test('counts its tests', () => {
    const path = written(vitestReport(12, 3))
    expect(tallyOfReport(1, path, readVitest)).toEqual({ passed: 12, failed: 3, skipped: 0 })
  })

  test('a file that could not be loaded is a failure', () => {
    const path = written(vitestReport(12, 1, 2))
    expect(tallyOfReport(1, path, readVitest)).toMatchObject({ passed: 12, failed: 3 })
  })

  test('a missing report is a failure, even with exit code 0', () => {
    const path = join(temporaryFolder(), 'none.json')
    expect(tallyOfReport(0, path, readVitest)).toMatchObject({ passed: 0, failed: 1 })
  })

  test('half a report is a failure', () => {
    const path = join(temporaryFolder(), 'half.json')
    writeFileSync(path, '{"numPassedTests": 3,')
    expect(tallyOfReport(0, path, readVitest)).toMatchObject({ passed: 0, failed: 1 })
  })

  test('a run without a test is a failure', () => {
    expect(tallyOfReport(0, written(vitestReport(0, 0)), readVitest)).toMatchObject({ failed: 1 })
  })

  test('a bad end after tests that all passed is a failure', () => {
    const path = written(vitestReport(5, 0))
    expect(tallyOfReport(1, path, readVitest)).toMatchObject({ passed: 5, failed: 1 })
  })

  test('a browser test that passed only when repeated has failed', () => {
    const stats = { expected: 4, unexpected: 1, flaky: 1, skipped: 2 }
    const tally = readPlaywright({ stats, errors: [{ message: 'no such file' }] })
    expect(tally).toEqual({ passed: 4, failed: 3, skipped: 2 })
  })
})

describe('the whole run', () => {
  test('adds up and says so in one line', () => {
    const total = sum([
      { passed: 1, failed: 0, skipped: 0 },
      { passed: 40, failed: 2, skipped: 1 },
    ])
    expect(lastLine(total)).toBe('41 passed, 2 failed')
  })

  test('is good when something ran and nothing failed', () => {
    expect(isGood({ passed: 3, failed: 0 })).toBe(true)
    expect(isGood({ passed: 3, failed: 1 })).toBe(false)
    expect(isGood(sum([]))).toBe(false)
  })
})

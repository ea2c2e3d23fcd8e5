/** Real counts from the JSON reports of the runners. A skipped test proves nothing and counts as failed. */
import { readFileSync } from 'node:fs'

export interface TestCounts {
  passed: number
  failed: number
  skipped: number
}

/** The report of a runner that ended without one: something failed that no test names. */
const NO_REPORT: TestCounts = { passed: 0, failed: 1, skipped: 0 }

interface VitestReport {
  numPassedTests: number
  numFailedTests: number
  numPendingTests: number
  numTodoTests: number
  testResults: { status: string; assertionResults: { status: string }[] }[]
}

interface PlaywrightReport {
  stats: { expected: number; unexpected: number; flaky: number; skipped: number }
  errors: unknown[]
}

export function countVitest(report: VitestReport): TestCounts {
  // A file that could not be imported has no failed test of its own.
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((test) => test.status === 'failed'),
  ).length
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + brokenFiles,
    skipped: report.numPendingTests + report.numTodoTests,
  }
}

export function countPlaywright(report: PlaywrightReport): TestCounts {
  const { expected, unexpected, flaky, skipped } = report.stats
  return { passed: expected, failed: unexpected + flaky + report.errors.length, skipped }
}

/** `hasFailed`: the runner's own exit status, which also knows of errors outside any test. */
export function readCounts<Report>(
  reportFile: string,
  count: (report: Report) => TestCounts,
  hasFailed: boolean,
): TestCounts {
  let counts: TestCounts
  try {
    counts = count(JSON.parse(readFileSync(reportFile, 'utf8')) as Report)
  } catch {
    return NO_REPORT
  }
  const isUnexplained = (hasFailed || counts.passed === 0) && counts.failed === 0
  return isUnexplained ? { ...counts, failed: 1 } : counts
}

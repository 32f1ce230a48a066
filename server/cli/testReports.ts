import { existsSync, readFileSync } from 'node:fs'

export interface Tally {
  passed: number
  failed: number
  skipped: number
}

interface VitestReport {
  testResults: { status: string; assertionResults: { status: string }[] }[]
}

interface PlaywrightReport {
  stats: { expected: number; unexpected: number; flaky: number; skipped: number }
  errors: unknown[]
}

/** Counts a Vitest JSON report; a file that did not even load counts as one failure. */
export function tallyVitest(file: string, exitCode: number): Tally {
  const report = readReport(file) as VitestReport | null
  if (!report) return withExitCode({ passed: 0, failed: 0, skipped: 0 }, exitCode)
  const statuses = report.testResults.flatMap(({ assertionResults }) =>
    assertionResults.map(({ status }) => status),
  )
  const notLoaded = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((result) => result.status === 'failed'),
  )
  const passed = statuses.filter((status) => status === 'passed').length
  const failed = statuses.filter((status) => status === 'failed').length
  const skipped = statuses.length - passed - failed
  return withExitCode({ passed, failed: failed + notLoaded.length, skipped }, exitCode)
}

/** Counts a Playwright JSON report; a test that only passed when tried again is a failure. */
export function tallyPlaywright(file: string, exitCode: number): Tally {
  const report = readReport(file) as PlaywrightReport | null
  if (!report) return withExitCode({ passed: 0, failed: 0, skipped: 0 }, exitCode)
  const { expected, unexpected, flaky, skipped } = report.stats
  const failed = unexpected + flaky + report.errors.length
  return withExitCode({ passed: expected, failed, skipped }, exitCode)
}

/** A run that ended badly has at least one failure, and one that counted nothing has too. */
function withExitCode(tally: Tally, exitCode: number): Tally {
  const isBad = exitCode !== 0 || tally.passed + tally.failed === 0
  return isBad && tally.failed === 0 ? { ...tally, failed: 1 } : tally
}

function readReport(file: string): unknown {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null
}

/** The last line of a test run. */
export function describeTally({ passed, failed, skipped }: Tally): string {
  const counts = `${passed} passed, ${failed} failed`
  return skipped > 0 ? `${counts}, ${skipped} skipped` : counts
}

export function addTallies(tallies: Tally[]): Tally {
  return tallies.reduce(
    (sum, tally) => ({
      passed: sum.passed + tally.passed,
      failed: sum.failed + tally.failed,
      skipped: sum.skipped + tally.skipped,
    }),
    { passed: 0, failed: 0, skipped: 0 },
  )
}

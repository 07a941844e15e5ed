import { existsSync, readFileSync } from 'node:fs'

const read = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined)

/** What the unit and reference tests reported, from Vitest's JSON. */
export function unitTotals(file) {
  const report = read(file)
  return {
    passed: report?.numPassedTests ?? 0,
    // A file that cannot even be loaded fails as a suite, with no test of its own.
    failed: Math.max(report?.numFailedTests ?? 0, report && !report.success ? 1 : 0),
    skipped: report?.numPendingTests ?? 0,
  }
}

/** What the browser tests reported, from Playwright's JSON. A test that passed on a second try has failed. */
export function pageTotals(file) {
  const { expected = 0, unexpected = 0, flaky = 0, skipped = 0 } = read(file)?.stats ?? {}
  return { passed: expected, failed: unexpected + flaky, skipped }
}

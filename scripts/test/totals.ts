export interface Totals {
  passed: number
  failed: number
  skipped: number
}

export const none: Totals = { passed: 0, failed: 0, skipped: 0 }
export const onePassed: Totals = { ...none, passed: 1 }
export const oneFailed: Totals = { ...none, failed: 1 }

/** The sum of several totals. */
export function sum(parts: readonly Totals[]): Totals {
  const add = (name: keyof Totals) => parts.reduce((all, part) => all + part[name], 0)
  return { passed: add('passed'), failed: add('failed'), skipped: add('skipped') }
}

/** The last line of `npm test`. */
export function totalsLine({ passed, failed, skipped }: Totals): string {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`
}

/** What vitest's JSON reporter writes, as far as we count it. */
export interface VitestReport {
  numPassedTests: number
  numFailedTests: number
  numPendingTests: number
  numTodoTests: number
  testResults: { status: string; assertionResults: unknown[] }[]
}

/**
 * Count a suite. A file that could not even be loaded has no tests to fail, so it counts as one failed; so does a
 * suite that ended badly (an error outside any test, no tests found, killed) though none of its tests failed.
 */
export function countSuite(report: VitestReport | undefined, exitCode: number): Totals {
  if (!report) return oneFailed
  const unloaded = report.testResults.filter((file) => file.status === 'failed' && file.assertionResults.length === 0)
  const failed = report.numFailedTests + unloaded.length
  return {
    passed: report.numPassedTests,
    failed: failed === 0 && exitCode !== 0 ? 1 : failed,
    skipped: report.numPendingTests + report.numTodoTests,
  }
}

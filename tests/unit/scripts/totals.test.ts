import { describe, expect, it } from 'vitest'
import { countSuite, sum, totalsLine } from '@/scripts/test/totals'

const clean = { numPassedTests: 7, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0, testResults: [] }
const unloaded = { status: 'failed', assertionResults: [] }

describe('the totals of npm test', () => {
  it('counts what passed, failed and was skipped', () => {
    const report = { ...clean, numFailedTests: 2, numPendingTests: 1, numTodoTests: 1 }
    expect(countSuite(report, 1)).toEqual({ passed: 7, failed: 2, skipped: 2 })
  })

  it('counts a file that could not be loaded as one failed', () => {
    expect(countSuite({ ...clean, testResults: [unloaded, unloaded] }, 1).failed).toBe(2)
  })

  it('does not call a suite good that ended badly outside its tests', () => {
    expect(countSuite(clean, 1).failed).toBe(1)
    expect(countSuite(clean, 137).failed).toBe(1)
  })

  it('does not call a suite good that wrote no report', () => {
    expect(countSuite(undefined, 0).failed).toBe(1)
  })

  it('says the sum in one line, and skipped only when there are any', () => {
    const one = { passed: 1, failed: 0, skipped: 0 }
    expect(totalsLine(sum([one, { passed: 40, failed: 2, skipped: 0 }]))).toBe('41 passed, 2 failed')
    expect(totalsLine(sum([one, { passed: 0, failed: 0, skipped: 3 }]))).toBe('1 passed, 0 failed, 3 skipped')
  })
})

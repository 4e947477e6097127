import { describe, expect, test } from 'vitest'
import {
  addCounts,
  countsOfPlaywright,
  countsOfVitest,
  formatCounts,
} from '../../src/command/counts.mjs'

describe('the counts of a run', () => {
  test('are added up over both kinds of tests', () => {
    const unit = countsOfVitest({
      numPassedTests: 40,
      numFailedTests: 1,
      numPendingTests: 2,
      numTodoTests: 1,
    })
    const endToEnd = countsOfPlaywright({
      stats: { expected: 10, unexpected: 1, flaky: 0, skipped: 1 },
    })
    expect(addCounts(unit, endToEnd)).toEqual({ passed: 50, failed: 2, skipped: 4 })
  })

  test('a test that passes only at the second try has failed', () => {
    expect(
      countsOfPlaywright({ stats: { expected: 9, unexpected: 0, flaky: 1, skipped: 0 } }),
    ).toEqual({ passed: 9, failed: 1, skipped: 0 })
  })

  test('are said in one line, with the skipped ones only where there are any', () => {
    expect(formatCounts({ passed: 12, failed: 0, skipped: 0 })).toBe('12 passed, 0 failed')
    expect(formatCounts({ passed: 12, failed: 3, skipped: 1 })).toBe(
      '12 passed, 3 failed, 1 skipped',
    )
  })
})

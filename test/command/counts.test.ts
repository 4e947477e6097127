import { describe, expect, test } from 'vitest'
import {
  addCounts,
  countsOfPlaywright,
  countsOfVitest,
  formatCounts,
} from '../../src/command/counts.mjs'

const unit = JSON.stringify({
  numPassedTests: 40,
  numFailedTests: 1,
  numPendingTests: 2,
  numTodoTests: 1,
})

function endToEnd(stats: { expected: number; unexpected: number; flaky: number; skipped: number }) {
  return JSON.stringify({ stats })
}

describe('the counts of a run', () => {
  test('are added up over both kinds of tests', () => {
    const report = endToEnd({ expected: 10, unexpected: 1, flaky: 0, skipped: 1 })
    expect(addCounts(countsOfVitest(unit), countsOfPlaywright(report))).toEqual({
      passed: 50,
      failed: 2,
      skipped: 4,
    })
  })

  test('a test that passes only at the second try has failed', () => {
    const report = endToEnd({ expected: 9, unexpected: 0, flaky: 1, skipped: 0 })
    expect(countsOfPlaywright(report)).toEqual({ passed: 9, failed: 1, skipped: 0 })
  })

  test('are said in one line, with the skipped ones only where there are any', () => {
    expect(formatCounts({ passed: 12, failed: 0, skipped: 0 })).toBe('12 passed, 0 failed')
    expect(formatCounts({ passed: 12, failed: 3, skipped: 1 })).toBe(
      '12 passed, 3 failed, 1 skipped',
    )
  })
})

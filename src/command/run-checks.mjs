import { existsSync, readFileSync } from 'node:fs'
import { addCounts } from './counts.mjs'

/**
 * Runs checks in turn, says the name of each and how long it took, and ends at the first that fails.
 * A check that runs tests fails too where its report is missing, counts a failed test, or counts no
 * test at all. A run that failed never says that nothing did.
 *
 * @param {readonly import('./checks.mjs').Check[]} checks
 * @param {(line: string) => void} say
 * @returns {Promise<{ counts: import('./counts.mjs').Counts, failed: string | undefined }>} the tests
 *   added up, and the name of the check that failed
 */
export async function runChecks(checks, say) {
  let counts = { passed: 0, failed: 0, skipped: 0 }
  for (const check of checks) {
    say(`\n── ${check.name}`)
    const start = performance.now()
    const hasEndedWell = await check.isWell()
    const found = readCounts(check)
    if (found !== undefined) counts = addCounts(counts, found)
    const seconds = ((performance.now() - start) / 1000).toFixed(1)
    const isWell = hasEndedWell && (check.tests === undefined || isProof(found))
    say(`${isWell ? '✓' : '✗'} ${check.name}, ${seconds} s`)
    if (!isWell) {
      return { counts: { ...counts, failed: Math.max(counts.failed, 1) }, failed: check.name }
    }
  }
  return { counts, failed: undefined }
}

/**
 * The counts in the report of a check; undefined where there is none.
 *
 * @param {import('./checks.mjs').Check} check
 */
function readCounts({ tests }) {
  if (tests === undefined || !existsSync(tests.report)) return undefined
  return tests.count(readFileSync(tests.report, 'utf8'))
}

/** @param {import('./counts.mjs').Counts | undefined} counts */
function isProof(counts) {
  return counts !== undefined && counts.passed > 0 && counts.failed === 0
}

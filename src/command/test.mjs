import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createChecks } from './checks.mjs'
import { addCounts, formatCounts } from './counts.mjs'

// `npm test`: every check in turn. The first that fails ends the run, and is named; the last line
// adds up the tests.
const reports = mkdtempSync(join(tmpdir(), 'phasogon-test-'))
let counts = { passed: 0, failed: 0, skipped: 0 }
let failure = ''

for (const check of createChecks(reports)) {
  console.log(`\n── ${check.name}`)
  const start = performance.now()
  let isWell = await check.isWell()
  if (check.report !== undefined && check.count !== undefined && existsSync(check.report)) {
    const found = check.count(JSON.parse(readFileSync(check.report, 'utf8')))
    counts = addCounts(counts, found)
    isWell &&= found.passed > 0 && found.failed === 0
  } else if (check.report !== undefined) isWell = false
  const seconds = ((performance.now() - start) / 1000).toFixed(1)
  console.log(`${isWell ? '✓' : '✗'} ${check.name}, ${seconds} s`)
  if (!isWell) {
    failure = check.name
    break
  }
}

rmSync(reports, { recursive: true, force: true })
if (failure !== '') {
  // A run that failed never says that nothing did.
  counts.failed = Math.max(counts.failed, 1)
  console.error(`\nThe check "${failure}" failed.`)
  process.exitCode = 1
}
console.log(`\n${formatCounts(counts)}`)

import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createChecks } from './checks.mjs'
import { formatCounts } from './counts.mjs'
import { runChecks } from './run-checks.mjs'

// `npm test`: every check in turn. The first that fails ends the run and is named; the last line adds
// up the tests.
const reports = mkdtempSync(join(tmpdir(), 'phasogon-test-'))
const { counts, failed } = await runChecks(createChecks(reports), console.log)
rmSync(reports, { recursive: true, force: true })

if (failed !== undefined) {
  console.log(`\nThe check "${failed}" failed.`)
  process.exitCode = 1
}
console.log(`\n${formatCounts(counts)}`)

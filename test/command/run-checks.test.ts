import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, test } from 'vitest'
import { createChecks } from '../../src/command/checks.mjs'
import { countsOfPlaywright } from '../../src/command/counts.mjs'
import { runChecks } from '../../src/command/run-checks.mjs'

const folder = mkdtempSync(join(tmpdir(), 'phasogon-checks-'))
afterAll(() => rmSync(folder, { recursive: true }))

/** A check that ends as told. */
function check(name: string, ends: boolean) {
  return { name, isWell: async () => ends }
}

/** A check that leaves a report with these counts, and then ends as told. */
function tests(name: string, ends: boolean, expected: number, unexpected: number) {
  const report = join(folder, `${name}.json`)
  const isWell = async () => {
    writeFileSync(report, JSON.stringify({ stats: { expected, unexpected, flaky: 0, skipped: 0 } }))
    return ends
  }
  return { name, isWell, tests: { report, count: countsOfPlaywright } }
}

async function run(...checks: Parameters<typeof runChecks>[0]) {
  const lines: string[] = []
  const result = await runChecks(checks, (line) => lines.push(line))
  return { ...result, lines }
}

describe('npm test', () => {
  test('names every check as it runs, and adds up the tests', async () => {
    const { counts, failed, lines } = await run(
      check('types', true),
      tests('units', true, 30, 0),
      tests('whole jobs', true, 12, 0),
    )
    expect(failed).toBeUndefined()
    expect(counts).toEqual({ passed: 42, failed: 0, skipped: 0 })
    expect(lines[0]).toBe('\n── types')
    expect(lines[1]).toMatch(/^✓ types, \d+\.\d s$/)
    expect(lines).toHaveLength(6)
  })

  test('ends at the first check that fails, and says which', async () => {
    const { counts, failed, lines } = await run(
      tests('units', true, 30, 0),
      check('build', false),
      tests('whole jobs', true, 12, 0),
    )
    expect(failed).toBe('build')
    expect(counts).toEqual({ passed: 30, failed: 1, skipped: 0 })
    expect(lines.at(-1)).toMatch(/^✗ build, /)
  })

  test('fails with a failed test, even where the program that ran it ended well', async () => {
    expect(await run(tests('units', true, 30, 2))).toMatchObject({
      failed: 'units',
      counts: { passed: 30, failed: 2 },
    })
  })

  test('fails where the program that ran the tests failed, even if every test passed', async () => {
    expect(await run(tests('units', false, 30, 0))).toMatchObject({
      failed: 'units',
      counts: { passed: 30, failed: 1 },
    })
  })

  test('fails where no test ran, or nothing says how many did', async () => {
    expect((await run(tests('none', true, 0, 0))).failed).toBe('none')
    const report = join(folder, 'never-written.json')
    const silent = { ...check('silent', true), tests: { report, count: countsOfPlaywright } }
    expect((await run(silent)).failed).toBe('silent')
  })

  test('holds every kind of check, the browser after the build', () => {
    const names = createChecks(folder).map(({ name }) => name)
    expect(names).toEqual([
      'packages installed',
      'browser found',
      'other engines',
      'types',
      'lint and format',
      'room borders',
      'packages used',
      'unit and property tests',
      'production build',
      'end-to-end tests',
    ])
  })

  test('is what a build machine calls', () => {
    expect(readFileSync('.ci/run', 'utf8').trimEnd().split('\n').at(-1)).toBe('npm test')
  })
})

import { join } from 'node:path'
import { prepareBrowser } from './browser.mjs'
import { countsOfPlaywright, countsOfVitest } from './counts.mjs'
import { prepareEngines } from './engines.mjs'
import { preparePackages } from './prepare.mjs'
import { commandFile, run } from './run.mjs'

/**
 * A step of `npm test`: what it is called, what it does (true: all is well), and, where it runs
 * tests, the JSON report it leaves and how to count in it.
 *
 * @typedef {object} Check
 * @property {string} name
 * @property {() => Promise<boolean>} isWell
 * @property {{ report: string, count: (report: string) => import('./counts.mjs').Counts }} [tests]
 */

/**
 * Every step of `npm test`, in order.
 *
 * @param {string} reports a folder for the reports
 * @returns {Check[]}
 */
export function createChecks(reports) {
  const unit = join(reports, 'unit.json')
  const endToEnd = join(reports, 'end-to-end.json')
  return [
    { name: 'packages installed', isWell: preparePackages },
    { name: 'browser found', isWell: prepareBrowser },
    { name: 'other engines', isWell: prepareEngines },
    { name: 'types', isWell: () => installed('typescript', 'tsc', ['-b']) },
    {
      name: 'lint and format',
      isWell: () =>
        installed('@biomejs/biome', 'biome', [
          'check',
          '--config-path=.config',
          '--error-on-warnings',
          '.',
        ]),
    },
    { name: 'room borders', isWell: () => own('check-rooms.mjs') },
    { name: 'packages used', isWell: () => own('check-packages.mjs') },
    {
      name: 'unit and property tests',
      isWell: () =>
        installed('vitest', 'vitest', [
          'run',
          '--allowOnly=false',
          '--reporter=default',
          '--reporter=json',
          `--outputFile.json=${unit}`,
        ]),
      tests: { report: unit, count: countsOfVitest },
    },
    { name: 'production build', isWell: () => installed('vite', 'vite', ['build']) },
    {
      name: 'end-to-end tests',
      isWell: () =>
        installed(
          '@playwright/test',
          'playwright',
          [
            'test',
            '--config=.config/playwright.config.ts',
            '--forbid-only',
            '--reporter=list,json',
          ],
          { PLAYWRIGHT_JSON_OUTPUT_FILE: endToEnd },
        ),
      tests: { report: endToEnd, count: countsOfPlaywright },
    },
  ]
}

/**
 * Runs a command of an installed package.
 *
 * @param {string} packageName
 * @param {string} command
 * @param {string[]} given
 * @param {NodeJS.ProcessEnv} [environment]
 */
async function installed(packageName, command, given, environment) {
  const file = commandFile(packageName, command)
  return (await run(process.execPath, [file, ...given], { environment })) === 0
}

/**
 * Runs a command of ours in a Node of its own, since what it imports may just have been installed.
 *
 * @param {string} file
 */
async function own(file) {
  return (await run(process.execPath, [join('src', 'command', file)])) === 0
}

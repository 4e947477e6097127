import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectFolder, run } from './run.mjs'

/**
 * A lock file as npm writes it, as far as it matters here.
 *
 * @typedef {{ packages?: Record<string, { version?: string, integrity?: string, optional?: boolean, devOptional?: boolean }> }} Lock
 */

/**
 * Whether what is installed is what the lock file asks for: every package at its version, and no
 * package besides. Optional ones are for other systems, and may be absent.
 *
 * @param {Lock} wanted `package-lock.json`
 * @param {Lock | undefined} installed `node_modules/.package-lock.json`, which npm writes last
 * @returns {boolean}
 */
export function isInstalled(wanted, installed) {
  if (installed?.packages === undefined) return false
  const found = installed.packages
  const asked = Object.entries(wanted.packages ?? {}).filter(([folder]) => folder !== '')
  const names = new Set(asked.map(([folder]) => folder))
  return (
    Object.keys(found).every((folder) => names.has(folder)) &&
    asked.every(([folder, entry]) => {
      const there = found[folder]
      if (there === undefined) return entry.optional === true || entry.devOptional === true
      return there.version === entry.version && there.integrity === entry.integrity
    })
  )
}

/**
 * Installs what the lock file asks for, where it is not installed already.
 *
 * @returns {Promise<boolean>} whether everything is there
 */
export async function preparePackages() {
  const wanted = readLock('package-lock.json')
  if (wanted === undefined) {
    console.error('package-lock.json is missing: fetch the project again.')
    return false
  }
  if (isInstalled(wanted, readLock('node_modules/.package-lock.json'))) return true
  console.log('Installing the packages that the lock file names …')
  if ((await runNpm(['ci', '--include=dev', '--no-audit', '--no-fund'])) === 0) return true
  console.error('The packages could not be installed: see what npm said above.')
  return false
}

/**
 * @param {string} name
 * @returns {Lock | undefined}
 */
function readLock(name) {
  const file = join(projectFolder, name)
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined
}

/**
 * Runs the npm that called us; where none did, the one that the system finds.
 *
 * @param {string[]} given
 */
function runNpm(given) {
  const own = process.env.npm_execpath
  if (own?.endsWith('npm-cli.js')) return run(process.execPath, [own, ...given])
  return run('npm', given, { shell: process.platform === 'win32' })
}

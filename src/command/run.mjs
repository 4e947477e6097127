import { spawn } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The folder of the project, whatever folder a command was called from. */
export const projectFolder = join(dirname(fileURLToPath(import.meta.url)), '..', '..')

/**
 * Runs a program in the project's folder, its output passed straight on, and promises its exit
 * status. A program that cannot be started, or that outlives its time, counts as failed (status 1).
 *
 * @param {string} program
 * @param {readonly string[]} given
 * @param {{ environment?: NodeJS.ProcessEnv | undefined, milliseconds?: number, shell?: boolean }} [options]
 * @returns {Promise<number>}
 */
export function run(program, given, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, given, {
      cwd: projectFolder,
      stdio: 'inherit',
      env: { ...process.env, ...options.environment },
      shell: options.shell ?? false,
      timeout: options.milliseconds,
    })
    child.on('error', (error) => {
      console.error(`${program} did not start: ${error.message}`)
      resolve(1)
    })
    child.on('close', (status) => resolve(status ?? 1))
  })
}

/**
 * The file behind a command of an installed package, to be run by this same Node, so that neither
 * a shell nor the system's way of linking commands matters.
 *
 * @param {string} packageName
 * @param {string} command
 * @returns {string}
 */
export function commandFile(packageName, command) {
  const folder = join(projectFolder, 'node_modules', packageName)
  const { bin } = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8'))
  const file = typeof bin === 'string' ? bin : bin?.[command]
  if (typeof file !== 'string') throw new Error(`The package ${packageName} has no ${command}.`)
  return join(folder, file)
}

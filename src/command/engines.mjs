import { existsSync, readdirSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { run } from './run.mjs'

/**
 * What drives a WebKit: its driver, the browser that the driver starts, and a screen for it.
 *
 * @typedef {{ driver: string, browser: string, screen: string }} WebKit
 */

/** The Firefox of this machine; undefined where there is none. */
export function maybeFirefox() {
  return onPath('firefox-esr') ?? onPath('firefox')
}

/**
 * The WebKit of this machine, as Debian packs it; undefined where a part of it is missing.
 *
 * @returns {WebKit | undefined}
 */
export function maybeWebKit() {
  const driver = onPath('WebKitWebDriver')
  const screen = onPath('xvfb-run')
  const browser = ['/usr/lib', '/usr/libexec']
    .flatMap((folder) => [folder, ...foldersIn(folder)])
    .flatMap((folder) => ['4.1', '6.0', '4.0'].map((api) => join(folder, `webkit2gtk-${api}`)))
    .map((folder) => join(folder, 'MiniBrowser'))
    .find((file) => existsSync(file))
  return driver && screen && browser ? { driver, browser, screen } : undefined
}

/**
 * Installs the engines that are missing beside Chromium, as root on a system with apt-get. Where that
 * cannot be done, the tests in them are skipped.
 *
 * @returns {Promise<boolean>} true: a missing engine fails no run
 */
export async function prepareEngines() {
  const wanted = [
    ...(maybeFirefox() ? [] : ['firefox-esr']),
    ...(maybeWebKit() ? [] : ['webkit2gtk-driver', 'xvfb', 'xauth']),
  ]
  if (wanted.length > 0 && process.platform === 'linux' && process.getuid?.() === 0) {
    console.log(`Installing ${wanted.join(', ')} with apt-get …`)
    const options = ['-o', 'DPkg::Lock::Timeout=300']
    const given = { environment: { DEBIAN_FRONTEND: 'noninteractive' }, milliseconds: 240_000 }
    await run('apt-get', [...options, 'update'], given)
    await run('apt-get', [...options, 'install', '-y', '--no-install-recommends', ...wanted], given)
  }
  const skipped = 'not here, so its tests are skipped'
  console.log(`Firefox: ${maybeFirefox() ?? skipped}`)
  console.log(`WebKit: ${maybeWebKit()?.browser ?? skipped}`)
  return true
}

/** @param {string} name */
function onPath(name) {
  return (process.env.PATH ?? '')
    .split(delimiter)
    .map((folder) => join(folder, name))
    .find((file) => existsSync(file))
}

/** @param {string} folder */
function foldersIn(folder) {
  if (!existsSync(folder)) return []
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => join(folder, entry.name))
}

import { execFile } from 'node:child_process'
import { accessSync, constants } from 'node:fs'
import { delimiter, join } from 'node:path'
import { promisify } from 'node:util'
import { commandFile, run } from './run.mjs'

/** What a Chromium is called on a search path; first the one without a window, which starts twice as fast. */
const names = [
  'chromium-headless-shell',
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'chrome',
]

/** Where a Chromium lies that is on no search path. */
const places = [
  '/usr/bin/chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
]

/** Flags that keep Chromium to the page: no sandbox (a container has none), no traffic of its own. */
export const browserFlags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  // Without it a Chromium without a window sets letters on whole pixels.
  '--font-render-hinting=none',
]

/**
 * Finds a Chromium that starts: the one that PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH names, one of the
 * machine, or Playwright's own.
 *
 * @returns {Promise<string | undefined>} its path, or undefined where there is none
 */
export async function maybeBrowser() {
  const named = process.env.PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH
  const candidates = [
    ...(named ? [named] : []),
    ...names.flatMap(onPath),
    ...places,
    ...(await playwrightsOwn()),
  ]
  for (const path of new Set(candidates)) {
    if (await starts(path)) return path
  }
  return undefined
}

/**
 * Finds a Chromium, and installs one where there is none: as root on a system with apt-get the
 * system's package, else Playwright's own.
 *
 * @returns {Promise<boolean>} whether there is one
 */
export async function prepareBrowser() {
  const ways = [installSystems, installPlaywrights]
  for (let way = 0; ; way += 1) {
    const path = await maybeBrowser()
    if (path !== undefined) {
      console.log(`Chromium: ${path}`)
      return true
    }
    const install = ways[way]
    if (install === undefined) break
    await install()
  }
  console.error(
    'No Chromium was found, and none could be installed: install one (on Debian: apt-get install chromium), ' +
      'or name yours in PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH, and run the command again.',
  )
  return false
}

/** @param {string} name */
function onPath(name) {
  const folders = (process.env.PATH ?? '').split(delimiter).filter((folder) => folder !== '')
  return folders.map((folder) => join(folder, name))
}

/** Playwright may not be installed yet, so it is only loaded here. */
async function playwrightsOwn() {
  const { chromium } = await import('playwright-core')
  return [chromium.executablePath()]
}

/**
 * A name on the path may be a stub, or lack a library: ask it for its version. On Windows that
 * question opens a window, so there its presence must do.
 *
 * @param {string} path
 */
async function starts(path) {
  try {
    accessSync(path, constants.X_OK)
    if (process.platform === 'win32') return true
    await promisify(execFile)(path, ['--version', '--no-sandbox'], { timeout: 20_000 })
    return true
  } catch {
    return false
  }
}

async function installPlaywrights() {
  console.log("No Chromium on this machine: fetching Playwright's own …")
  await run(
    process.execPath,
    [commandFile('playwright-core', 'playwright-core'), 'install', '--no-shell', 'chromium'],
    { environment: { PLAYWRIGHT_DOWNLOAD_CONNECTION_TIMEOUT: '10000' }, milliseconds: 240_000 },
  )
}

async function installSystems() {
  if (process.platform !== 'linux' || process.getuid?.() !== 0) return
  console.log("Installing the system's Chromium with apt-get …")
  const options = ['-o', 'DPkg::Lock::Timeout=300']
  const environment = { DEBIAN_FRONTEND: 'noninteractive' }
  await run('apt-get', [...options, 'update'], { environment })
  for (const name of ['chromium-headless-shell', 'chromium']) {
    const install = [...options, 'install', '-y', '--no-install-recommends', name]
    if ((await run('apt-get', install, { environment })) === 0) return
  }
}
